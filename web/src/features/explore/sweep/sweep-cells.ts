import {
  cellCount,
  keptAt,
  quantityAt,
  readRow,
  rowLength,
  tileCells,
  type CellFigures,
  type SweepPlan,
} from "@restband/solver";

/** The cells of a sweep that are there so far, by their number. */
export class SweepCells {
  readonly plan: SweepPlan;
  readonly count: number;
  /** Rows of all cells one after the other; those that are not there are 0. */
  private readonly figures: Float64Array;
  private readonly isThere: Uint8Array;
  private readonly tiles = new Set<number>();
  private readonly length: number;
  private readonly limits: number;
  done = 0;

  constructor(plan: SweepPlan, limits: number) {
    this.plan = plan;
    this.limits = limits;
    this.count = cellCount(plan);
    this.length = rowLength(plan);
    this.figures = new Float64Array(this.count * this.length);
    this.isThere = new Uint8Array(this.count);
  }

  hasTile = (tile: number): boolean => this.tiles.has(tile);

  /** Puts the rows of a tile where its cells are. */
  setTile(tile: number, rows: Float64Array): void {
    if (this.tiles.has(tile)) return;
    this.tiles.add(tile);
    tileCells(this.plan, tile).forEach((cell, i) => {
      this.figures.set(rows.subarray(i * this.length, (i + 1) * this.length), cell * this.length);
      this.isThere[cell] = 1;
      this.done += 1;
    });
  }

  /** The rows of a tile as they were handed in; undefined while it is not there. */
  rowsOf(tile: number): Float64Array | undefined {
    if (!this.tiles.has(tile)) return undefined;
    const cells = tileCells(this.plan, tile);
    const rows = new Float64Array(cells.length * this.length);
    cells.forEach((cell, i) =>
      rows.set(this.figures.subarray(cell * this.length, (cell + 1) * this.length), i * this.length),
    );
    return rows;
  }

  /** Null while the cell is not there. */
  read(cell: number): CellFigures | null {
    return this.isThere[cell] === 1 ? readRow(this.figures, cell * this.length, this.plan, this.limits) : null;
  }

  /** The outcome's code alone, negative where it is refused; null while the cell is not there. */
  code(cell: number): number | null {
    return this.isThere[cell] === 1 ? this.figures[cell * this.length] : null;
  }

  /** The value of the quantity at a place of the plan; null where there is none, and while the cell is not there. */
  quantity(cell: number, place: number): number | null {
    return this.isThere[cell] === 1 ? quantityAt(this.figures, cell * this.length, place) : null;
  }

  /** The verdict of a limit; null where it cannot be judged, and while the cell is not there. */
  kept(cell: number, limit: number): boolean | null {
    return this.isThere[cell] === 1 ? keptAt(this.figures[cell * this.length + 1], limit) : null;
  }
}
