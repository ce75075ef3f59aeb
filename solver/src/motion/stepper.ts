import { firstZero, type Watched, type Work } from "../numerics/first-zero.ts";
import type { Phase } from "../result.ts";
import type { Problem } from "../scenario/problem.ts";
import { Form, type SlipMaker } from "./form.ts";
import type { Cause, Ending } from "./slip.ts";
import { chooseBoth, orient, orientSide } from "./spring-element.ts";
import type { Happening, Stance } from "./stance.ts";
import { BaseSlipWatch, CarriedStretchWatch, HoldWatch, ShareWatch, heldTolerance } from "./watch.ts";

/**
 * Takes a body from one happening to the next: the rules of stick and slip at v_r = 0, of the second
 * set-valued element at ḋ = 0, and at the corners of the inputs (right-hand values; what falls on a corner is not lost).
 * It knows no events list and no end of the run: `run.ts` records, `look-ahead.ts` only asks.
 */
export class Stepper {
  readonly form: Form;
  private readonly holdWatch: HoldWatch;
  private readonly shareWatch: ShareWatch;
  private readonly carriedWatch: CarriedStretchWatch;
  private readonly baseSlipWatch: BaseSlipWatch;
  private readonly ending: Ending = { tau: Infinity, cause: "corner", isTouch: false };
  /** What rounding may have done to the clock at the end of the step, s. */
  private blur = 0;
  /** The side of the needed force that could no longer be held at the end of a stick. */
  private lostSide: Phase = 0;

  constructor(
    private readonly problem: Problem,
    private readonly work: Work,
    makeSlip: SlipMaker,
  ) {
    this.form = new Form(problem, makeSlip);
    const { inputs, carried } = this.form;
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
    this.work.spent++; // even a step of no length costs something, so that none goes on for ever
    const end = Math.min(form.inputs.end, limit);
    form.take(s);
    this.ending.tau = end - s.t;
    this.blur = 2 ** -49 * end;
    this.ending.cause = "corner";
    this.ending.isTouch = false;
    if (form.kind === "slip") this.watchSlip();
    else if (form.kind === "stick") this.watchStick(s);
    else this.watchLock(s);
    if (this.outOfWork) return null;
    const tau = this.ending.tau;
    if (this.ending.cause === "corner") return this.pass(s, end, end < limit || end === form.inputs.end);
    if (s.t + tau >= end && end === form.inputs.end) return this.pass(s, end, true);
    this.carry(s, tau);
    if (this.ending.cause === "contact") {
      if (form.kind === "stick") return this.breakAway(s);
      return form.kind === "lock" ? this.meetBoth(s, s.contact) : this.meet(s, s.contact, this.ending.isTouch);
    }
    if (this.ending.cause === "element") return this.meetElement(s);
    if (this.ending.cause === "side") s.side = -s.side as Phase;
    return null;
  }

