import type { Ended, Phase } from "../result.ts";
import type { Problem } from "../scenario/problem.ts";
import type { Motion, MotionMark } from "./motion.ts";
import type { State } from "./state.ts";
import { type Form } from "./form.ts";
import { commonPeriod, ratesOf } from "./common-period.ts";
import { slidingFriction } from "./sliding-friction.ts";
import { newStance, type Segments } from "./stance.ts";

/** A run as a chain of segments, asked again at any instant: each is set up anew from its start. */
export class SegmentedMotion implements Motion {
  private readonly stance = newStance();
  private made: Form | null = null;
  private marks: readonly MotionMark[] | null = null;
  private loaded = -1;

  constructor(
    readonly problem: Problem,
    private readonly makeForm: () => Form,
    readonly method: Motion["method"],
    private readonly segments: Segments,
    readonly ended: Ended,
    readonly end: number,
    readonly nextBreakAway: number,
  ) {}

  get events(): readonly MotionMark[] {
    return (this.marks ??= this.makeMarks());
  }

  private makeMarks(): readonly MotionMark[] {
    const { segments } = this;
    const marks: MotionMark[] = [{ t: 0, kind: "start", segment: 0 }];
    for (let i = 0; i < segments.count; i++) {
      const kind = segments.happening(i);
      if (kind !== null) marks.push({ t: segments.from(i), kind, segment: i });
    }
    marks.push({ t: this.end, kind: "end", segment: segments.count - 1 });
    return marks;
  }

  release(): void {
    this.segments.release();
  }

  private get form(): Form {
    return (this.made ??= this.makeForm());
  }

  get count(): number {
    return this.segments.count;
  }

  from(i: number): number {
    return this.segments.from(i);
  }

  to(i: number): number {
    return i + 1 < this.segments.count ? this.segments.from(i + 1) : this.end;
  }

  phase(i: number): Phase {
    return this.segments.phase(i);
  }

  find(t: number): number {
    return this.segments.find(t);
  }

  read(i: number, t: number, state: State): void {
    this.load(i);
    const { form, problem, stance } = this;
    const tau = t - stance.t;
    const isSlip = form.kind === "slip";
    if (isSlip) form.slip.read(tau);
    else form.carried.evaluate(tau);
    const v = form.inputs.evaluate(tau);
    state.t = t;
    state.phase = stance.contact;
    state.force = v.force - problem.weight;
    state.base = problem.isRelative ? 0 : v.base;
    state.baseVelocity = v.baseVelocity;
    state.baseAcceleration = v.baseAcceleration;
    state.counterfaceVelocity = form.counterfaceVelocity();
    state.normal = v.normal;
    if (isSlip) this.readSlip(state);
    else if (form.kind === "stick") this.readStick(state);
    else this.readLock(state);
    state.x = state.d + state.base;
    const isOnGround = form.kind === "stick" && form.contactCarrier !== "base";
    if (isOnGround) state.x = stance.place + problem.beltVelocity * tau;
  }

  panel(i: number, t: number): number {
    this.load(i);
    const { inputs, slip, kind } = this.form;
    if (kind === "slip") return slip.panel(t - this.stance.t);
    const rate = inputs.fastest();
    return rate > 0 ? 1 / rate : Infinity;
  }

  period(i: number, t: number): number {
    this.load(i);
    const { inputs, slip, kind } = this.form;
    if ((this.to(i) - t) * inputs.fastest() < 4 * Math.PI) return 0; // too short to repeat itself
    if (kind === "slip" && !slip.isSteady(t - this.stance.t)) return 0;
    if (kind !== "slip" && this.form.contactCarrier === "belt") return 0;
    if (inputs.isSwept()) return 0;
    return commonPeriod(ratesOf(this.problem, inputs)) ?? 0;
  }

  private load(i: number): void {
    if (i === this.loaded) return;
    this.segments.load(i, this.stance);
    this.form.begin(this.stance);
    this.loaded = i;
  }

  private readSlip(state: State): void {
    const { form, problem, stance } = this;
    const { slip } = form;
    state.d = slip.position;
    state.stretchRate = slip.velocity;
    state.v = slip.velocity + state.baseVelocity;
    state.slip = slip.slip;
    state.a = slip.acceleration + (problem.isRelative ? 0 : state.baseAcceleration);
    state.f = -stance.contact * slidingFriction(problem, state.slip, state.normal) || 0;
    const element = stance.spring * stance.side * form.elementSlope * state.d;
    state.solid = problem.solid.viscous * state.stretchRate + element;
  }

  private readStick(state: State): void {
    const { form, problem, stance } = this;
    const { carried } = form;
    this.readCarried(state);
    state.slip = 0;
    state.v = state.counterfaceVelocity;
    state.a = problem.isRelative ? 0 : carried.carrierAcceleration;
    state.f = carried.need;
    state.solid = problem.solid.viscous * state.stretchRate;
    if (stance.spring !== 0) {
      state.solid += form.hasElement ? stance.spring * stance.side * form.elementSlope * state.d : 0;
      return;
    }
    // both elements hold: the contact takes its share first
    const most = form.grip * state.normal;
    state.f = Math.min(most, Math.max(-most, carried.need));
    state.solid = state.f - carried.need;
  }

  private readLock(state: State): void {
    const { form, problem, stance } = this;
    this.readCarried(state);
    state.v = state.baseVelocity;
    state.slip = state.v - state.counterfaceVelocity;
    state.a = problem.isRelative ? 0 : state.baseAcceleration;
    state.f = -stance.contact * slidingFriction(problem, state.slip, state.normal) || 0;
    state.solid = -form.carried.need;
  }

  private readCarried(state: State): void {
    state.d = this.form.carried.position;
    state.stretchRate = this.form.carried.velocity;
  }
}
