import { lossFactorField } from "./loss-factor.ts";
import type { SolidDamping, SolidSurroundings } from "./solid-damping.ts";

export interface EquivalentViscous {
  model: "equivalent-viscous";
  lossFactor: number;
  at: "natural" | "drive" | { hz: number };
}

/** S = c_h ḋ with c_h = η k/ω*: the loss π η k X² per cycle at the frequency ω* only. */
export const equivalentViscous: SolidDamping<"equivalent-viscous", EquivalentViscous> = {
  model: "equivalent-viscous",
  label: "Equivalent viscous",
  summary: "a damper with the same loss per cycle at one frequency",
  sentence: "solid damping of loss factor {lossFactor}, taken as a damper at {at}",
  fields: [lossFactorField],
  choices: [
    {
      key: "at",
      label: "Same loss at",
      options: [
        { value: "natural", label: "the natural frequency" },
        { value: "drive", label: "the drive's frequency" },
        {
          value: "hz",
          label: "a given frequency",
          field: {
            key: "hz",
            label: "Frequency",
            symbol: "f*",
            dimension: "frequency",
            exclusiveMinimum: 0,
            initial: 10,
          },
        },
      ],
    },
  ],
  source: "equal loss per cycle, common practice",
  faults: ({ at }, { stiffness, driveHz }) => {
    if (at === "natural" && stiffness === 0) {
      const message = "Without a spring (stiffness 0) there is no natural frequency. Give a stiffness or a frequency.";
      return [{ path: "at", message }];
    }
    if (at === "drive" && driveHz === null) {
      const message = "Nothing drives the body at one frequency. Add a harmonic or an unbalance, or give a frequency.";
      return [{ path: "at", message }];
    }
    return [];
  },
  compile: ({ lossFactor, at }, surroundings) => ({
    viscous: (lossFactor * surroundings.stiffness) / angularFrequency(at, surroundings),
    proportional: 0,
  }),
};

/** ω*, rad/s. */
function angularFrequency(at: EquivalentViscous["at"], { stiffness, inertia, driveHz }: SolidSurroundings): number {
  if (at === "natural") return Math.sqrt(stiffness / inertia);
  // A checked scenario with "drive" has a harmonic.
  return 2 * Math.PI * (at === "drive" ? (driveHz as number) : at.hz);
}
