import type { Quantity } from "./quantity.ts";

export const driveForcePeak: Quantity = {
  name: "driveForcePeak",
  label: "Peak drive force",
  dimension: "force",
  signed: false,
  meaning: "largest |k d + k3 d³ + c ḋ + S| of the run, what base and body exert on each other",
  whole: ["driveForce"],
  value: ({ whole }) => whole.peak("driveForce"),
};
