import type { Field, KindFault } from "../field.ts";

/** μs, no unit. */
export const staticField: Field = {
  key: "static",
  label: "Static friction",
  symbol: "μs",
  dimension: "none",
  minimum: 0,
  initial: 0.15,
  help: "at rest",
};

/** μk, no unit. */
export const kineticField: Field = {
  key: "kinetic",
  label: "Kinetic friction",
  symbol: "μk",
  dimension: "none",
  minimum: 0,
  initial: 0.12,
  help: "while sliding",
};

/** The rule μs ≥ μk ≥ 0 that all laws with two coefficients share. */
export function staticBelowKinetic(law: { static: number; kinetic: number }): readonly KindFault[] {
  if (!(law.static < law.kinetic)) return [];
  const message =
    `Static friction cannot be smaller than kinetic friction; they are ${law.static} and ${law.kinetic}. ` +
    `Raise static to ${law.kinetic} or more, or lower kinetic first.`;
  return [{ path: "static", message }];
}
