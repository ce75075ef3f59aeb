import type { RunAsk, RunReply, Scenario, SweepPlan } from "@restband/solver";

/** What a worker can be sent for: runs of an exploration, or one tile of a sweep. */
export type Errand =
  | { readonly kind: "runs"; readonly runs: readonly RunAsk[] }
  | { readonly kind: "tile"; readonly scenario: Scenario; readonly plan: SweepPlan; readonly tile: number };

/** What it brings: a reply for each run; the rows of the tile. */
export interface ErrandAnswers {
  readonly runs: readonly RunReply[];
  readonly tile: Float64Array;
}

export type AnswerTo<E extends Errand> = ErrandAnswers[E["kind"]];

/** Told now and then while a tile is run: how many of its cells are done. */
export type TellDone = (done: number) => void;

/** One worker as the pool sees it. */
export interface ErrandWorker {
  do(errand: Errand, tell: TellDone): Promise<ErrandAnswers[Errand["kind"]]>;
  terminate(): void;
  /** Told once when the worker died of itself. */
  onCrash(tell: () => void): void;
}

/** The errand was called off. */
export class CalledOff extends Error {
  constructor() {
    super("The computation was stopped.");
    this.name = "CalledOff";
  }
}

/** The worker died of the errand, each time it was sent. */
export class BrokenOff extends Error {
  constructor() {
    super("The computation broke off twice.");
    this.name = "BrokenOff";
  }
}
