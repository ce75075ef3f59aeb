import type { Motion } from "../motion/motion.ts";
import { emptyState, type State } from "../motion/state.ts";
import type { EventKind } from "../result.ts";
import type { Problem } from "../scenario/problem.ts";
import { Channels, type AnyChannel } from "./channels.ts";
import { isFed, lowestHz } from "./drive.ts";
import { Extent, Strip } from "./extent.ts";
import { restTimeOf } from "./rest.ts";
import { steadyWindow, type SteadyWindow } from "./steady-window.ts";

/** A run with what quantities, outcome, notes and ledger read of it, each part worked out once and only when asked for. */
export class Reading {
  readonly problem: Problem;
  readonly window: SteadyWindow;
  /** Times in s. */
  readonly breakAways: readonly number[];
  readonly stops: readonly number[];
  readonly turns: readonly number[];
  /** True where the base feeds: then displacements are told of d. */
  readonly isFed: boolean;
  /** Over the whole run, over its steady window (which ends with the run), and over the equal parts of that. */
  readonly whole: Extent;
  readonly steady: Extent;
  readonly parts: readonly Extent[];
  private readonly channels: Channels;
  private rest: number | null | undefined;

  /** @param whole, steady channels to survey in one pass when the first of them is read */
  constructor(
    readonly motion: Motion,
    whole: readonly AnyChannel[] = [],
    steady: readonly AnyChannel[] = [],
  ) {
    const { problem, end } = motion;
    this.problem = problem;
    this.window = steadyWindow(problem, end);
    this.breakAways = timesOf(motion, "break-away");
    this.stops = timesOf(motion, "stop");
    this.turns = timesOf(motion, "turn");
    this.isFed = isFed(problem);
    this.channels = new Channels(problem);
    const { from } = this.window;
    const parts = this.cut([...new Set<AnyChannel>([...whole, ...steady, "excursion"])]);
    const before = from > 0 ? [new Strip(motion, this.channels, 0, from, whole)] : [];
    this.whole = new Extent([...before, ...parts]);
    this.steady = new Extent(parts);
    this.parts = parts.map((part) => new Extent([part]));
  }

  /** Any other stretch of the run. */
  over(from: number, to: number, ...names: AnyChannel[]): Extent {
    return new Extent([new Strip(this.motion, this.channels, from, to, names)]);
  }

  /** The steady window in its parts, each to be gone over once for all that is asked of it. */
  private cut(names: readonly AnyChannel[]): readonly Strip[] {
    const { from, to, parts } = this.window;
    const at = (i: number): number => (i === parts ? to : from + ((to - from) * i) / parts);
    return Array.from({ length: parts }, (_, i) => new Strip(this.motion, this.channels, at(i), at(i + 1), names));
  }

  /** All there is to know at t, right-hand values at an event. */
  at(t: number): State {
    const state = emptyState();
    this.motion.read(this.motion.find(t), t, state);
    return state;
  }

  /** The break-aways within the steady window. */
  get steadyBreakAways(): readonly number[] {
    return this.within(this.breakAways);
  }

  /** The stops within the steady window. */
  get steadyStops(): readonly number[] {
    return this.within(this.stops);
  }

  /** Periods of the lowest input frequency that fit in the steady window; null without a harmonic input. */
  get cycles(): number | null {
    const hz = lowestHz(this.problem);
    const { from, to, kind, parts } = this.window;
    if (hz === null || to === from) return null;
    return kind === "periodic" && parts === 10 ? 10 : (to - from) * hz;
  }

  /** When the body stands still for good, s; null where it does not. */
  get restTime(): number | null {
    if (this.rest === undefined) this.rest = restTimeOf(this.motion);
    return this.rest;
  }

  private within(times: readonly number[]): readonly number[] {
    // half open, by more than rounding: what recurs each period is counted once a period
    const { from, to, kind } = this.window;
    const blur = 1e-12 * to;
    const isBefore = (t: number): boolean => kind !== "periodic" || from === 0 || t < to - blur;
    return times.filter((t) => t >= from - blur && isBefore(t));
  }
}

function timesOf({ events }: Motion, kind: EventKind): readonly number[] {
  return events.filter((mark) => mark.kind === kind).map(({ t }) => t);
}
