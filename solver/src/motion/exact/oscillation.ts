import type { Inputs } from "../inputs.ts";
import type { Carrier } from "../carried.ts";
import { Chain } from "./chain.ts";
import { FreeMode } from "./free-mode.ts";
import { ResonantAnswer } from "./resonant-answer.ts";
import { StartSeries } from "./start-series.ts";
import { SteadyAnswer } from "./steady-answer.ts";
import type { Stance } from "../stance.ts";

const unitRoundoff = 2 ** -53;

/**
 * The closed form of one slip: m d̈ + C ḋ + K d = F + W − m ÿ + f, with f = −slide·N(t) (slide = s r μk), from the
 * state (d₀, ḋ₀) at the origin of the inputs to their next corner. Deflections are told from d₀, so that a short slip
 * far out on the spring keeps its digits.
 *
 * d − d₀ = ḋ₀ S + Σ A_j S_j + Σ harmonics, with the chain S, S_j of `chain.ts` and A_j τ^j/j! the polynomial part of
 * (F + W − mÿ + f − K d₀)/m. A harmonic H e^{iΩτ} answers with P e^{iΩτ}, P = H/(ω₀² − Ω² + 2iσΩ), less the free motion
 * that P starts with; where iΩ is within 5 % of the root λ = −σ + iω_d that difference cancels and is written as
 * τ e^{λτ} (e^{(iΩ−λ)τ} − 1)/((iΩ−λ)τ), which stays exact at resonance. While every rate times τ is ≤ 1 all of it is
 * one power series instead (`start-series.ts`): so a slip that starts with v = a = 0 has v ~ t² to full relative accuracy.
 */
export class Oscillation {
  /** d, ḋ, d̈, d⃛ and d⁗ at the last `evaluate`. */
  position = 0;
  velocity = 0;
  acceleration = 0;
  jerk = 0;
  snap = 0;
  /** v_r and its first two derivatives at the last `evaluateSlip`. */
  slip = 0;
  slipRate = 0;
  slipSecond = 0;
  /** What rounding may have done to `velocity` (or `slip`): ulps of the sum of its terms' magnitudes, m/s. */
  noise = 0;

  /** The τ at which `evaluate` and `evaluateSlip` were last asked: asking again costs nothing. */
  private at = NaN;
  private slipAt = NaN;
  /** K/m = ω₀². */
  squared = 0;
  private sigma = 0;
  private start = 0;
  private startVelocity = 0;
  private inputs!: Inputs;
  private readonly series = new StartSeries();
  readonly chain = new Chain();
  /** A_j, so that the polynomial part is Σ A_j τ^j/j!, m/s². */
  private readonly push = new Float64Array(4);
  /** True where only A₀ acts, so that of the chain's integrals one is enough. */
  private isPushSteady = true;
  private readonly steady: SteadyAnswer;
  /** True where the sum of modes applies: underdamped and far from critical, constant push, no harmonic next to resonance. */
  private isSwing = false;
  /** The free motion, and A₀/ω₀², about which it swings. */
  private readonly free = new FreeMode();
  private settled = 0;
  /** Size of the free motion at its start and at the last `evaluate`. */
  private startSwing = 0;
  private swing = 0;
  /** Up to this τ the power series is used. */
  private seriesReach = Infinity;
  private readonly answer = new ResonantAnswer();

  /** @param room the most harmonics there can be, the ripple of N included */
  constructor(
    room: number,
    private readonly carrier: Carrier,
    private readonly beltVelocity: number,
  ) {
    this.steady = new SteadyAnswer(room);
  }

  /** Starts a slip from a stance at the inputs' origin; `slide` = s r μk. */
  begin(
    inputs: Inputs,
    body: { inertia: number; stiffness: number; viscous: number },
    slide: number,
    stance: Stance,
  ): void {
    const { inertia } = body;
    this.inputs = inputs;
    this.sigma = body.viscous / (2 * inertia);
    this.squared = body.stiffness / inertia;
    this.chain.set(this.sigma, this.squared);
    this.answer.set(this.sigma, this.chain.damped);
    this.start = stance.position;
    this.startVelocity = stance.velocity;
    const { push } = this;
    const { force, acceleration: base } = inputs;
    push[0] = (force[0] - slide * inputs.normal) / inertia - base[0] - this.squared * stance.position;
    push[1] = force[1] / inertia - base[1];
    push[2] = 2 * (force[2] / inertia - base[2]);
    push[3] = 6 * (force[3] / inertia - base[3]);
    this.isPushSteady = push[1] === 0 && push[2] === 0 && push[3] === 0;
    this.takeHarmonics(inputs, inertia, slide);
    const isOnBase = this.carrier === "base";
    const fastest = Math.max(2 * this.sigma, Math.sqrt(this.squared), inputs.fastest());
    this.seriesReach = fastest > 0 ? 1 / fastest : Infinity;
    this.series.begin(inputs, body, slide, stance, isOnBase, this.seriesReach);
    this.at = NaN;
    this.slipAt = NaN;
    if (!Number.isNaN(stance.acceleration)) push[0] += this.knownAcceleration(stance) - this.startAcceleration();
    this.isSwing = this.isPushSteady && !this.steady.hasResonance && this.chain.damped > 0.3 * this.chain.fast;
    if (this.isSwing) this.takeSwing();
  }

