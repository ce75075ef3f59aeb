import type { Choice, Field, KindFault, Rows } from "../field.ts";

/** A cos(2π hz (t − origin) + phase); amplitude in the term's unit, phase in rad. */
export interface Harmonic {
  readonly amplitude: number;
  readonly hz: number;
  readonly phase: number;
  readonly origin: number;
}

/**
 * A term as the run needs it: between corners a polynomial of degree ≤ 3 plus harmonics. Right-hand values at corners.
 * Pure functions of t, so that any instant of a run can be looked at again without history.
 */
export interface CompiledTerm {
  /** The first corner after t (t itself excluded), Infinity where none is left. */
  nextCorner(t: number): number;
  /** Adds the term's polynomial about t, valid from t to the next corner, to `into[j] += c_j` of Σ c_j τ^j (τ = time − t; length 4). */
  addPolynomial(t: number, into: Float64Array): void;
  /** Harmonics acting from t to the next corner (the same array object as long as they are the same). */
  harmonics(t: number): readonly Harmonic[];
  /** True from t on where the term will never change again (a constant, a ramp that has ended, a move that is over). */
  isConstantFrom(t: number): boolean;
  /** Hz of a steady harmonic input, else null: what the steady window, "per cycle" quantities and `at: drive` read. */
  readonly hz: number | null;
  /** What kind of input it is when a run is judged (`domain.md` §5). */
  readonly nature: "constant" | "ramp" | "harmonic" | "transient";
  /** Rate of a ramp that never stops, per second; else 0. */
  readonly endlessRate: number;
  /**
   * Travels of a moving base, for settle time and lost motion: start, end and signed distance, in time order. Of many (a
   * staircase, a record) only those a run is judged by: the first in each direction and the last. A ramp without an end
   * travels to Infinity.
   */
  readonly travels: readonly Travel[];
  /** Not a sum of polynomials and harmonics (chirp): only the adaptive method applies, and reads this. */
  readonly smooth?: SmoothPart;
  /** True where the term gives ÿ, not y or F (acceleration record). */
  readonly isAcceleration: boolean;
}

/**
 * A smooth function that acts from `from` to `to` (corners of its term), zero outside. `value` and `rate` go on past both
 * ends, so that a step that ends there reads the left-hand value.
 */
export interface SmoothPart {
  readonly from: number;
  readonly to: number;
  value(t: number): number;
  /** d value/dt. */
  rate(t: number): number;
  /** d² value/dt². */
  second(t: number): number;
  /** A bound of the n-th derivative, n from 0 to 3. */
  bound(n: number): number;
  /** The highest frequency met, Hz: bounds the step. */
  readonly fastestHz: number;
}

/** The points of a record, by position; times strictly rising, at least two. */
export interface RecordPoints {
  readonly times: ArrayLike<number>;
  readonly values: ArrayLike<number>;
}

export interface Travel {
  readonly from: number;
  readonly to: number;
  readonly distance: number;
}

/** An excitation kind describes itself once; a new kind is one file with one of these and one line in `index.ts`. */
export interface ExcitationTerm<Kind extends string = string, Values = unknown> {
  /** The `kind` of saved scenarios: never renamed, never reused. */
  readonly kind: Kind;
  readonly label: string;
  readonly summary: string;
  readonly places: readonly ("force" | "base")[];
  /** Bodies it has a place on; absent: both. */
  readonly motions?: readonly ("linear" | "angular")[];
  /** Whole sentences by place, without the full stop; `{key}` marks a value edited in place. */
  readonly sentence: { readonly force?: string; readonly base?: string };
  /** `displacement` and `force` dimensions follow the place: write "force" for a member that is F or y alike. */
  readonly fields: readonly Field[];
  /** Members with a fixed list of words (shape, spacing). */
  readonly choices?: readonly Choice[];
  /** Records only: `times` and `values`, one column each, inline or stored. */
  readonly rows?: Rows;
  readonly source: string;
  /** Faults that no single field's bounds can tell; a member faulty in itself reads NaN, so rules about it stay silent. */
  faults(term: Values): readonly KindFault[];
  /** `points` are the arrays of a record term, inline or stored; absent for all others. */
  compile(term: Values, points?: RecordPoints): CompiledTerm;
}
