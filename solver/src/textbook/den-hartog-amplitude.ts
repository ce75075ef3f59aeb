import {
  hasNoReidDamping,
  hasStraightSpring,
  isDrivenByOneForce,
  isUnderdamped,
  slidesAtOneForce,
} from "./conditions.ts";
import { forcedRatios, isUnboundedAt } from "./driving-force.ts";
import { noStopLimit, noStopMotion } from "./no-stop-motion.ts";
import type { Condition, TextbookCompanion } from "./textbook-companion.ts";

const hasNoStop: Condition = (kase) => {
  const { r, beta } = forcedRatios(kase);
  if (isUnboundedAt(r) && kase.ratio === 0) return "At resonance without damping there is no steady motion.";
  const motion = noStopMotion(r, kase.ratio, beta);
  if (motion === null || !motion.isWithoutStop)
    return `Friction is ${beta.toPrecision(3)} of the force; above ${noStopLimit(r, kase.ratio).toPrecision(3)} the motion has stops, which the formula excludes.`;
  const held = beta * (kase.staticForce / (kase.kineticForce ?? NaN));
  return Math.abs(motion.forceAtTurn) > held ? null : "Static friction holds it at its turning points.";
};

/** Exact amplitude of the steady motion without stops. */
export const denHartogAmplitude: TextbookCompanion = {
  key: "den-hartog-amplitude",
  label: "Amplitude, exact without stops",
  formula: "(P/k)(−β G + √(1/q^2 − β^2 H^2))",
  source: "Den Hartog 1931, Trans. ASME 53, 107; with damping from memory, recomputed",
  dimension: "displacement",
  conditions: [hasStraightSpring, isDrivenByOneForce, slidesAtOneForce, isUnderdamped, hasNoReidDamping, hasNoStop],
  value: (kase) => {
    const { r, beta, unit } = forcedRatios(kase);
    return unit * (noStopMotion(r, kase.ratio, beta)?.amplitude ?? NaN);
  },
  ofRun: ({ result }) => result.quantities.amplitude ?? null,
  note: (kase) => {
    const { r, beta } = forcedRatios(kase);
    return `Holds up to friction of ${noStopLimit(r, kase.ratio).toPrecision(3)} of the force; here it is ${beta.toPrecision(3)}.`;
  },
};
