import type { Dimension } from "../../field.ts";
import type { Flip } from "./threshold.ts";

/** How far one value may go one way, the others as entered. */
export interface HoldingEnd {
  /** The last value known to hold; the end of what was searched where nothing changes. */
  readonly value: number;
  /** Where something changes: `below` and `above` lie on either side of it. Null where nothing does within what was searched. */
  readonly flip: Flip | null;
  /**
   * What changes first: the outcome, or the limit at that place of the scenario. Null where nothing does, and with a flip
   * where the values beyond it cannot stand together or be judged: the reply of its far end then says why.
   */
  readonly change: { readonly kind: "outcome" } | { readonly kind: "limit"; readonly limit: number } | null;
}

/** The range of one field over which the outcome and the verdicts of all limits stay as they are as entered. */
export interface HoldingRange {
  readonly path: string;
  readonly label: string;
  readonly dimension: Dimension;
  readonly entered: number;
  readonly low: HoldingEnd;
  readonly high: HoldingEnd;
}
