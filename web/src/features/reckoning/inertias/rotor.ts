import { formula, measures, textbook } from "../formula/formula.ts";
import { bore, boreFault, lengthOf } from "../formula/lengths.ts";
import { density, materialsFor } from "../formula/materials.ts";

export const rotor = formula({
  key: "rotor",
  label: "Rotor, coupling or pulley, from its sheet",
  givens: [
    {
      key: "inertia",
      label: "Moment of inertia",
      symbol: "J",
      measure: measures.inertia,
      unit: "kg·cm²",
      exclusiveMinimum: 0,
    },
  ],
  result: { symbol: "J", measure: measures.inertia },
  expression: "{inertia}",
  source: "its data sheet",
  caveat: "A motor’s brake and encoder come on top where its sheet lists them apart.",
  value: ({ inertia }) => inertia,
});

/**
 * Moment of inertia J = π ρ L (d⁴ − d_i⁴)/32 of a shaft, screw or disc about its axis, kg·m².
 * @param density ρ, kg/m³
 * @param diameter d, m
 * @param bore d_i, m, 0 where solid
 * @param length L, or thickness, m
 */
export const cylinderInertia = ({
  density,
  diameter,
  bore,
  length,
}: Record<"density" | "diameter" | "bore" | "length", number>): number =>
  (Math.PI * density * length * (diameter ** 4 - bore ** 4)) / 32;

export const cylinder = formula({
  key: "cylinder",
  label: "Shaft, screw or disc, from its dimensions",
  givens: [
    density,
    lengthOf("diameter", "Diameter", "d", "of a screw: between core and nominal"),
    bore,
    lengthOf("length", "Length or thickness", "L"),
  ],
  presets: [materialsFor("density")],
  result: { symbol: "J", measure: measures.inertia },
  expression: "π · {density} · {length} · ({diameter}^4 − {bore}^4) / 32",
  source: textbook,
  value: cylinderInertia,
  fault: boreFault,
});