  private watchSlip(): void {
    const { slip, hasElement, contactCarrier } = this.form;
    const isApart = contactCarrier !== "base" && !this.form.isCarriedWithBase();
    slip.follow(this.ending, { side: hasElement, element: hasElement && isApart }, this.blur, this.work);
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

  /**
   * The first instant at which need leaves ±room, told window by window so that neither side is followed far past the other;
   * both over the same window, so that a mirrored run is the same to the last bit.
   */
  private watchHold(cause: Cause): void {
    const scale = this.inputScale();
    const end = this.ending.tau;
    for (let from = this.form.carried.holdsUntil(); from < end && this.ending.tau === end; from += 4 * scale) {
      const to = Math.min(end, from + 4 * scale);
      for (const side of [1, -1] as const) {
        this.holdWatch.sign = side;
        this.look(this.holdWatch, scale, cause, from, to, to === end ? this.blur : 0);
      }
      if (this.ending.tau < end || this.ending.cause === cause) this.forgive(end);
      if (this.outOfWork) return;
    }
  }

  /** Where the contact goes room is 0, but a body that needs no force stays where it is: what need is then is rounding. */
  private forgive(end: number): void {
    const { carried } = this.form;
    carried.evaluate(this.ending.tau);
    if (!(carried.roomRate < 0) || Math.abs(carried.need) > carried.needRounding()) return;
    this.ending.tau = end;
    this.ending.cause = "corner";
  }

  /** Both sides over the same stretch, so that a mirrored run costs the same work. */
  private watchShares(): void {
    const end = this.ending.tau;
    for (const side of [1, -1] as const) {
      this.shareWatch.begin(side, this.blur);
      this.look(this.shareWatch, this.inputScale(), "share", 0, end);
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

  private look(
    watched: Watched,
    scale: number,
    cause: Cause,
    from = 0,
    to = this.ending.tau,
    blur = to === this.ending.tau ? this.blur : 0,
  ): void {
    const tau = firstZero(watched, from, to, scale, this.work, blur);
    if (!(tau <= this.ending.tau)) return;
    this.ending.tau = tau;
    this.ending.cause = cause;
    this.ending.isTouch = watched.isTouch;
  }

  /** Moves the stance by τ along its segment and locates the inputs there. */
  private carry(s: Stance, tau: number): void {
    const { form } = this;
    let at = tau;
    if (form.kind === "slip") {
      form.slip.evaluate(at);
      s.position = form.slip.position;
      s.velocity = form.slip.velocity;
      s.slip = form.slip.slip;
    } else {
      if (this.ending.cause === "contact" || this.ending.cause === "element") at = this.atLimit(tau);
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
    if (this.form.kind === "stick" && !isStuckToBase) s.place += this.problem.beltVelocity * tau;
    else s.place = s.position + (this.problem.isRelative ? 0 : base);
  }

  /**
   * The stick was found to end where need passes room (1 + tolerance); its time is where need equals room, a hair earlier.
   * Where nothing holds, it left when need began to be, at the start of the segment: inputs are smooth from there on.
   */
  private atLimit(tau: number): number {
    const { carried } = this.form;
    carried.evaluate(tau);
    this.lostSide = Math.sign(carried.need) as Phase;
    if (carried.room === 0 && carried.roomRate === 0) return 0;
    const over = this.lostSide * carried.need - carried.room;
    const rate = this.lostSide * carried.needRate - carried.roomRate;
    const isEnd = Math.abs(over) <= 1e-9 * carried.room && rate > 0;
    return isEnd ? Math.max(0, tau - over / rate) : tau;
  }

  /** The end of a stick: the force is exactly what could just be held, so the acceleration is known exactly. */
  private breakAway(s: Stance): Happening {
    const { inputs } = this.form;
    this.placeOnCounterface(s);
    const side = -this.lostSide as Phase;
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
   * Where v_r only touches 0 the acceleration is 0 too, and with nothing to hold it the body slips on as it came.
   */
  private meet(s: Stance, before: Phase, isTouch = false): Happening {
    const { form, problem } = this;
    this.placeOnCounterface(s);
    s.contact = 0;
    s.acceleration = NaN;
    orient(this.form, s);
    form.take(s);
    form.carried.evaluate(0);
    const { need, room } = form.carried;
    if (isTouch && room === 0) {
      s.contact = before;
      orient(this.form, s);
      s.acceleration = 0;
      return null;
    }
    const canHold = room > 0 || before === 0 || problem.model !== "none";
    const limit = room > 0 ? room * (1 + heldTolerance) : form.carried.needRounding();
    if (canHold && Math.abs(need) <= limit) return before === 0 ? null : "stop";
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
    if (form.kind === "lock") {
      s.acceleration = form.inputs.values.baseAcceleration; // need is exactly what could just be held: d̈ = 0
      s.spring = -this.lostSide as Phase;
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
    const wasSlip = form.kind === "slip";
    const isZero = form.kind !== "stick" && this.ending.cause === "contact";
    const startSpeed = Math.abs(form.inputs.evaluate(0).baseVelocity);
    if (wasSlip) form.slip.evaluate(tau);
    else form.carried.evaluate(tau);
    const moved = wasSlip ? form.slip : form.carried;
    s.slip = wasSlip ? form.slip.slip : this.slipOfCarried();
    s.position = moved.position;
    s.velocity = moved.velocity;
    s.acceleration = NaN;
    const { values } = form.inputs;
    form.inputs.evaluate(tau);
    const before = values.baseVelocity;
    let hurry = Math.abs(values.baseAcceleration);
    s.t = end;
    this.place(s, tau, values.base);
    if (!isCorner) return null;
    form.inputs.locate(end);
    form.inputs.evaluate(0);
    const after = values.baseVelocity;
    hurry += Math.abs(values.baseAcceleration);
    // the corner's own time is rounded: what ẏ does in that while is no jump
    const tolerance = 1e-12 * Math.max(startSpeed, Math.abs(before), Math.abs(after)) + this.blur * hurry;
    const isJump = Math.abs(after - before) > tolerance;
    if (isJump && !problem.isRelative) s.velocity += before - after;
    const slipsNow = isJump && form.contactCarrier === "base" && !problem.isRelative;
    if (slipsNow) s.slip = s.velocity;
    return this.enter(s, slipsNow, isZero, tolerance);
  }

  /** v_r of a stick (0), or of a body locked to its base over ground or belt. */
  private slipOfCarried(): number {
    if (this.form.kind === "stick") return 0;
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
