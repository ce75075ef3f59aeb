/**
 * The impulse response S of ẍ + 2σẋ + ω₀²x = δ(t) and its integrals from 0, the only functions that closed forms of the
 * oscillator need for polynomial forcing: `rate` = Ṡ, `impulse` = S, and `integrals[j]` = the (j + 1)-fold integral of S.
 * The response from rest to τ^j/j! is integrals[j], its velocity integrals[j − 1] (S for j = 0).
 *
 * In terms of the roots λ of λ² + 2σλ + ω₀² = 0 they are divided differences of e^{zτ} (S = exp[λ₁, λ₂]τ, the integrals
 * add a node 0 each), and the evaluation avoids every cancellation of those:
 * - |λ|τ ≤ 1: power series (also where k = 0, c = 0, or both);
 * - √|q| τ ≤ 0.1 with q = σ² − ω₀² (near critical): e^{−στ} with series of cosh √q τ and sinh √q τ / √q;
 * - q < 0: sines; then integrals[j] from the equation itself, which is stable for ω₀τ > 1/2;
 * - q > 0: separate roots, λ₁ = −ω₀²/(σ + √q) without cancellation, and the φ-functions of exponential integrators.
 * Relative accuracy of each value about 1e-14 for στ up to 700; beyond that the transient has underflowed to 0.
 *
 * Source: φ-functions and their recurrence as in Hochbruck & Ostermann, Acta Numerica 19 (2010) 209 (from memory).
 */
export class Chain {
  rate = 1;
  impulse = 0;
  readonly integrals = new Float64Array(4);

  /** σ = C/2m, 1/s. */
  private sigma = 0;
  /** ω₀² = K/m, 1/s². */
  private squared = 0;
  private readonly phi1 = new Float64Array(5);
  private readonly phi2 = new Float64Array(5);

  /** ω₀, and ω_d (0 unless underdamped), 1/s. */
  private natural = 0;
  damped = 0;
  /** q = σ² − ω₀²; its sign tells over- from underdamped. */
  discriminant = 0;

  /** The fastest and slowest rate of the free motion, 1/s, and the time after which its fast part has died away, s. */
  fast = 0;
  slow = 0;
  fastDies = Infinity;

  set(sigma: number, squared: number): void {
    this.sigma = sigma;
    this.squared = squared;
    this.natural = Math.sqrt(squared);
    this.discriminant = (sigma - this.natural) * (sigma + this.natural);
    this.damped = Math.sqrt(Math.max(0, -this.discriminant));
    const q = this.discriminant;
    this.fast = q <= 0 ? this.natural : sigma + Math.sqrt(q);
    this.slow = q <= 0 ? 0 : squared / this.fast;
    this.fastDies = q > 0 ? 40 / this.fast : sigma > 0 ? 40 / sigma : Infinity;
  }

  /** @param depth how many of the integrals are asked for, at least 1; the others may be left as they were */
  evaluate(tau: number, depth = 4): void {
    const { sigma, natural, discriminant } = this;
    if (Math.max(2 * sigma, natural) * tau <= 1) return this.bySeries(tau);
    if (Math.abs(discriminant) * tau * tau <= 0.01) return this.nearCritical(tau);
    if (discriminant < 0) return this.underdamped(tau, depth);
    this.overdamped(tau);
  }

  private bySeries(tau: number): void {
    const { sigma, squared, integrals } = this;
    let before = 0; // coefficient n of S times τ^n
    let term = tau;
    let impulse = tau;
    let rate = 1;
    let i0 = tau / 2;
    let i1 = tau / 6;
    let i2 = tau / 24;
    let i3 = tau / 120;
    for (let n = 2; n < 24; n++) {
      const next = (-2 * sigma * tau * (n - 1) * term - squared * tau * tau * before) / (n * (n - 1));
      before = term;
      term = next;
      impulse += term;
      rate += (n * term) / tau;
      i0 += term / (n + 1);
      i1 += term / ((n + 1) * (n + 2));
      i2 += term / ((n + 1) * (n + 2) * (n + 3));
      i3 += term / ((n + 1) * (n + 2) * (n + 3) * (n + 4));
      if (Math.abs(term) + Math.abs(before) < 1e-19 * tau) break;
    }
    this.impulse = impulse;
    this.rate = tau === 0 ? 1 : rate;
    const t2 = tau * tau;
    integrals[0] = i0 * tau;
    integrals[1] = i1 * t2;
    integrals[2] = i2 * t2 * tau;
    integrals[3] = i3 * t2 * t2;
  }

  private nearCritical(tau: number): void {
    const z = this.discriminant * tau * tau;
    const decay = Math.exp(-this.sigma * tau);
    const cosh = 1 + (z / 2) * (1 + (z / 12) * (1 + (z / 30) * (1 + z / 56)));
    const sinh = 1 + (z / 6) * (1 + (z / 20) * (1 + (z / 42) * (1 + z / 72)));
    this.impulse = decay * tau * sinh;
    this.rate = decay * (cosh - this.sigma * tau * sinh);
    this.integrate(tau, 4);
  }

  private underdamped(tau: number, depth: number): void {
    const { damped, sigma } = this;
    const decay = sigma > 0 ? Math.exp(-sigma * tau) : 1;
    const sine = Math.sin(damped * tau) / damped;
    this.impulse = decay * sine;
    this.rate = decay * (Math.cos(damped * tau) - sigma * sine);
    this.integrate(tau, depth);
  }

  /** The integrals from the equation: its own (j + 1)-fold integral solved for the last term. */
  private integrate(tau: number, depth: number): void {
    const { sigma, squared, integrals } = this;
    integrals[0] = (1 - this.rate - 2 * sigma * this.impulse) / squared;
    if (depth === 1) return;
    integrals[1] = (tau - this.impulse - 2 * sigma * integrals[0]) / squared;
    integrals[2] = ((tau * tau) / 2 - integrals[0] - 2 * sigma * integrals[1]) / squared;
    integrals[3] = ((tau * tau * tau) / 6 - integrals[1] - 2 * sigma * integrals[2]) / squared;
  }

  private overdamped(tau: number): void {
    const root = Math.sqrt(this.discriminant);
    const fast = -(this.sigma + root);
    const slow = this.squared / fast;
    phi(slow * tau, this.phi1);
    phi(fast * tau, this.phi2);
    const scale = 1 / (slow - fast);
    this.impulse = (this.phi1[0] - this.phi2[0]) * scale;
    this.rate = (slow * this.phi1[0] - fast * this.phi2[0]) * scale;
    let power = tau;
    for (let j = 0; j < 4; j++) {
      this.integrals[j] = power * (this.phi1[j + 1] - this.phi2[j + 1]) * scale;
      power *= tau;
    }
  }
}

/** φ₀ … φ₄ at z ≤ 0: φ₀ = e^z, φ_{j+1} = (φ_j − 1/j!)/z; by its series for |z| < 1. */
function phi(z: number, out: Float64Array): void {
  out[0] = Math.exp(z);
  if (z > -1) {
    let last = 0;
    let term = 1 / 24;
    for (let n = 5; n < 26 && Math.abs(term) > 1e-20; n++) {
      last += term;
      term *= z / n;
    }
    out[4] = last;
    out[3] = 1 / 6 + z * out[4];
    out[2] = 1 / 2 + z * out[3];
    out[1] = 1 + z * out[2];
    return;
  }
  out[1] = Math.expm1(z) / z;
  out[2] = (out[1] - 1) / z;
  out[3] = (out[2] - 1 / 2) / z;
  out[4] = (out[3] - 1 / 6) / z;
}
