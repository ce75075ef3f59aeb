import { hasNoReidDamping, hasStraightSpring, isUndamped, slidesAtOneForce, swingsFreely } from "./conditions.ts";
import { shortfalls, turningPointsOf } from "./free-swings.ts";
import { slidingOffset } from "./textbook-case.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** The straight envelope of the swing: it falls by 2 F_k ω/(πk) in a second. */
export const envelopeSlope: TextbookCompanion = {
  key: "envelope-slope",
  label: "Slope of the envelope",
  formula: "2 F_k ω/(π k)",
  source: "Free vibration with Coulomb friction, textbook knowledge, from memory",
  dimension: "velocity",
  conditions: [swingsFreely, hasStraightSpring, slidesAtOneForce, isUndamped, hasNoReidDamping],
  value: (kase) => (2 * slidingOffset(kase) * kase.omega) / Math.PI,
  ofRun: (kase) => {
    const points = turningPointsOf(kase);
    const lost = shortfalls(points).reduce((sum, each) => sum + each, 0);
    return points.length < 2 ? null : lost / (points[points.length - 1].t - points[0].t);
  },
};
