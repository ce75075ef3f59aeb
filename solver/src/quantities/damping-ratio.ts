import type { Quantity } from "./quantity.ts";

export const dampingRatio: Quantity = {
  name: "dampingRatio",
  symbol: "ζ",
  label: "Damping ratio",
  dimension: "none",
  signed: false,
  meaning: "(c + c_h)/(2√(k m)), the damper and solid damping taken as a damper, over critical damping",
  absent: "there is no spring",
  value: ({ problem: { stiffness, inertia, viscous, solid } }) =>
    stiffness === 0 ? null : (viscous + solid.viscous) / (2 * Math.sqrt(stiffness * inertia)),
};
