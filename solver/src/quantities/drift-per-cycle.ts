import type { Quantity } from "./quantity.ts";

export const driftPerCycle: Quantity = {
  name: "driftPerCycle",
  label: "Drift per cycle",
  dimension: "displacement",
  signed: true,
  meaning: "∫v_r dt per period of the lowest input frequency, over the steady window",
  absent: "no input is harmonic",
  steady: ["drift"],
  value: ({ cycles, steady }) => (cycles === null ? null : steady.integral("drift") / cycles),
};
