import type { CompiledTerm, Harmonic, SmoothPart } from "../excitation/excitation-term.ts";
import type { Problem } from "../scenario/problem.ts";

/** What acts at one instant; units of `Problem`. */
export interface InputValues {
  /** F + W, and its first two time derivatives. */
  force: number;
  forceRate: number;
  forceSecond: number;
  /** y … y⁗ of the base; all 0 in relative motion but for ÿ and what follows it. */
  base: number;
  baseVelocity: number;
  baseAcceleration: number;
  baseJerk: number;
  baseSnap: number;
  /** N, Ṅ, N̈ (0 while the contact is lost). */
  normal: number;
  normalRate: number;
  normalSecond: number;
}

/** Room for the harmonics of one term; none of today's kinds has more than one. */
const harmonicsPerTerm = 4;

/**
 * The inputs between two corners, laid out for closed forms: polynomials about `origin` and harmonics as complex
 * amplitudes at `origin` (value Re(A e^{iωτ}), τ = t − origin). `locate` moves the origin; everything is a pure function
 * of t, so that a run can be looked at again at any instant.
 */
export class Inputs {
  origin = 0;
  /** The first corner after the origin, Infinity where none is left; and the first of the terms, the ripple of N aside. */
  end = Infinity;
  corner = Infinity;
  /** Σ force[j] τ^j = F without harmonics, plus the weight W. */
  readonly force = new Float64Array(4);
  /** Σ base[j] τ^j = y without harmonics. */
  readonly base = new Float64Array(4);
  /** Σ acceleration[j] τ^j = ÿ without harmonics. */
  readonly acceleration = new Float64Array(4);
  /** Number of harmonics; each has a share in the force or the base. */
  count = 0;
  readonly omega: Float64Array;
  readonly forceRe: Float64Array;
  readonly forceIm: Float64Array;
  readonly baseRe: Float64Array;
  readonly baseIm: Float64Array;
  /** |A| and |Y| of each harmonic. */
  readonly forceSize: Float64Array;
  readonly baseSize: Float64Array;
  /** cos ωτ and sin ωτ of each harmonic at the last `turn`, those of the ripple of N after the last. */
  readonly cosine: Float64Array;
  readonly sine: Float64Array;
  readonly normal: number;
  /** True where nothing ever moves the base. */
  readonly isBaseStill: boolean;
  /** False while the ripple of N has let the contact go: N then reads 0. */
  isInContact = true;
  rippleOmega = 0;
  rippleRe = 0;
  rippleIm = 0;
  readonly values: InputValues = {
    force: 0,
    forceRate: 0,
    forceSecond: 0,
    base: 0,
    baseVelocity: 0,
    baseAcceleration: 0,
    baseJerk: 0,
    baseSnap: 0,
    normal: 0,
    normalRate: 0,
    normalSecond: 0,
  };

  private readonly problem: Problem;
  /** The τ that `values` are of, and `cosine` and `sine`. */
  private at = NaN;
  private turnedAt = NaN;
  /** True where no term ever changes but by swinging: one layout then serves all instants, the harmonics turned. */
  private readonly isTimeless: boolean;
  private isLaidOut = false;
  /** Where each harmonic comes from. */
  private readonly sources: Harmonic[] = [];
  /** Parts of the force that are neither polynomial nor harmonic, and those acting at the origin. */
  private readonly smooth: readonly SmoothPart[];
  private acting: readonly SmoothPart[] = [];
  private readonly rotated = { re: 0, im: 0 };
  private readonly before = new Float64Array(4);

  constructor(problem: Problem) {
    this.problem = problem;
    this.normal = problem.normal;
    this.isBaseStill = problem.base.length === 0;
    this.isTimeless = [...problem.force, ...problem.base].every(
      ({ nature }) => nature === "constant" || nature === "harmonic",
    );
    this.smooth = problem.force.flatMap((term) => (term.smooth === undefined ? [] : [term.smooth]));
    const room = harmonicsPerTerm * (problem.force.length + problem.base.length);
    this.omega = new Float64Array(room);
    this.forceRe = new Float64Array(room);
    this.forceIm = new Float64Array(room);
    this.baseRe = new Float64Array(room);
    this.baseIm = new Float64Array(room);
    this.forceSize = new Float64Array(room);
    this.baseSize = new Float64Array(room);
    this.cosine = new Float64Array(room + 1);
    this.sine = new Float64Array(room + 1);
  }

  /** Takes t as origin, with right-hand values where an input has a corner there. */
  locate(t: number): void {
    this.origin = t;
    this.at = NaN;
    this.turnedAt = NaN;
    if (!this.isTimeless || !this.isLaidOut) this.layOut(t);
    this.turnAmplitudes(t);
    this.end = this.problem.ripple === null ? this.corner : Math.min(this.corner, this.locateRipple(t));
  }

