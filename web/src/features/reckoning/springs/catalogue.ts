import { formula, measures } from "../formula/formula.ts";

/** A member whose stiffness somebody else has measured or computed. */
const fromCatalogue = (key: string, label: string, turns: boolean, caveat: string) =>
  formula({
    key,
    label,
    givens: [
      {
        key: "rate",
        label: turns ? "Torsional stiffness" : "Stiffness",
        symbol: turns ? "κ" : "k",
        measure: turns ? measures.torsionRate : measures.springRate,
        exclusiveMinimum: 0,
      },
    ],
    result: { symbol: turns ? "κ" : "k", measure: turns ? measures.torsionRate : measures.springRate },
    expression: "{rate}",
    source: "its data sheet",
    caveat,
    value: ({ rate }) => rate,
  });

export const nut = fromCatalogue(
  "nut",
  "Ball or roller nut, from its sheet",
  false,
  "Sheets give it at a share of the dynamic load rating; below that it is softer. Taking 80 % of the sheet is common practice, from memory.",
);
export const bearing = fromCatalogue(
  "bearing",
  "Thrust bearing, from its sheet",
  false,
  "As a preloaded set. The seat and housing are softer than the bearing more often than not: give them a member.",
);
export const mount = fromCatalogue(
  "mount",
  "Mount, bracket or anything known",
  false,
  "Measured or computed for the direction in which the body moves.",
);
export const coupling = fromCatalogue(
  "coupling",
  "Coupling, from its sheet",
  true,
  "Elastomer inserts stiffen with load and speed: the sheet’s dynamic value counts for vibration.",
);
export const torsionMember = fromCatalogue(
  "torsion-known",
  "Gear stage or anything known that twists",
  true,
  "Seen from its own output side; backlash is no stiffness and is not in here.",
);
