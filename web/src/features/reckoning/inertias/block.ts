import { formula, measures, textbook } from "../formula/formula.ts";
import { lengthOf } from "../formula/lengths.ts";
import { density, materialsFor } from "../formula/materials.ts";

/**
 * Mass m = ρ a b c of a solid block, kg.
 * @param density ρ, kg/m³
 * @param length a, width b, height c, m
 */
export const blockMass = ({
  density,
  length,
  width,
  height,
}: Record<"density" | "length" | "width" | "height", number>): number => density * length * width * height;

export const block = formula({
  key: "block",
  label: "Block, from its dimensions",
  givens: [
    density,
    lengthOf("length", "Length", "a"),
    lengthOf("width", "Width", "b"),
    lengthOf("height", "Height", "c"),
  ],
  presets: [materialsFor("density")],
  result: { symbol: "m", measure: measures.mass },
  expression: "{density} · {length} · {width} · {height}",
  source: textbook,
  value: blockMass,
});
