import type { Field } from "../field.ts";

/** Solid damping as the run needs it. */
export interface CompiledSolid {
  /** c_h of S = c_h ḋ, N·s/m (N·m·s/rad). */
  readonly viscous: number;
  /** ρ of S = ρ k |d| sgn(ḋ), no unit, < 1. */
  readonly proportional: number;
}

export interface SolidDamping<Model extends string = string, Values = unknown> {
  /** The `model` of saved scenarios: never renamed, never reused. */
  readonly model: Model;
  readonly label: string;
  readonly summary: string;
  readonly sentence: string;
  readonly fields: readonly Field[];
  readonly source: string;
  faults(solid: Values): readonly { path: string; message: string }[];
  /** `stiffness` k and `inertia` m of the body; `driveHz` the first harmonic among the forces, else among the base terms, null without one. */
  compile(solid: Values, body: { stiffness: number; inertia: number }, driveHz: number | null): CompiledSolid;
}
