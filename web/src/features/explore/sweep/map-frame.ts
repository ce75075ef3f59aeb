import type { AxisScale } from "./axis-scale.ts";

/** Where the cells of a map stand, px. The first axis runs to the right, the second upwards. */
export interface MapFrame {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly top: number;
  readonly cellWidth: number;
  readonly cellHeight: number;
  readonly columns: number;
  readonly rows: number;
}

const LEFT = 58;
const RIGHT = 4;
const TOP = 26;
const BOTTOM = 48;

export function mapFrame(width: number, across: AxisScale, up: AxisScale | null): MapFrame {
  const columns = across.count;
  const rows = up?.count ?? 1;
  const cellWidth = (width - LEFT - RIGHT) / columns;
  // Low wide cells, as a strip is, and no map taller than a screen.
  const cellHeight = up ? Math.min(Math.max(34, cellWidth * 0.72), 440 / rows) : 44;
  const height = TOP + BOTTOM + Math.max(rows * cellHeight, up ? 180 : 44);
  return {
    width,
    height,
    left: LEFT,
    top: TOP,
    cellWidth,
    cellHeight: (height - TOP - BOTTOM) / rows,
    columns,
    rows,
  };
}

/** Left upper corner of a cell by its places along the axes. */
export const cornerOf = ({ left, top, cellWidth, cellHeight, rows }: MapFrame, column: number, row: number) => ({
  x: left + column * cellWidth,
  y: top + (rows - 1 - row) * cellHeight,
});

/** A point by its places on the axes, counted in cells. */
export const pointOf = ({ left, top, cellWidth, cellHeight, rows }: MapFrame, across: number, up: number) => ({
  x: left + across * cellWidth,
  y: top + (rows - up) * cellHeight,
});

/** The cell under a point of the map; null beside it. */
export function cellAt(frame: MapFrame, x: number, y: number): { column: number; row: number } | null {
  const column = Math.floor((x - frame.left) / frame.cellWidth);
  const row = frame.rows - 1 - Math.floor((y - frame.top) / frame.cellHeight);
  const isInside = column >= 0 && column < frame.columns && row >= 0 && row < frame.rows;
  return isInside ? { column, row } : null;
}
