import type { Inputs } from "../inputs.ts";
import type { Carrier } from "../carried.ts";
import { Chain } from "./chain.ts";
import { StartSeries } from "./start-series.ts";
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

  /** The fastest and slowest rate of the free motion, 1/s, and the time after which its fast part has died away. */
  fast = 0;
  slow = 0;
  fastDies = Infinity;

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
  private readonly chain = new Chain();
  /** A_j, so that the polynomial part is Σ A_j τ^j/j!, m/s². */
  private readonly push = new Float64Array(4);
  /** True where only A₀ acts, so that of the chain's integrals one is enough. */
  private isPushSteady = true;
  private count = 0;
  private readonly omega: Float64Array;
  private readonly re: Float64Array;
  private readonly im: Float64Array;
  /** P of each harmonic; 0 for the resonant ones. */
  private readonly particularRe: Float64Array;
  private readonly particularIm: Float64Array;
  private readonly isResonant: Uint8Array;
  private sumRe = 0;
  private sumRate = 0;
  private magnitude = 0;
  /** Up to this τ the power series is used. */
  private seriesReach = Infinity;
  /** ∂³ and ∂² bounds of the harmonic forcing per m. */
  private secondForcing = 0;
  private thirdForcing = 0;
  private readonly response = { position: 0, velocity: 0 };
  private readonly phi = { re: 0, im: 0 };

  /** @param room the most harmonics there can be, the ripple of N included */
  constructor(
    room: number,
    private readonly carrier: Carrier,
    private readonly beltVelocity: number,
  ) {
    this.omega = new Float64Array(room);
    this.re = new Float64Array(room);
    this.im = new Float64Array(room);
    this.particularRe = new Float64Array(room);
    this.particularIm = new Float64Array(room);
    this.isResonant = new Uint8Array(room);
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
    this.takeRates();
    this.at = NaN;
    this.slipAt = NaN;
    if (!Number.isNaN(stance.acceleration)) push[0] += this.knownAcceleration(stance) - this.startAcceleration();
  }

  /** d̈ at the start, from v̇_r known exactly. */
  private knownAcceleration(stance: Stance): number {
    if (this.carrier === "base") return stance.acceleration;
    return stance.acceleration - this.inputs.evaluate(0).baseAcceleration;
  }

  private startAcceleration(): number {
    let sum = this.push[0];
    for (let i = 0; i < this.count; i++) sum += this.re[i];
    return sum - 2 * this.sigma * this.startVelocity;
  }

  private takeRates(): void {
    const q = this.chain.discriminant;
    this.fast = q <= 0 ? Math.sqrt(this.squared) : this.sigma + Math.sqrt(q);
    this.slow = q <= 0 ? 0 : this.squared / this.fast;
    this.fastDies = q > 0 ? 40 / this.fast : this.sigma > 0 ? 40 / this.sigma : Infinity;
  }

  evaluate(tau: number): void {
    if (tau === this.at && tau !== this.slipAt) return; // after evaluateSlip the noise is that of v_r
    this.at = tau;
    this.slipAt = NaN;
    if (tau > this.seriesReach) return this.evaluateClosed(tau);
    const { series } = this;
    series.evaluate(tau);
    this.position = this.start + series.position;
    this.velocity = series.velocity;
    this.acceleration = series.acceleration;
    this.jerk = series.jerk;
    this.snap = series.snap;
    this.noise = series.noise;
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

  /** Bound of |d⁗| on [τ, τ + reach], from the energy of the twice differentiated equation (see `first-zero.ts`). */
  snapBound(reach: number): number {
    return Math.sqrt(this.snap * this.snap + this.squared * this.jerk * this.jerk) + reach * this.thirdForcing;
  }

  /** Bound of |d⃛| on [τ, τ + reach], likewise. */
  jerkBound(reach: number): number {
    const now = this.jerk * this.jerk + this.squared * this.acceleration * this.acceleration;
    return Math.sqrt(now) + reach * this.secondForcing;
  }

  private takeHarmonics(inputs: Inputs, inertia: number, slide: number): void {
    this.count = 0;
    this.sumRe = this.sumRate = this.magnitude = 0;
    this.secondForcing = Math.abs(this.push[2]);
    this.thirdForcing = Math.abs(this.push[3]);
    for (let i = 0; i < inputs.count; i++) {
      const w = inputs.omega[i];
      const re = inputs.forceRe[i] / inertia + w * w * inputs.baseRe[i];
      const im = inputs.forceIm[i] / inertia + w * w * inputs.baseIm[i];
      this.addHarmonic(w, re, im);
    }
    if (inputs.rippleOmega > 0) {
      const share = -slide / inertia;
      this.addHarmonic(inputs.rippleOmega, share * inputs.rippleRe, share * inputs.rippleIm);
    }
  }

  private addHarmonic(omega: number, re: number, im: number): void {
    const i = this.count++;
    this.omega[i] = omega;
    this.re[i] = re;
    this.im[i] = im;
    const amplitude = Math.sqrt(re * re + im * im);
    this.secondForcing += amplitude * omega * omega;
    this.thirdForcing += amplitude * omega * omega * omega;
    const { sigma, squared } = this;
    const { damped } = this.chain;
    this.isResonant[i] = damped > 0 && sigma * sigma + (omega - damped) ** 2 < 0.0025 * squared ? 1 : 0;
    if (this.isResonant[i]) {
      this.particularRe[i] = this.particularIm[i] = 0;
      this.magnitude += amplitude / damped;
      return;
    }
    const natural = Math.sqrt(squared);
    const zRe = (natural - omega) * (natural + omega);
    const zIm = 2 * sigma * omega;
    const z2 = zRe * zRe + zIm * zIm;
    const pRe = (re * zRe + im * zIm) / z2;
    const pIm = (im * zRe - re * zIm) / z2;
    this.particularRe[i] = pRe;
    this.particularIm[i] = pIm;
    this.sumRe += pRe;
    this.sumRate -= omega * pIm;
    this.magnitude += Math.sqrt(pRe * pRe + pIm * pIm) * omega;
  }

  private evaluateClosed(tau: number): void {
    const { chain, push, sigma, squared } = this;
    chain.evaluate(tau, this.isPushSteady ? 1 : 4);
    const { rate, impulse, integrals } = chain;
    const steady = integrals[0];
    const free = this.startVelocity - this.sumRate;
    const fromRest = rate + 2 * sigma * impulse;
    const push0 = push[0] + this.sumRe * squared;
    let position = free * impulse - this.sumRe * fromRest;
    let velocity = free * rate + push0 * impulse;
    // by derivative, not from the equation: a free motion that has died away must not leave the forces' rounding behind
    let acceleration = push0 * rate - free * (2 * sigma * rate + squared * impulse);
    if (this.isPushSteady) position += push[0] * steady;
    else {
      position += push[0] * steady + push[1] * integrals[1] + push[2] * integrals[2] + push[3] * integrals[3];
      velocity += push[1] * steady + push[2] * integrals[1] + push[3] * integrals[2];
      acceleration += push[1] * impulse + push[2] * steady + push[3] * integrals[1];
    }
    let forcingRate = push[1] + tau * (push[2] + (tau * push[3]) / 2);
    let forcingSecond = push[2] + tau * push[3];
    for (let i = 0; i < this.count; i++) {
      const w = this.omega[i];
      const c = Math.cos(w * tau);
      const s = Math.sin(w * tau);
      const value = this.re[i] * c - this.im[i] * s;
      forcingRate -= w * (this.re[i] * s + this.im[i] * c);
      forcingSecond -= w * w * value;
      if (this.isResonant[i]) {
        this.respondResonant(i, tau, c, s);
        position += this.response.position;
        velocity += this.response.velocity;
        acceleration += value - 2 * sigma * this.response.velocity - squared * this.response.position;
      } else {
        position += this.particularRe[i] * c - this.particularIm[i] * s;
        velocity -= w * (this.particularRe[i] * s + this.particularIm[i] * c);
        acceleration -= w * w * (this.particularRe[i] * c - this.particularIm[i] * s);
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
        this.magnitude +
        Math.abs(this.sumRe * squared * impulse) +
        Math.abs(velocity));
  }

  /** The response from rest to a harmonic next to resonance: Im-free form of exp[λ, λ̄, iΩ]τ, see the class comment. */
  private respondResonant(i: number, tau: number, c: number, s: number): void {
    const w = this.omega[i];
    const { damped } = this.chain;
    const decay = Math.exp(-this.sigma * tau);
    const lc = decay * Math.cos(damped * tau);
    const ls = decay * Math.sin(damped * tau);
    // near = τ e^{λτ} φ₁(δτ) = (e^{iΩτ} − e^{λτ})/δ, δ = iΩ − λ
    const difference = w - damped;
    const distance = this.sigma * this.sigma + difference * difference;
    let nearRe: number;
    let nearIm: number;
    if (distance * tau * tau < 1) {
      phi1(this.sigma * tau, difference * tau, this.phi);
      nearRe = tau * (lc * this.phi.re - ls * this.phi.im);
      nearIm = tau * (lc * this.phi.im + ls * this.phi.re);
    } else {
      nearRe = ((c - lc) * this.sigma + (s - ls) * difference) / distance;
      nearIm = ((s - ls) * this.sigma - (c - lc) * difference) / distance;
    }
    // far = (e^{iΩτ} − e^{λ̄τ})/(iΩ − λ̄)
    const sum = w + damped;
    const size = this.sigma * this.sigma + sum * sum;
    const farRe = ((c - lc) * this.sigma + (s + ls) * sum) / size;
    const farIm = ((s + ls) * this.sigma - (c - lc) * sum) / size;
    // Both obey D' = iΩ D + e^{bτ}; G = (near − far)/(2i ω_d).
    const gRe = (nearIm - farIm) / (2 * damped);
    const gIm = -(nearRe - farRe) / (2 * damped);
    const rateRe = -w * gIm + ls / damped;
    const rateIm = w * gRe;
    this.response.position = this.re[i] * gRe - this.im[i] * gIm;
    this.response.velocity = this.re[i] * rateRe - this.im[i] * rateIm;
  }
}

/** φ₁(z) = (e^z − 1)/z for z = x + iy with |z| < 1, by its series. */
function phi1(x: number, y: number, out: { re: number; im: number }): void {
  let re = 1;
  let im = 0;
  for (let n = 22; n >= 1; n--) {
    const r = re;
    re = 1 + (x * r - y * im) / (n + 1);
    im = (x * im + y * r) / (n + 1);
  }
  out.re = re;
  out.im = im;
}
