import { hasNoDamper, hasNoDryFriction, hasStraightSpring, swingsFreely } from "./conditions.ts";
import { decrementOf, turningPointsOf } from "./free-swings.ts";
import type { Condition, TextbookCompanion } from "./textbook-companion.ts";

const hasReidDamping: Condition = ({ problem }) =>
  problem.solid.proportional > 0 ? null : "The solid damping is not displacement-proportional.";

/** √((1 − ρ)/(1 + ρ)), ρ = πη/2: each extreme beside the one before; it never halts. */
export const reidRatio: TextbookCompanion = {
  key: "reid-ratio",
  label: "Ratio of successive extremes",
  formula: "√((1 − ρ)/(1 + ρ))",
  source: "Reid 1956 for the law; ratio derived from it",
  dimension: "none",
  conditions: [swingsFreely, hasStraightSpring, hasReidDamping, hasNoDryFriction, hasNoDamper],
  value: ({ problem: { solid } }) => Math.sqrt((1 - solid.proportional) / (1 + solid.proportional)),
  ofRun: (kase) => {
    const read = decrementOf(turningPointsOf(kase));
    return read && Math.exp(-read.perCycle / 2);
  },
  note: () => "ρ = π η/2. The ratio is constant: the swing never halts.",
};
