/** The free swing of an underdamped body about where it would settle, Re(Z e^{λτ}) with λ = −σ + iω_d, and its derivatives. */
export class FreeMode {
  /** The τ to look at, s. */
  tau = 0;
  /** At the τ last looked at: the swing and its first four derivatives. */
  position = 0;
  velocity = 0;
  acceleration = 0;
  jerk = 0;
  snap = 0;
  /** |Z| e^{−στ} there (at the start before any look), which never grows, and |λ Z| e^{−στ} or a little more. */
  size = 0;
  speed = 0;

  private sigma = 0;
  private damped = 1;
  private re = 0;
  private im = 0;

  /** σ ≥ 0 and ω_d > 0, 1/s. */
  set(sigma: number, damped: number): void {
    this.sigma = sigma;
    this.damped = damped;
  }

  /** The swing that starts at this position with this velocity. */
  begin(position: number, velocity: number): void {
    const im = -(velocity + this.sigma * position) / this.damped;
    this.re = position;
    this.im = im;
    this.size = Math.sqrt(position * position + im * im);
  }

  /** At `tau`, a field like all the rest so that looking allocates nothing. */
  look(): void {
    const { sigma, damped, tau } = this;
    const decay = sigma > 0 ? Math.exp(-sigma * tau) : 1;
    const c = decay * Math.cos(damped * tau);
    const s = decay * Math.sin(damped * tau);
    const re = this.re * c - this.im * s;
    const im = this.re * s + this.im * c;
    // times λ, again and again
    const rateRe = -sigma * re - damped * im;
    const rateIm = damped * re - sigma * im;
    const secondRe = -sigma * rateRe - damped * rateIm;
    const secondIm = damped * rateRe - sigma * rateIm;
    const thirdRe = -sigma * secondRe - damped * secondIm;
    const thirdIm = damped * secondRe - sigma * secondIm;
    this.position = re;
    this.velocity = rateRe;
    this.acceleration = secondRe;
    this.jerk = thirdRe;
    this.snap = -sigma * thirdRe - damped * thirdIm;
    this.size = Math.sqrt(re * re + im * im);
    this.speed = Math.abs(rateRe) + Math.abs(rateIm);
  }
}
