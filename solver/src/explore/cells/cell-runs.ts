import type { Result } from "../../result.ts";
import { compileProblem } from "../../scenario/compile-problem.ts";
import { needsAdaptive } from "../../scenario/needs-adaptive.ts";
import type { Problem } from "../../scenario/problem.ts";
import type { Records, Scenario } from "../../scenario/scenario.ts";
import { unsupported } from "../../scenario/unsupported.ts";
import { simulateProblem } from "../../simulate.ts";
import type { SimulateOptions } from "../../options.ts";
import type { Links } from "../links.ts";
import { inputsAt, lowestInputHz } from "../motion-inputs.ts";
import { cellOutcomes, cellRefusals, limitsCode, rowHead, type RowPlan } from "./cell-row.ts";
import { CellSetter } from "./cell-setter.ts";

/** Where a cell starts from. */
export type CellStart = Scenario["initial"];

export interface CellSettings extends RowPlan {
  readonly scenario: Scenario;
  /** The paths whose values cells give, in order. */
  readonly varied: readonly string[];
  readonly links: Links;
  readonly records?: Records;
}

/** Runs a checked scenario with other numbers at a few paths, over and over, each into a row; the rest is as entered. */
export class CellRuns {
  private readonly setter: CellSetter;
  private readonly isComputed: boolean;

  constructor(private readonly settings: CellSettings) {
    const { scenario, varied, links, records } = settings;
    this.setter = new CellSetter(scenario, varied, links);
    this.isComputed = unsupported(scenario, records) === null;
  }

  /** Runs one cell into its row, which must be all 0. */
  run(values: ArrayLike<number>, row: Float64Array): void {
    this.attempt(values, row, (problem) => this.fill(problem, row));
  }

  /** Likewise from another start; returns the start of the cell that follows, null where this one was refused or cut off. */
  runFrom(start: CellStart, values: ArrayLike<number>, row: Float64Array): CellStart | null {
    let next: CellStart | null = null;
    this.attempt(values, row, (compiled) => {
      const problem = { ...compiled, initial: start };
      const end = wholePeriods(problem);
      const result = this.fill(problem, row, end);
      if (result.outcome !== null) next = startAfter(problem, end, result);
    });
    return next;
  }

  private attempt(values: ArrayLike<number>, row: Float64Array, run: (problem: Problem) => void): void {
    const { setter, settings } = this;
    if (setter.set(values) !== null) row[0] = cellRefusals.refused;
    else if (!this.isComputed) row[0] = cellRefusals["not-computed"];
    else
      try {
        run(compileProblem(setter.scenario, settings.records));
      } catch {
        row.fill(0);
        row[0] = cellRefusals.failed;
      }
  }

  private fill(problem: Problem, row: Float64Array, end?: number): Result {
    const { quantities } = this.settings;
    const at = end === undefined ? {} : { at: [end] };
    const options: SimulateOptions = { quantities, samples: 0, events: false, energy: false, ...at };
    const result = simulateProblem(problem, needsAdaptive(this.setter.scenario) === null, options);
    fillRow(row, result, this.settings);
    return result;
  }
}

function fillRow(row: Float64Array, { outcome, ended, limits, quantities }: Result, plan: RowPlan): void {
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
function startAfter(problem: Problem, t: number, { at }: Result): CellStart {
  const then = inputsAt(problem, t);
  const now = inputsAt(problem, 0);
  if (at === undefined) return problem.initial;
  return { displacement: at.x[0] - then.y + now.y, velocity: at.v[0] - then.rate + now.rate };
}
