import { formula, measures, textbook } from "../formula/formula.ts";
import { lengthOf } from "../formula/lengths.ts";
import { materialsFor, shearModulus } from "../formula/materials.ts";

/**
 * Stiffness k = G d⁴ / (8 D³ n) of a helical spring of round wire, N/m.
 * @param shearModulus G, Pa
 * @param wire d, diameter of the wire, m
 * @param coil D, mean diameter of the coil (outside less d), m, above d
 * @param turns n that work: all but the closed ends
 */
export const helicalStiffness = ({
  shearModulus,
  wire,
  coil,
  turns,
}: Record<"shearModulus" | "wire" | "coil" | "turns", number>): number =>
  (shearModulus * wire ** 4) / (8 * coil ** 3 * turns);

export const helicalSpring = formula({
  key: "helical-spring",
  label: "Helical spring",
  givens: [
    shearModulus,
    lengthOf("wire", "Wire diameter", "d"),
    lengthOf("coil", "Mean coil diameter", "D", "outside less one wire"),
    {
      key: "turns",
      label: "Working turns",
      symbol: "n",
      measure: measures.number,
      exclusiveMinimum: 0,
      help: "without closed ends",
    },
  ],
  presets: [materialsFor("shearModulus")],
  result: { symbol: "k", measure: measures.springRate },
  expression: "{shearModulus} · {wire}^4 / (8 · {coil}^3 · {turns})",
  source: textbook,
  caveat: "Before turns touch. Makers allow some 10 % on the rate, from memory; a rate from the sheet goes before it.",
  value: helicalStiffness,
  fault: ({ wire, coil }) =>
    wire < coil ? null : { key: "coil", message: "The coil is wider than its wire: enter more than d." },
});
