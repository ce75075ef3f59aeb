import type { Phase } from "../../result.ts";
import type { Problem } from "../../scenario/problem.ts";
import type { Happening, Stance } from "../stance.ts";
import { heldTolerance } from "../watch.ts";
import { PlainInputs } from "./plain-inputs.ts";
import { PlainSlip } from "./plain-slip.ts";

const turn = 2 * Math.PI;
/** Relative distance from a tie below which rounding might decide. */
const clear = 1e-9;

/**
 * The steps of a plain problem in straight-line code, for sweeps and long runs: constant friction, constant forces and
 * feeds, at most one frequency on force and base, an underdamped body, nothing that starts or stops on the way. A slip ends
 * where `plain-slip.ts` says, a stick where an arc cosine does.
 *
 * What is not clear (a tie, a touch, a halt on the same side, a slip so short that its closed form cancels) it does not
 * decide: it answers `undefined`, leaves the stance as it was, and that step is taken by the rules in full (`stepper.ts`).
 */
export class PlainStepper {
  private readonly slip: PlainSlip;
  /** What friction can hold, and what it is while sliding, N. */
  private readonly grip: number;
  private readonly slide: number;
  private readonly viscous: number;
  private readonly isOnBase: boolean;
  /** ḋ of a body carried along, the harmonic aside, m/s. */
  private readonly carried: number;

  /** need and its harmonic part at the last `weigh`, and the size of what makes it up, N. */
  private need = 0;
  private swingRe = 0;
  private swingIm = 0;
  private size = 0;
  /** What `findStickEnd` found: how long the stick lasts, s, and the side of need that is lost. */
  private lasts = NaN;
  private lostSide: Phase = 0;

  /** A stepper for the problem; null where it is not a plain one. */
  static of(problem: Problem): PlainStepper | null {
    const { law, cubic, solid, ripple } = problem;
    if (law.constant === null || cubic !== 0 || solid.proportional !== 0 || ripple !== null) return null;
    const inputs = PlainInputs.of(problem);
    if (inputs === null) return null;
    const stepper = new PlainStepper(problem, inputs, law.constant);
    return stepper.slip.isSound ? stepper : null;
  }

  private constructor(
    private readonly problem: Problem,
    private readonly inputs: PlainInputs,
    sliding: number,
  ) {
    const { normal, radius, law, viscous, solid, beltVelocity, counterface } = problem;
    this.grip = law.atRest * radius * normal;
    this.slide = sliding * radius * normal;
    this.viscous = viscous + solid.viscous;
    this.isOnBase = counterface === "base";
    this.carried = this.isOnBase ? 0 : beltVelocity - inputs.feed;
    this.slip = new PlainSlip(problem, inputs, this.carried, this.slide);
  }

  /** Places a body at t = 0 as `Stepper.start` does. */
  start(s: Stance): Happening | undefined {
    const { inputs, isOnBase } = this;
    const { initial, beltVelocity } = this.problem;
    s.t = 0;
    this.turnInputs(s);
    s.place = initial.displacement;
    s.position = initial.displacement - inputs.base;
    const baseVelocity = inputs.feed - inputs.omega * inputs.baseIm;
    s.velocity = initial.velocity - baseVelocity;
    s.acceleration = NaN;
    const carrier = isOnBase ? baseVelocity : beltVelocity;
    const slip = initial.velocity - carrier;
    if (Math.abs(slip) <= 1e-12 * Math.max(Math.abs(initial.velocity), Math.abs(carrier))) return this.meet(s, 0);
    s.slip = slip;
    s.contact = slip > 0 ? 1 : -1;
    return null;
  }

  /** Takes `s` to the end of its segment, not beyond that of the run, and tells what happened there. */
  step(s: Stance): Happening | undefined {
    this.turnInputs(s);
    return s.contact === 0 ? this.stick(s) : this.slideOn(s);
  }

  /** When a body stuck at `s` breaks away if the inputs go on for ever: Infinity where never, NaN where it is not clear. */
  nextBreakAway(s: Stance): number {
    this.turnInputs(s);
    this.findStickEnd(s);
    return s.t + this.lasts;
  }

  private slideOn(s: Stance): Happening | undefined {
    const { slip, inputs } = this;
    const { seconds } = this.problem;
    slip.begin(s);
    slip.end = seconds - s.t;
    slip.blur = clear * seconds;
    slip.findZero();
    if (slip.zero === Infinity) return this.slideToEnd(s);
    if (!(slip.zero < slip.end - slip.blur)) return undefined;
    const { t, position } = s;
    s.t += slip.zero;
    s.position += slip.moved;
    this.turnInputs(s);
    const happening = this.meet(s, s.contact);
    if (happening === undefined) {
      s.t = t;
      s.position = position;
      return undefined;
    }
    s.place = s.position + inputs.base;
    return happening;
  }

  /** Still sliding at the end of the run, where the slip has been looked at. */
  private slideToEnd(s: Stance): Happening {
    const { slip, inputs } = this;
    s.t = this.problem.seconds;
    s.position += slip.moved;
    s.slip = slip.side * slip.w;
    this.turnInputs(s);
    s.velocity = s.slip + this.carriedVelocity();
    s.place = s.position + inputs.base;
    s.acceleration = NaN;
    return null;
  }

