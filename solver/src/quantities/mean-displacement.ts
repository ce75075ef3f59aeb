import type { Quantity } from "./quantity.ts";

export const meanDisplacement: Quantity = {
  name: "meanDisplacement",
  label: "Mean displacement",
  dimension: "displacement",
  signed: true,
  meaning: "mean of x over the steady window, of d where the base feeds",
  steady: ["excursion"],
  value: ({ steady }) => steady.mean("excursion"),
};
