import { hasNoDamper, hasNoDryFriction, hasSolidDamping, hasStraightSpring, swingsFreely } from "./conditions.ts";
import { decrementOf, turningPointsOf } from "./free-swings.ts";
import { lossFactorOf } from "./solid-loss.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** ζ_eq = η/2: the damper that loses as much per cycle at the natural frequency. */
export const solidDampingRatio: TextbookCompanion = {
  key: "solid-damping-ratio",
  label: "Equivalent damping ratio",
  formula: "η/2",
  source: "Equal loss per cycle at resonance, textbook knowledge, from memory",
  dimension: "none",
  conditions: [swingsFreely, hasStraightSpring, hasNoDryFriction, hasSolidDamping, hasNoDamper],
  value: (kase) => lossFactorOf(kase) / 2,
  ofRun: (kase) => {
    const read = decrementOf(turningPointsOf(kase));
    return read && read.perCycle / Math.hypot(2 * Math.PI, read.perCycle);
  },
  note: () => "The run's is read from its decrement, δ/√(4π^2 + δ^2).",
};
