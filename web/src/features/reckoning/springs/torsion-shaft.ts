import { formula, measures, textbook } from "../formula/formula.ts";
import { bore, boreFault, lengthOf } from "../formula/lengths.ts";
import { materialsFor, shearModulus } from "../formula/materials.ts";

/**
 * Torsional stiffness κ = G J / L of a round shaft, J = π (d⁴ − d_i⁴)/32, N·m/rad.
 * @param shearModulus G, Pa
 * @param diameter d, m
 * @param bore d_i, m, 0 where solid
 * @param length L that twists, m
 */
export const torsionShaftStiffness = ({
  shearModulus,
  diameter,
  bore,
  length,
}: Record<"shearModulus" | "diameter" | "bore" | "length", number>): number =>
  (shearModulus * Math.PI * (diameter ** 4 - bore ** 4)) / (32 * length);

export const torsionShaft = formula({
  key: "torsion-shaft",
  label: "Shaft, twisted",
  givens: [shearModulus, lengthOf("diameter", "Diameter", "d"), bore, lengthOf("length", "Length that twists", "L")],
  presets: [materialsFor("shearModulus")],
  result: { symbol: "κ", measure: measures.torsionRate },
  expression: "{shearModulus} · π · ({diameter}^4 − {bore}^4) / (32 · {length})",
  source: textbook,
  caveat: "A round shaft of one diameter. Keyways and steps soften it.",
  value: torsionShaftStiffness,
  fault: boreFault,
});
