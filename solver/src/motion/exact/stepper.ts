import { firstZero, type Watched, type Work } from "../../numerics/first-zero.ts";
import type { EventKind, Phase } from "../../result.ts";
import type { Problem } from "../../scenario/problem.ts";
import { ClosedForm } from "./closed-form.ts";
import { chooseBoth, orient, orientSide } from "./spring-element.ts";
import type { Stance } from "./stance.ts";
import {
  BaseSlipWatch,
  CarriedStretchWatch,
  HoldWatch,
  ShareWatch,
  SlipWatch,
  StretchRateWatch,
  StretchWatch,
  heldTolerance,
} from "./watch.ts";

/** What happened at the end of a step; null where only the closed form changes (a corner, a spring passing its free length). */
export type Happening = Extract<EventKind, "stop" | "turn" | "break-away"> | null;

/** What ends a segment, the earliest first. */
type Cause = "corner" | "contact" | "element" | "side" | "share";

/**
 * Takes a body from one happening to the next by closed form: the rules of stick and slip at v_r = 0, of the second
 * set-valued element at ḋ = 0, and at the corners of the inputs (right-hand values; what falls on a corner is not lost).
 * It knows no events list and no end of the run: `exact-run.ts` records, `look-ahead.ts` only asks.
 */
export class Stepper {
  readonly form: ClosedForm;
  private readonly slipWatch: SlipWatch;
  private readonly stretchWatch: StretchWatch;
  private readonly stretchRateWatch: StretchRateWatch;
  private readonly holdWatch: HoldWatch;
  private readonly shareWatch: ShareWatch;
  private readonly carriedWatch: CarriedStretchWatch;
  private readonly baseSlipWatch: BaseSlipWatch;
  private first = Infinity;
  /** What rounding may have done to the clock at the end of the step, s. */
  private blur = 0;
  private cause: Cause = "corner";

  constructor(
    private readonly problem: Problem,
    private readonly work: Work,
  ) {
    this.form = new ClosedForm(problem);
    const { oscillation, inputs, carried } = this.form;
    this.slipWatch = new SlipWatch(oscillation, inputs, this.form.contactCarrier);
    this.stretchWatch = new StretchWatch(oscillation);
    this.stretchRateWatch = new StretchRateWatch(oscillation);
    this.holdWatch = new HoldWatch(carried);
    this.shareWatch = new ShareWatch(carried);
    this.carriedWatch = new CarriedStretchWatch(carried, inputs);
    this.baseSlipWatch = new BaseSlipWatch(inputs, problem.beltVelocity);
  }

  get outOfWork(): boolean {
    return this.work.spent > this.work.allowed;
  }

  /** Places a body at t = 0; the happening is `break-away` where it starts at rest and is not held. */
  start(s: Stance): Happening {
    const { inputs } = this.form;
    const { initial, isRelative } = this.problem;
    s.t = 0;
    inputs.locate(0);
    const v = inputs.evaluate(0);
    s.place = initial.displacement;
    s.position = initial.displacement - (isRelative ? 0 : v.base);
    s.velocity = initial.velocity - (isRelative ? 0 : v.baseVelocity);
    s.acceleration = NaN;
    const carrier = isRelative ? 0 : this.form.counterfaceVelocity();
    const slip = initial.velocity - carrier;
    const scale = Math.max(Math.abs(initial.velocity), Math.abs(carrier));
    if (Math.abs(slip) <= 1e-12 * scale) return this.meet(s, 0);
    s.slip = slip;
    s.contact = slip > 0 ? 1 : -1;
    orient(this.form, s);
    return null;
  }

  /** Judges anew a body that is stuck at s.t, the inputs being located there. */
  rejudge(s: Stance): Happening {
    return this.meet(s, 0);
  }

  /** Takes `s` to the end of its segment, not beyond `limit`, and tells what happened there. */
  step(s: Stance, limit: number): Happening {
    const { form } = this;
    const end = Math.min(form.inputs.end, limit);
    form.take(s);
    this.first = end - s.t;
    this.blur = 2 ** -49 * end;
    this.cause = "corner";
    if (form.form === "slip") this.watchSlip(s);
    else if (form.form === "stick") this.watchStick(s);
    else this.watchLock(s);
    if (this.outOfWork) return null;
    const tau = this.first;
    if (this.cause === "corner") return this.pass(s, end, end < limit || end === form.inputs.end);
    if (s.t + tau >= end && end === form.inputs.end) return this.pass(s, end, true);
    this.carry(s, tau);
    if (this.cause === "contact") {
      if (form.form === "stick") return this.breakAway(s);
      return form.form === "lock" ? this.meetBoth(s, s.contact) : this.meet(s, s.contact);
    }
    if (this.cause === "element") return this.meetElement(s);
    if (this.cause === "side") s.side = -s.side as Phase;
    return null;
  }

