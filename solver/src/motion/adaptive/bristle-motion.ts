import { widestPanel } from "../../numerics/panel-rule.ts";
import type { Ended, Phase } from "../../result.ts";
import type { Problem } from "../../scenario/problem.ts";
import { Inputs } from "../inputs.ts";
import type { Motion, MotionMark } from "../motion.ts";
import type { State } from "../state.ts";
import { BristleBody } from "./bristle-body.ts";
import type { StepStore } from "./step-store.ts";

/** A stretch of one phase between corners; its steps in the store, and the corner its inputs are told from. */
export interface BristleSegment {
  readonly from: number;
  readonly phase: Phase;
  readonly origin: number;
  readonly firstStep: number;
  lastStep: number;
}

/** A run on bristles, asked again at any instant from the steps kept. */
export class BristleMotion implements Motion {
  readonly method = "adaptive";
  /** A body on bristles never rests for good, and is not looked at beyond its run. */
  readonly nextBreakAway = NaN;
  private readonly inputs: Inputs;
  private readonly body: BristleBody;
  private readonly at = new Float64Array(3);
  private readonly rates = [0, 0, 0];

  constructor(
    readonly problem: Problem,
    private readonly store: StepStore,
    private readonly segments: readonly BristleSegment[],
    readonly events: readonly MotionMark[],
    readonly ended: Ended,
    readonly end: number,
  ) {
    this.inputs = new Inputs(problem);
    this.body = new BristleBody(problem, this.inputs);
    this.inputs.locate(0);
  }

  get count(): number {
    return this.segments.length;
  }

  release(): void {
    // its steps are kept in arrays of their own, for no other run to take
  }

  from(i: number): number {
    return this.segments[i].from;
  }

  to(i: number): number {
    return i + 1 < this.segments.length ? this.segments[i + 1].from : this.end;
  }

  phase(i: number): Phase {
    return this.segments[i].phase;
  }

  find(t: number): number {
    let low = 0;
    let high = this.segments.length - 1;
    while (low < high) {
      const middle = (low + high + 1) >> 1;
      if (this.segments[middle].from <= t) low = middle;
      else high = middle - 1;
    }
    return low;
  }

  read(i: number, t: number, state: State): void {
    const { problem, inputs, store, body, at } = this;
    const { origin, phase, firstStep, lastStep } = this.segments[i];
    if (inputs.origin !== origin) inputs.locate(origin);
    // a segment that lasts no time has no step of its own
    store.evaluate(store.find(t, Math.min(firstStep, lastStep), lastStep), t, at);
    const tau = t - origin;
    body.rates(tau, at, this.rates);
    const v = inputs.evaluate(tau);
    state.t = t;
    state.phase = phase;
    [state.d, state.stretchRate] = at;
    state.force = v.force - problem.weight;
    state.base = problem.isRelative ? 0 : v.base;
    state.baseVelocity = v.baseVelocity;
    state.baseAcceleration = v.baseAcceleration;
    state.counterfaceVelocity = problem.counterface === "base" ? v.baseVelocity : problem.beltVelocity;
    state.normal = v.normal;
    state.x = state.d + state.base;
    state.v = state.stretchRate + state.baseVelocity;
    state.slip = state.v - state.counterfaceVelocity;
    state.a = this.rates[1] + (problem.isRelative ? 0 : state.baseAcceleration);
    state.f = body.friction(state.slip, at[2], v.normal);
    state.solid = problem.solid.viscous * state.stretchRate;
  }

  panel(i: number, t: number): number {
    const { firstStep, lastStep } = this.segments[i];
    const step = this.store.find(t, firstStep, lastStep);
    return step === lastStep ? Infinity : (this.store.to(step) - t) / widestPanel;
  }

  period(): number {
    return 0;
  }
}
