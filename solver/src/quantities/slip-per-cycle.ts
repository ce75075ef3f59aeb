import type { Quantity } from "./quantity.ts";

export const slipPerCycle: Quantity = {
  name: "slipPerCycle",
  label: "Slip per cycle",
  dimension: "displacement",
  signed: false,
  meaning: "∫|v_r| dt per period of the lowest input frequency, over the steady window",
  absent: "no input is harmonic",
  steady: ["slipSpeed"],
  value: ({ cycles, steady }) => (cycles === null ? null : steady.integral("slipSpeed") / cycles),
};
