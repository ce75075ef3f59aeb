import type { Quantity } from "./quantity.ts";

export const frictionPowerMean: Quantity = {
  name: "frictionPowerMean",
  label: "Mean friction power",
  dimension: "power",
  signed: false,
  meaning: "mean of −f v_r over the steady window, what the contact turns into heat",
  steady: ["contactHeat"],
  value: ({ steady }) => steady.mean("contactHeat"),
};
