import type { Quantity } from "./quantity.ts";

export const restTime: Quantity = {
  name: "restTime",
  label: "Time to rest",
  dimension: "time",
  signed: false,
  meaning: "when the body stands still for good and no input changes any more",
  absent: "the body does not come to rest for good",
  value: ({ restTime }) => restTime,
};
