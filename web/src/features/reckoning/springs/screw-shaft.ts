import { formula, measures, textbook } from "../formula/formula.ts";
import { lengthOf } from "../formula/lengths.ts";
import { materialsFor, modulus } from "../formula/materials.ts";

const core = lengthOf("diameter", "Core diameter", "d", "of the thread’s root, not its nominal diameter");

/**
 * Axial stiffness k = E A / L of a screw held axially at one end, A = π d²/4, N/m.
 * @param modulus E, Pa
 * @param diameter d of the core, m
 * @param length L between the fixed bearing and the nut, m: longest travel is softest
 */
export const fixedFree = ({ modulus, diameter, length }: Record<"modulus" | "diameter" | "length", number>): number =>
  (modulus * Math.PI * diameter ** 2) / (4 * length);

/**
 * Axial stiffness k = E A L / (a (L − a)) of a screw held axially at both ends: its two lengths side by side, N/m.
 * @param modulus E, Pa
 * @param diameter d of the core, m
 * @param length L between the two bearings, m
 * @param position a of the nut from one of them, m, 0 < a < L; softest at L/2
 */
export const fixedFixed = ({
  modulus,
  diameter,
  length,
  position,
}: Record<"modulus" | "diameter" | "length" | "position", number>): number =>
  (modulus * Math.PI * diameter ** 2 * length) / (4 * position * (length - position));

export const screwFixedFree = formula({
  key: "screw-fixed-free",
  label: "Screw shaft, held at one end",
  givens: [modulus, core, lengthOf("length", "From fixed bearing to nut", "L", "the longest is the softest")],
  presets: [materialsFor("modulus")],
  result: { symbol: "k", measure: measures.springRate },
  expression: "{modulus} · π · {diameter}^2 / (4 · {length})",
  source: textbook,
  caveat: "Stretch of the shaft alone: nut and bearing are members of their own, and so is its twist.",
  value: fixedFree,
});

export const screwFixedFixed = formula({
  key: "screw-fixed-fixed",
  label: "Screw shaft, held at both ends",
  givens: [
    modulus,
    core,
    lengthOf("length", "Between the bearings", "L"),
    lengthOf("position", "From one bearing to the nut", "a", "softest in the middle"),
  ],
  presets: [materialsFor("modulus")],
  result: { symbol: "k", measure: measures.springRate },
  expression: "{modulus} · π · {diameter}^2 · {length} / (4 · {position} · ({length} − {position}))",
  source: textbook,
  caveat: "Both bearings hold axially and are stiff beside the shaft; the screw is stretched enough never to go slack.",
  value: fixedFixed,
  fault: ({ length, position }) =>
    position < length ? null : { key: "position", message: "The nut lies between the bearings: enter less than L." },
});
