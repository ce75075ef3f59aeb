import type { Problem } from "../../scenario/problem.ts";

const turn = 2 * Math.PI;

/** The inputs of a plain problem (see `plain-stepper.ts`) in one: F + W = steady + Re(F̂ e^{iΩt}), y = start + feed t + Re(Ŷ e^{iΩt}). */
export class PlainInputs {
  hz = 0;
  omega = 0;
  /** F + W without the harmonic. */
  steadyForce = 0;
  /** Rate of y without the harmonic. */
  feed = 0;
  /** The instant to turn to, s: a field, so that turning allocates nothing. */
  t = 0;
  /** F̂, Ŷ and y at the instant last turned to. */
  forceRe = 0;
  forceIm = 0;
  baseRe = 0;
  baseIm = 0;
  base = 0;

  private start = 0;
  /** Re F̂, Im F̂, Re Ŷ, Im Ŷ at t = 0. */
  private readonly amplitudes = new Float64Array(4);
  private turnedTo = NaN;

  /** Null where a problem's inputs have corners or curves, or more than one frequency. */
  static of(problem: Problem): PlainInputs | null {
    const inputs = new PlainInputs();
    const force = new Float64Array(4);
    const base = new Float64Array(4);
    for (let place = 0; place < 2; place++) {
      for (const term of place === 0 ? problem.force : problem.base) {
        if (term.nextCorner(0) !== Infinity || term.isAcceleration || term.smooth !== undefined) return null;
        term.addPolynomial(0, place === 0 ? force : base);
        for (const { amplitude, hz, phase, origin } of term.harmonics(0)) {
          if (inputs.hz !== 0 && inputs.hz !== hz) return null;
          inputs.hz = hz;
          inputs.amplitudes[2 * place] += amplitude * Math.cos(phase - turn * hz * origin);
          inputs.amplitudes[2 * place + 1] += amplitude * Math.sin(phase - turn * hz * origin);
        }
      }
    }
    if (force[1] !== 0 || force[2] !== 0 || force[3] !== 0 || base[2] !== 0 || base[3] !== 0) return null;
    inputs.omega = turn * inputs.hz;
    inputs.steadyForce = problem.weight + force[0];
    inputs.start = base[0];
    inputs.feed = base[1];
    return inputs;
  }

  /** Turns the amplitudes to `t`; whole turns are taken out before the multiplication by 2π. */
  turn(): void {
    const { t, amplitudes } = this;
    if (t === this.turnedTo) return;
    this.turnedTo = t;
    if (this.omega > 0) {
      const turns = this.hz * t;
      const angle = turn * (turns - Math.round(turns));
      const c = Math.cos(angle);
      const s = Math.sin(angle);
      this.forceRe = amplitudes[0] * c - amplitudes[1] * s;
      this.forceIm = amplitudes[0] * s + amplitudes[1] * c;
      this.baseRe = amplitudes[2] * c - amplitudes[3] * s;
      this.baseIm = amplitudes[2] * s + amplitudes[3] * c;
    }
    this.base = this.start + this.feed * t + this.baseRe;
  }
}
