import type { Quantity } from "./quantity.ts";

export const frictionPowerPeak: Quantity = {
  name: "frictionPowerPeak",
  label: "Peak friction power",
  dimension: "power",
  signed: false,
  meaning: "largest −f v_r of the run, what the contact turns into heat",
  whole: ["frictionPower"],
  value: ({ whole }) => whole.max("frictionPower"),
};
