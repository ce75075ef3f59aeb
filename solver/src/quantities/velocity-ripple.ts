import type { Quantity } from "./quantity.ts";

export const velocityRipple: Quantity = {
  name: "velocityRipple",
  label: "Speed ripple",
  dimension: "none",
  signed: false,
  meaning: "(max ẋ − min ẋ)/|mean ẋ| over the steady window of a feed",
  absent: "the base does not feed, or the body has no mean speed",
  steady: ["velocity"],
  value: ({ isFed, steady }) => {
    if (!isFed) return null;
    const mean = Math.abs(steady.mean("velocity"));
    return mean === 0 ? null : (2 * steady.halfSwing("velocity")) / mean;
  },
};