  private watchSlip(s: Stance): void {
    const { oscillation, hasElement, inputs, contactCarrier } = this.form;
    const { fast } = oscillation.freeRates;
    const rate = Math.max(fast, inputs.fastest());
    const scale = rate > 0 ? 2 / rate : Infinity;
    this.slipWatch.sign = s.contact;
    this.look(this.slipWatch, scale, "contact");
    if (!hasElement) return;
    this.stretchWatch.sign = s.side;
    this.look(this.stretchWatch, scale, "side");
    if (contactCarrier === "base" || this.form.isCarriedWithBase()) return;
    this.stretchRateWatch.sign = s.spring;
    this.look(this.stretchRateWatch, scale, "element");
  }

  private watchStick(s: Stance): void {
    this.watchHold("contact");
    if (!this.form.hasElement) return;
    if (s.spring === 0) return this.watchShares();
    const scale = this.inputScale();
    this.baseSlipWatch.sign = -s.spring;
    this.look(this.baseSlipWatch, scale, "element");
    this.carriedWatch.sign = s.side;
    this.look(this.carriedWatch, scale, "side");
  }

  /** The first instant at which need leaves ±room, told window by window so that neither side is followed past the other. */
  private watchHold(cause: Cause): void {
    const scale = this.inputScale();
    const end = this.first;
    for (let from = this.form.carried.holdsUntil(); from < end && this.first === end; from += 4 * scale) {
      const to = Math.min(end, from + 4 * scale);
      this.holdWatch.sign = 1;
      this.look(this.holdWatch, scale, cause, from, to);
      this.holdWatch.sign = -1;
      this.look(this.holdWatch, scale, cause, from, Math.min(to, this.first));
      if (this.outOfWork) return;
    }
  }

  private watchShares(): void {
    for (const side of [1, -1] as const) {
      this.shareWatch.begin(side);
      this.look(this.shareWatch, this.inputScale(), "share");
    }
  }

  private inputScale(): number {
    const rate = this.form.inputs.fastest();
    return rate > 0 ? 2 / rate : Infinity;
  }

  private watchLock(s: Stance): void {
    this.watchHold("element");
    this.baseSlipWatch.sign = s.contact;
    this.look(this.baseSlipWatch, this.inputScale(), "contact");
  }

  private look(watched: Watched, scale: number, cause: Cause, from = 0, to = this.first): void {
    const tau = firstZero(watched, from, to, scale, this.work, to === this.first ? this.blur : 0);
    if (!(tau <= this.first)) return;
    this.first = tau;
    this.cause = cause;
  }

  /** Moves the stance by τ along its closed form and locates the inputs there. */
  private carry(s: Stance, tau: number): void {
    const { form } = this;
    let at = tau;
    if (form.form === "slip") {
      form.oscillation.evaluateSlip(at);
      s.position = form.oscillation.position;
      s.velocity = form.oscillation.velocity;
      s.slip = form.oscillation.slip;
    } else {
      if (this.cause === "contact" || this.cause === "element") at = this.atLimit(tau);
      form.carried.evaluate(at);
      s.position = form.carried.position;
      s.velocity = form.carried.velocity;
      s.slip = this.slipOfCarried();
    }
    s.t += at;
    s.acceleration = NaN;
    form.inputs.locate(s.t);
    const { base } = form.inputs.evaluate(0);
    this.place(s, at, base);
  }

  /** Keeps x: y + d, or where it was stuck (moved on by the belt). */
  private place(s: Stance, tau: number, base: number): void {
    const isStuckToBase = this.form.contactCarrier === "base";
    if (this.form.form === "stick" && !isStuckToBase) s.place += this.problem.beltVelocity * tau;
    else s.place = s.position + (this.problem.isRelative ? 0 : base);
  }

  /** The stick was found to end where need passes room (1 + tolerance); its time is where need equals room, a hair earlier. */
  private atLimit(tau: number): number {
    const { carried } = this.form;
    carried.evaluate(tau);
    const sign = Math.sign(carried.need);
    const over = sign * carried.need - carried.room;
    const rate = sign * carried.needRate - carried.roomRate;
    const isEnd = Math.abs(over) <= 1e-9 * carried.room && rate > 0;
    return isEnd ? Math.max(0, tau - over / rate) : tau;
  }

  /** The end of a stick: the force is exactly what could just be held, so the acceleration is known exactly. */
  private breakAway(s: Stance): Happening {
    const { carried, inputs } = this.form;
    this.placeOnCounterface(s);
    const side = -Math.sign(carried.need) as Phase;
    const relative = (side * ((this.form.grip - this.form.slide) * inputs.values.normal)) / this.problem.inertia;
    s.acceleration = relative;
    s.contact = side;
    orient(this.form, s);
    return "break-away";
  }

