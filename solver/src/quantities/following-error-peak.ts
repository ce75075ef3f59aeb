import type { Quantity } from "./quantity.ts";

export const followingErrorPeak: Quantity = {
  name: "followingErrorPeak",
  label: "Peak following error",
  dimension: "displacement",
  signed: false,
  meaning: "largest |d| over the steady window, the distance from the base",
  steady: ["deflection"],
  value: ({ steady }) => steady.peak("deflection"),
};
