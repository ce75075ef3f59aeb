import type { Inputs } from "../inputs.ts";
import { copyStance, newStance, type Stance } from "../stance.ts";

const terms = 26;
/** Enough for d to d⁗ at τ = 0. */
const fewest = 6;
/**
 * The share of the series' reach up to which n coefficients suffice: from the sixth on (inputs have degree ≤ 3) each is at
 * most rate/n of the one before, and the fourth derivative brings n⁴. None but τ = 0 does with fewer than ten.
 */
const reaches = Float64Array.from({ length: terms }, (_, n) => {
  if (n < 10) return 0;
  let size = n ** 4;
  for (let k = 6; k <= n; k++) size /= k;
  return (2 ** -60 / size) ** (1 / (n - 5));
});
const unitRoundoff = 2 ** -53;

/**
 * A slip just after its start as power series in τ, good while every rate times τ is ≤ 1 (the last of 26 terms is then
 * below rounding). d − d₀ = Σ c_n τ^n comes from the equation itself; against ground or belt v_r has a series of its own,
 * from m ẍ = F + W + f − C ḋ − K d, so that v_r near 0 is no difference of ḋ and ẏ.
 */
export class StartSeries {
  position = 0;
  velocity = 0;
  acceleration = 0;
  jerk = 0;
  snap = 0;
  slip = 0;
  slipRate = 0;
  slipSecond = 0;
  noise = 0;

  private inputs!: Inputs;
  private inertia = 0;
  private sigma = 0;
  private squared = 0;
  private slide = 0;
  private isOnBase = true;
  private readonly stance = newStance();
  /** The τ up to which the series is good: one over the fastest rate. */
  private reach = Infinity;
  /** Coefficients of `stretch` worked out so far. */
  private made = 0;
  private readonly stretch = new Float64Array(terms);
  private readonly sliding = new Float64Array(terms);
  private turned = new Float64Array(0);
  /** Number of harmonics, the ripple of N the last of them. */
  private count = 0;

  /** Nothing is computed until it is asked for; the inputs must stay where they are until then. */
  begin(
    inputs: Inputs,
    body: { inertia: number; stiffness: number; viscous: number },
    slide: number,
    stance: Stance,
    isOnBase: boolean,
    reach: number,
  ): void {
    this.inputs = inputs;
    this.inertia = body.inertia;
    this.sigma = body.viscous / (2 * body.inertia);
    this.squared = body.stiffness / body.inertia;
    this.slide = slide;
    this.isOnBase = isOnBase;
    copyStance(stance, this.stance);
    this.reach = reach;
    this.made = 0;
  }

  evaluate(tau: number): void {
    const count = this.termsFor(tau);
    if (this.made < count) this.make(count);
    const { stretch } = this;
    // Horner's scheme for the value and its derivatives over their factorials together
    let p = 0;
    let v = 0;
    let a = 0;
    let j = 0;
    let s = 0;
    for (let n = count - 1; n >= 0; n--) {
      s = s * tau + j;
      j = j * tau + a;
      a = a * tau + v;
      v = v * tau + p;
      p = p * tau + stretch[n];
    }
    this.position = p;
    this.velocity = v;
    this.acceleration = 2 * a;
    this.jerk = 6 * j;
    this.snap = 24 * s;
    this.noise = this.noiseOf(v, stretch[1], stretch[2], tau);
  }

  evaluateSlip(tau: number): void {
    const count = this.termsFor(tau);
    if (this.made < count) this.make(count);
    const { sliding } = this;
    let v = 0;
    let a = 0;
    let j = 0;
    for (let n = count - 2; n >= 0; n--) {
      j = j * tau + a;
      a = a * tau + v;
      v = v * tau + sliding[n];
    }
    this.slip = v;
    this.slipRate = a;
    this.slipSecond = 2 * j;
    this.noise = this.noiseOf(v, sliding[0], sliding[1], tau);
  }

  /** d, ḋ, d̈ and v_r alone. */
  read(tau: number): void {
    const count = this.termsFor(tau);
    if (this.made < count) this.make(count);
    const { stretch, sliding } = this;
    let p = 0;
    let v = 0;
    let a = 0;
    for (let n = count - 1; n >= 0; n--) {
      a = a * tau + v;
      v = v * tau + p;
      p = p * tau + stretch[n];
    }
    this.position = p;
    this.velocity = v;
    this.acceleration = 2 * a;
    this.slip = this.velocity;
    if (this.isOnBase) return;
    let slip = 0;
    for (let n = count - 2; n >= 0; n--) slip = slip * tau + sliding[n];
    this.slip = slip;
  }

