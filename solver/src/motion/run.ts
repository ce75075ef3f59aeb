import type { Work } from "../numerics/first-zero.ts";
import type { Ended } from "../result.ts";
import type { Problem } from "../scenario/problem.ts";
import type { Motion } from "./motion.ts";
import { SegmentedMotion } from "./segmented-motion.ts";
import { nextBreakAway } from "./look-ahead.ts";
import type { SlipMaker } from "./form.ts";
import { newStance, Segments, type Happening, type Stance } from "./stance.ts";
import { Stepper } from "./stepper.ts";

const segmentsPerReport = 512;
/** Certificate steps spent at most on what comes after the run. */
const workAhead = 2e6;

/** Called with the fraction of the span done; returning false cancels, and the motion so far is returned. */
export type Progress = (fraction: number) => boolean;

/** A quicker way for some problems: what it is not sure of it leaves undefined, and NaN, for the rules in full. */
export interface ShortCut {
  start(s: Stance): Happening | undefined;
  step(s: Stance): Happening | undefined;
  nextBreakAway(s: Stance): number;
}

/**
 * Runs a problem from event to event with the method's slip. Each segment starts from the state at the event before it.
 * The run ends by rest (with `untilRest`), by time, by its caps or by cancellation, and says which.
 */
export function runSegments(
  problem: Problem,
  method: Motion["method"],
  makeSlip: SlipMaker,
  progress?: Progress,
  shortCut: ShortCut | null = null,
): Motion {
  return new Run(problem, method, makeSlip, progress, shortCut).motion();
}

class Run {
  private readonly work: Work;
  private made: Stepper | null = null;
  private readonly segments = new Segments();
  private readonly stance = newStance();
  private steps = 0;

  constructor(
    private readonly problem: Problem,
    private readonly method: Motion["method"],
    private readonly makeSlip: SlipMaker,
    private readonly progress: Progress | undefined,
    private readonly shortCut: ShortCut | null,
  ) {
    this.work = { spent: 0, allowed: problem.maxWork };
  }

  /** The rules in full; with a short cut they may never be needed. */
  private get stepper(): Stepper {
    return (this.made ??= new Stepper(this.problem, this.work, this.makeSlip));
  }

  motion(): Motion {
    const { problem, stance, segments } = this;
    const start = this.shortCut?.start(stance);
    const happening = start === undefined ? this.stepper.start(stance) : start;
    segments.push(stance, happening);
    let ended: Ended | null = this.restsForEver() ? "rest" : null;
    while (ended === null) ended = this.cutOff() ?? this.advance();
    const end = stance.t;
    const next = stance.contact === 0 ? this.nextBreakAway() : NaN;
    return new SegmentedMotion(problem, () => this.stepper.form, this.method, segments, ended, end, next);
  }

  /** Why the run cannot go on from here; null where it can. */
  private cutOff(): Ended | null {
    const { problem, stance, progress } = this;
    if (this.segments.happened >= problem.maxEvents) return "max-events";
    if (stance.t >= problem.seconds) return "time";
    const isDue = ++this.steps % segmentsPerReport === 0;
    return isDue && progress?.(stance.t / problem.seconds) === false ? "cancelled" : null;
  }

  /** One segment; why the run has ended with it, null where it goes on. */
  private advance(): Ended | null {
    const { stance, segments } = this;
    this.work.spent++;
    const shortly = this.shortCut?.step(stance);
    const what = shortly === undefined ? this.stepInFull() : shortly;
    if (this.work.spent > this.work.allowed) return "max-work";
    segments.push(stance, what);
    return this.restsForEver() ? "rest" : null;
  }

  private stepInFull(): Happening {
    const { stepper, stance } = this;
    if (this.shortCut !== null) stepper.form.inputs.locate(stance.t);
    return stepper.step(stance, this.problem.seconds);
  }

  private nextBreakAway(): number {
    const { problem, stance } = this;
    const shortly = this.shortCut?.nextBreakAway(stance) ?? NaN;
    return Number.isNaN(shortly) ? nextBreakAway(problem, stance, workAhead, this.makeSlip) : shortly;
  }

  /** With `untilRest`: stuck, every input constant from now on, and nothing left that could break the stick. */
  private restsForEver(): boolean {
    const { problem, stance } = this;
    if (!problem.untilRest || stance.contact !== 0) return false;
    if (!problem.force.every((term) => term.isConstantFrom(stance.t))) return false;
    if (!problem.base.every((term) => term.isConstantFrom(stance.t))) return false;
    return this.nextBreakAway() === Infinity;
  }
}
