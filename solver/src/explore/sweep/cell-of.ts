import { checkScenario, type Checked } from "../../scenario/check-scenario.ts";
import type { Records, Scenario } from "../../scenario/scenario.ts";
import { unsupported } from "../../scenario/unsupported.ts";
import { withValues } from "../links.ts";
import { cellPlace, cellValues, sizesOf } from "./axis-values.ts";
import { rowLength, type CellRefusal } from "../cells/cell-row.ts";
import { SweepRunner } from "./run-tile.ts";
import type { SweepPlan } from "./sweep-plan.ts";

/**
 * The scenario of one cell, ready to be opened, or the faults that refuse it. With continuation the cells before it in its
 * line are run again, so that it starts from where they ended.
 */
export function cellOf(scenario: Scenario, plan: SweepPlan, index: number, records?: Records): Checked {
  const values = cellValues(plan, index).map((value, i): [string, number] => [plan.axes[i].path, value]);
  const cell = withValues(scenario, values, plan.links);
  const initial = plan.continuation === "none" ? cell.initial : startOf(scenario, plan, index, records);
  return checkScenario({ ...cell, initial });
}

function startOf(
  scenario: Scenario,
  plan: SweepPlan,
  index: number,
  records: Records | undefined,
): Scenario["initial"] {
  const runner = new SweepRunner(scenario, plan, records);
  const [first] = sizesOf(plan);
  const { places, isDown } = cellPlace(plan, index);
  const before = isDown ? first - 1 - places[0] : places[0];
  const step = isDown ? 1 : -1;
  for (let i = before; i > 0; i--) runner.run(index + step * i, new Float64Array(rowLength(plan)));
  return runner.startOf(index);
}

const cutOff: Readonly<Record<"max-events" | "max-work" | "failed", string>> = {
  "max-events": "The run reached the most events it is allowed before its end.",
  "max-work": "The run reached the most work it is allowed before its end.",
  failed: "The run failed.",
};

/** Why a cell has no outcome, as a sentence. @param refusal as `readRow` tells it */
export function cellReason(scenario: Scenario, plan: SweepPlan, index: number, refusal: CellRefusal): string {
  if (refusal === "refused")
    return cellOf(scenario, plan, index).faults[0]?.message ?? "These values cannot stand together.";
  if (refusal === "not-computed") return unsupported(scenario)?.message ?? "not computed by this version";
  return cutOff[refusal];
}
