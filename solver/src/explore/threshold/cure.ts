import type { Dimension } from "../../field.ts";
import type { Scenario } from "../../scenario/scenario.ts";
import type { Flip } from "./threshold.ts";

/** A change of one field alone with which a broken limit is kept. */
export interface Cure {
  readonly path: string;
  readonly label: string;
  readonly dimension: Dimension;
  /** SI. */
  readonly entered: number;
  /** The nearest value found with which the limit is kept, verified by a run. */
  readonly value: number;
  /** |ln(value/entered)|; of a damping that was 0, its share of critical damping: what cures are ranked by. */
  readonly size: number;
  readonly flip: Flip;
  /** True where all other limits are kept as well at this value. */
  readonly keepsOthers: boolean;
  /** The scenario with this value, ready to be opened. */
  readonly scenario: Scenario;
}

export interface Cures {
  /** Place of the limit in the scenario. */
  readonly limit: number;
  /** False where the limit is kept as entered: there is nothing to cure. */
  readonly isBroken: boolean;
  /** The smallest change first. */
  readonly cures: readonly Cure[];
  /** Fields with which alone it cannot be cured within the values searched. */
  readonly withoutCure: readonly {
    readonly path: string;
    readonly label: string;
    readonly low: number;
    readonly high: number;
  }[];
}
