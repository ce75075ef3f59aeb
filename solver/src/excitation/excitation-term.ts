import type { Field } from "../field.ts";

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
  /** Travels of a moving base, for settle time and lost motion: start, end and signed distance of each, in time order. */
  readonly travels: readonly Travel[];
  /** Not a sum of polynomials and harmonics (chirp): only the adaptive method applies, and reads these. */
  readonly smooth?: { value(t: number): number; rate(t: number): number; fastestHz: number };
  /** True where the term gives ÿ, not y or F (acceleration record). */
  readonly isAcceleration: boolean;
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
  /** Sentences by place; `{key}` marks a value edited in place. */
  readonly sentence: { readonly force?: string; readonly base?: string };
  /** `displacement` and `force` dimensions follow the place: write "force" for a member that is F or y alike. */
  readonly fields: readonly Field[];
  /** Members with a fixed list of words (shape, spacing). */
  readonly choices?: readonly { key: string; label: string; options: readonly { value: string; label: string }[] }[];
  /** True for records: `times` and `values`, inline or stored. */
  readonly isRecord?: boolean;
  readonly source: string;
  /** Faults across members; paths relative to the term. */
  faults(term: Values): readonly { path: string; message: string }[];
  /** `points` are the arrays of a record term, inline or stored; absent for all others. */
  compile(term: Values, points?: { times: ArrayLike<number>; values: ArrayLike<number> }): CompiledTerm;
}
