import {
  hasNoReidDamping,
  hasStraightSpring,
  isDamped,
  isUnderdamped,
  slidesAtOneForce,
  swingsFreely,
} from "./conditions.ts";
import { firstTurningPoint, turningPointsOf } from "./free-swings.ts";
import { slidingOffset, type TextbookCase } from "./textbook-case.ts";
import type { Condition, TextbookCompanion } from "./textbook-companion.ts";

const leavesItsBand: Condition = (kase) =>
  Math.abs(firstTurningPoint(kase).offset) > kase.staticForce / kase.problem.stiffness
    ? null
    : "It rests at its first turning point, so there is no swing back.";

/** B = exp(−πζ/√(1−ζ²)). */
const shrinkOf = ({ ratio }: TextbookCase): number => Math.exp((-Math.PI * ratio) / Math.sqrt(1 - ratio * ratio));

/** Reach of the swing after the first turning point, with dry and viscous friction together; negative on the same side. */
export const dampedSwing: TextbookCompanion = {
  key: "damped-swing",
  label: "Reach of the first swing back",
  formula: "x_1 = B x_0 − (1 + B) F_k/k",
  source: "Coulomb and viscous friction together, from memory; Feeny & Liang 1996, J. Sound Vib. 195, 149, for the use",
  dimension: "displacement",
  conditions: [
    swingsFreely,
    hasStraightSpring,
    slidesAtOneForce,
    isDamped,
    isUnderdamped,
    hasNoReidDamping,
    leavesItsBand,
  ],
  value: (kase) => {
    const shrink = shrinkOf(kase);
    return shrink * Math.abs(firstTurningPoint(kase).offset) - (1 + shrink) * slidingOffset(kase);
  },
  ofRun: (kase) => {
    const [first, second] = turningPointsOf(kase);
    return second === undefined ? null : -Math.sign(first.offset) * second.offset;
  },
  note: () => "B = exp(−π ζ/√(1 − ζ^2)).",
};
