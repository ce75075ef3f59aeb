import { jsonText } from "../../json-text.ts";
import { canonicalForm, digestOfText } from "../../scenario/canonical.ts";
import type { Scenario } from "../../scenario/scenario.ts";
import { withLimitQuantities } from "../cells/cell-row.ts";
import { cellCount, cellValues } from "./axis-values.ts";
import type { SweepPlan } from "./sweep-plan.ts";

/** The format in which cells travel: a header, then `[index, value, …]` a line; answered by `[index, outcome, quantity, …]`. */
export const cellsFormat = "restband-cells/1";

/** What tells one sweep from all others: SHA-256 of its scenario and its plan, lower-case hex. */
export const sweepDigest = (scenario: Scenario, plan: SweepPlan): string =>
  digestOfText(jsonText({ scenario: canonicalForm(scenario), plan }, "sorted"));

/** The header of a sweep's cells and of their answers; it goes with any part of them. */
export const cellsHeader = (scenario: Scenario, plan: SweepPlan): string =>
  jsonText({
    format: cellsFormat,
    base: scenario,
    fields: plan.axes.map(({ path }) => path),
    quantities: withLimitQuantities(plan, scenario.limits).quantities,
    links: plan.links,
    digest: sweepDigest(scenario, plan),
  });

/**
 * A sweep as the lines of `restband-cells/1`, to be solved anywhere by `solve --lines`; its quantities are those of limits,
 * then those of the plan. Throws RangeError where cells follow one another.
 */
export function* cellLines(scenario: Scenario, plan: SweepPlan): Generator<string> {
  if (plan.continuation !== "none") throw new RangeError("cells that follow one another cannot be solved apart");
  yield cellsHeader(scenario, plan);
  for (let index = 0; index < cellCount(plan); index++) yield jsonText([index, ...cellValues(plan, index)]);
}
