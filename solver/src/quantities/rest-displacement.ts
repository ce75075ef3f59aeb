import type { Quantity } from "./quantity.ts";

export const restDisplacement: Quantity = {
  name: "restDisplacement",
  label: "Rest position",
  dimension: "displacement",
  signed: true,
  meaning: "where the body stands still for good",
  absent: "the body does not come to rest for good",
  value: (reading) => (reading.restTime === null ? null : reading.at(reading.restTime).x),
};