  /** From d(0) = 0 and ḋ(0), told from d₀. */
  private takeSwing(): void {
    this.settled = this.push[0] / this.squared;
    this.free.set(this.sigma, this.chain.damped);
    this.free.begin(-this.settled - this.steady.position, this.startVelocity - this.steady.velocity);
    this.startSwing = this.free.size;
  }

  /** d̈ at the start, from v̇_r known exactly. */
  private knownAcceleration(stance: Stance): number {
    if (this.carrier === "base") return stance.acceleration;
    return stance.acceleration - this.inputs.evaluate(0).baseAcceleration;
  }

  private startAcceleration(): number {
    let sum = this.push[0];
    for (let i = 0; i < this.steady.count; i++) sum += this.steady.forcingRe[i];
    return sum - 2 * this.sigma * this.startVelocity;
  }

  evaluate(tau: number): void {
    if (tau === this.at && tau !== this.slipAt) return; // after evaluateSlip the noise is that of v_r
    this.at = tau;
    this.slipAt = NaN;
    this.swing = this.startSwing;
    if (tau > this.seriesReach) {
      if (this.isSwing && this.chain.fast * tau > 1) return this.evaluateSwing(tau);
      return this.evaluateClosed(tau);
    }
    const { series } = this;
    series.evaluate(tau);
    this.position = this.start + series.position;
    this.velocity = series.velocity;
    this.acceleration = series.acceleration;
    this.jerk = series.jerk;
    this.snap = series.snap;
    this.noise = series.noise;
  }

  /** d, ḋ, d̈ and v_r for those who only read: the series in fewer derivatives, the modes wherever they cancel by two digits at most. */
  read(tau: number): void {
    if (tau === this.slipAt) return;
    if (this.isSwing && this.chain.fast * tau > 0.1) return this.readSwing(tau);
    if (tau > this.seriesReach) return this.evaluateSlip(tau);
    const { series } = this;
    this.at = this.slipAt = NaN;
    series.read(tau);
    this.position = this.start + series.position;
    this.velocity = series.velocity;
    this.acceleration = series.acceleration;
    this.slip = series.slip;
  }

  private readSwing(tau: number): void {
    this.at = this.slipAt = NaN;
    this.evaluateSwing(tau);
    this.slip = this.velocity;
    if (this.carrier !== "base") this.slip += this.inputs.evaluate(tau).baseVelocity - this.beltVelocity;
  }

  /** As `evaluate`, and v_r with its derivatives. */
  evaluateSlip(tau: number): void {
    if (tau === this.slipAt) return;
    this.evaluate(tau);
    this.slipAt = tau;
    if (this.carrier === "base") {
      this.slip = this.velocity;
      this.slipRate = this.acceleration;
      this.slipSecond = this.jerk;
    } else if (tau <= this.seriesReach) {
      this.series.evaluateSlip(tau);
      this.slip = this.series.slip;
      this.slipRate = this.series.slipRate;
      this.slipSecond = this.series.slipSecond;
      this.noise = this.series.noise;
    } else if (this.inputs.isBaseStill) {
      this.slip = this.velocity - this.beltVelocity;
      this.slipRate = this.acceleration;
      this.slipSecond = this.jerk;
      this.noise += 4 * unitRoundoff * Math.abs(this.beltVelocity);
    } else {
      const v = this.inputs.evaluate(tau);
      const apart = v.baseVelocity - this.beltVelocity;
      this.slip = this.velocity + apart;
      this.slipRate = this.acceleration + v.baseAcceleration;
      this.slipSecond = this.jerk + v.baseJerk;
      // of a steady base ẏ is known exactly: a body that settles to run along with it is not stopped by rounding
      const size = this.inputs.isBaseSteady()
        ? Math.abs(apart)
        : Math.abs(v.baseVelocity) + Math.abs(this.beltVelocity);
      this.noise += 4 * unitRoundoff * size;
    }
  }

  /**
   * Bound of |d⁗| on [τ, τ + reach]: of a sum of modes their magnitudes, which never grow; else from the energy of the
   * twice differentiated equation (see `first-zero.ts`).
   */
  snapBound(reach: number): number {
    if (this.isSwing) return this.steady.snap + this.squared * this.squared * this.swing;
    return (
      Math.sqrt(this.snap * this.snap + this.squared * this.jerk * this.jerk) +
      reach * (Math.abs(this.push[3]) + this.steady.forcingThird)
    );
  }

  /** Bound of |d⃛| on [τ, τ + reach], likewise. */
  jerkBound(reach: number): number {
    if (this.isSwing) return this.steady.jerk + this.squared * this.chain.fast * this.swing;
    const now = this.jerk * this.jerk + this.squared * this.acceleration * this.acceleration;
    return Math.sqrt(now) + reach * (Math.abs(this.push[2]) + this.steady.forcingSecond);
  }

