import { firstZero, type Watched, type Work } from "../../numerics/first-zero.ts";
import type { Problem } from "../../scenario/problem.ts";
import type { Inputs } from "../inputs.ts";
import type { BodyValues, Cause, Ending, Slip, SlipWatches } from "../slip.ts";
import { copyStance, newStance, type Stance } from "../stance.ts";
import { Oscillation } from "./oscillation.ts";
import { SlipWatch, StretchRateWatch, StretchWatch } from "./slip-watch.ts";

/** A slip by closed form, its end found by `firstZero`, which cannot miss it. Friction is one constant while it lasts. */
export class ExactSlip implements Slip {
  private readonly oscillation: Oscillation;
  private readonly slipWatch: SlipWatch;
  private readonly stretchWatch: StretchWatch;
  private readonly stretchRateWatch: StretchRateWatch;
  private readonly slide: number;
  private readonly stance = newStance();

  constructor(
    problem: Problem,
    private readonly inputs: Inputs,
  ) {
    const { counterface, beltVelocity } = problem;
    this.slide = (problem.law.constant ?? NaN) * problem.radius;
    this.oscillation = new Oscillation(inputs.omega.length + 1, counterface, beltVelocity);
    this.slipWatch = new SlipWatch(this.oscillation, inputs, counterface);
    this.stretchWatch = new StretchWatch(this.oscillation);
    this.stretchRateWatch = new StretchRateWatch(this.oscillation);
  }

  get position(): number {
    return this.oscillation.position;
  }

  get velocity(): number {
    return this.oscillation.velocity;
  }

  get acceleration(): number {
    return this.oscillation.acceleration;
  }

  get slip(): number {
    return this.oscillation.slip;
  }

  begin(inputs: Inputs, body: BodyValues, stance: Stance): void {
    copyStance(stance, this.stance);
    this.oscillation.begin(inputs, body, inputs.isInContact ? stance.contact * this.slide : 0, stance);
  }

  follow(ending: Ending, watches: SlipWatches, blur: number, work: Work): void {
    const { stance } = this;
    this.slipWatch.sign = stance.contact;
    this.look(this.slipWatch, "contact", ending, blur, work);
    if (watches.side) {
      this.stretchWatch.sign = stance.side;
      this.look(this.stretchWatch, "side", ending, blur, work);
    }
    if (!watches.element) return;
    this.stretchRateWatch.sign = stance.spring;
    this.look(this.stretchRateWatch, "element", ending, blur, work);
  }

  private look(watched: Watched, cause: Cause, ending: Ending, blur: number, work: Work): void {
    const tau = firstZero(watched, 0, ending.tau, this.scale, work, blur);
    if (!(tau <= ending.tau)) return;
    ending.tau = tau;
    ending.cause = cause;
    ending.isTouch = watched.isTouch;
  }

  evaluate(tau: number): void {
    this.oscillation.evaluateSlip(tau);
  }

  read(tau: number): void {
    this.oscillation.read(tau);
  }

  panel(tau: number): number {
    const { fast, slow, fastDies } = this.oscillation.chain;
    const rate = Math.max(this.inputs.fastest(), tau < fastDies ? fast : slow);
    return rate > 0 ? 1 / rate : Infinity;
  }

  isSteady(tau: number): boolean {
    const { slow, fastDies } = this.oscillation.chain;
    // without a spring only the velocity repeats itself, not the place
    return tau >= fastDies && slow === 0 && this.oscillation.squared > 0;
  }

  private get scale(): number {
    const rate = Math.max(this.oscillation.chain.fast, this.inputs.fastest());
    return rate > 0 ? 2 / rate : Infinity;
  }
}
