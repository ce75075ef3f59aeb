import type {
  ReadAnswers,
  RunAsk,
  RunReply,
  Scenario,
  SweepPlan,
  TolerancePlan,
  ToleranceSummary,
} from "@restband/solver";

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

/** What a worker can be sent for: runs of an exploration, rows, what the rows of a study say, or what others have solved. */
export type Errand =
  | { readonly kind: "runs"; readonly runs: readonly RunAsk[] }
  | TileErrand
  | {
      readonly kind: "summary";
      readonly scenario: Scenario;
      readonly plan: TolerancePlan;
      readonly rows: Float64Array;
    }
  | {
      readonly kind: "answers";
      readonly scenario: Scenario;
      readonly plan: SweepPlan;
      /** The lines as they were brought in. */
      readonly text: string;
      /** Chooses the cells that are run again. */
      readonly seed: number;
    };

/** What it brings: a reply for each run; rows; a summary. */
export interface ErrandAnswers {
  readonly runs: readonly RunReply[];
  readonly tile: Float64Array;
  readonly draws: Float64Array;
  readonly summary: ToleranceSummary;
  readonly answers: ReadAnswers;
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
