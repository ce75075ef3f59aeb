import { compileProblem } from "../../scenario/compile-problem.ts";
import { spanFields } from "../../scenario/fields.ts";
import type { Records, Scenario } from "../../scenario/scenario.ts";
import { unsupported } from "../../scenario/unsupported.ts";
import { feedSpeed } from "../../textbook/feed.ts";

const longest = spanFields.find(({ key }) => key === "seconds")?.maximum ?? Infinity;

const lasting = (scenario: Scenario, seconds: number): Scenario => ({
  ...scenario,
  span: { ...scenario.span, seconds: Math.min(longest, seconds) },
});

/**
 * A run past which base or belt moves at |V| lasts at least 4 μs N r/(k|V|), twice the time of the first load-up and as much
 * again for the window that is judged, and 40 natural periods, whatever its span says.
 */
export function longEnough(scenario: Scenario, records?: Records): Scenario {
  if (unsupported(scenario, records) !== null) return scenario;
  const problem = compileProblem(scenario, records);
  const { law, normal, radius, stiffness, inertia } = problem;
  const speed = feedSpeed(problem);
  if (speed === null || !(stiffness > 0)) return scenario;
  const least =
    (4 * law.atRest * normal * radius) / (stiffness * speed) + 80 * Math.PI * Math.sqrt(inertia / stiffness);
  return least > scenario.span.seconds ? lasting(scenario, least) : scenario;
}

/**
 * A run started at steady sliding, up to eight natural periods longer: the half that is judged then has four parts of whole
 * periods, and a swing that grows or fades by a ten-thousandth is told by their amplitudes alone.
 */
export function wholePeriodsLong(scenario: Scenario): Scenario {
  const { inertia, stiffness } = scenario.body;
  const eight = 16 * Math.PI * Math.sqrt(inertia / stiffness);
  const least = Math.ceil(scenario.span.seconds / eight) * eight;
  return least <= longest ? lasting(scenario, least) : scenario;
}

/** The same run for longer, past the break-away still to come; null where it lasts as long as a run may already. */
export function lengthened(scenario: Scenario, nextBreakAway: number): Scenario | null {
  const { seconds } = scenario.span;
  return seconds < longest ? lasting(scenario, Math.max(2 * seconds, 4 * nextBreakAway)) : null;
}
