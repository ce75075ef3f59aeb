import { choleskyOf, lowerTimes } from "../../numerics/cholesky.ts";
import { normalQuantile, normalShare } from "../../numerics/normal.ts";
import { randomFrom, shuffled, type Random } from "../../numerics/random.ts";
import { checkScenario, type Checked } from "../../scenario/check-scenario.ts";
import type { Scenario } from "../../scenario/scenario.ts";
import { withValues } from "../links.ts";
import { inRankOrder } from "./rank-order.ts";
import { correlationMatrix, variedPaths, type Distribution, type TolerancePlan } from "./tolerance-plan.ts";

/** The draws of a study: for each, the values of `variedPaths(plan)`, one draw after another. */
export type Draws = Float64Array;

/**
 * All draws of a checked plan. The same plan gives the same draws: they follow from its seed. A Latin hypercube takes each
 * of `runs` equally likely stretches of every input once (McKay, Beckman & Conover 1979).
 */
export function drawsOf(plan: TolerancePlan): Draws {
  const random = randomFrom(plan.seed);
  const singles = plan.inputs.map(({ distribution }) =>
    sharesOf(plan, random).map((share) => quantileOf(distribution, share)),
  );
  const scores = plan.joint.map(({ paths }) => paths.map(() => sharesOf(plan, random).map(normalQuantile)));
  const ordered =
    plan.correlations.length === 0
      ? singles
      : inRankOrder(singles, correlationMatrix(singles.length, plan.correlations), random);
  const columns = [...ordered, ...plan.joint.flatMap((joint, i) => jointColumns(joint, scores[i]))];
  const draws = new Float64Array(plan.runs * columns.length);
  columns.forEach((column, j) => column.forEach((value, i) => (draws[i * columns.length + j] = value)));
  return draws;
}

/** The scenario of one draw, or the faults that refuse it. */
export function drawScenario(scenario: Scenario, plan: TolerancePlan, draws: Draws, index: number): Checked {
  const paths = variedPaths(plan);
  const values = paths.map((path, j): [string, number] => [path, draws[index * paths.length + j]]);
  return checkScenario(withValues(scenario, values, plan.links));
}

/** Numbers in (0, 1): one in each of as many equal stretches, in random order, or each anywhere. */
function sharesOf({ runs, sampling }: TolerancePlan, random: Random): Float64Array {
  // the middle of a cell of 2⁻⁵³, so that 0, which no quantile has, is never drawn
  const next = () => random() + 2 ** -54;
  if (sampling === "random") return Float64Array.from({ length: runs }, next);
  const order = shuffled(runs, random);
  return Float64Array.from(order, (stretch) => (stretch + next()) / runs);
}

/** The value below which a share of a distribution lies. */
export function quantileOf(distribution: Distribution, share: number): number {
  switch (distribution.kind) {
    case "uniform":
      return distribution.low + share * (distribution.high - distribution.low);
    case "normal":
      return distribution.mean + distribution.deviation * normalQuantile(share);
    case "truncated":
      return truncatedQuantile(distribution, share);
    case "triangular":
      return triangularQuantile(distribution, share);
  }
}

type Truncated = Extract<Distribution, { kind: "truncated" }>;
type Triangular = Extract<Distribution, { kind: "triangular" }>;

/** Taken from the side of the lower tail, where shares keep their digits. */
function truncatedQuantile({ mean, deviation, low, high }: Truncated, share: number): number {
  const [from, to] = [(low - mean) / deviation, (high - mean) / deviation];
  const isUpper = from > 0;
  const [a, b] = isUpper ? [normalShare(-to), normalShare(-from)] : [normalShare(from), normalShare(to)];
  const z = isUpper ? -normalQuantile(a + (1 - share) * (b - a)) : normalQuantile(a + share * (b - a));
  return Math.min(high, Math.max(low, mean + deviation * z));
}

function triangularQuantile({ low, likeliest, high }: Triangular, share: number): number {
  const width = high - low;
  const rising = (likeliest - low) / width;
  return share < rising
    ? low + Math.sqrt(share * width * (likeliest - low))
    : high - Math.sqrt((1 - share) * width * (high - likeliest));
}

/** means + L z, L the Cholesky factor of the covariance. */
function jointColumns(
  { means, covariance }: TolerancePlan["joint"][number],
  scores: readonly Float64Array[],
): Float64Array[] {
  const factor = choleskyOf(covariance) ?? [];
  const columns = means.map(() => new Float64Array(scores[0].length));
  for (let i = 0; i < scores[0].length; i++)
    lowerTimes(
      factor,
      scores.map((column) => column[i]),
    ).forEach((z, j) => (columns[j][i] = means[j] + z));
  return columns;
}
