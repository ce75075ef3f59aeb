import type { Records, Scenario } from "../../scenario/scenario.ts";
import { rowLength } from "../cells/cell-row.ts";
import { CellRuns, type CellStart } from "../cells/cell-runs.ts";
import { axisValues, cellPlace, sizesOf } from "./axis-values.ts";
import type { SweepPlan } from "./sweep-plan.ts";
import { tileCells } from "./tiles.ts";

export interface TileSettings {
  readonly records?: Records;
  /** Called after each cell with how many of the tile are done; returning false ends the tile, and its rows are lost. */
  readonly onCell?: (done: number) => boolean;
}

/**
 * Runs the cells of one tile here and now. A cell that is refused or cut off says so in its row, and the rest goes on.
 *
 * @param scenario the checked scenario of a checked plan
 * @returns the rows in the order of `tileCells` (see `CellRow`); null where `onCell` ended it
 */
export function runTile(
  scenario: Scenario,
  plan: SweepPlan,
  tile: number,
  settings: TileSettings = {},
): Float64Array | null {
  const cells = tileCells(plan, tile);
  const length = rowLength(plan);
  const rows = new Float64Array(cells.length * length);
  const runner = new SweepRunner(scenario, plan, settings.records);
  for (let i = 0; i < cells.length; i++) {
    runner.run(cells[i], rows.subarray(i * length, (i + 1) * length));
    if (settings.onCell?.(i + 1) === false) return null;
  }
  return rows;
}

/** Runs cells one after another; with continuation each from where the one before it in its line ended. */
export class SweepRunner {
  private readonly cells: CellRuns;
  private readonly values: readonly (readonly number[])[];
  private readonly at: Float64Array;
  private start: CellStart;

  constructor(
    private readonly base: Scenario,
    private readonly plan: SweepPlan,
    records: Records | undefined,
  ) {
    const { axes, links, quantities } = plan;
    this.cells = new CellRuns({ scenario: base, varied: axes.map(({ path }) => path), links, quantities, records });
    this.values = axes.map(axisValues);
    this.at = new Float64Array(axes.length);
    this.start = base.initial;
  }

  /** Runs one cell into its row, which must be all 0. */
  run(index: number, row: Float64Array): void {
    const { places } = cellPlace(this.plan, index);
    this.values.forEach((values, i) => (this.at[i] = values[places[i]]));
    if (this.plan.continuation === "none") this.cells.run(this.at, row);
    else {
      const start = this.startOf(index);
      this.start = this.cells.runFrom(start, this.at, row) ?? start;
    }
  }

  /** Where a cell starts, those before it in its line having been run: the first of a line as the scenario does. */
  startOf(index: number): CellStart {
    const [first] = sizesOf(this.plan);
    const { places, isDown } = cellPlace(this.plan, index);
    return places[0] === (isDown ? first - 1 : 0) ? this.base.initial : this.start;
  }
}
