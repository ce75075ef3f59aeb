import type { SwitchedOff } from "@restband/api/contract";
import type { Scenario } from "@restband/solver";

/** A scenario, and its terms that are switched off. */
export interface Work {
  readonly content: Scenario;
  readonly switchedOff: readonly SwitchedOff[];
}
