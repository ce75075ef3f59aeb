import { axisValues, sizesOf } from "./axis-values.ts";
import type { SweepPlan } from "./sweep-plan.ts";

/** Which two neighbours: `axis` 0 the cell at column and row with the one to its right, 1 with the one above. */
export type EdgePlace = `${0 | 1} ${number} ${number}`;

/** Two neighbouring cells of a map that differ. */
export interface MapEdge<Side> {
  readonly place: EdgePlace;
  readonly axis: 0 | 1;
  readonly column: number;
  readonly row: number;
  readonly from: Side;
  readonly to: Side;
  /** The values of the field of `axis` in the one and in the other; SI. */
  readonly low: number;
  readonly high: number;
  /** The value of the other field, which both have. */
  readonly beside: number;
}

export const edgePlace = (axis: 0 | 1, column: number, row: number): EdgePlace => `${axis} ${column} ${row}`;

/** All neighbours of a map of two fields that differ, row by row. @param sideOf of the cell at an index; null is like nothing and unlike nothing */
export function mapEdges<Side>(plan: SweepPlan, sideOf: (index: number) => Side | null): MapEdge<Side>[] {
  const [columns, rows] = sizesOf(plan);
  const values = plan.axes.map(axisValues);
  const sides = Array.from({ length: columns * rows }, (_, index) => sideOf(index));
  const edges: MapEdge<Side>[] = [];
  const look = (axis: 0 | 1, column: number, row: number): void => {
    const here = row * columns + column;
    const [from, to] = [sides[here], sides[axis === 0 ? here + 1 : here + columns]];
    if (from === null || to === null || from === to) return;
    const at = axis === 0 ? column : row;
    const beside = axis === 0 ? values[1][row] : values[0][column];
    const place = edgePlace(axis, column, row);
    edges.push({ place, axis, column, row, from, to, low: values[axis][at], high: values[axis][at + 1], beside });
  };
  for (let row = 0; row < rows; row++)
    for (let column = 0; column < columns; column++) {
      if (column + 1 < columns) look(0, column, row);
      if (row + 1 < rows) look(1, column, row);
    }
  return edges;
}