  private takeHarmonics(inputs: Inputs, inertia: number, slide: number): void {
    this.steady.begin(this.sigma, this.squared, this.chain.damped);
    for (let i = 0; i < inputs.count; i++) {
      const w = inputs.omega[i];
      const re = inputs.forceRe[i] / inertia + w * w * inputs.baseRe[i];
      const im = inputs.forceIm[i] / inertia + w * w * inputs.baseIm[i];
      this.steady.add(w, re, im);
    }
    if (inputs.rippleOmega > 0) {
      const share = -slide / inertia;
      this.steady.add(inputs.rippleOmega, share * inputs.rippleRe, share * inputs.rippleIm);
    }
  }

  /** d₀ + A₀/ω₀² + Re(Z e^{λτ}) + Σ Re(P e^{iΩτ}): what `evaluateClosed` comes to where nothing in it cancels. */
  private evaluateSwing(tau: number): void {
    const { inputs, free, steady } = this;
    free.tau = tau;
    free.look();
    let position = this.settled + free.position;
    let { velocity, acceleration, jerk, snap } = free;
    inputs.turn(tau);
    for (let i = 0; i < steady.count; i++) {
      const w = steady.omega[i];
      const w2 = w * w;
      const value = steady.re[i] * inputs.cosine[i] - steady.im[i] * inputs.sine[i];
      const rate = -w * (steady.re[i] * inputs.sine[i] + steady.im[i] * inputs.cosine[i]);
      position += value;
      velocity += rate;
      acceleration -= w2 * value;
      jerk -= w2 * rate;
      snap += w2 * w2 * value;
    }
    this.position = this.start + position;
    this.velocity = velocity;
    this.acceleration = acceleration;
    this.jerk = jerk;
    this.snap = snap;
    this.swing = free.size;
    this.noise = 8 * unitRoundoff * (free.speed + this.steady.speed + Math.abs(velocity));
  }

  private evaluateClosed(tau: number): void {
    const { chain, push, sigma, squared, steady } = this;
    chain.evaluate(tau, this.isPushSteady ? 1 : 4);
    const { rate, impulse, integrals } = chain;
    const once = integrals[0];
    const free = this.startVelocity - this.steady.velocity;
    const fromRest = rate + 2 * sigma * impulse;
    const push0 = push[0] + this.steady.position * squared;
    let position = free * impulse - this.steady.position * fromRest;
    let velocity = free * rate + push0 * impulse;
    // by derivative, not from the equation: a free motion that has died away must not leave the forces' rounding behind
    let acceleration = push0 * rate - free * (2 * sigma * rate + squared * impulse);
    if (this.isPushSteady) position += push[0] * once;
    else {
      position += push[0] * once + push[1] * integrals[1] + push[2] * integrals[2] + push[3] * integrals[3];
      velocity += push[1] * once + push[2] * integrals[1] + push[3] * integrals[2];
      acceleration += push[1] * impulse + push[2] * once + push[3] * integrals[1];
    }
    let forcingRate = push[1] + tau * (push[2] + (tau * push[3]) / 2);
    let forcingSecond = push[2] + tau * push[3];
    this.inputs.turn(tau);
    for (let i = 0; i < steady.count; i++) {
      const w = steady.omega[i];
      const c = this.inputs.cosine[i];
      const s = this.inputs.sine[i];
      const value = steady.forcingRe[i] * c - steady.forcingIm[i] * s;
      forcingRate -= w * (steady.forcingRe[i] * s + steady.forcingIm[i] * c);
      forcingSecond -= w * w * value;
      if (steady.isResonant[i]) {
        const { answer } = this;
        answer.evaluate(steady.forcingRe[i], steady.forcingIm[i], w, tau, c, s);
        position += answer.position;
        velocity += answer.velocity;
        acceleration += value - 2 * sigma * answer.velocity - squared * answer.position;
      } else {
        position += steady.re[i] * c - steady.im[i] * s;
        velocity -= w * (steady.re[i] * s + steady.im[i] * c);
        acceleration -= w * w * (steady.re[i] * c - steady.im[i] * s);
      }
    }
    this.position = this.start + position;
    this.velocity = velocity;
    this.acceleration = acceleration;
    this.jerk = forcingRate - 2 * sigma * this.acceleration - squared * velocity;
    this.snap = forcingSecond - 2 * sigma * this.jerk - squared * this.acceleration;
    this.noise =
      8 *
      unitRoundoff *
      (Math.abs(free * rate) +
        Math.abs(push[0] * impulse) +
        // the integrals' own cancellation: they come from the equation, divided by ω₀²
        Math.min(tau * tau, 1 / squared) * (Math.abs(push[1]) + tau * (Math.abs(push[2]) + tau * Math.abs(push[3]))) +
        this.steady.speed +
        Math.abs(this.steady.position * squared * impulse) +
        Math.abs(velocity));
  }
}
