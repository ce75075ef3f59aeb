import type { LimitLine, Scenario } from "@restband/solver";
import { useId, type KeyboardEvent, type MouseEvent } from "react";
import { useWidth } from "../../../components/use-width.ts";
import { outcomeWords } from "../../../format/outcomes.ts";
import type { AxisScale } from "./axis-scale.ts";
import { CanvasCells } from "./canvas-cells.tsx";
import { MapAxes } from "./map-axes.tsx";
import { cellAt, cornerOf, mapFrame, type MapFrame } from "./map-frame.ts";
import { MapLines } from "./map-lines.tsx";
import { regionLabels, type RegionLabel } from "./region-labels.ts";
import type { Shown } from "./shown.ts";
import { StripCells } from "./strip-cells.tsx";
import type { SweepCells } from "./sweep-cells.ts";
import { Contours } from "./contours.tsx";

interface SweepMapProps {
  cells: SweepCells;
  scenario: Scenario;
  across: AxisScale;
  up: AxisScale | null;
  /** Number of the first cell of the branch shown. */
  first: number;
  shown: Shown;
  lines: readonly LimitLine[];
  /** The selected cell, counted within the branch. */
  selected: number | null;
  onSelect: (cell: number) => void;
  onOpen?: () => void;
  edition: number;
}

const MOST_STRIPS = 1600;

/** The map of a sweep: cells, searched lines, names of the regions, axes; the arrow keys move the selection. */
export function SweepMap(props: SweepMapProps) {
  const { cells, scenario, across, up, first, shown, lines, selected, onSelect, onOpen, edition } = props;
  const [ref, width] = useWidth<HTMLDivElement>(834);
  const frame = mapFrame(width, across, up);
  const asStrips = shown.kind === "outcome" && frame.columns * frame.rows <= MOST_STRIPS;
  const labels = shown.kind !== "quantity" && up ? regionLabels(cells, first, frame, shown) : [];
  const labelId = useId();
  const press = (event: KeyboardEvent): void => {
    const moved = movedBy(event.key, selected ?? 0, frame);
    if (moved !== null) {
      event.preventDefault();
      onSelect(moved);
    } else if (event.key === "Enter") onOpen?.();
  };
  const click = (event: MouseEvent<HTMLDivElement>): void => {
    const box = event.currentTarget.getBoundingClientRect();
    const hit = cellAt(frame, event.clientX - box.left, event.clientY - box.top);
    if (hit) onSelect(hit.row * frame.columns + hit.column);
  };
  return (
    <div ref={ref}>
      <div
        role="application"
        aria-roledescription="map of cells"
        aria-labelledby={labelId}
        tabIndex={0}
        className="relative cursor-crosshair"
        style={{ height: frame.height }}
        onKeyDown={press}
        onClick={click}
      >
        <span id={labelId} className="sr-only">
          {`Map of ${across.name}${up ? ` and ${up.name}` : ""}. ${selectionWords(props)}`}
        </span>
        {!asStrips && <CanvasCells {...{ cells, frame, first, shown, edition }} />}
        <svg
          width={frame.width}
          height={frame.height}
          className="absolute inset-0 forced-color-adjust-none"
          aria-hidden="true"
        >
          {!asStrips && <Rim frame={frame} />}
          {asStrips && <StripCells {...{ cells, frame, first, edition }} />}
          {shown.kind === "quantity" && up && <Contours {...{ cells, frame, first, shown, edition }} />}
          {up && <MapLines {...{ frame, across, up, shown, lines, scenario }} taken={labels} />}
          <Regions labels={labels} />
          <MapAxes {...{ frame, across, up, selected }} />
          {selected !== null && <Selection frame={frame} cell={selected} />}
        </svg>
      </div>
    </div>
  );
}

const steps: Record<string, [number, number]> = {
  ArrowLeft: [-1, 0],
  ArrowRight: [1, 0],
  ArrowUp: [0, 1],
  ArrowDown: [0, -1],
};

function movedBy(key: string, cell: number, { columns, rows }: MapFrame): number | null {
  const step = Object.hasOwn(steps, key) ? steps[key] : null;
  if (!step) return null;
  const column = Math.min(columns - 1, Math.max(0, (cell % columns) + step[0]));
  const row = Math.min(rows - 1, Math.max(0, Math.floor(cell / columns) + step[1]));
  return row * columns + column;
}

function selectionWords({ selected, cells, first, across, up }: SweepMapProps): string {
  if (selected === null) return "No cell is selected.";
  const figures = cells.read(first + selected);
  const column = selected % across.count;
  const row = Math.floor(selected / across.count);
  const at = `${across.name} ${across.text(across.values[column])} ${across.unit.label}`;
  const and = up ? `, ${up.name} ${up.text(up.values[row])} ${up.unit.label}` : "";
  const what = !figures ? "still to come" : figures.outcome ? outcomeWords[figures.outcome] : "no answer";
  return `Selected: ${at}${and}: ${what}.`;
}

/** Where the map is, also before any of its cells is. */
function Rim({ frame: { left, top, columns, cellWidth, rows, cellHeight } }: { frame: MapFrame }) {
  const box = { x: left, y: top, width: columns * cellWidth, height: rows * cellHeight };
  return <rect {...box} className="fill-none stroke-line" />;
}

function Selection({ frame, cell }: { frame: MapFrame; cell: number }) {
  const { x, y } = cornerOf(frame, cell % frame.columns, Math.floor(cell / frame.columns));
  const [width, height] = [Math.max(8, frame.cellWidth + 2), Math.max(8, frame.cellHeight + 2)];
  return (
    <>
      <rect x={x - 2} y={y - 2} width={width} height={height} className="fill-none stroke-paper" strokeWidth={4} />
      <rect x={x - 2} y={y - 2} width={width} height={height} className="fill-none stroke-ink" strokeWidth={2.25} />
    </>
  );
}

/** The name of each region, on plain ground, where it is widest. */
function Regions({ labels }: { labels: readonly RegionLabel[] }) {
  return labels.map(({ words, x, y, width }) => (
    <g key={words}>
      <rect x={x - width / 2} y={y - 12} width={width} height={23} rx={2} className="fill-paper" opacity={0.94} />
      <text x={x} y={y + 5} textAnchor="middle" className="fill-ink text-[15px] font-bold">
        {words}
      </text>
    </g>
  ));
}
