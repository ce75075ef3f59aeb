import type { Refusal, Result, Scenario, SimulateOptions } from "@restband/solver";

/** Instants evenly over a part of a run, from its beginning on and none at its end; s. */
export interface EvenTimes {
  readonly from: number;
  readonly to: number;
  readonly count: number;
}

/** What may be asked of a worker: the options that can be told as a message. */
export interface RunOptions extends Pick<
  SimulateOptions,
  "samples" | "quantities" | "events" | "energy" | "method" | "tolerance"
> {
  /** The result then has `at`, at these instants. */
  readonly evenly?: EvenTimes;
}

export interface SolverJob {
  readonly scenario: Scenario;
  readonly options: RunOptions;
}

/** What a job came to. `dropped`: a newer job of the same client took its place. */
export type SolverReply =
  | { kind: "result"; result: Result }
  | { kind: "refusal"; refusal: Refusal["error"] }
  | { kind: "dropped" }
  | { kind: "cancelled" }
  | { kind: "failed"; message: string };

/** One worker as the pool sees it. */
export interface SolverWorker {
  run(job: SolverJob, onProgress: (fraction: number) => void): Promise<Result | Refusal>;
  terminate(): void;
  /** Told once when the worker died of itself. */
  onCrash(tell: () => void): void;
}
