import { hasSolidDamping, hasStraightSpring, isDrivenByOneForce } from "./conditions.ts";
import { amplitudeOf, isSteady, lossFactorOf, lossOfLastCycle } from "./solid-loss.ts";
import type { TextbookCompanion } from "./textbook-companion.ts";

/** ΔW = π η k X²: what the spring's material loses in a cycle of amplitude X, the run's own. */
export const solidLossPerCycle: TextbookCompanion = {
  key: "solid-loss-per-cycle",
  label: "Loss in the spring per cycle",
  formula: "π η k X^2",
  source: "Hysteretic damping with h = ηk, textbook knowledge, from memory",
  dimension: "energy",
  conditions: [hasSolidDamping, hasStraightSpring, isDrivenByOneForce, isSteady],
  value: (kase) => Math.PI * lossFactorOf(kase) * kase.problem.stiffness * (amplitudeOf(kase) ?? NaN) ** 2,
  ofRun: lossOfLastCycle,
  note: ({ scenario: { solid } }) => {
    const read = "X is the run's amplitude; its loss is read from its samples, to about 0.1 %.";
    if (solid.model !== "equivalent-viscous") return read;
    return `${read} The damper that stands for the material has this loss at one frequency only.`;
  },
};
