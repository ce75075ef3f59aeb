import { choleskyOf, lowerTimes, solveLower } from "../../numerics/cholesky.ts";
import { normalQuantile } from "../../numerics/normal.ts";
import { shuffled, type Random } from "../../numerics/random.ts";
import { correlationOf, ranksOf } from "../../numerics/ranks.ts";

/**
 * The same values in each column, put in another order so that the columns have the rank correlations asked for, about as
 * closely as a sample can (Iman & Conover 1982): normal scores in random order are given those correlations, what chance
 * gave them taken out, and each column follows the ranks of its scores.
 *
 * @param target Spearman's correlations, symmetric with 1 on the diagonal; their `scoreCorrelations` positive definite
 */
export function inRankOrder(
  columns: readonly Float64Array[],
  target: readonly (readonly number[])[],
  random: Random,
): Float64Array[] {
  const runs = columns[0].length;
  const ladder = Float64Array.from({ length: runs }, (_, i) => normalQuantile((i + 1) / (runs + 1)));
  const scores = columns.map(() => Float64Array.from(shuffled(runs, random), (place) => ladder[place]));
  const wanted = choleskyOf(scoreCorrelations(target));
  const byChance = choleskyOf(scores.map((a) => scores.map((b) => correlationOf(a, b) ?? 0)));
  if (wanted === null || byChance === null) return [...columns];
  const turned = scores.map(() => new Float64Array(runs));
  for (let i = 0; i < runs; i++) {
    const plain = solveLower(
      byChance,
      scores.map((column) => column[i]),
    );
    lowerTimes(wanted, plain).forEach((value, j) => (turned[j][i] = value));
  }
  return columns.map((column, j) => orderedBy(column, turned[j]));
}

/**
 * The correlations of normal scores whose ranks correlate so: 2 sin(πρ/6) (Pearson 1907). They are a little larger than those
 * of the ranks: the ones may be possible together and the others not.
 */
export const scoreCorrelations = (target: readonly (readonly number[])[]): number[][] =>
  target.map((row, i) => row.map((value, j) => (i === j ? 1 : 2 * Math.sin((Math.PI * value) / 6))));

function orderedBy(column: Float64Array, guide: Float64Array): Float64Array {
  const sorted = Float64Array.from(column).sort();
  return Float64Array.from(ranksOf(guide), (rank) => sorted[Math.ceil(rank) - 1]);
}
