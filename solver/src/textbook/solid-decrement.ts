import { hasNoDamper, hasNoDryFriction, hasSolidDamping, hasStraightSpring, swingsFreely } from "./conditions.ts";
import { decrementOf, turningPointsOf } from "./free-swings.ts";
import { lossFactorOf } from "./solid-loss.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** δ ≈ πη of a swing damped by its spring's material alone. */
export const solidDecrement: TextbookCompanion = {
  key: "solid-decrement",
  label: "Decrement of the solid damping",
  formula: "π η",
  source: "Small loss factor, textbook knowledge, from memory",
  dimension: "none",
  conditions: [swingsFreely, hasStraightSpring, hasNoDryFriction, hasSolidDamping, hasNoDamper],
  value: (kase) => Math.PI * lossFactorOf(kase),
  ofRun: (kase) => decrementOf(turningPointsOf(kase))?.perCycle ?? null,
};
