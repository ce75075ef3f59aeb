import type { Field, KindFault, Rows } from "../field.ts";

/** A friction law as the run needs it. v is the speed of the faces, m/s, ≥ 0; coefficients have no unit. */
export interface CompiledLaw {
  /** μs: what friction can hold at rest is μs N. */
  readonly atRest: number;
  /** μ at v = 0+ (right after break-away). */
  readonly atOnset: number;
  /** μ while sliding where it is one constant and no fluid term acts, else null: only then the exact method applies. */
  readonly constant: number | null;
  /** μ(v) for v > 0. */
  coefficient(v: number): number;
  /** dμ/dv at v > 0, per m/s. */
  slope(v: number): number;
  /** b of the term b·v added to the friction force, N·s/m. */
  readonly fluid: number;
  /** True where μ(v) leaves rest with infinite slope, so that an integrator's error estimate cannot see it there. */
  readonly isSteepAtRest?: boolean;
  /** Speeds at which μ(v) is not smooth (nodes of a table): the adaptive method restarts there. */
  readonly corners: readonly number[];
  /** Laws with a deflection of their own (LuGre): present only there. */
  readonly bristle?: {
    readonly stiffness: number;
    readonly damping: number;
    readonly kinetic: number;
    readonly velocity: number;
  };
}

/**
 * A friction law describes itself once; forms, sentences, validation, reports and the laws' common tests read this.
 * A new law is one file with one of these and one line in `index.ts`.
 */
export interface FrictionLaw<Model extends string = string, Values = unknown> {
  /** The `model` of saved scenarios: never renamed, never reused. */
  readonly model: Model;
  readonly label: string;
  /** One quiet line beside the label. */
  readonly summary: string;
  /** Part of the contact sentence; `{key}` marks a value edited in place. */
  readonly sentence: string;
  readonly fields: readonly Field[];
  /** Laws given by measured points: `points`, rows of speed and coefficient. */
  readonly rows?: Rows;
  /** Published source of the law. */
  readonly source: string;
  /** Faults that no single field's bounds can tell (static below kinetic). A member faulty in itself reads NaN, so rules about it stay silent. */
  faults(law: Values): readonly KindFault[];
  compile(law: Values): CompiledLaw;
}
