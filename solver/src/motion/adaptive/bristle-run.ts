import type { Work } from "../../numerics/first-zero.ts";
import type { Ended, Phase } from "../../result.ts";
import type { Problem } from "../../scenario/problem.ts";
import { Inputs } from "../inputs.ts";
import type { Motion, MotionMark } from "../motion.ts";
import type { Progress } from "../run.ts";
import { BristleBody } from "./bristle-body.ts";
import { BristleMotion, type BristleSegment } from "./bristle-motion.ts";
import { crossings } from "./crossings.ts";
import { integrate, usualTolerance } from "./integrate.ts";
import { StepStore } from "./step-store.ts";

/** Finer than for slips: errors of z feed on through its stiff spring, with no event to end them. */
const bristleTolerance = usualTolerance / 10;
/** A body whose faces pass slower than this share of vs is told as stuck. */
const creepShare = 1e-3;

/**
 * A run with bristle friction (LuGre): one smooth motion from corner to corner of the inputs, with the bending z as a third
 * unknown. It never sticks; `stop` and `break-away` are the instants at which |v_r| falls below or rises above 1e-3 vs
 * (of the faces), and there is no `turn` and no rest. Stiff bristles ask for many steps: the run then ends by `max-work`.
 *
 * Source: Canudas de Wit, Olsson, Åström & Lischinsky, IEEE Trans. Automatic Control 40 (1995) 419.
 */
export function runBristle(problem: Problem, progress?: Progress, tolerance = bristleTolerance): Motion {
  return new BristleRun(problem, progress, tolerance).motion();
}

class BristleRun {
  private readonly inputs: Inputs;
  private readonly body: BristleBody;
  private readonly store = new StepStore(3);
  private readonly segments: BristleSegment[] = [];
  private readonly marks: MotionMark[] = [];
  private readonly work: Work;
  private readonly threshold: number;
  private readonly at = new Float64Array(3);
  private ended: Ended | null = null;
  private t = 0;

  constructor(
    private readonly problem: Problem,
    private readonly progress: Progress | undefined,
    private readonly tolerance: number,
  ) {
    this.inputs = new Inputs(problem);
    this.body = new BristleBody(problem, this.inputs);
    this.work = { spent: 0, allowed: problem.maxWork };
    this.threshold = (creepShare * (problem.law.bristle?.velocity ?? 0)) / problem.radius;
  }

  motion(): Motion {
    const { problem, store, marks, segments } = this;
    let y = this.start();
    while (this.ended === null) {
      y = this.follow(y);
      if (this.ended === null && this.t >= problem.seconds) this.ended = "time";
      if (this.ended !== null) break;
      y = this.passCorner(y);
    }
    if (store.count === 0) store.push(0, problem.seconds, (i) => y[i]); // no step could be taken: all that is known is the start
    segments[segments.length - 1].lastStep = store.count - 1;
    marks.push({ t: this.t, kind: "end", segment: segments.length - 1 });
    return new BristleMotion(problem, store, segments, marks, this.ended, this.t);
  }

  private start(): number[] {
    const { problem, inputs, marks } = this;
    inputs.locate(0);
    const v = inputs.evaluate(0);
    const y = problem.isRelative
      ? [problem.initial.displacement, problem.initial.velocity, 0]
      : [problem.initial.displacement - v.base, problem.initial.velocity - v.baseVelocity, 0];
    this.open(this.phaseOf(this.body.slipOf(0, y)));
    marks.push({ t: 0, kind: "start", segment: 0 });
    return y;
  }

  /** To the next corner or the end of the run; what the unknowns are there. */
  private follow(start: number[]): number[] {
    const { problem, inputs, body, store } = this;
    const from = this.t;
    const to = Math.min(inputs.end, problem.seconds);
    const rate = body.rate(start);
    const reached = integrate({
      from,
      to,
      start,
      rates: (t, y, out) => body.rates(t - from, y, out),
      sizes: body.sizes(start, rate),
      unit: 1 / rate,
      longest: 1 / body.slowRate(),
      tolerance: this.tolerance,
      work: this.work,
      onStep: (a, b, dense) => {
        store.push(a, b, dense);
        this.t = b;
        this.mark(a, b);
        if (this.progress?.(b / problem.seconds) === false) this.ended = "cancelled";
        return this.ended === null;
      },
    });
    if (this.ended === null && reached < to) this.ended = "max-work";
    if (store.count > 0) store.evaluate(store.count - 1, this.t, this.at);
    return this.ended === "max-events" || store.count === 0 ? start : [...this.at];
  }

  /** Events within the step just stored. */
  private mark(a: number, b: number): void {
    const { store, body, inputs } = this;
    const step = store.count - 1;
    const slipAt = (t: number): number => {
      store.evaluate(step, t, this.at);
      return body.slipOf(t - inputs.origin, this.at);
    };
    const found = crossings(slipAt, this.threshold, a, b);
    for (let k = 0; k < found.length; k++) {
      const t = found[k];
      const next = found[k + 1] ?? b;
      const isTold = next - t > 8 * Number.EPSILON * t;
      if (!isTold && k + 1 < found.length) continue; // the same crossing again
      const after = slipAt((t + next) / 2);
      const wasStuck = this.segments[this.segments.length - 1].phase === 0;
      const isStuck = isTold ? this.phaseOf(after) === 0 : !wasStuck;
      if (isStuck === wasStuck) continue;
      this.t = t;
      this.happen(isStuck ? 0 : (Math.sign(after) as Phase));
      if (this.ended !== null) return;
    }
    this.t = b;
  }

  /** A stop (phase 0) or a break-away, now. */
  private happen(phase: Phase): void {
    this.open(phase);
    this.marks.push({ t: this.t, kind: phase === 0 ? "stop" : "break-away", segment: this.segments.length - 1 });
    if (this.marks.length - 1 >= this.problem.maxEvents) this.ended = "max-events";
  }

  /** A corner keeps ẋ, so ḋ jumps with ẏ; where the contact is lost the bristles spring back. */
  private passCorner(y: number[]): number[] {
    const { inputs, segments, problem } = this;
    const before = inputs.evaluate(this.t - inputs.origin).baseVelocity;
    inputs.locate(this.t);
    const v = inputs.evaluate(0);
    const { phase } = segments[segments.length - 1];
    const jump = problem.isRelative ? 0 : before - v.baseVelocity;
    const isJump = Math.abs(jump) > 1e-12 * Math.max(Math.abs(before), Math.abs(v.baseVelocity));
    // a counterface that jumps takes v_r with it
    const after = isJump && problem.counterface === "base" ? this.phaseOf(y[1] + jump) : phase;
    if ((after === 0) === (phase === 0)) this.open(after);
    else this.happen(after);
    return [y[0], y[1] + jump, v.normal > 0 ? y[2] : 0];
  }

  private phaseOf(slip: number): Phase {
    return Math.abs(slip) < this.threshold ? 0 : slip > 0 ? 1 : -1;
  }

  /** A new segment from now on: after an event within the step in hand, after a corner with the step to come. */
  private open(phase: Phase): void {
    const { segments, store, inputs } = this;
    const last = segments[segments.length - 1];
    const isSamePiece = last?.origin === inputs.origin;
    const firstStep = isSamePiece ? store.count - 1 : store.count;
    if (last !== undefined) last.lastStep = store.count - 1;
    segments.push({ from: this.t, phase, origin: inputs.origin, firstStep, lastStep: firstStep });
  }
}
