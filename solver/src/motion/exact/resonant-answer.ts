/**
 * The response from rest to H e^{iΩτ} where iΩ is next to the root λ = −σ + iω_d: what the harmonic's steady answer less the
 * free motion that it starts with comes to, written as a divided difference so that nothing cancels at resonance.
 *
 * G = exp[λ, λ̄, iΩ]τ = (near − far)/(2i ω_d) with near = (e^{iΩτ} − e^{λτ})/(iΩ − λ) = τ e^{λτ} φ₁((iΩ − λ)τ), and far the
 * same with λ̄. Both obey D′ = iΩ D + e^{bτ}.
 */
export class ResonantAnswer {
  /** Re(H G), and its rate. */
  position = 0;
  velocity = 0;
  private sigma = 0;
  private damped = 0;
  private readonly phi = { re: 0, im: 0 };

  set(sigma: number, damped: number): void {
    this.sigma = sigma;
    this.damped = damped;
  }

  /** @param c, s cos Ωτ and sin Ωτ */
  evaluate(re: number, im: number, omega: number, tau: number, c: number, s: number): void {
    const { sigma, damped } = this;
    const decay = Math.exp(-sigma * tau);
    const lc = decay * Math.cos(damped * tau);
    const ls = decay * Math.sin(damped * tau);
    const difference = omega - damped;
    const distance = sigma * sigma + difference * difference;
    let nearRe: number;
    let nearIm: number;
    if (distance * tau * tau < 1) {
      phi1(sigma * tau, difference * tau, this.phi);
      nearRe = tau * (lc * this.phi.re - ls * this.phi.im);
      nearIm = tau * (lc * this.phi.im + ls * this.phi.re);
    } else {
      nearRe = ((c - lc) * sigma + (s - ls) * difference) / distance;
      nearIm = ((s - ls) * sigma - (c - lc) * difference) / distance;
    }
    const sum = omega + damped;
    const size = sigma * sigma + sum * sum;
    const farRe = ((c - lc) * sigma + (s + ls) * sum) / size;
    const farIm = ((s + ls) * sigma - (c - lc) * sum) / size;
    const gRe = (nearIm - farIm) / (2 * damped);
    const gIm = -(nearRe - farRe) / (2 * damped);
    const rateRe = -omega * gIm + ls / damped;
    const rateIm = omega * gRe;
    this.position = re * gRe - im * gIm;
    this.velocity = re * rateRe - im * rateIm;
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
