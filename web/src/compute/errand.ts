import type { RunAsk, RunReply, Scenario, SweepPlan, TolerancePlan, ToleranceSummary } from "@restband/solver";

/** One tile of a sweep, or some draws of a study: what comes back as rows. */
export type TileErrand =
  | { readonly kind: "tile"; readonly scenario: Scenario; readonly plan: SweepPlan; readonly tile: number }
  | {
      readonly kind: "draws";
      readonly scenario: Scenario;
      readonly plan: TolerancePlan;
      readonly from: number;
      /** One past the last. */
      readonly to: number;
    };

/** What a worker can be sent for: runs of an exploration, rows, or what the rows of a study say. */
export type Errand =
  | { readonly kind: "runs"; readonly runs: readonly RunAsk[] }
  | TileErrand
  | {
      readonly kind: "summary";
      readonly scenario: Scenario;
      readonly plan: TolerancePlan;
      readonly rows: Float64Array;
    };

/** What it brings: a reply for each run; rows; a summary. */
export interface ErrandAnswers {
  readonly runs: readonly RunReply[];
  readonly tile: Float64Array;
  readonly draws: Float64Array;
  readonly summary: ToleranceSummary;
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
