import type { Law } from "../scenario/scenario.ts";
import { pythonList, pythonNumber as n } from "./literals.ts";

type LawOf<Model extends Law["model"]> = Extract<Law, { model: Model }>;
type Model = Law["model"];

/** `friction(v)` of each law in Python: the body of the function, and lines before it. v ≥ 0 is the speed of the faces. */
const writers: { readonly [M in Model]: (law: LawOf<M>) => LawPart } = {
  none: () => ({ body: ["return 0.0 * v"] }),
  coulomb: (law) => ({ body: [`return np.where(v > 0, ${n(law.kinetic)}, ${n(law.static)})`] }),
  stribeck: ({ static: atRest, kinetic, velocity, exponent }) => ({
    body: [falling(atRest, kinetic, velocity, exponent)],
  }),
  bristle: ({ static: atRest, kinetic, velocity, stiffness, damping }) => ({
    setUp: [
      `BRISTLE_STIFFNESS, BRISTLE_DAMPING = ${n(stiffness)}, ${n(damping)}  # s0, s1; s2 is FLUID`,
      `BRISTLE_VELOCITY = ${n(velocity)}  # vs`,
    ],
    body: [falling(atRest, kinetic, velocity, 2)],
  }),
  table: ({ points }) => ({
    setUp: [
      `SPEEDS = np.array(${pythonList(points.map(([speed]) => speed))})`,
      `COEFFICIENTS = np.array(${pythonList(points.map(([, coefficient]) => coefficient))})`,
      ...(points.length > 1 ? tableSetUp : []),
    ],
    body: [points.length > 1 ? "return CURVE(np.minimum(v, SPEEDS[-1]))" : "return COEFFICIENTS[0] + 0.0 * v"],
  }),
};

const falling = (atRest: number, kinetic: number, velocity: number, exponent: number) =>
  `return ${n(kinetic)} + (${n(atRest)} - ${n(kinetic)}) * np.exp(-((v / ${n(velocity)}) ** ${n(exponent)}))`;

export interface LawPart {
  readonly setUp?: readonly string[];
  readonly body: readonly string[];
}

/** A law in Python; `not-covered.ts` has seen to it that there is a writer. */
export function lawPart(law: Law): LawPart {
  const write = writers[law.model] as (law: Law) => LawPart;
  return write(law);
}

export const isLawWritten = (model: string): boolean => model in writers;

/** The monotone cubic through the points as the law defines it: a Hermite spline whose slopes are limited. */
const tableSetUp = [
  "SECANTS = np.diff(COEFFICIENTS) / np.diff(SPEEDS)",
  "INNER = np.where(SECANTS[1:] * SECANTS[:-1] > 0, (SECANTS[1:] + SECANTS[:-1]) / 2, 0.0)",
  "SLOPES = np.concatenate([SECANTS[:1], INNER, SECANTS[-1:]])",
  "for i, secant in enumerate(SECANTS):",
  "    steepness = np.hypot(SLOPES[i] / secant, SLOPES[i + 1] / secant) if secant else 0.0",
  "    if steepness > 3:",
  "        SLOPES[i : i + 2] *= 3 / steepness",
  "CURVE = CubicHermiteSpline(SPEEDS, COEFFICIENTS, SLOPES)",
];