  private layOut(t: number): void {
    const { problem } = this;
    this.isLaidOut = true;
    // one by one: `fill` costs more than all the rest of a short layout
    for (let j = 0; j < 4; j++) this.force[j] = this.base[j] = this.acceleration[j] = 0;
    this.force[0] = problem.weight;
    this.count = 0;
    this.corner = Infinity;
    for (const term of problem.force) {
      term.addPolynomial(t, this.force);
      this.corner = Math.min(this.corner, term.nextCorner(t));
      this.addHarmonics(term, t, this.forceSize);
    }
    for (const term of problem.base) {
      this.addBase(term, t);
      this.corner = Math.min(this.corner, term.nextCorner(t));
      this.addHarmonics(term, t, this.baseSize);
    }
    if (!problem.isRelative) {
      this.acceleration[0] = 2 * this.base[2];
      this.acceleration[1] = 6 * this.base[3];
    }
    if (this.smooth.length > 0) this.acting = this.smooth.filter((part) => part.from <= t && t < part.to);
  }

  /** The complex amplitudes at t of the harmonics laid out. */
  private turnAmplitudes(t: number): void {
    for (let i = 0; i < this.count; i++) {
      rotate(this.sources[i], t, this.rotated);
      const isOfBase = this.baseSize[i] > 0;
      (isOfBase ? this.baseRe : this.forceRe)[i] = this.rotated.re;
      (isOfBase ? this.baseIm : this.forceIm)[i] = this.rotated.im;
    }
  }

  /** Adds a term's y (or ÿ); where terms cancel each other nothing is left of them, not their rounding: a base at rest rests. */
  private addBase(term: CompiledTerm, t: number): void {
    const { base, before } = this;
    if (term.isAcceleration) return term.addPolynomial(t, this.acceleration);
    for (let j = 1; j < 4; j++) before[j] = base[j];
    term.addPolynomial(t, base);
    for (let j = 1; j < 4; j++) if (Math.abs(base[j]) <= 2 ** -50 * Math.abs(before[j])) base[j] = 0;
  }

  /** Fills `values` at τ = t − origin. */
  evaluate(tau: number): InputValues {
    const { values: v, force: p, base: y, acceleration: a } = this;
    if (tau === this.at) return v;
    this.at = tau;
    v.force = p[0] + tau * (p[1] + tau * (p[2] + tau * p[3]));
    v.forceRate = p[1] + tau * (2 * p[2] + tau * 3 * p[3]);
    v.forceSecond = 2 * p[2] + tau * 6 * p[3];
    v.base = y[0] + tau * (y[1] + tau * (y[2] + tau * y[3]));
    v.baseVelocity = y[1] + tau * (2 * y[2] + tau * 3 * y[3]);
    v.baseAcceleration = a[0] + tau * (a[1] + tau * (a[2] + tau * a[3]));
    v.baseJerk = a[1] + tau * (2 * a[2] + tau * 3 * a[3]);
    v.baseSnap = 2 * a[2] + tau * 6 * a[3];
    v.normal = this.normal;
    v.normalRate = 0;
    v.normalSecond = 0;
    this.turn(tau);
    for (let i = 0; i < this.count; i++) this.addHarmonicValues(i);
    if (this.rippleOmega > 0) this.addRippleValues();
    for (const part of this.acting) {
      v.force += part.value(this.origin + tau);
      v.forceRate += part.rate(this.origin + tau);
      v.forceSecond += part.second(this.origin + tau);
    }
    return v;
  }

  /** Fills `cosine` and `sine` at τ = t − origin. */
  turn(tau: number): void {
    if (tau === this.turnedAt) return;
    this.turnedAt = tau;
    for (let i = 0; i < this.count; i++) this.turnOne(i, this.omega[i] * tau);
    if (this.rippleOmega > 0) this.turnOne(this.count, this.rippleOmega * tau);
  }

  private turnOne(i: number, angle: number): void {
    this.cosine[i] = Math.cos(angle);
    this.sine[i] = Math.sin(angle);
  }

  /** Σ |A| ω^n over the force harmonics (n ≤ 3 with a sweep): no n-th derivative of their sum is larger. */
  forceBound(power: number): number {
    let sum = 0;
    for (let i = 0; i < this.count; i++) sum += this.forceSize[i] * raised(this.omega[i], power);
    for (const part of this.acting) sum += part.bound(power);
    return sum;
  }

  /** Σ |Y| ω^n over the base harmonics. */
  baseBound(power: number): number {
    let sum = 0;
    for (let i = 0; i < this.count; i++) sum += this.baseSize[i] * raised(this.omega[i], power);
    return sum;
  }

