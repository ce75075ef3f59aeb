import type { Work } from "../numerics/first-zero.ts";
import type { Ended } from "../result.ts";
import type { Problem } from "../scenario/problem.ts";
import type { Motion, MotionMark } from "./motion.ts";
import { SegmentedMotion } from "./segmented-motion.ts";
import { nextBreakAway } from "./look-ahead.ts";
import type { SlipMaker } from "./form.ts";
import { newStance, Segments } from "./stance.ts";
import { Stepper } from "./stepper.ts";

const segmentsPerReport = 512;
/** Certificate steps spent at most on what comes after the run. */
const workAhead = 2e6;

/** Called with the fraction of the span done; returning false cancels, and the motion so far is returned. */
export type Progress = (fraction: number) => boolean;

/**
 * Runs a problem from event to event with the method's slip. Each segment starts from the state at the event before it.
 * The run ends by rest (with `untilRest`), by time, by its caps or by cancellation, and says which.
 */
export function runSegments(
  problem: Problem,
  method: Motion["method"],
  makeSlip: SlipMaker,
  progress?: Progress,
): Motion {
  return new Run(problem, method, makeSlip, progress).motion();
}

class Run {
  private readonly work: Work;
  private readonly stepper: Stepper;
  private readonly segments = new Segments();
  private readonly marks: MotionMark[] = [];
  private readonly stance = newStance();
  private steps = 0;

  constructor(
    private readonly problem: Problem,
    private readonly method: Motion["method"],
    private readonly makeSlip: SlipMaker,
    private readonly progress: Progress | undefined,
  ) {
    this.work = { spent: 0, allowed: problem.maxWork };
    this.stepper = new Stepper(problem, this.work, makeSlip);
  }

  motion(): Motion {
    const { problem, stance, segments, marks } = this;
    const happening = this.stepper.start(stance);
    segments.push(stance);
    marks.push({ t: 0, kind: "start", segment: 0 });
    if (happening !== null) marks.push({ t: 0, kind: happening, segment: 0 });
    let ended: Ended | null = this.restsForEver() ? "rest" : null;
    while (ended === null) ended = this.cutOff() ?? this.advance();
    const end = stance.t;
    const next = stance.contact === 0 ? nextBreakAway(problem, stance, workAhead, this.makeSlip) : NaN;
    marks.push({ t: end, kind: "end", segment: segments.count - 1 });
    return new SegmentedMotion(this.stepper.form, this.method, segments, marks, ended, end, next);
  }

  /** Why the run cannot go on from here; null where it can. */
  private cutOff(): Ended | null {
    const { problem, stance, progress } = this;
    if (this.marks.length - 1 >= problem.maxEvents) return "max-events";
    if (stance.t >= problem.seconds) return "time";
    const isDue = ++this.steps % segmentsPerReport === 0;
    return isDue && progress?.(stance.t / problem.seconds) === false ? "cancelled" : null;
  }

  /** One segment; why the run has ended with it, null where it goes on. */
  private advance(): Ended | null {
    const { problem, stance, segments } = this;
    const what = this.stepper.step(stance, problem.seconds);
    if (this.stepper.outOfWork) return "max-work";
    segments.push(stance);
    if (what !== null) this.marks.push({ t: stance.t, kind: what, segment: segments.count - 1 });
    return this.restsForEver() ? "rest" : null;
  }

  /** With `untilRest`: stuck, every input constant from now on, and nothing left that could break the stick. */
  private restsForEver(): boolean {
    const { problem, stance } = this;
    if (!problem.untilRest || stance.contact !== 0) return false;
    if (!problem.force.every((term) => term.isConstantFrom(stance.t))) return false;
    if (!problem.base.every((term) => term.isConstantFrom(stance.t))) return false;
    return nextBreakAway(problem, stance, workAhead, this.makeSlip) === Infinity;
  }
}
