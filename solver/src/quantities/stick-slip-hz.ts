import type { Quantity } from "./quantity.ts";

export const stickSlipHz: Quantity = {
  name: "stickSlipHz",
  label: "Stick-slip frequency",
  dimension: "frequency",
  signed: false,
  meaning: "break-aways a second, from the first to the last in the steady window",
  absent: "the body breaks away less than twice in the steady window",
  value: ({ steadyBreakAways: times }) => {
    const jumps = times.length - 1;
    return jumps < 1 ? null : jumps / (times[jumps] - times[0]);
  },
};
