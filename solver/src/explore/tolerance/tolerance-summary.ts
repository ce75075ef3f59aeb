import type { QuantityName } from "../../scenario/quantity-names.ts";
import type { CellRefusal } from "../cells/cell-row.ts";
import type { Outcome } from "../../result.ts";

/** A number with the interval that covers it with 95 %. */
export interface Estimate {
  readonly value: number;
  readonly low: number;
  readonly high: number;
}

/** A share of all draws. */
export interface Share {
  /** Draws that count, and draws judged. */
  readonly count: number;
  readonly of: number;
  /** Share among those judged, with its Wilson interval (Wilson 1927). */
  readonly estimate: Estimate;
  /** The exact interval (Clopper & Pearson 1934); wider. */
  readonly exact: { readonly low: number; readonly high: number };
  /**
   * With all draws that were refused or could not be judged counted against, and for: the exact interval of the one's low
   * end and of the other's high end. Equal to `exact` where every draw was judged.
   */
  readonly bounded: { readonly low: number; readonly high: number };
}

/** How one quantity scatters over the draws in which it has a value. */
export interface QuantitySpread {
  readonly quantity: QuantityName;
  readonly count: number;
  readonly mean: number;
  readonly deviation: number;
  readonly least: number;
  readonly largest: number;
  /** By shares of the draws: 1, 2.5, 5, 10, 25, 50, 75, 90, 95, 97.5, 99 %. */
  readonly percentiles: readonly { readonly share: number; readonly value: number }[];
  readonly histogram: { readonly edges: readonly number[]; readonly counts: readonly number[] };
  /** What matters, the input that matters most first (by variance share, else by the size of the rank correlation). */
  readonly influences: readonly Influence[];
  /** Mean after the first n draws, with its interval. */
  readonly convergence: readonly ConvergencePoint[];
}

/** How much one input has to do with a quantity. */
export interface Influence {
  readonly path: string;
  /** Spearman's rank correlation, −1…1; null where one of the two does not vary. */
  readonly rankCorrelation: number | null;
  /** First-order share of the variance, 0…1, with its own interval; null under 1,000 draws. */
  readonly varianceShare: Estimate | null;
}

export interface ConvergencePoint {
  readonly runs: number;
  readonly estimate: Estimate;
}

/** Draws that have no outcome for one and the same reason. */
export interface RefusedDraws {
  readonly refusal: CellRefusal;
  readonly count: number;
  /** The number at fault, where values cannot stand together; null otherwise. */
  readonly path: string | null;
  /** One of the draws, and what is wrong with it in a sentence that holds its own figures; null where runs were cut off. */
  readonly first: number;
  readonly example: string | null;
}

export interface ToleranceSummary {
  readonly runs: number;
  /** Draws without an outcome, by why, the most first. */
  readonly refused: readonly RefusedDraws[];
  /** One for each limit of the scenario: the probability that it is kept. */
  readonly limits: readonly { readonly kept: Share; readonly convergence: readonly ConvergencePoint[] }[];
  /** That all limits are kept together; null without limits. */
  readonly allLimits: Share | null;
  readonly outcomes: readonly { readonly outcome: Outcome; readonly share: Share }[];
  readonly spreads: readonly QuantitySpread[];
}
