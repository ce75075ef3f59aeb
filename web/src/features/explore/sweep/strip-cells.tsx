import { memo } from "react";
import type { CellFigures } from "@restband/solver";
import type { SweepCells } from "./sweep-cells.ts";
import { cornerOf, type MapFrame } from "./map-frame.ts";
import { outcomeMarks } from "./outcome-marks.ts";

interface StripCellsProps {
  cells: SweepCells;
  frame: MapFrame;
  /** Number of the first cell of the branch shown. */
  first: number;
  /** Changes with the cells. */
  edition: number;
}

/** Each cell as a strip of one cycle: how much of the time it sticks, hatched; how much it slides, solid above. */
export const StripCells = memo(function StripCells({ cells, frame, first }: StripCellsProps) {
  const { columns, rows, cellWidth, cellHeight } = frame;
  const gap = Math.min(2, cellWidth * 0.08);
  const box = { width: cellWidth - gap, height: cellHeight - gap };
  return (
    <g>
      {Array.from({ length: columns * rows }, (_, i) => {
        const { x, y } = cornerOf(frame, i % columns, Math.floor(i / columns));
        return <StripCell key={i} figures={cells.read(first + i)} x={x} y={y} {...box} />;
      })}
    </g>
  );
});

interface StripCellProps {
  figures: CellFigures | null;
  x: number;
  y: number;
  width: number;
  height: number;
}

function StripCell({ figures, x, y, width, height }: StripCellProps) {
  if (!figures) return <Pending x={x} y={y} width={width} height={height} />;
  const { outcome, quantities } = figures;
  if (outcome === null) return <Refused x={x} y={y} width={width} height={height} />;
  // The plan's first quantity is the share of time stuck.
  const stuck = quantities[0] ?? 0;
  const half = height / 2;
  if (outcome === "stick-slip")
    return (
      <>
        <rect x={x + stuck * width} y={y} width={(1 - stuck) * width} height={half} className="fill-slip" />
        <rect x={x} y={y + half * 0.75} width={stuck * width} height={half} fill={outcomeMarks[outcome].fill} />
      </>
    );
  const isSlip = outcome === "smooth-sliding" || outcome === "settles";
  return <rect x={x} y={y} width={width} height={isSlip ? half : height} fill={outcomeMarks[outcome].fill} />;
}

function Pending({ x, y, width, height }: Omit<StripCellProps, "figures">) {
  return (
    <>
      <rect x={x + 0.5} y={y + 0.5} width={width - 1} height={height - 1} className="fill-none stroke-line" />
      {width > 6 && <circle cx={x + width / 2} cy={y + height / 2} r={1.5} className="fill-quiet" />}
    </>
  );
}

function Refused({ x, y, width, height }: Omit<StripCellProps, "figures">) {
  const d = `M${x + 2} ${y + 2}l${width - 4} ${height - 4}m0 ${4 - height}l${4 - width} ${height - 4}`;
  return <path d={d} className="fill-none stroke-edge" strokeWidth={1} />;
}
