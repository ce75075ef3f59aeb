import type { Problem } from "../scenario/problem.ts";
import type { Ended, EventKind, Phase } from "../result.ts";
import type { State } from "./state.ts";

/**
 * A run as it went, whatever the method: a chain of segments, each smooth and with one phase, told by closed form or
 * dense output, so that any instant can be asked at full accuracy. Quantities, samples, events and the ledger read this.
 */
export interface Motion {
  readonly problem: Problem;
  readonly method: "exact" | "adaptive";
  readonly ended: Ended;
  /** Where the run ended, s. */
  readonly end: number;
  /** Number of segments, at least 1. Segment i lasts from `from(i)` to `to(i)`; a stick may last no time. */
  readonly count: number;
  from(i: number): number;
  to(i: number): number;
  phase(i: number): Phase;
  /** The last segment with from ≤ t: right-hand values at an event. */
  find(t: number): number;
  /** Fills `state` with the values in segment i at t, one-sided at its ends. */
  read(i: number, t: number, state: State): void;
  /** A stretch from t on over which the segment turns by no more than about one radian of its fastest living rate, s. */
  panel(i: number, t: number): number;
  /** The period with which all of segment i repeats itself exactly from t on, s; 0 where it does not. */
  period(i: number, t: number): number;
  /** Events in order, `start` first, `end` last. */
  readonly events: readonly MotionMark[];
  /**
   * For a run that ends in a stick: when it breaks if the inputs go on for ever (Infinity: never). NaN where the run does
   * not end in a stick or the question could not be settled within the work allowed.
   */
  readonly nextBreakAway: number;
  /** Gives what the run is kept in to the next one: who has read all they want of it may say so. Nothing can be asked after that. */
  release(): void;
}

/** An event and the segment whose right-hand values are its own. */
export interface MotionMark {
  readonly t: number;
  readonly kind: EventKind;
  readonly segment: number;
}
