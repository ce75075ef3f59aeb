import type { Ended, Phase } from "../../result.ts";
import type { Problem } from "../../scenario/problem.ts";
import type { Motion, MotionMark } from "../motion.ts";
import type { State } from "../state.ts";
import { ClosedForm } from "./closed-form.ts";
import { commonPeriod, ratesOf } from "./common-period.ts";
import { newStance, type Segments } from "./stance.ts";

/** A run by closed form, asked again at any instant: each segment's form is made anew from its start state. */
export class ExactMotion implements Motion {
  readonly method = "exact";
  private readonly form: ClosedForm;
  private readonly stance = newStance();
  private loaded = -1;

  constructor(
    readonly problem: Problem,
    private readonly segments: Segments,
    readonly events: readonly MotionMark[],
    readonly ended: Ended,
    readonly end: number,
    readonly nextBreakAway: number,
  ) {
    this.form = new ClosedForm(problem);
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
    const isSlip = form.form === "slip";
    if (isSlip) form.oscillation.evaluate(tau);
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
    else if (form.form === "stick") this.readStick(state);
    else this.readLock(state);
    state.x = state.d + state.base;
    const isOnGround = form.form === "stick" && form.contactCarrier !== "base";
    if (isOnGround) state.x = stance.place + problem.beltVelocity * tau;
  }

  panel(i: number, t: number): number {
    this.load(i);
    const { inputs, oscillation, form } = this.form;
    let rate = inputs.fastest();
    if (form === "slip") {
      const { fast, slow, fastDies } = oscillation.freeRates;
      rate = Math.max(rate, t - this.stance.t < fastDies ? fast : slow);
    }
    return rate > 0 ? 1 / rate : Infinity;
  }

  period(i: number, t: number): number {
    this.load(i);
    const { inputs, oscillation, form } = this.form;
    if (form === "slip" && t - this.stance.t < oscillation.freeRates.fastDies) return 0;
    const { force, base, acceleration } = inputs;
    for (let j = 1; j < 4; j++) if (force[j] !== 0 || base[j] !== 0 || acceleration[j] !== 0) return 0;
    if (form !== "slip" && this.form.contactCarrier === "belt") return 0;
    const isSlowing = oscillation.freeRates.slow > 0;
    return form === "slip" && isSlowing ? 0 : (commonPeriod(ratesOf(this.problem, inputs)) ?? 0);
  }

  private load(i: number): void {
    if (i === this.loaded) return;
    this.segments.load(i, this.stance);
    this.form.begin(this.stance);
    this.loaded = i;
  }

  private readSlip(state: State): void {
    const { form, problem, stance } = this;
    const { oscillation } = form;
    state.d = oscillation.position;
    state.stretchRate = oscillation.velocity;
    state.v = oscillation.velocity + state.baseVelocity;
    state.slip = form.contactCarrier === "base" ? oscillation.velocity : state.v - state.counterfaceVelocity;
    state.a = oscillation.acceleration + (problem.isRelative ? 0 : state.baseAcceleration);
    state.f = -stance.contact * form.slide * state.normal || 0;
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
    state.f = -stance.contact * form.slide * state.normal || 0;
    state.solid = -form.carried.need;
  }

  private readCarried(state: State): void {
    state.d = this.form.carried.position;
    state.stretchRate = this.form.carried.velocity;
  }
}
