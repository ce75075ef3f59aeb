import { formula, measures, textbook } from "../formula/formula.ts";
import { lengthOf } from "../formula/lengths.ts";

/**
 * Stiffness k = M a b / t of a rectangular pad, N/m.
 * @param stiffnessModulus M, Pa: the compression modulus where it is pressed, the shear modulus where it is sheared
 * @param length a and width b of its face, m
 * @param thickness t, m
 */
export const padStiffness = ({
  stiffnessModulus,
  length,
  width,
  thickness,
}: Record<"stiffnessModulus" | "length" | "width" | "thickness", number>): number =>
  (stiffnessModulus * length * width) / thickness;

const pad = (key: string, label: string, modulusLabel: string, symbol: string, caveat: string) =>
  formula({
    key,
    label,
    givens: [
      { key: "stiffnessModulus", label: modulusLabel, symbol, measure: measures.pressure, exclusiveMinimum: 0 },
      lengthOf("length", "Length of the face", "a"),
      lengthOf("width", "Width of the face", "b"),
      lengthOf("thickness", "Thickness", "t"),
    ],
    result: { symbol: "k", measure: measures.springRate },
    expression: "{stiffnessModulus} · {length} · {width} / {thickness}",
    source: textbook,
    caveat,
    value: padStiffness,
  });

export const padPressed = pad(
  "pad-pressed",
  "Pad, pressed",
  "Compression modulus",
  "E_c",
  "A wide thin elastomer pad cannot bulge: its compression modulus is far above Young’s. Take it from the pad’s sheet; for vibration the dynamic one.",
);
export const padSheared = pad(
  "pad-sheared",
  "Pad, sheared",
  "Shear modulus",
  "G",
  "Bonded on both faces, thin beside its length. Elastomers stiffen with frequency: take the dynamic modulus.",
);
