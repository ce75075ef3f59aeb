import type { SimulateOptions } from "../options.ts";
import type { Ended, LimitVerdict, Outcome, Result, Samples } from "../result.ts";
import type { QuantityName } from "../scenario/quantity-names.ts";
import type { Records, Scenario } from "../scenario/scenario.ts";
import { simulate } from "../simulate.ts";

/** One run that an exploration asks for. */
export interface RunAsk {
  readonly scenario: Scenario;
  /** Those wanted besides the ones that limits name. */
  readonly quantities: readonly QuantityName[];
  /** Times in [0, seconds] at which the motion itself is wanted. */
  readonly at?: readonly number[];
}

/** Runs that do not wait for each other, and how far the whole is: a pool may share them out. */
export interface RunBatch {
  readonly runs: readonly RunAsk[];
  /** Runs answered so far, and how many there will be as far as can be told; the total may grow. */
  readonly done: number;
  readonly total: number;
}

/** What an exploration reads of a run. */
export interface RunFigures {
  /** Null of a run that was cut off: `ended` says why. */
  readonly outcome: Outcome | null;
  readonly ended: Ended;
  readonly limits: readonly LimitVerdict[];
  readonly quantities: Readonly<Record<string, number | null>>;
  /** When the stick in which the run ended will break, s; only with outcome `too-short`. */
  readonly nextBreakAway: number | null;
  readonly at?: Samples;
}

/** What a run came to, or why there is none. */
export type RunReply = RunFigures | { readonly reason: string };

/**
 * A computation that asks for runs and is given what each came to, in the order asked. Pure: the caller decides where and
 * when they take place, and ends the whole by asking no further.
 */
export type Exploring<T> = Generator<RunBatch, T, readonly RunReply[]>;

/** The options under which a run asked for is simulated. */
export function runOptions({ quantities, at }: RunAsk): SimulateOptions {
  return { quantities, samples: 0, events: false, energy: false, ...(at === undefined ? {} : { at }) };
}

/** What an exploration reads of a result. */
export function figuresOf({ outcome, ended, limits, quantities, notes, at }: Result): RunFigures {
  const next = notes.find(({ code }) => code === "next-break-away")?.t ?? null;
  return { outcome, ended, limits, quantities, nextBreakAway: next, ...(at === undefined ? {} : { at }) };
}

/** Runs what is asked here and now. A failure is told as the reason why there is no run. */
export function answerRun(ask: RunAsk, records?: Records): RunReply {
  try {
    const result = simulate(ask.scenario, { ...runOptions(ask), records });
    return "error" in result ? { reason: result.error.message } : figuresOf(result);
  } catch (error) {
    return { reason: `The run failed: ${(error as Error).message}.` };
  }
}

/** Goes through an exploration with runs here and now: the command line and the tests. */
export function answerAll<T>(exploring: Exploring<T>, records?: Records): T {
  let step = exploring.next();
  while (!step.done) step = exploring.next(step.value.runs.map((ask) => answerRun(ask, records)));
  return step.value;
}
