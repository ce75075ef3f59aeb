import { correlationOf, deviationOf, meanOf, percentileOf, ranksOf } from "../../numerics/ranks.ts";
import { varianceShare } from "../../numerics/variance-share.ts";
import type { QuantityName } from "../../scenario/quantity-names.ts";
import type { ConvergencePoint, Influence, QuantitySpread } from "./tolerance-summary.ts";

const shares = [0.01, 0.025, 0.05, 0.1, 0.25, 0.5, 0.75, 0.9, 0.95, 0.975, 0.99];
const fewestForShares = 1000;
const convergencePoints = 20;
const mostBins = 60;
/** 97.5 % of the normal distribution. */
const z975 = 1.959963984540054;

/** An input of a study over all its draws. */
export interface StudyInput {
  readonly path: string;
  readonly values: Float64Array;
  readonly ranks: Float64Array;
}

/** How a quantity scatters. @param values one for each draw, null where it has none; @param inputs the draws themselves */
export function spreadOf(
  quantity: QuantityName,
  values: readonly (number | null)[],
  inputs: readonly StudyInput[],
): QuantitySpread {
  const there = values.flatMap((value, i) => (value === null ? [] : [i]));
  const own = Float64Array.from(there, (i) => values[i] as number);
  const sorted = Float64Array.from(own).sort();
  const ranks = ranksOf(own);
  const isEmpty = own.length === 0;
  return {
    quantity,
    count: own.length,
    mean: isEmpty ? 0 : meanOf(own),
    deviation: isEmpty ? 0 : deviationOf(own),
    least: isEmpty ? 0 : sorted[0],
    largest: isEmpty ? 0 : sorted[sorted.length - 1],
    percentiles: isEmpty ? [] : shares.map((share) => ({ share, value: percentileOf(sorted, share) })),
    histogram: histogramOf(sorted),
    influences: inputs.map((input) => influenceOf(input, there, own, ranks)).sort(byWeight),
    convergence: convergenceRuns(own.length).map((runs) => meanAfter(own.subarray(0, runs), runs)),
  };
}

/** Up to 20 numbers of draws, evenly, the last of them all. */
export function convergenceRuns(all: number): number[] {
  const steps = Math.min(convergencePoints, all);
  return Array.from({ length: steps }, (_, i) => Math.round((all * (i + 1)) / steps));
}

/** Equal bins, 2 n^(1/3) of them (Rice's rule, common practice). */
function histogramOf(sorted: Float64Array): QuantitySpread["histogram"] {
  const n = sorted.length;
  const [least, largest] = [sorted[0], sorted[n - 1]];
  if (n === 0 || least === largest)
    return n === 0 ? { edges: [], counts: [] } : { edges: [least, largest], counts: [n] };
  const bins = Math.min(mostBins, Math.ceil(2 * Math.cbrt(n)));
  const counts = Array.from({ length: bins }, () => 0);
  for (const value of sorted) counts[Math.min(bins - 1, Math.floor(((value - least) / (largest - least)) * bins))] += 1;
  return { edges: Array.from({ length: bins + 1 }, (_, i) => least + ((largest - least) * i) / bins), counts };
}

/** @param there the draws in which the quantity has a value */
function influenceOf(
  input: StudyInput,
  there: readonly number[],
  own: Float64Array,
  ownRanks: Float64Array,
): Influence {
  const isWhole = there.length === input.values.length;
  const ranks = isWhole ? input.ranks : ranksOf(Float64Array.from(there, (i) => input.values[i]));
  return {
    path: input.path,
    rankCorrelation: own.length < 3 ? null : correlationOf(ranks, ownRanks),
    varianceShare: own.length < fewestForShares ? null : varianceShare(ranks, own),
  };
}

const weightOf = ({ varianceShare: share, rankCorrelation: rank }: Influence): number =>
  share?.value ?? Math.abs(rank ?? 0);
const byWeight = (a: Influence, b: Influence): number => weightOf(b) - weightOf(a);

function meanAfter(values: Float64Array, runs: number): ConvergencePoint {
  const mean = meanOf(values);
  const half = (z975 * deviationOf(values)) / Math.sqrt(runs);
  return { runs, estimate: { value: mean, low: mean - half, high: mean + half } };
}
