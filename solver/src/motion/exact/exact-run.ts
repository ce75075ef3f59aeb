import type { Work } from "../../numerics/first-zero.ts";
import type { Ended } from "../../result.ts";
import type { Problem } from "../../scenario/problem.ts";
import type { Motion, MotionMark } from "../motion.ts";
import { ExactMotion } from "./exact-motion.ts";
import { nextBreakAway } from "./look-ahead.ts";
import { newStance, Segments, type Stance } from "./stance.ts";
import { Stepper } from "./stepper.ts";

const segmentsPerReport = 512;
/** Certificate steps spent at most on what comes after the run. */
const workAhead = 2e6;

/**
 * Runs a problem by closed form from event to event: no step size, no tolerance, and no drift, since each segment starts
 * from the state at the event before it. Valid for laws whose friction is constant while sliding, k3 = 0, and inputs that
 * are polynomials and harmonics between corners (`unsupported` of `scenario/` tells which are not).
 *
 * @param progress called with the fraction of the span done; returning false cancels, and the motion so far is returned
 */
export function runExact(problem: Problem, progress?: (fraction: number) => boolean): Motion {
  const work: Work = { spent: 0, allowed: problem.maxWork };
  const stepper = new Stepper(problem, work);
  const segments = new Segments();
  const marks: MotionMark[] = [];
  const stance = newStance();
  let count = 0;
  let ended: Ended | null = null;
  const happening = stepper.start(stance);
  segments.push(stance);
  marks.push({ t: 0, kind: "start", segment: 0 });
  if (happening !== null) count = marks.push({ t: 0, kind: happening, segment: 0 }) - 1;
  if (restsForEver(problem, stance)) ended = "rest";
  let steps = 0;
  while (ended === null) {
    if (count >= problem.maxEvents) ended = "max-events";
    else if (stance.t >= problem.seconds) ended = "time";
    else if (++steps % segmentsPerReport === 0 && progress?.(stance.t / problem.seconds) === false) ended = "cancelled";
    if (ended !== null) break;
    const what = stepper.step(stance, problem.seconds);
    if (stepper.outOfWork) {
      ended = "max-work";
      break;
    }
    segments.push(stance);
    if (what !== null) {
      marks.push({ t: stance.t, kind: what, segment: segments.count - 1 });
      count++;
    }
    if (stance.contact === 0 && restsForEver(problem, stance)) ended = "rest";
  }
  const end = stance.t;
  const next = stance.contact === 0 ? nextBreakAway(problem, stance, workAhead) : NaN;
  marks.push({ t: end, kind: "end", segment: segments.count - 1 });
  return new ExactMotion(problem, segments, marks, ended, end, next);
}

/** With `untilRest`: stuck, every input constant from now on, and nothing left that could break the stick. */
function restsForEver(problem: Problem, s: Stance): boolean {
  if (!problem.untilRest || s.contact !== 0) return false;
  if (!problem.force.every((term) => term.isConstantFrom(s.t))) return false;
  if (!problem.base.every((term) => term.isConstantFrom(s.t))) return false;
  return nextBreakAway(problem, s, workAhead) === Infinity;
}
