import type { Records, Scenario } from "../../scenario/scenario.ts";
import { rowLength, withLimitQuantities, type RowPlan } from "../cells/cell-row.ts";
import { CellRuns } from "../cells/cell-runs.ts";
import type { Draws } from "./draws.ts";
import { variedPaths, type TolerancePlan } from "./tolerance-plan.ts";

/** What the rows of a study hold: the quantities that limits name, then the others asked for. */
export const studyRows = (plan: TolerancePlan, scenario: Scenario): RowPlan =>
  withLimitQuantities(plan, scenario.limits);

export interface DrawSettings {
  readonly records?: Records;
  /** Called after each draw with how many are done; returning false ends the work, and its rows are lost. */
  readonly onDraw?: (done: number) => boolean;
}

/**
 * Runs the draws from one place to another here and now. A draw that is refused or cut off says so in its row.
 *
 * @param to one past the last @returns rows as `studyRows` has them (see `CellRow`); null where `onDraw` ended it
 */
export function runDraws(
  scenario: Scenario,
  plan: TolerancePlan,
  draws: Draws,
  [from, to]: readonly [number, number],
  settings: DrawSettings = {},
): Float64Array | null {
  const { quantities } = studyRows(plan, scenario);
  const varied = variedPaths(plan);
  const length = rowLength({ quantities });
  const rows = new Float64Array((to - from) * length);
  const cells = new CellRuns({ scenario, varied, links: plan.links, quantities, records: settings.records });
  for (let i = 0; i < to - from; i++) {
    const at = (from + i) * varied.length;
    cells.run(draws.subarray(at, at + varied.length), rows.subarray(i * length, (i + 1) * length));
    if (settings.onDraw?.(i + 1) === false) return null;
  }
  return rows;
}
