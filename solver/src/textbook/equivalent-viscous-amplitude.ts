import { hasStraightSpring, isDrivenByOneForce, slidesAtOneForce, hasNoReidDamping } from "./conditions.ts";
import { forcedRatios, isUnboundedAt } from "./driving-force.ts";
import type { Condition, TextbookCompanion } from "./textbook-companion.ts";

/**
 * X k/P when friction is replaced by the damper of equal loss, c_eq = 4F/(πΩX): the positive root of
 * q²X² + 2·2ζr·gX + g² = 1 with g = 4β/π and q² = (1 − r²)² + (2ζr)². Null where there is none: β ≥ π/4, or without damping
 * at resonance.
 */
export function equivalentViscousRatio(r: number, ratio: number, beta: number): number | null {
  const g = (4 * beta) / Math.PI;
  const loss = 2 * ratio * r;
  const q2 = (1 - r * r) ** 2 + loss * loss;
  if (g >= 1 || q2 === 0) return null;
  return (1 - g * g) / (loss * g + Math.sqrt((loss * g) ** 2 + q2 * (1 - g * g)));
}

const hasAmplitude: Condition = (kase) => {
  const { r, beta } = forcedRatios(kase);
  if (beta >= Math.PI / 4) return "Friction is π/4 of the force or more: the formula has no amplitude.";
  return isUnboundedAt(r) && kase.ratio === 0 ? "At resonance without damping it has no bound." : null;
};

/** Amplitude under a harmonic force with friction taken as a damper of equal loss per cycle. */
export const equivalentViscousAmplitude: TextbookCompanion = {
  key: "equivalent-viscous-amplitude",
  label: "Amplitude, friction as a damper",
  formula: "(P/k) √(1 − (4β/π)^2)/|1 − r^2|",
  source: "Equivalent viscous damping 4F_k/(πΩX), textbook knowledge, from memory",
  dimension: "displacement",
  conditions: [hasStraightSpring, isDrivenByOneForce, slidesAtOneForce, hasNoReidDamping, hasAmplitude],
  value: (kase) => {
    const { r, beta, unit } = forcedRatios(kase);
    return unit * (equivalentViscousRatio(r, kase.ratio, beta) ?? NaN);
  },
  ofRun: ({ result }) => result.quantities.amplitude ?? null,
  note: ({ damping }) =>
    damping > 0
      ? "An estimate; with damping the same balance keeps the term 2ζr beside it."
      : "An estimate: it takes the motion for a pure sine.",
};
