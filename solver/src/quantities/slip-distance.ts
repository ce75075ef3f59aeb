import type { Quantity } from "./quantity.ts";

export const slipDistance: Quantity = {
  name: "slipDistance",
  label: "Distance of a slip",
  dimension: "displacement",
  signed: false,
  meaning: "mean distance slipped after a break-away, over whole cycles of the steady window",
  absent: "the body breaks away less than twice in the steady window",
  value: (reading) => {
    const times = reading.steadyBreakAways;
    const jumps = times.length - 1;
    return jumps < 1 ? null : reading.over(times[0], times[jumps], "slipSpeed").integral("slipSpeed") / jumps;
  },
};
