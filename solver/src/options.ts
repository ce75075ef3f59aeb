import type { Fault, Records } from "./scenario/scenario.ts";

/** What a caller asks of `simulate`. Only what is asked is computed. */
export interface SimulateOptions {
  /** Points of the uniform grid of `samples`; 0 leaves samples out. Default 2001. */
  samples?: number;
  /** Times in [0, seconds], any order: the result then has `at`. */
  at?: readonly number[];
  /** Names of the quantities wanted; default all. Those the limits name are always computed. */
  quantities?: readonly string[];
  /** False leaves the event list out of the result. Default true. */
  events?: boolean;
  /** False leaves the energy ledger out. Default true. */
  energy?: boolean;
  method?: "auto" | "exact" | "adaptive";
  /** Relative tolerance of the adaptive method, between 1e-12 and 1e-3; the exact method has none. */
  tolerance?: number;
  /** Points of stored records. */
  records?: Records;
  /** Called with the fraction of the span done, 0…1; returning false cancels the run. */
  progress?: (fraction: number) => boolean;
}

/** A scenario that is refused, or valid but not computed by this version. `path` and `message` are those of the first fault. */
export interface Refusal {
  error: { path: string; message: string; faults: Fault[] };
}
