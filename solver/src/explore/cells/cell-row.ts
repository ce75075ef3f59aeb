import type { LimitVerdict, Outcome } from "../../result.ts";
import type { Limit } from "../../scenario/scenario.ts";
import type { QuantityName } from "../../scenario/quantity-names.ts";

/** What rows hold: the plan of a sweep or of a study. */
export interface RowPlan {
  readonly quantities: readonly QuantityName[];
}

/**
 * A cell of a sweep, or a draw of a study, as numbers: `[outcome, limits, absent, quantity…]`. Never NaN.
 *
 * - `outcome`: the place in `cellOutcomes`, or a negative code of `cellRefusals`: then all that follows is 0.
 * - `limits`: a digit to base 4 for each limit of the scenario, the first lowest: 1 kept, 2 broken, 3 cannot be judged.
 * - `absent`: bit i is set where the i-th quantity of the plan has no value in this cell; its number is then 0.
 */
export type CellRow = Float64Array;

/** The same with the quantities that limits name in front: enough to tell every verdict. */
export const withLimitQuantities = ({ quantities }: RowPlan, limits: readonly Limit[]): RowPlan => ({
  quantities: [...new Set([...limits.map(({ quantity }) => quantity as QuantityName), ...quantities])],
});

/** Numbers in front of the quantities. */
export const rowHead = 3;

export const rowLength = ({ quantities }: RowPlan): number => rowHead + quantities.length;

/** Outcomes by their code; the order is part of saved sweeps. */
export const cellOutcomes = [
  "never-moved",
  "came-to-rest",
  "too-short",
  "growing",
  "stick-slip",
  "settles",
  "not-settled",
  "smooth-sliding",
] as const satisfies readonly Outcome[];

/** Why a cell has no outcome, by its code: values that cannot stand together, no method for them, or a run that was cut off. */
export const cellRefusals = {
  refused: -1,
  "not-computed": -2,
  "max-events": -3,
  "max-work": -4,
  failed: -5,
} as const;
export type CellRefusal = keyof typeof cellRefusals;

/** Verdicts of limits fit a number's 53 bits. */
export const mostLimits = 25;
/** Asked for besides those that limits name. */
export const mostQuantities = 29;

/** What a row says, read back. */
export interface CellFigures {
  readonly outcome: Outcome | null;
  /** Null where there is an outcome. */
  readonly refusal: CellRefusal | null;
  /** In the order of the scenario's limits: true kept, false broken, null cannot be judged. */
  readonly kept: readonly (boolean | null)[];
  /** In the order of the plan; null where there is no value. */
  readonly quantities: readonly (number | null)[];
}

/** Reads the row at an offset of many. @param limits how many limits the scenario has */
export function readRow(row: Float64Array, offset: number, plan: RowPlan, limits: number): CellFigures {
  const code = row[offset];
  const isRefused = code < 0;
  return {
    outcome: isRefused ? null : cellOutcomes[code],
    refusal: isRefused ? refusalOf(code) : null,
    kept: Array.from({ length: limits }, (_, i) => keptAt(row[offset + 1], i)),
    quantities: plan.quantities.map((_, i) => quantityAt(row, offset, i)),
  };
}

const refusalOf = (code: number): CellRefusal =>
  (Object.keys(cellRefusals) as CellRefusal[]).find((name) => cellRefusals[name] === code) ?? "failed";

/** The verdict of the i-th limit in the number that holds all; null where it cannot be judged. */
export function keptAt(limits: number, i: number): boolean | null {
  const digit = Math.floor(limits / 4 ** i) % 4;
  return digit === 1 ? true : digit === 2 ? false : null;
}

/** The i-th quantity of the row at an offset; null where it has no value, and in a cell without an outcome. */
export function quantityAt(row: Float64Array, offset: number, i: number): number | null {
  const isAbsent = row[offset] < 0 || Math.floor(row[offset + 2] / 2 ** i) % 2 === 1;
  return isAbsent ? null : row[offset + rowHead + i];
}

/** The number that holds the verdicts of all limits. */
export function limitsCode(verdicts: readonly LimitVerdict[]): number {
  return verdicts.reduce((code, { kept }, i) => code + (kept === null ? 3 : kept ? 1 : 2) * 4 ** i, 0);
}
