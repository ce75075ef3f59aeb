import { formula, measures, textbook } from "../formula/formula.ts";
import { bore, boreFault, lengthOf } from "../formula/lengths.ts";
import { materialsFor, modulus } from "../formula/materials.ts";

/**
 * Axial stiffness k = E A / L of a rod or tube, A = π (d² − d_i²)/4, N/m.
 * @param modulus E, Pa
 * @param diameter d, m
 * @param bore d_i, m, 0 where solid
 * @param length L, m
 */
export const rodStiffness = ({
  modulus,
  diameter,
  bore,
  length,
}: Record<"modulus" | "diameter" | "bore" | "length", number>): number =>
  (modulus * Math.PI * (diameter ** 2 - bore ** 2)) / (4 * length);

export const rod = formula({
  key: "rod",
  label: "Rod or tube, pulled",
  givens: [modulus, lengthOf("diameter", "Diameter", "d"), bore, lengthOf("length", "Length", "L")],
  presets: [materialsFor("modulus")],
  result: { symbol: "k", measure: measures.springRate },
  expression: "{modulus} · π · ({diameter}^2 − {bore}^2) / (4 · {length})",
  source: textbook,
  caveat: "Its ends are members of their own. A long rod under pressure buckles before it is a spring.",
  value: rodStiffness,
  fault: boreFault,
});
