import type { Quantity } from "./quantity.ts";

export const followingErrorRms: Quantity = {
  name: "followingErrorRms",
  label: "Following error, rms",
  dimension: "displacement",
  signed: false,
  meaning: "root mean square of d over the steady window, the distance from the base",
  steady: ["deflectionSquared"],
  value: ({ steady }) => Math.sqrt(steady.mean("deflectionSquared")),
};
