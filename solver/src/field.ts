/** What a number measures; `web/src/format` turns each into the units people read. `force` reads as torque on angular bodies, and so on. */
export type Dimension =
  | "none"
  | "inertia" // kg, or kg·m² (angular)
  | "stiffness" // N/m, or N·m/rad
  | "cubicStiffness" // N/m³, or N·m/rad³
  | "damping" // N·s/m, or N·m·s/rad
  | "displacement" // m, or rad
  | "velocity" // m/s, or rad/s
  | "acceleration" // m/s², or rad/s²
  | "force" // N, or N·m
  | "forceRate" // N/s, or N·m/s
  | "pressing" // N always: what presses the faces together
  | "length" // m always: radius, eccentricity
  | "mass" // kg always
  | "slidingVelocity" // m/s always: of the faces
  | "fluidDamping" // N·s/m always: of the faces
  | "bristleStiffness" // N/m always
  | "frequency" // Hz
  | "time" // s
  | "angle" // degrees, as the format stores phase and incline
  | "power" // W
  | "energy"; // J

/** Bounds of one number. `exclusive` bounds are not allowed themselves. All finite numbers are allowed where a bound is missing. */
export interface Bounds {
  readonly minimum?: number;
  readonly exclusiveMinimum?: number;
  readonly maximum?: number;
  readonly exclusiveMaximum?: number;
  readonly integer?: boolean;
}

/**
 * One number a kind asks for, described once: forms, sentences, validation and reports read it.
 * `key` lives in saved scenarios: never renamed, never reused.
 */
export interface Field extends Bounds {
  readonly key: string;
  /** As a form labels it: "Static friction". */
  readonly label: string;
  /** As the trade writes it: "μs". */
  readonly symbol?: string;
  readonly dimension: Dimension;
  /** Written by the canonical form where the member is left out; absent means the member must be given. */
  readonly default?: number;
  /** A value a new scenario starts from, in SI; not a recommendation. */
  readonly initial: number;
  /** The same for a term of the base where it differs: metres, not newtons. */
  readonly initialOnBase?: number;
  /** True where the member may be absent and has no default number (a ramp without an end): the canonical form writes "none". */
  readonly optional?: boolean;
  /** Follows the kind's sentence where an optional member is given: ", until {stop}". */
  readonly clause?: string;
  /** One short line under the field. */
  readonly help?: string;
}

/**
 * A member with a fixed list of words (shape, spacing). An option with a `field` is stored as `{ [field.key]: number }`
 * in place of its word: `"at": { "hz": 12 }`, `"counterface": { "velocity": 0.2 }`. The first option is the one to start from.
 */
export interface Choice {
  readonly key: string;
  readonly label: string;
  readonly options: readonly ChoiceOption[];
}

export interface ChoiceOption {
  readonly value: string;
  /** As a sentence or a menu says it. */
  readonly label: string;
  readonly field?: Field;
}

/** Rows of two numbers a kind asks for: the points of a friction table, the times and values of a record. */
export interface Rows {
  readonly columns: readonly [Field, Field];
  /** What a new scenario starts from. */
  readonly initial: readonly (readonly [number, number])[];
}

/** A fault of a kind's own rules; the path is relative to the kind: `static`, `times[2]`. */
export interface KindFault {
  readonly path: string;
  readonly message: string;
}
