import type { CompiledTerm } from "../../../solver/src/excitation/excitation-term.ts";
import { termOf } from "../../../solver/src/excitation/index.ts";
import type { Term } from "@restband/solver";

export const compileTerm = (term: Term): CompiledTerm =>
  termOf(term.kind).compile(term, "times" in term ? term : undefined);

/** A term's value and speed at t + τ as read about t: polynomial, harmonics and smooth part, as a run adds them up. */
export function readAbout(term: CompiledTerm, t: number, tau = 0): { value: number; speed: number } {
  const c = new Float64Array(4);
  term.addPolynomial(t, c);
  let value = c[0] + tau * (c[1] + tau * (c[2] + tau * c[3]));
  let speed = c[1] + tau * (2 * c[2] + tau * 3 * c[3]);
  for (const { amplitude, hz, phase, origin } of term.harmonics(t)) {
    const angle = 2 * Math.PI * hz * (t + tau - origin) + phase;
    value += amplitude * Math.cos(angle);
    speed -= amplitude * 2 * Math.PI * hz * Math.sin(angle);
  }
  const smooth = term.smooth;
  if (smooth !== undefined && t >= smooth.from && t < smooth.to) {
    value += smooth.value(t + tau);
    speed += smooth.rate(t + tau);
  }
  return { value, speed };
}

/** The corners of a term in [from, to]. */
export function cornersOf(term: CompiledTerm, from: number, to: number): number[] {
  const corners: number[] = [];
  for (let t = term.nextCorner(from); t <= to; t = term.nextCorner(t)) corners.push(t);
  return corners;
}
