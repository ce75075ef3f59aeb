import { quantityNames, type QuantityName } from "../../scenario/quantity-names.ts";
import { z } from "../../scenario/zod.ts";
import { linksSchema, type Links } from "../links.ts";
import { mostQuantities } from "../cells/cell-row.ts";

/**
 * How a number scatters, SI. `uniform`: low…high. `normal`: mean and standard deviation. `truncated`: the same, cut at low
 * and high. `triangular`: low, the likeliest, high.
 */
export type Distribution =
  | { readonly kind: "uniform"; readonly low: number; readonly high: number }
  | { readonly kind: "normal"; readonly mean: number; readonly deviation: number }
  | {
      readonly kind: "truncated";
      readonly mean: number;
      readonly deviation: number;
      readonly low: number;
      readonly high: number;
    }
  | { readonly kind: "triangular"; readonly low: number; readonly likeliest: number; readonly high: number };

/** A number that scatters. */
export interface ScatteredInput {
  readonly path: string;
  readonly distribution: Distribution;
}

/** A rank correlation between two inputs, by their place in the list; −1 < value < 1. */
export interface RankCorrelation {
  readonly first: number;
  readonly second: number;
  readonly value: number;
}

/**
 * Inputs that scatter together with a normal distribution, by mean and covariance (typed, or from a fit); SI, the matrix
 * symmetric and positive definite, a row for each path.
 */
export interface JointInput {
  readonly paths: readonly string[];
  readonly means: readonly number[];
  readonly covariance: readonly (readonly number[])[];
  /** Where the numbers come from, in words: a fit, a measurement, a paper. */
  readonly source?: string;
}

export interface TolerancePlan {
  readonly format: "restband-tolerance/1";
  readonly inputs: readonly ScatteredInput[];
  readonly correlations: readonly RankCorrelation[];
  readonly joint: readonly JointInput[];
  readonly links: Links;
  /** A whole number: the same seed gives the same draws everywhere. */
  readonly seed: number;
  /** 100 to 100,000. */
  readonly runs: number;
  readonly sampling: "latin-hypercube" | "random";
  /** Described besides the ones that limits name. */
  readonly quantities: readonly QuantityName[];
}

export const fewestRuns = 100;
export const mostRuns = 100_000;
/** Letters of a source. */
export const mostSource = 200;

const distributionSchema = z.discriminatedUnion("kind", [
  z.strictObject({ kind: z.literal("uniform"), low: z.number(), high: z.number() }),
  z.strictObject({ kind: z.literal("normal"), mean: z.number(), deviation: z.number() }),
  z.strictObject({
    kind: z.literal("truncated"),
    mean: z.number(),
    deviation: z.number(),
    low: z.number(),
    high: z.number(),
  }),
  z.strictObject({ kind: z.literal("triangular"), low: z.number(), likeliest: z.number(), high: z.number() }),
]);

/** The shape of a plan alone; `checkTolerancePlan` judges it beside its scenario. */
export const tolerancePlanSchema: z.ZodType<TolerancePlan> = z.strictObject({
  format: z.literal("restband-tolerance/1"),
  inputs: z.array(z.strictObject({ path: z.string(), distribution: distributionSchema })),
  correlations: z.array(z.strictObject({ first: z.int(), second: z.int(), value: z.number() })),
  joint: z.array(
    z.strictObject({
      paths: z.array(z.string()),
      means: z.array(z.number()),
      covariance: z.array(z.array(z.number())),
      source: z.string().max(mostSource).optional(),
    }),
  ),
  links: linksSchema,
  seed: z.int(),
  runs: z.int().min(fewestRuns).max(mostRuns),
  sampling: z.enum(["latin-hypercube", "random"]),
  quantities: z.array(z.enum(quantityNames)).max(mostQuantities),
});

/** The paths of all that scatters, in the order of a draw's values. */
export const variedPaths = ({ inputs, joint }: Pick<TolerancePlan, "inputs" | "joint">): string[] => [
  ...inputs.map(({ path }) => path),
  ...joint.flatMap(({ paths }) => paths),
];

/** The symmetric matrix of rank correlations, 1 on its diagonal. */
export function correlationMatrix(size: number, correlations: readonly RankCorrelation[]): number[][] {
  const matrix = Array.from({ length: size }, (_, i) => Array.from({ length: size }, (__, j) => Number(i === j)));
  for (const { first, second, value } of correlations) matrix[first][second] = matrix[second][first] = value;
  return matrix;
}
