/**
 * The body's steady answer to harmonic forcing: to H e^{iΩτ} (per unit of inertia) it is P e^{iΩτ} with
 * P = H/(ω₀² − Ω² + 2iσΩ). Where iΩ is within 5 % of the root −σ + iω_d, P is left 0: see `resonant-answer.ts`.
 */
export class SteadyAnswer {
  count = 0;
  readonly omega: Float64Array;
  /** H, and P. */
  readonly forcingRe: Float64Array;
  readonly forcingIm: Float64Array;
  readonly re: Float64Array;
  readonly im: Float64Array;
  readonly isResonant: Uint8Array;
  hasResonance = false;
  /** Σ Re P and Σ Re(iΩP): where the answer starts, and how fast. */
  position = 0;
  velocity = 0;
  /** Bounds of the answer's velocity (the resonant ones about so), of its third and fourth derivative. */
  speed = 0;
  jerk = 0;
  snap = 0;
  /** Bounds of the second and third derivative of the forcing. */
  forcingSecond = 0;
  forcingThird = 0;

  private sigma = 0;
  private squared = 0;
  private damped = 0;

  /** @param room the most harmonics there can be */
  constructor(room: number) {
    this.omega = new Float64Array(room);
    this.forcingRe = new Float64Array(room);
    this.forcingIm = new Float64Array(room);
    this.re = new Float64Array(room);
    this.im = new Float64Array(room);
    this.isResonant = new Uint8Array(room);
  }

  /** Takes a body's σ, ω₀² and ω_d, with no harmonic yet. */
  begin(sigma: number, squared: number, damped: number): void {
    this.sigma = sigma;
    this.squared = squared;
    this.damped = damped;
    this.count = 0;
    this.hasResonance = false;
    this.position = this.velocity = 0;
    this.speed = this.jerk = this.snap = this.forcingSecond = this.forcingThird = 0;
  }

  add(omega: number, re: number, im: number): void {
    const { sigma, squared, damped } = this;
    const i = this.count++;
    this.omega[i] = omega;
    this.forcingRe[i] = re;
    this.forcingIm[i] = im;
    const amplitude = Math.sqrt(re * re + im * im);
    this.forcingSecond += amplitude * omega * omega;
    this.forcingThird += amplitude * omega * omega * omega;
    this.isResonant[i] = damped > 0 && sigma * sigma + (omega - damped) ** 2 < 0.0025 * squared ? 1 : 0;
    if (this.isResonant[i]) {
      this.hasResonance = true;
      this.re[i] = this.im[i] = 0;
      this.speed += amplitude / damped;
      return;
    }
    const natural = Math.sqrt(squared);
    const zRe = (natural - omega) * (natural + omega);
    const zIm = 2 * sigma * omega;
    const z2 = zRe * zRe + zIm * zIm;
    const pRe = (re * zRe + im * zIm) / z2;
    const pIm = (im * zRe - re * zIm) / z2;
    this.re[i] = pRe;
    this.im[i] = pIm;
    this.position += pRe;
    this.velocity -= omega * pIm;
    const speed = Math.sqrt(pRe * pRe + pIm * pIm) * omega;
    this.speed += speed;
    this.jerk += speed * omega * omega;
    this.snap += speed * omega * omega * omega;
  }
}
