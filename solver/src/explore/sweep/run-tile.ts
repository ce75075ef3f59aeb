import type { Result } from "../../result.ts";
import { compileProblem } from "../../scenario/compile-problem.ts";
import { needsAdaptive } from "../../scenario/needs-adaptive.ts";
import type { Problem } from "../../scenario/problem.ts";
import type { Records, Scenario } from "../../scenario/scenario.ts";
import { unsupported } from "../../scenario/unsupported.ts";
import { simulateProblem } from "../../simulate.ts";
import type { SimulateOptions } from "../../options.ts";
import { inputsAt, lowestInputHz } from "../motion-inputs.ts";
import { axisValues, cellPlace, sizesOf } from "./axis-values.ts";
import { cellOutcomes, cellRefusals, limitsCode, rowHead, rowLength } from "./cell-row.ts";
import { CellSetter } from "./cell-setter.ts";
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
  const runner = new CellRunner(scenario, plan, settings.records);
  for (let i = 0; i < cells.length; i++) {
    runner.run(cells[i], rows.subarray(i * length, (i + 1) * length));
    if (settings.onCell?.(i + 1) === false) return null;
  }
  return rows;
}

/** Where a cell starts from. */
interface Start {
  readonly displacement: number;
  readonly velocity: number;
}

/** Runs cells one after another; with continuation each from where the one before it in its line ended. */
export class CellRunner {
  private readonly setter: CellSetter;
  private readonly values: readonly (readonly number[])[];
  private readonly at: Float64Array;
  private readonly isComputed: boolean;
  private start: Start;

  constructor(
    private readonly base: Scenario,
    private readonly plan: SweepPlan,
    private readonly records: Records | undefined,
  ) {
    this.setter = new CellSetter(
      base,
      plan.axes.map(({ path }) => path),
      plan.links,
    );
    this.values = plan.axes.map(axisValues);
    this.at = new Float64Array(plan.axes.length);
    this.isComputed = unsupported(base, records) === null;
    this.start = base.initial;
  }

  /** Runs one cell into its row, which must be all 0. */
  run(index: number, row: Float64Array): void {
    const isContinued = this.plan.continuation !== "none";
    if (isContinued) this.start = this.startOf(index);
    if (!this.set(index)) row[0] = cellRefusals.refused;
    else if (!this.isComputed) row[0] = cellRefusals["not-computed"];
    else this.fill(row, isContinued);
  }

  private set(index: number): boolean {
    const { places } = cellPlace(this.plan, index);
    this.values.forEach((values, i) => (this.at[i] = values[places[i]]));
    return this.setter.set(this.at) === null;
  }

  private fill(row: Float64Array, isContinued: boolean): void {
    try {
      const { scenario } = this.setter;
      const compiled = compileProblem(scenario, this.records);
      const problem = isContinued ? { ...compiled, initial: this.start } : compiled;
      const end = isContinued ? wholePeriods(problem) : null;
      const result = simulateProblem(problem, needsAdaptive(scenario) === null, this.options(end));
      fillRow(row, result, this.plan);
      if (end !== null && result.outcome !== null) this.start = startAfter(problem, end, result);
    } catch {
      row.fill(0);
      row[0] = cellRefusals.failed;
    }
  }

  private options(end: number | null): SimulateOptions {
    const { quantities } = this.plan;
    return { quantities, samples: 0, events: false, energy: false, ...(end === null ? {} : { at: [end] }) };
  }

  /** Where a cell starts, those before it in its line having been run: the first of a line as the scenario does. */
  startOf(index: number): Start {
    const [first] = sizesOf(this.plan);
    const { places, isDown } = cellPlace(this.plan, index);
    return places[0] === (isDown ? first - 1 : 0) ? this.base.initial : this.start;
  }
}

function fillRow(row: Float64Array, { outcome, ended, limits, quantities }: Result, plan: SweepPlan): void {
  if (outcome === null) {
    row[0] = ended === "max-events" || ended === "max-work" ? cellRefusals[ended] : cellRefusals.failed;
    return;
  }
  row[0] = cellOutcomes.indexOf(outcome);
  row[1] = limitsCode(limits);
  plan.quantities.forEach((name, i) => {
    const value = quantities[name];
    if (value === null) row[2] += 2 ** i;
    else row[rowHead + i] = value;
  });
}

/** The last instant of the span that is a whole number of periods of the lowest input; the end without one. */
function wholePeriods(problem: Problem): number {
  const hz = lowestInputHz(problem);
  if (hz === null) return problem.seconds;
  const periods = Math.floor(problem.seconds * hz * (1 + 1e-12));
  return periods === 0 ? problem.seconds : Math.min(problem.seconds, periods / hz);
}

/** The state at an instant, told as a start at t = 0: as far from the base and as fast past it as it was then. */
function startAfter(problem: Problem, t: number, { at }: Result): Start {
  const then = inputsAt(problem, t);
  const now = inputsAt(problem, 0);
  if (at === undefined) return problem.initial;
  return { displacement: at.x[0] - then.y + now.y, velocity: at.v[0] - then.rate + now.rate };
}