  /** A known start (at rest, acceleration exact) leaves only the rounding of what is there. */
  private noiseOf(value: number, first: number, second: number, tau: number): number {
    return 4 * unitRoundoff * (Math.abs(value) + Math.abs(first) + 2 * Math.abs(second * tau));
  }

  /** How many coefficients τ needs: the rest are below rounding in every derivative. */
  private termsFor(tau: number): number {
    const share = tau / this.reach;
    for (let n = fewest; n < terms; n++) if (share <= reaches[n]) return n;
    return terms;
  }

  /** Goes on from the coefficients there are to `count`. */
  private make(count: number): void {
    const { stretch, sliding, sigma, squared, stance, isOnBase } = this;
    const known = stance.acceleration / 2;
    if (this.made === 0) {
      this.startTurning();
      stretch[0] = 0;
      stretch[1] = stance.velocity;
      sliding[0] = stance.slip;
      this.made = 2;
    }
    for (let n = this.made - 2; n + 2 < count; n++) {
      const held = n === 0 ? stance.position : stretch[n];
      const pull = 2 * sigma * (n + 1) * stretch[n + 1] + squared * held;
      // beyond their degree polynomial inputs have nothing more to add
      const isForced = n < 4 || this.count > 0;
      let next = ((isForced ? this.forceAt(n) : 0) - pull) / ((n + 2) * (n + 1));
      const base = isForced ? this.baseAt(n + 2) : 0;
      if (isOnBase) next -= base;
      if (n === 0 && !Number.isNaN(known)) next = known;
      stretch[n + 2] = isOnBase ? next : next - base;
      sliding[n + 1] = (n + 2) * next;
      if (this.count > 0) this.turn(n);
    }
    this.made = count;
  }

  /** The harmonics' complex amplitudes (force per m; base), to be turned by iω/(n + 1) from one coefficient to the next. */
  private startTurning(): void {
    const { inputs, inertia } = this;
    this.count = inputs.count + (inputs.rippleOmega > 0 ? 1 : 0);
    if (this.turned.length < 4 * this.count) this.turned = new Float64Array(4 * this.count);
    const { turned } = this;
    for (let i = 0; i < inputs.count; i++) {
      turned[4 * i] = inputs.forceRe[i] / inertia;
      turned[4 * i + 1] = inputs.forceIm[i] / inertia;
      turned[4 * i + 2] = inputs.baseRe[i];
      turned[4 * i + 3] = inputs.baseIm[i];
    }
    if (this.count === inputs.count) return;
    const ripple = 4 * inputs.count;
    turned[ripple] = (-this.slide * inputs.rippleRe) / inertia;
    turned[ripple + 1] = (-this.slide * inputs.rippleIm) / inertia;
  }

  private turn(n: number): void {
    const { inputs, turned } = this;
    for (let i = 0; i < this.count; i++) {
      const step = (i < inputs.count ? inputs.omega[i] : inputs.rippleOmega) / (n + 1);
      for (let k = 4 * i; k < 4 * i + 4; k += 2) {
        const re = turned[k];
        turned[k] = -turned[k + 1] * step;
        turned[k + 1] = re * step;
      }
    }
  }

  /** Coefficient n of (F + W + f)/m; with an acceleration record that of (F + f)/m − ÿ. */
  private forceAt(n: number): number {
    const { inputs, inertia, turned } = this;
    let sum = 0;
    if (n < 4) sum = (inputs.force[n] - (n === 0 ? this.slide * inputs.normal : 0)) / inertia;
    for (let i = 0; i < this.count; i++) sum += turned[4 * i];
    return sum;
  }

  /** Coefficient n of y (n ≥ 2), by way of ÿ so that an acceleration record counts too. */
  private baseAt(n: number): number {
    const { inputs, turned } = this;
    if (n === 2) return inputs.evaluate(0).baseAcceleration / 2; // the very number a known start is told from
    let sum = n < 6 ? inputs.acceleration[n - 2] / (n * (n - 1)) : 0;
    for (let i = 0; i < inputs.count; i++) {
      const w = inputs.omega[i];
      sum -= (turned[4 * i + 2] * w * w) / (n * (n - 1));
    }
    return sum;
  }
}
