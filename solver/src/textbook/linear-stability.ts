import { isFed } from "./conditions.ts";
import { speedOf } from "./feed.ts";
import type { TextbookCase } from "./textbook-case.ts";
import type { Condition, TextbookCompanion } from "./textbook-companion.ts";

const rubs: Condition = ({ problem }) =>
  problem.normal > 0 && problem.law.coefficient(problem.radius) + problem.law.atRest > 0
    ? null
    : "There is no friction to feed a swing.";

const pressesSteadily: Condition = ({ problem }) =>
  problem.ripple === null ? null : "The pressing force ripples, so there is no steady sliding.";

const hasNoInnerState: Condition = ({ problem }) =>
  problem.law.bristle === undefined ? null : "The law has a deflection of its own, which the criterion leaves out.";

/** c + c_h + r²(N dμ/dv + b) at the sliding speed r V. */
function netDamping({ problem, damping, ...rest }: TextbookCase): number {
  const { law, normal, radius } = problem;
  const sliding = radius * speedOf({ problem, damping, ...rest });
  return damping + radius * radius * (normal * law.slope(sliding) + law.fluid);
}

/** Damping left for a small swing about steady sliding: friction that falls with speed takes from it. */
export const linearStability: TextbookCompanion = {
  key: "linear-stability",
  label: "Net damping of steady sliding",
  formula: "c + N dμ/dv",
  source: "Linear stability of steady sliding, textbook knowledge, from memory",
  dimension: "damping",
  conditions: [isFed, rubs, pressesSteadily, hasNoInnerState],
  value: netDamping,
  // a run shows what becomes of its own start, not the damping of a small swing
  ofRun: () => null,
  note: (kase) => {
    const net = netDamping(kase);
    if (net < 0) return "Below zero: steady sliding at this speed is unstable and a swing grows from it.";
    const stays = "a small swing about steady sliding does not grow, but a large one may still stick and slip.";
    return net === 0 ? `Zero: ${stays}` : `Above zero: ${stays}`;
  },
};
