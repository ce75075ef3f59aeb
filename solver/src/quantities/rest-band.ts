import type { Quantity } from "./quantity.ts";

export const restBand: Quantity = {
  name: "restBand",
  symbol: "xb",
  label: "Rest band",
  dimension: "displacement",
  signed: false,
  meaning: "μs N r/k, half the width of the range in which the body can come to rest, N without ripple",
  absent: "there is no spring",
  value: ({ problem: { law, normal, radius, stiffness } }) =>
    stiffness === 0 ? null : (law.atRest * normal * radius) / stiffness,
};
