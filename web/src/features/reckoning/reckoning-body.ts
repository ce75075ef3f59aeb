import type { Scenario } from "@restband/solver";
import type { Reckoning } from "./reckonings.ts";
import type { Taken } from "./taken.ts";

/** What the inside of the dialog gets, whatever the reckoning. */
export interface ReckoningBodyProps {
  readonly reckoning: Reckoning;
  /** The field the value is for. */
  readonly path: string;
  readonly scenario: Scenario;
  /** Names the open scenario: long work that was left comes back for it alone. */
  readonly keptUnder: string;
  readonly onTake: (taken: readonly Taken[]) => void;
  readonly onClose: () => void;
}
