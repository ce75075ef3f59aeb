import type { Scenario } from "@restband/solver";
import type { Measure } from "../../../format/unit.ts";

/** A number of the base scenario that a column may give another value. */
export interface CaseField {
  readonly path: string;
  readonly label: string;
  readonly symbol?: string;
  readonly measure: Measure;
  /** In the base scenario, SI. */
  readonly value: number;
}

/** A copy of a scenario with the number at a path replaced. */
export type WriteNumber = (scenario: Scenario, path: string, value: number) => Scenario;
