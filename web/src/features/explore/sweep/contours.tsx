import { contours as contoursOf } from "d3-contour";
import { memo } from "react";
import type { MapFrame } from "./map-frame.ts";
import { shareOn, type Shown } from "./shown.ts";
import type { SweepCells } from "./sweep-cells.ts";

interface ContoursProps {
  cells: SweepCells;
  frame: MapFrame;
  first: number;
  shown: Extract<Shown, { kind: "quantity" }>;
  edition: number;
}

/** Lines of one sixth of the scale each; cells without a value take part with the low end. */
export const Contours = memo(function Contours({ cells, frame, first, shown }: ContoursProps) {
  const { columns, rows, left, top, cellWidth, cellHeight } = frame;
  if (columns < 2 || rows < 2 || shown.high <= shown.low) return null;
  const shares = Array.from({ length: columns * rows }, (_, i) => {
    const [column, row] = [i % columns, rows - 1 - Math.floor(i / columns)];
    const value = cells.quantity(first + row * columns + column, shown.place);
    return value === null ? 0 : shareOn(shown, value);
  });
  const lines = contoursOf().size([columns, rows]).thresholds(levels)(shares);
  return (
    <g className="fill-none stroke-ink" strokeWidth={1} opacity={0.75}>
      {lines.map(({ value, coordinates }) => (
        <path key={value} d={coordinates.flat().map(ringPath).join("")} />
      ))}
    </g>
  );

  /** Rings run along the edge of the map too: there they are no line of equal value and are left out. */
  function ringPath(ring: readonly number[][]): string {
    let d = "";
    let isDown = false;
    for (const [x, y] of ring) {
      const isEdge = x <= 0.5 || y <= 0.5 || x >= columns - 0.5 || y >= rows - 0.5;
      d += isEdge
        ? ""
        : `${isDown ? "L" : "M"}${(left + x * cellWidth).toFixed(1)} ${(top + y * cellHeight).toFixed(1)}`;
      isDown = !isEdge;
    }
    return d;
  }
});

const LEVELS = 6;
const levels = Array.from({ length: LEVELS - 1 }, (_, i) => (i + 1) / LEVELS);
