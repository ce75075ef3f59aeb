import {
  hasNoDryFriction,
  hasNoReidDamping,
  hasStraightSpring,
  isDamped,
  isUnderdamped,
  swingsFreely,
} from "./conditions.ts";
import { decrementOf, turningPointsOf } from "./free-swings.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** δ = (1/n) ln(x_0/x_n) = 2πζ/√(1 − ζ²) of a damped swing without dry friction. */
export const logarithmicDecrement: TextbookCompanion = {
  key: "logarithmic-decrement",
  label: "Logarithmic decrement per cycle",
  formula: "2π ζ/√(1 − ζ^2)",
  source: "Free damped vibration, textbook knowledge, from memory",
  dimension: "none",
  conditions: [swingsFreely, hasStraightSpring, hasNoDryFriction, hasNoReidDamping, isDamped, isUnderdamped],
  value: ({ ratio }) => (2 * Math.PI * ratio) / Math.sqrt(1 - ratio * ratio),
  ofRun: (kase) => decrementOf(turningPointsOf(kase))?.perCycle ?? null,
  note: (kase) => {
    const read = decrementOf(turningPointsOf(kase));
    return read && `The run's is (1/n) ln(x_0/x_n) over n = ${read.cycles} ${read.cycles === 1 ? "cycle" : "cycles"}.`;
  },
};
