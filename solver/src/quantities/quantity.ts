import type { Dimension } from "../field.ts";
import type { QuantityName } from "../scenario/quantity-names.ts";
import type { AnyChannel } from "./channels.ts";
import type { Reading } from "./reading.ts";

/**
 * One number a run is told by, described once: tables, limits, sweeps and exports read this. A new quantity is one file
 * with one of these, its name in `scenario/quantity-names.ts` and one line in `index.ts`.
 */
export interface Quantity {
  /** As limits and results name it: never renamed, never reused. */
  readonly name: QuantityName;
  /** As the trade writes it. */
  readonly symbol?: string;
  readonly label: string;
  readonly dimension: Dimension;
  /** True where the value may be negative: a limit with one bound then leaves the other side open. */
  readonly signed: boolean;
  /** One sentence without its full stop: what the number is, and over what. */
  readonly meaning: string;
  /** Where the value may be null: why a run has none, as the end of "… has no value here: ". */
  readonly absent?: string;
  /** Channels read over the whole run, and over the steady window: those of all quantities asked for are surveyed in one pass. */
  readonly whole?: readonly AnyChannel[];
  readonly steady?: readonly AnyChannel[];
  /** The value in SI; null exactly where it has no meaning. */
  value(reading: Reading): number | null;
}
