import { firstRoot, SafeStep } from "../../numerics/safe-step.ts";
import type { Problem } from "../../scenario/problem.ts";
import type { Stance } from "../stance.ts";
import { FreeMode } from "./free-mode.ts";
import type { PlainInputs } from "./plain-inputs.ts";

const unitRoundoff = 2 ** -53;
/** Certificate steps after which a slip is left to the rules in full. */
const mostSteps = 100;

/**
 * A slip of a plain problem (see `plain-stepper.ts`) and its end: d = d₀ + A/ω₀² + Re(Z e^{λτ}) + Re(P e^{iΩτ}), so that
 * w = s v_r has |w‴| ≤ |X| Ω⁴ + |Z| ω₀⁴ e^{−στ}, X being the body's steady answer against its counterface: a bound that never
 * grows. The first zero r of w is guessed from the last slip to that side, polished by Halley's method and proven by the
 * argument of `first-zero.ts` from both its ends; what is not proven so is marched over.
 *
 * The hot loop of a sweep: its scratch is in fields, so that nothing is allocated.
 */
export class PlainSlip {
  /** How far `findZero` looks, and how close to that a zero is not clear, s. */
  end = 0;
  blur = 0;
  /** Where `findZero` found the first zero, s: Infinity where there is none before the end, NaN where it is not clear. */
  zero = NaN;
  /** w = s v_r and two derivatives at the τ last looked at, what rounding may have done to it, and d − d₀. */
  w = 0;
  first = 0;
  second = 0;
  noise = 0;
  moved = 0;
  side = 1;

  private readonly sigma: number;
  private readonly squared: number;
  private readonly damped: number;
  private readonly omega: number;
  private readonly isOnBase: boolean;
  /** 1/(ω₀² − Ω² + 2iσΩ). */
  private readonly answerRe: number;
  private readonly answerIm: number;
  /** A zero farther ahead than this is not guessed at: a nearer one is likely. */
  private readonly farthest: number;
  /** The free swing, P, X and A/ω₀² of the slip in hand. */
  private readonly free = new FreeMode();
  private pRe = 0;
  private pIm = 0;
  private xRe = 0;
  private xIm = 0;
  private settled = 0;
  private tau = 0;
  private lookedAt = NaN;
  /** The search under way: how far it has come, how far it guesses, the zero it has guessed, the step that is safe. */
  private left = 0;
  private right = 0;
  private root = Infinity;
  private readonly ahead = new SafeStep();
  /** How long the last slip to either side took. */
  private lastUp = NaN;
  private lastDown = NaN;

  /** @param carried ḋ of a body carried along, the harmonic aside, m/s. @param slide friction while sliding, N */
  constructor(
    private readonly problem: Problem,
    private readonly inputs: PlainInputs,
    private readonly carried: number,
    private readonly slide: number,
  ) {
    const { inertia, stiffness, viscous, solid, counterface } = problem;
    const { omega } = inputs;
    const natural = Math.sqrt(stiffness / inertia);
    this.sigma = (viscous + solid.viscous) / (2 * inertia);
    this.squared = stiffness / inertia;
    this.damped = Math.sqrt(Math.max(0, (natural - this.sigma) * (natural + this.sigma)));
    this.free.set(this.sigma, this.damped);
    this.farthest = (2 * Math.PI) / natural;
    this.omega = omega;
    this.isOnBase = counterface === "base";
    const re = (natural - omega) * (natural + omega);
    const im = 2 * this.sigma * omega;
    this.answerRe = re / (re * re + im * im);
    this.answerIm = -im / (re * re + im * im);
  }

  /** Far enough from critical damping and from resonance that the sum of modes cancels by two digits at most. */
  get isSound(): boolean {
    const { squared, answerRe, answerIm } = this;
    const isOscillating = this.damped > 0.3 * Math.sqrt(squared);
    return isOscillating && (this.omega === 0 || squared * Math.sqrt(answerRe * answerRe + answerIm * answerIm) < 70);
  }

  /** Sets up the slip from `s`, the inputs being turned to s.t. What is known of its start is put in exactly. */
  begin(s: Stance): void {
    const { sigma, squared, omega, inputs, isOnBase } = this;
    const { inertia } = this.problem;
    const hRe = inputs.forceRe / inertia + omega * omega * inputs.baseRe;
    const hIm = inputs.forceIm / inertia + omega * omega * inputs.baseIm;
    const pRe = hRe * this.answerRe - hIm * this.answerIm;
    const pIm = hRe * this.answerIm + hIm * this.answerRe;
    const baseAcceleration = isOnBase ? 0 : -omega * omega * inputs.baseRe;
    let push = (inputs.steadyForce - s.contact * this.slide) / inertia - squared * s.position;
    let acceleration = push + hRe - 2 * sigma * s.velocity;
    if (!Number.isNaN(s.acceleration)) {
      const known = s.acceleration - baseAcceleration;
      push += known - acceleration;
      acceleration = known;
    }
    this.pRe = pRe;
    this.pIm = pIm;
    this.xRe = isOnBase ? pRe : pRe + inputs.baseRe;
    this.xIm = isOnBase ? pIm : pIm + inputs.baseIm;
    this.settled = push / squared;
    this.free.begin(-this.settled - pRe, s.velocity + omega * pIm);
    this.lookedAt = NaN;
    const side = s.contact;
    this.side = side;
    // of v_r, so that it is no difference of ẍ and ü: against ground or belt only the force has a rate
    const forcingRate = isOnBase ? -omega * hIm : (-omega * inputs.forceIm) / inertia;
    this.w = side * s.slip;
    this.first = side * (acceleration + baseAcceleration);
    this.second = side * (forcingRate - 2 * sigma * acceleration - squared * s.velocity);
  }

