import type { Scenario } from "../../scenario/scenario.ts";
import type { CellFigures, CellRefusal } from "../cells/cell-row.ts";
import { CellSetter } from "../cells/cell-setter.ts";
import type { Draws } from "./draws.ts";
import { variedPaths, type TolerancePlan } from "./tolerance-plan.ts";
import type { RefusedDraws } from "./tolerance-summary.ts";

/**
 * The draws without an outcome by why: values that cannot stand together are set again, and those whose faults differ in
 * nothing but figures are one reason.
 *
 * @param all what the first draws came to
 */
export function refusedDraws(
  scenario: Scenario,
  plan: TolerancePlan,
  draws: Draws,
  all: readonly CellFigures[],
): RefusedDraws[] {
  const varied = variedPaths(plan);
  const setter = new CellSetter(scenario, varied, plan.links);
  const found = new Map<string, RefusedDraws>();
  all.forEach(({ refusal }, i) => {
    if (refusal === null) return;
    const fault = refusal === "refused" ? setter.set(draws.subarray(i * varied.length, (i + 1) * varied.length)) : null;
    const key = reasonOf(refusal, fault?.path, fault?.message);
    const known = found.get(key) ?? none(refusal, i, fault?.path, fault?.message);
    found.set(key, { ...known, count: known.count + 1 });
  });
  return [...found.values()].sort((a, b) => b.count - a.count);
}

const none = (refusal: CellRefusal, first: number, path: string | null = null, example: string | null = null) => ({
  ...{ refusal, count: 0, path, first, example },
});

const figures = /-?\d+(?:\.\d+)?(?:e[-+]?\d+)?/g;

const reasonOf = (refusal: CellRefusal, path = "", message = ""): string =>
  [refusal, path, message.replace(figures, "#")].join(" ");