  private stick(s: Stance): Happening | undefined {
    const { inputs, isOnBase } = this;
    const { seconds } = this.problem;
    this.findStickEnd(s);
    const { lasts } = this;
    const isOver = s.t + lasts < seconds;
    if (Number.isNaN(lasts) || Math.abs(s.t + lasts - seconds) <= clear * seconds) return undefined;
    const tau = isOver ? lasts : seconds - s.t;
    const before = inputs.baseRe;
    s.t = isOver ? s.t + lasts : seconds;
    this.turnInputs(s);
    if (!isOnBase) {
      s.place += this.problem.beltVelocity * tau;
      s.position += this.carried * tau - (inputs.baseRe - before);
    } else s.place = s.position + inputs.base;
    s.velocity = this.carriedVelocity();
    s.acceleration = NaN;
    return isOver ? this.breakAway(s) : null;
  }

  /** The force is exactly what could just be held, so the acceleration is known exactly. */
  private breakAway(s: Stance): Happening {
    s.contact = -this.lostSide as Phase;
    s.acceleration = (s.contact * (this.grip - this.slide)) / this.problem.inertia;
    return "break-away";
  }

  /**
   * Puts into `lasts` how long a body stuck at `s` stays so, the inputs being turned to s.t: Infinity for ever, NaN where it is
   * not clear.
   */
  private findStickEnd(s: Stance): void {
    const { grip, swingRe, swingIm } = this.weigh(s);
    const drift = this.isOnBase ? 0 : this.problem.stiffness * this.carried;
    const swing = Math.sqrt(swingRe * swingRe + swingIm * swingIm);
    this.lasts = NaN;
    if (swing === 0) {
      this.lostSide = Math.sign(drift) as Phase;
      this.lasts = drift === 0 ? Infinity : (grip - this.lostSide * this.need) / Math.abs(drift);
      return;
    }
    if (drift !== 0) return;
    const still = this.need - swingRe;
    const upper = (grip - still) / swing;
    const lower = (-grip - still) / swing;
    if (Math.abs(upper - 1) < clear || Math.abs(lower + 1) < clear) return;
    const angle = Math.atan2(swingIm, swingRe);
    // need = still + swing cos(angle + Ωτ) rises through +grip in its lower half turn, falls through −grip in its upper one
    const up = upper < 1 ? turnsAhead(-Math.acos(Math.max(-1, upper)) - angle) : Infinity;
    const down = lower > -1 ? turnsAhead(Math.acos(Math.min(1, lower)) - angle) : Infinity;
    const soonest = Math.min(up, down);
    this.lostSide = up < down ? 1 : -1;
    const isClear = soonest > clear && soonest < turn - clear && Math.abs(up - down) > clear;
    if (soonest === Infinity || isClear) this.lasts = soonest / this.inputs.omega;
  }

  /** Fills in need of a body carried along at `s`, the inputs being turned to s.t: its value, its harmonic part, its size. */
  private weigh(s: Stance): this {
    const { inputs, isOnBase, viscous, problem } = this;
    const { inertia, stiffness } = problem;
    const { omega, forceRe, forceIm, baseRe, baseIm } = inputs;
    const spring = stiffness * s.position;
    this.size = this.grip + Math.abs(spring) + Math.abs(inputs.steadyForce) + Math.abs(forceRe);
    if (isOnBase) {
      this.swingRe = -inertia * omega * omega * baseRe - forceRe;
      this.swingIm = -inertia * omega * omega * baseIm - forceIm;
      this.need = spring - inputs.steadyForce + this.swingRe;
      return this;
    }
    // K d + C ḋ with d = … − y: their harmonics are −(K + iΩC) Ŷ, that of K d being in d already
    const drag = viscous * omega * baseIm;
    this.swingRe = drag - forceRe - stiffness * baseRe;
    this.swingIm = -forceIm - stiffness * baseIm - viscous * omega * baseRe;
    this.need = spring - inputs.steadyForce + viscous * this.carried + drag - forceRe;
    return this;
  }

  private turnInputs(s: Stance): void {
    this.inputs.t = s.t;
    this.inputs.turn();
  }

  /** ḋ of a body that its counterface carries along, the inputs being turned to its instant. */
  private carriedVelocity(): number {
    return this.isOnBase ? 0 : this.carried + this.inputs.omega * this.inputs.baseIm;
  }

  /** Judges a body whose v_r is 0, the inputs being turned to s.t; as `Stepper.meet`, but for what is close to a tie. */
  private meet(s: Stance, before: Phase): Happening | undefined {
    const { velocity, slip } = s;
    s.slip = 0;
    s.velocity = this.carriedVelocity();
    this.weigh(s);
    const over = Math.abs(this.need) - this.grip * (1 + heldTolerance);
    const contact = over <= 0 ? 0 : this.need > 0 ? -1 : 1;
    if (Math.abs(over) <= clear * this.size || (before !== 0 && contact === before)) {
      s.velocity = velocity;
      s.slip = slip;
      return undefined;
    }
    s.contact = contact;
    s.acceleration = NaN;
    if (contact === 0) return before === 0 ? null : "stop";
    return before === 0 ? "break-away" : "turn";
  }
}

/** An angle in (−4π, 4π) brought to [0, 2π). */
function turnsAhead(angle: number): number {
  return angle - turn * Math.floor(angle / turn);
}