  /** w, its derivatives and d − d₀ at `tau`. */
  private look(): void {
    const { free, omega, side, tau } = this;
    if (tau === this.lookedAt) return;
    this.lookedAt = tau;
    free.tau = tau;
    free.look();
    let value = free.velocity - this.carried;
    let first = free.acceleration;
    let second = free.jerk;
    let moved = this.settled + free.position;
    let noise = free.speed + Math.abs(this.carried);
    if (omega > 0) {
      const c = Math.cos(omega * tau);
      const s = Math.sin(omega * tau);
      const rate = -omega * (this.xRe * s + this.xIm * c);
      const quadrature = omega * (this.xRe * c - this.xIm * s);
      value += rate;
      first -= omega * quadrature;
      second -= omega * omega * rate;
      moved += this.pRe * c - this.pIm * s;
      noise += Math.abs(rate) + Math.abs(quadrature);
    }
    this.w = side * value;
    this.first = side * first;
    this.second = side * second;
    this.moved = moved;
    this.noise = 8 * unitRoundoff * noise;
  }

  /** |w‴| from the τ last looked at on (from the start before any look). */
  private thirdBound(): number {
    const { omega, squared, xRe, xIm } = this;
    const w2 = omega * omega;
    return Math.sqrt(xRe * xRe + xIm * xIm) * w2 * w2 + this.free.size * squared * squared;
  }

  /** Puts the first zero of w in (0, end] into `zero` and leaves w looked at there, at the end where there is none. */
  findZero(): void {
    const { end } = this;
    this.zero = NaN;
    if (this.w < 0 || (this.w === 0 && !(this.first > 0 || (this.first === 0 && this.second > 0)))) return;
    let guess = this.side > 0 ? this.lastUp : this.lastDown;
    if (Number.isNaN(guess)) guess = firstRoot(this.w, this.first, this.second / 2);
    this.left = 0;
    this.root = Infinity;
    let clearFrom = Infinity;
    this.findAhead();
    for (let n = 0; n < mostSteps; n++) {
      const { ahead } = this;
      const reached = this.left + ahead.step;
      if (this.root === Infinity && guess > this.left) {
        this.root = guess;
        this.right = Math.min(end, this.left + this.farthest);
        this.polish();
        if (this.root < Infinity) {
          ahead.value = 0;
          ahead.first = -this.first;
          ahead.second = this.second;
          ahead.span = this.root;
          ahead.find();
          clearFrom = this.root - ahead.step;
        }
      }
      if (reached >= clearFrom) return this.accept();
      if (reached >= end) {
        this.tau = end;
        this.look();
        if (this.w > this.noise - this.blur * Math.min(0, this.first)) this.zero = Infinity;
        return;
      }
      this.left = this.tau = reached;
      this.look();
      if (this.w <= this.noise) {
        this.root = reached;
        return this.accept();
      }
      this.findAhead();
      guess = reached + firstRoot(this.w, this.first, this.second / 2);
    }
  }

  /** How far ahead of `left`, where w was looked at, no zero can be. */
  private findAhead(): void {
    const { ahead } = this;
    ahead.value = this.w;
    ahead.first = this.first;
    ahead.second = this.second;
    ahead.bound = this.thirdBound();
    ahead.span = this.end - this.left;
    ahead.find();
  }

  /** Halley's method from `root`; it becomes the falling zero in (left, right) that it leads to, looked at last, or Infinity. */
  private polish(): void {
    const { left, right } = this;
    let r = this.root;
    this.root = Infinity;
    for (let i = 0; i < 8; i++) {
      if (!(r > left && r < right)) return;
      this.tau = r;
      this.look();
      const { w, first, second } = this;
      if (!(first < 0)) return;
      if (Math.abs(w) <= this.noise / 8) {
        this.root = r;
        return;
      }
      const step = (2 * w * first) / (2 * first * first - w * second);
      r -= step;
      // of third order: what is left after so small a step is rounding
      if (Math.abs(step) > 1e-6 * r) continue;
      this.tau = r;
      this.look();
      if (this.first < 0 && r > left && r < right) this.root = r;
      return;
    }
  }

  /** The root is taken where w falls through it for certain, and where its closed form has not cancelled. */
  private accept(): void {
    this.tau = this.root;
    this.look();
    const { root, first, second, noise } = this;
    const isCrossing = first < 0 && first * first > 64 * noise * Math.abs(second);
    if (!isCrossing || !(noise < -1e-13 * first * root)) return;
    this.zero = root;
    if (this.side > 0) this.lastUp = root;
    else this.lastDown = root;
  }
}
