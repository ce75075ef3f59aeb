import type { Quantity } from "./quantity.ts";

export const naturalHz: Quantity = {
  name: "naturalHz",
  symbol: "fn",
  label: "Natural frequency",
  dimension: "frequency",
  signed: false,
  meaning: "√(k/m)/2π, of the body on its spring without damping and friction",
  absent: "there is no spring",
  value: ({ problem: { stiffness, inertia } }) =>
    stiffness === 0 ? null : Math.sqrt(stiffness / inertia) / (2 * Math.PI),
};