  /** Sets ḋ = u̇ − ẏ exactly. */
  private placeOnCounterface(s: Stance): void {
    const { form } = this;
    s.slip = 0;
    s.velocity = form.contactCarrier === "base" ? 0 : this.problem.beltVelocity - form.inputs.values.baseVelocity;
  }

  /**
   * Judges a body whose v_r is 0 at s.t (inputs located there): held, it sticks; else it slips to the side of the force
   * that cannot be held. `before` is the phase it came in (0: the start of the run, or a stick that a corner has ended).
   */
  private meet(s: Stance, before: Phase): Happening {
    const { form, problem } = this;
    this.placeOnCounterface(s);
    s.contact = 0;
    s.acceleration = NaN;
    orient(this.form, s);
    form.take(s);
    form.carried.evaluate(0);
    const { need, room } = form.carried;
    const canHold = room > 0 || before === 0 || problem.model !== "none";
    if (canHold && Math.abs(need) <= room * (1 + heldTolerance)) return before === 0 ? null : "stop";
    s.contact = need > 0 ? -1 : need < 0 ? 1 : before;
    orient(this.form, s);
    if (before === 0) return "break-away";
    return s.contact === before ? null : "turn";
  }

  /** ḋ has reached 0, or has been held there as long as it could be; the contact slips or sticks on. */
  private meetElement(s: Stance): Happening {
    const { form } = this;
    s.velocity = 0;
    if (s.contact === 0) return this.meetBoth(s, 0);
    if (form.form === "lock") {
      s.acceleration = form.inputs.values.baseAcceleration; // need is exactly what could just be held: d̈ = 0
      s.spring = -Math.sign(form.carried.need) as Phase;
      orientSide(s);
      return null;
    }
    orient(this.form, s);
    return null;
  }

  /** v_r and ḋ are 0 at once, for an instant only. */
  private meetBoth(s: Stance, before: Phase): Happening {
    this.placeOnCounterface(s);
    s.acceleration = NaN;
    chooseBoth(this.form, s);
    if (s.contact === before) return null;
    if (s.contact === 0) return "stop";
    return before === 0 ? "break-away" : "turn";
  }

  /** A corner of the inputs, or the limit of the step: right-hand values from here on. */
  private pass(s: Stance, end: number, isCorner: boolean): Happening {
    const { form, problem } = this;
    const tau = end - s.t;
    const wasSlip = form.form === "slip";
    const isZero = form.form !== "stick" && this.cause === "contact";
    const startSpeed = Math.abs(form.inputs.evaluate(0).baseVelocity);
    if (wasSlip) form.oscillation.evaluateSlip(tau);
    else form.carried.evaluate(tau);
    const moved = wasSlip ? form.oscillation : form.carried;
    s.slip = wasSlip ? form.oscillation.slip : this.slipOfCarried();
    s.position = moved.position;
    s.velocity = moved.velocity;
    s.acceleration = NaN;
    const before = form.inputs.evaluate(tau).baseVelocity;
    s.t = end;
    this.place(s, tau, form.inputs.values.base);
    if (!isCorner) return null;
    form.inputs.locate(end);
    const after = form.inputs.evaluate(0).baseVelocity;
    const scale = Math.max(startSpeed, Math.abs(before), Math.abs(after));
    const isJump = Math.abs(after - before) > 1e-12 * scale;
    if (isJump && !problem.isRelative) s.velocity += before - after;
    const slipsNow = isJump && form.contactCarrier === "base" && !problem.isRelative;
    if (slipsNow) s.slip = s.velocity;
    return this.enter(s, slipsNow, isZero, 1e-12 * scale);
  }

  /** v_r of a stick (0), or of a body locked to its base over ground or belt. */
  private slipOfCarried(): number {
    if (this.form.form === "stick") return 0;
    return this.form.inputs.values.baseVelocity - this.problem.beltVelocity;
  }

  /** What a corner does to the contact; `isJump` where the counterface itself has jumped, so that v_r has too. */
  private enter(s: Stance, isJump: boolean, isZero: boolean, tolerance: number): Happening {
    const was = s.contact;
    if (was === 0 && !isJump) return this.meet(s, 0);
    if (!isJump) {
      if (isZero) return this.meet(s, was);
      orient(this.form, s);
      return null;
    }
    if (Math.abs(s.slip) <= tolerance) return this.meet(s, was);
    s.contact = s.slip > 0 ? 1 : -1;
    orient(this.form, s);
    if (was === 0) return "break-away";
    return s.contact === was ? null : "turn";
  }
}
