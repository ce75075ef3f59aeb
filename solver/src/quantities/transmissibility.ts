import type { Quantity } from "./quantity.ts";
import { inputsOf, isPeriodic } from "./drive.ts";

export const transmissibility: Quantity = {
  name: "transmissibility",
  symbol: "T",
  label: "Transmissibility",
  dimension: "none",
  signed: false,
  meaning:
    "over the steady window: amplitude of x over that of a harmonic base, or half peak-to-peak of " +
    "k d + k3 d³ + (c + c_h) ḋ over the amplitude of a harmonic force",
  absent: "it takes exactly one harmonic input, and none that is not constant beside it",
  steady: ["displacement", "transmittedForce"],
  value: ({ problem, steady }) => {
    const harmonic = inputsOf(problem).filter(({ nature }) => nature === "harmonic");
    if (!isPeriodic(problem) || harmonic.length > 1) return null;
    const input = Math.abs(harmonic[0].harmonics(0)[0].amplitude);
    const output = problem.base.includes(harmonic[0]) ? "displacement" : "transmittedForce";
    return input === 0 ? null : steady.halfSwing(output) / input;
  },
};
