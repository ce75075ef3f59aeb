import type { Quantity } from "./quantity.ts";

export const driveForceRms: Quantity = {
  name: "driveForceRms",
  label: "Drive force, rms",
  dimension: "force",
  signed: false,
  meaning: "root mean square of k d + k3 d³ + c ḋ + S over the run",
  whole: ["driveForceSquared"],
  value: ({ whole }) => Math.sqrt(whole.mean("driveForceSquared")),
};
