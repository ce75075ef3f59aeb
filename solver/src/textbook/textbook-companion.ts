import type { Dimension } from "../field.ts";
import type { TextbookCase } from "./textbook-case.ts";

/** A ground on which a formula does not hold for a case, as a sentence; null where the case raises none. */
export type Condition = (kase: TextbookCase) => string | null;

/**
 * A closed form of the trade that stands beside the run's own number. It describes itself once; checks and reports read
 * it. A new one is one file with one of these and one line in `index.ts`.
 */
export interface TextbookCompanion {
  /** Never renamed, never reused. */
  readonly key: string;
  readonly label: string;
  /** As a book writes it; `_` sets the letters and figures after it, or what stands in braces, lower, `^` higher. */
  readonly formula: string;
  /** Who published it; "from memory" where nobody of us has held it. */
  readonly source: string;
  readonly dimension: Dimension;
  /** What must hold; the first that does not tells why the formula has no place here. */
  readonly conditions: readonly Condition[];
  /** The formula's value, SI; asked for only where every condition holds. */
  value(kase: TextbookCase): number;
  /** The same number read from the run's result, SI; null where the run does not tell it. */
  ofRun(kase: TextbookCase): number | null;
  /** What a reader must know to compare the two, as sentences; null where nothing is to be said. */
  note?(kase: TextbookCase): string | null;
}

/** Why a companion does not apply to a case; null where it does. */
export function reasonAgainst({ conditions }: TextbookCompanion, kase: TextbookCase): string | null {
  for (const condition of conditions) {
    const reason = condition(kase);
    if (reason !== null) return reason;
  }
  return null;
}
