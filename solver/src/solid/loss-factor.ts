import type { Field } from "../field.ts";

/** η = h/k, the share of the spring's energy lost per radian of a cycle. */
export const lossFactorField: Field = {
  key: "lossFactor",
  label: "Loss factor",
  symbol: "η",
  dimension: "none",
  minimum: 0,
  initial: 0.02,
  help: "of the spring's material and joints",
};
