import { lossFactorField } from "./loss-factor.ts";
import type { SolidDamping } from "./solid-damping.ts";

export interface DisplacementProportional {
  model: "displacement-proportional";
  lossFactor: number;
}

/** ρ of S = ρ k |d| sgn(ḋ) from the loss factor: the loss over a cycle of amplitude X is then 2 ρ k X² = π η k X². */
const proportionOf = (lossFactor: number) => (Math.PI * lossFactor) / 2;

/** S = ρ k |d| sgn(ḋ) with ρ = πη/2: the loss π η k X² per cycle at every frequency. */
export const displacementProportional: SolidDamping<"displacement-proportional", DisplacementProportional> = {
  model: "displacement-proportional",
  label: "Displacement-proportional",
  summary: "the same loss per cycle at every frequency",
  sentence: "solid damping of loss factor {lossFactor}, the same at every frequency",
  fields: [lossFactorField],
  source: "Reid 1956",
  faults: ({ lossFactor }) => {
    if (!(proportionOf(lossFactor) >= 1)) return [];
    const message = `The loss factor must be less than 2/π = 0.6366 in this model; it is ${lossFactor}.`;
    return [{ path: "lossFactor", message }];
  },
  compile: ({ lossFactor }) => ({ viscous: 0, proportional: proportionOf(lossFactor) }),
};
