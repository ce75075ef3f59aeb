import type { Quantity } from "./quantity.ts";

export const amplitude: Quantity = {
  name: "amplitude",
  symbol: "X",
  label: "Amplitude",
  dimension: "displacement",
  signed: false,
  meaning: "half peak-to-peak of x over the steady window, of d where the base feeds",
  steady: ["excursion"],
  value: ({ steady }) => steady.halfSwing("excursion"),
};
