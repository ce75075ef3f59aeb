import { formula, measures, textbook, type Formula } from "../formula/formula.ts";
import { lengthOf } from "../formula/lengths.ts";
import { materialsFor, modulus } from "../formula/materials.ts";

/**
 * Bending stiffness k = n E I / L³ of a slender beam where its load acts, N/m.
 * @param n 3: a cantilever loaded at its end; 48: on two supports, loaded in the middle; 192: clamped at both ends
 * @param modulus E, Pa
 * @param secondMoment I of the section about the axis it bends around, m⁴
 * @param length L between the supports, or free length, m
 */
export const beamStiffness = (n: number, modulus: number, secondMoment: number, length: number): number =>
  (n * modulus * secondMoment) / length ** 3;

const supports = [
  { key: "cantilever", label: "Cantilever", n: 3, length: lengthOf("length", "Free length", "L"), at: "at its end" },
  {
    key: "supported",
    label: "Beam on two supports",
    n: 48,
    length: lengthOf("length", "Between the supports", "L"),
    at: "in the middle",
  },
  {
    key: "clamped",
    label: "Beam clamped at both ends",
    n: 192,
    length: lengthOf("length", "Between the clamps", "L"),
    at: "in the middle",
  },
] as const;

type Support = (typeof supports)[number];

const remark = ({ at }: Support) =>
  `Slender, loaded ${at}. Shear is left out: below about ten times its height a beam is softer. A real clamp gives way.`;

const common = { presets: [materialsFor("modulus")], source: textbook };
const result = { symbol: "k", measure: measures.springRate };

/** I = b h³/12. */
const rectangular = (support: Support): Formula =>
  formula({
    ...common,
    result,
    key: `${support.key}-rectangular`,
    label: `${support.label}, rectangular`,
    givens: [
      modulus,
      lengthOf("width", "Width", "b"),
      lengthOf("height", "Height", "h", "along the motion"),
      support.length,
    ],
    expression: `${support.n} · {modulus} · ({width} · {height}^3 / 12) / {length}^3`,
    caveat: remark(support),
    value: ({ modulus, width, height, length }) =>
      beamStiffness(support.n, modulus, (width * height ** 3) / 12, length),
  });

/** I = π d⁴/64. */
const round = (support: Support): Formula =>
  formula({
    ...common,
    result,
    key: `${support.key}-round`,
    label: `${support.label}, round`,
    givens: [modulus, lengthOf("diameter", "Diameter", "d"), support.length],
    expression: `${support.n} · {modulus} · (π · {diameter}^4 / 64) / {length}^3`,
    caveat: remark(support),
    value: ({ modulus, diameter, length }) => beamStiffness(support.n, modulus, (Math.PI * diameter ** 4) / 64, length),
  });

export const beams: readonly Formula[] = supports.flatMap((support) => [rectangular(support), round(support)]);
