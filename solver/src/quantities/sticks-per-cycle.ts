import type { Quantity } from "./quantity.ts";

export const sticksPerCycle: Quantity = {
  name: "sticksPerCycle",
  label: "Sticks per cycle",
  dimension: "none",
  signed: false,
  meaning: "sticks begun in the steady window, per period of the lowest input frequency",
  absent: "no input is harmonic",
  value: ({ cycles, steadyStops }) => (cycles === null ? null : steadyStops.length / cycles),
};