  /** |A| ω^n of the ripple of N. */
  rippleBound(power: number): number {
    return this.problem.ripple === null ? 0 : Math.abs(this.problem.ripple.amplitude) * raised(this.rippleOmega, power);
  }

  /** True where ẏ is constant up to the next corner. */
  isBaseSteady(): boolean {
    return this.base[2] === 0 && this.base[3] === 0 && this.baseBound(1) === 0;
  }

  /** True where a sweep acts. */
  get hasSweep(): boolean {
    return this.acting.length > 0;
  }

  /** True where the polynomials or a sweep move the inputs on, so that nothing repeats itself. */
  isSwept(): boolean {
    for (let j = 1; j < 4; j++) {
      if (this.force[j] !== 0 || this.base[j] !== 0 || this.acceleration[j] !== 0) return true;
    }
    return this.hasSweep;
  }

  /** The fastest angular frequency acting, rad/s; 0 without harmonics. */
  fastest(): number {
    let fastest = this.rippleOmega;
    for (let i = 0; i < this.count; i++) fastest = Math.max(fastest, this.omega[i]);
    for (const part of this.acting) fastest = Math.max(fastest, 2 * Math.PI * part.fastestHz);
    return fastest;
  }

  private addHarmonics(term: CompiledTerm, t: number, size: Float64Array): void {
    const harmonics = term.harmonics(t);
    for (let n = 0; n < harmonics.length; n++) {
      const i = this.count++;
      this.omega[i] = 2 * Math.PI * harmonics[n].hz;
      this.forceRe[i] = this.forceIm[i] = this.baseRe[i] = this.baseIm[i] = 0;
      this.forceSize[i] = this.baseSize[i] = 0;
      this.sources[i] = harmonics[n];
      size[i] = Math.abs(harmonics[n].amplitude);
    }
  }

  /** The instant at which the ripple next lets the contact go or takes it up again; Infinity where it never does. */
  private locateRipple(t: number): number {
    const { ripple, model } = this.problem;
    if (ripple === null) return Infinity;
    rotate(ripple, t, this.rotated);
    this.rippleOmega = 2 * Math.PI * ripple.hz;
    this.rippleRe = this.rotated.re;
    this.rippleIm = this.rotated.im;
    const swing = Math.abs(ripple.amplitude);
    if (swing <= this.normal || model === "none") return Infinity;
    // N = normal + swing·cos θ is positive for |θ| < α
    const alpha = Math.acos(-this.normal / swing);
    const theta = Math.atan2(this.rippleIm, this.rippleRe);
    const atCorner = 1e-9;
    this.isInContact = theta > -alpha - atCorner && theta < alpha - atCorner;
    const next = this.isInContact ? alpha : 2 * Math.PI - alpha;
    return t + ((next - theta) % (2 * Math.PI)) / this.rippleOmega;
  }

  private addHarmonicValues(i: number): void {
    const v = this.values;
    const w = this.omega[i];
    const c = this.cosine[i];
    const s = this.sine[i];
    const w2 = w * w;
    const force = this.forceRe[i] * c - this.forceIm[i] * s;
    v.force += force;
    v.forceRate -= w * (this.forceRe[i] * s + this.forceIm[i] * c);
    v.forceSecond -= w2 * force;
    if (this.baseSize[i] === 0) return;
    const base = this.baseRe[i] * c - this.baseIm[i] * s;
    const quadrature = this.baseRe[i] * s + this.baseIm[i] * c;
    v.base += base;
    v.baseVelocity -= w * quadrature;
    v.baseAcceleration -= w2 * base;
    v.baseJerk += w2 * w * quadrature;
    v.baseSnap += w2 * w2 * base;
  }

  private addRippleValues(): void {
    const v = this.values;
    const w = this.rippleOmega;
    const c = this.cosine[this.count];
    const s = this.sine[this.count];
    const ripple = this.rippleRe * c - this.rippleIm * s;
    v.normal = Math.max(0, v.normal + ripple); // 0 to rounding where the contact is about to go
    v.normalRate -= w * (this.rippleRe * s + this.rippleIm * c);
    v.normalSecond -= w * w * ripple;
    if (!this.isInContact) v.normal = v.normalRate = v.normalSecond = 0;
  }
}

/** A e^{i(2π hz (t − origin) + phase)}; whole turns are taken out before the multiplication by 2π. */
function rotate(harmonic: Harmonic, t: number, out: { re: number; im: number }): void {
  const turns = harmonic.hz * (t - harmonic.origin);
  const angle = 2 * Math.PI * (turns - Math.round(turns)) + harmonic.phase;
  out.re = harmonic.amplitude * Math.cos(angle);
  out.im = harmonic.amplitude * Math.sin(angle);
}

function raised(base: number, power: number): number {
  let product = 1;
  for (let n = 0; n < power; n++) product *= base;
  return product;
}
