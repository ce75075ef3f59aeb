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
 * One number (or list, or choice) a kind asks for, described once: forms, sentences, validation and reports read it.
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
  /** True where the member may be absent and has no default (a ramp without an end). */
  readonly optional?: boolean;
  /** One short line under the field. */
  readonly help?: string;
}
