import type { Quantity } from "./quantity.ts";

export const halfCycles: Quantity = {
  name: "halfCycles",
  symbol: "n",
  label: "Half cycles to rest",
  dimension: "none",
  signed: false,
  meaning: "all stops and turns up to the rest",
  absent: "the body does not come to rest for good",
  value: ({ restTime, stops, turns }) => (restTime === null ? null : stops.length + turns.length),
};
