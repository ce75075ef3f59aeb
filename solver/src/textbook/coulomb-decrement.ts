import { hasNoReidDamping, hasStraightSpring, isUndamped, slidesAtOneForce, swingsFreely } from "./conditions.ts";
import { shortfalls, turningPointsOf } from "./free-swings.ts";
import { slidingOffset } from "./textbook-case.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** Amplitude lost in each half cycle: 2 F_k/k, the same from swing to swing. */
export const coulombDecrement: TextbookCompanion = {
  key: "coulomb-decrement",
  label: "Amplitude lost per half cycle",
  formula: "2 F_k/k",
  source: "Free vibration with Coulomb friction, textbook knowledge, from memory; Lorenz 1924",
  dimension: "displacement",
  conditions: [swingsFreely, hasStraightSpring, slidesAtOneForce, isUndamped, hasNoReidDamping],
  value: (kase) => 2 * slidingOffset(kase),
  ofRun: (kase) => {
    const lost = shortfalls(turningPointsOf(kase));
    return lost.length === 0 ? null : lost.reduce((sum, each) => sum + each, 0) / lost.length;
  },
};
