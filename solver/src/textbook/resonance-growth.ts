import { hasNoReidDamping, hasStraightSpring, isDrivenByOneForce, isUndamped, slidesAtOneForce } from "./conditions.ts";
import { drivingForce, forcedRatios, isUnboundedAt } from "./driving-force.ts";
import { turningPointsOf } from "./free-swings.ts";
import { slidingForce, type TextbookCase } from "./textbook-case.ts";
import type { Condition, TextbookCompanion } from "./textbook-companion.ts";

const growsAtResonance: Condition = (kase) => {
  const { r, beta } = forcedRatios(kase);
  if (!isUnboundedAt(r)) return "The force is not at the natural frequency.";
  return beta < Math.PI / 4 ? null : "Friction is π/4 of the force or more: the amplitude does not grow for ever.";
};

/** At undamped resonance friction below π/4 of the force cannot bound the swing: it grows by (πP − 4F_k)/k a cycle. */
export const resonanceGrowth: TextbookCompanion = {
  key: "resonance-growth",
  label: "Growth of the amplitude per cycle",
  formula: "(π P − 4 F_k)/k",
  source: "Energy balance over a cycle, textbook knowledge, from memory",
  dimension: "displacement",
  conditions: [hasStraightSpring, isDrivenByOneForce, slidesAtOneForce, isUndamped, hasNoReidDamping, growsAtResonance],
  value: (kase) =>
    (Math.PI * (drivingForce(kase.problem)?.amplitude ?? NaN) - 4 * slidingForce(kase)) / kase.problem.stiffness,
  ofRun: growthOfRun,
  note: () => "The run's is the mean over its last ten cycles.",
};

function growthOfRun(kase: TextbookCase): number | null {
  const points = turningPointsOf(kase);
  const last = points.length - 1;
  return last < 20 ? null : (Math.abs(points[last].offset) - Math.abs(points[last - 20].offset)) / 10;
}
