import type { Quantity } from "./quantity.ts";
import { stuckShare } from "./stuck-share.ts";

export const cycleStickFraction: Quantity = {
  name: "cycleStickFraction",
  label: "Share of a cycle stuck",
  dimension: "none",
  signed: false,
  meaning: "share of the time stuck over whole cycles, from the first to the last break-away in the steady window",
  absent: "the body breaks away less than twice in the steady window",
  value: ({ motion, steadyBreakAways: times }) =>
    times.length < 2 ? null : stuckShare(motion, times[0], times[times.length - 1]),
};
