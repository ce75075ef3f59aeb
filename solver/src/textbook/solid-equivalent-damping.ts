import { hasSolidDamping, hasStraightSpring, isDrivenByOneForce } from "./conditions.ts";
import { drivingForce } from "./driving-force.ts";
import { amplitudeOf, isSteady, lossFactorOf, lossOfLastCycle } from "./solid-loss.ts";
import type { TextbookCase } from "./textbook-case.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

const omegaOf = ({ problem }: TextbookCase): number => drivingForce(problem)?.omega ?? NaN;

/** c_eq = η k/Ω: the damper with the same loss per cycle at the drive's frequency. */
export const solidEquivalentDamping: TextbookCompanion = {
  key: "solid-equivalent-damping",
  label: "Equivalent damper of the solid damping",
  formula: "η k/Ω",
  source: "Equal loss per cycle, textbook knowledge, from memory",
  dimension: "damping",
  conditions: [hasSolidDamping, hasStraightSpring, isDrivenByOneForce, isSteady],
  value: (kase) => (lossFactorOf(kase) * kase.problem.stiffness) / omegaOf(kase),
  ofRun: (kase) => {
    const [loss, amplitude] = [lossOfLastCycle(kase), amplitudeOf(kase)];
    return loss === null || !amplitude ? null : loss / (Math.PI * omegaOf(kase) * amplitude ** 2);
  },
  note: () => "The run's is its loss over the last cycle, divided by π Ω X^2.",
};
