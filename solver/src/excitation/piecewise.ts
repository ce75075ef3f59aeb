import type { CompiledTerm } from "./excitation-term.ts";

/** c0 + c1 s + c2 s² with s = time − anchor, in force from `from` until the next stretch begins. */
export interface Stretch {
  readonly from: number;
  readonly anchor: number;
  readonly c0: number;
  readonly c1: number;
  readonly c2: number;
}

export const level = (from: number, value: number): Stretch => ({ from, anchor: 0, c0: value, c1: 0, c2: 0 });

export const line = (from: number, anchor: number, value: number, rate: number): Stretch => ({
  from,
  anchor,
  c0: value,
  c1: rate,
  c2: 0,
});

/** A piecewise polynomial of few stretches in time order, the first from −Infinity; at a corner the new one applies. */
export function piecewise(
  stretches: readonly Stretch[],
): Pick<CompiledTerm, "nextCorner" | "addPolynomial" | "isConstantFrom"> {
  const constantFrom = whereConstant(stretches);
  return {
    nextCorner: (t) => {
      for (const { from } of stretches) if (from > t) return from;
      return Infinity;
    },
    addPolynomial: (t, into) => {
      let i = stretches.length - 1;
      while (i > 0 && t < stretches[i].from) i--;
      addParabola(stretches[i], t - stretches[i].anchor, into);
    },
    isConstantFrom: (t) => t >= constantFrom,
  };
}

/** Adds c0 + c1 (s + τ) + c2 (s + τ)² as a polynomial in τ. */
export function addParabola({ c0, c1, c2 }: Stretch, s: number, into: Float64Array): void {
  into[0] += c0 + s * (c1 + s * c2);
  into[1] += c1 + 2 * c2 * s;
  into[2] += c2;
}

/** The instant after which the value never changes again; Infinity where the last stretch still moves. */
function whereConstant(stretches: readonly Stretch[]): number {
  const isFlat = ({ c1, c2 }: Stretch) => c1 === 0 && c2 === 0;
  let i = stretches.length - 1;
  if (!isFlat(stretches[i])) return Infinity;
  while (i > 0 && isFlat(stretches[i - 1]) && stretches[i - 1].c0 === stretches[i].c0) i--;
  return stretches[i].from;
}
