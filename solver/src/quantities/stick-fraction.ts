import type { Quantity } from "./quantity.ts";
import { stuckShare } from "./stuck-share.ts";

export const stickFraction: Quantity = {
  name: "stickFraction",
  label: "Share of time stuck",
  dimension: "none",
  signed: false,
  meaning: "share of the steady window that the body is stuck, 0 to 1",
  value: ({ motion, window }) => stuckShare(motion, window.from, window.to),
};
