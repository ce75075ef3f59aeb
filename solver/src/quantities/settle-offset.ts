import type { Quantity } from "./quantity.ts";
import { finalDeflection } from "./settle-time.ts";
import { travelEnd } from "./travel-end.ts";

export const settleOffset: Quantity = {
  name: "settleOffset",
  label: "Offset after the move",
  dimension: "displacement",
  signed: true,
  meaning: "d at the end of the run, after the last base move",
  absent: "the base makes no move that ends in the run",
  value: (reading) => (travelEnd(reading) === null ? null : finalDeflection(reading)),
};
