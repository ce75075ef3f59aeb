import { exactInterval, wilsonInterval } from "../../numerics/binomial-interval.ts";
import { ranksOf } from "../../numerics/ranks.ts";
import { cellOutcomes, readRow, rowLength, type CellFigures } from "../cells/cell-row.ts";
import type { Scenario } from "../../scenario/scenario.ts";
import { drawsOf } from "./draws.ts";
import { refusedDraws } from "./refused-draws.ts";
import { convergenceRuns, spreadOf } from "./quantity-spread.ts";
import { studyRows } from "./run-draws.ts";
import { variedPaths, type TolerancePlan } from "./tolerance-plan.ts";
import type { ConvergencePoint, Estimate, Share, ToleranceSummary } from "./tolerance-summary.ts";

const confidence = 0.95;

/**
 * What a study says. Intervals are those of independent draws; of a Latin hypercube they are on the wide side (common
 * practice). Throws RangeError where the rows are no whole number of draws.
 *
 * @param rows of the first draws of a checked plan, all of them or as many as there are yet (see `studyRows`)
 */
export function toleranceSummary(plan: TolerancePlan, scenario: Scenario, rows: Float64Array): ToleranceSummary {
  const kept = studyRows(plan, scenario);
  const length = rowLength(kept);
  const runs = rows.length / length;
  if (!Number.isInteger(runs)) throw new RangeError(`${rows.length} numbers are no whole number of rows of ${length}`);
  const all = Array.from({ length: runs }, (_, i) => readRow(rows, i * length, kept, scenario.limits.length));
  const draws = drawsOf(plan);
  const columns = columnsOf(draws, variedPaths(plan).length, runs);
  const inputs = variedPaths(plan).map((path, j) => ({ path, values: columns[j], ranks: ranksOf(columns[j]) }));
  return {
    runs,
    refused: refusedDraws(scenario, plan, draws, all),
    limits: scenario.limits.map((_, i) => {
      const verdicts = all.map(({ kept: each, refusal }) => (refusal === null ? each[i] : null));
      return { kept: shareOf(verdicts), convergence: shareConvergence(verdicts) };
    }),
    allLimits: scenario.limits.length === 0 ? null : shareOf(all.map(togetherOf)),
    outcomes: cellOutcomes.flatMap((outcome) => {
      const share = shareOf(all.map((one) => (one.outcome === null ? null : one.outcome === outcome)));
      return share.count === 0 ? [] : [{ outcome, share }];
    }),
    spreads: kept.quantities.map((quantity, i) =>
      spreadOf(
        quantity,
        all.map(({ quantities }) => quantities[i]),
        inputs,
      ),
    ),
  };
}

function columnsOf(draws: Float64Array, width: number, runs: number): Float64Array[] {
  return Array.from({ length: width }, (_, j) => Float64Array.from({ length: runs }, (__, i) => draws[i * width + j]));
}

/** All limits of a draw together; null where one that is not broken cannot be judged. */
function togetherOf({ kept, refusal }: CellFigures): boolean | null {
  if (refusal !== null) return null;
  if (kept.includes(false)) return false;
  return kept.includes(null) ? null : true;
}

/** The share of true among what is judged; null is not, and bounds it both ways. */
function shareOf(verdicts: readonly (boolean | null)[]): Share {
  const count = verdicts.filter((one) => one === true).length;
  const of = verdicts.filter((one) => one !== null).length;
  const unjudged = verdicts.length - of;
  return {
    count,
    of,
    estimate: estimateOf(count, of),
    exact: of === 0 ? { low: 0, high: 1 } : exactInterval(count, of, confidence),
    bounded: {
      low: verdicts.length === 0 ? 0 : exactInterval(count, verdicts.length, confidence).low,
      high: verdicts.length === 0 ? 1 : exactInterval(count + unjudged, verdicts.length, confidence).high,
    },
  };
}

const estimateOf = (count: number, of: number): Estimate => ({
  value: of === 0 ? 0 : count / of,
  ...wilsonInterval(count, of, confidence),
});

function shareConvergence(verdicts: readonly (boolean | null)[]): ConvergencePoint[] {
  let [count, of, seen] = [0, 0, 0];
  return convergenceRuns(verdicts.length).map((runs) => {
    for (; seen < runs; seen++) {
      if (verdicts[seen] === true) count += 1;
      if (verdicts[seen] !== null) of += 1;
    }
    return { runs, estimate: estimateOf(count, of) };
  });
}
