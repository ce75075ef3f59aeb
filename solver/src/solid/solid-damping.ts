import type { Choice, Field, KindFault } from "../field.ts";

/** Solid damping as the run needs it. */
export interface CompiledSolid {
  /** c_h of S = c_h ḋ, N·s/m (N·m·s/rad). */
  readonly viscous: number;
  /** ρ of S = ρ k |d| sgn(ḋ), no unit, < 1. */
  readonly proportional: number;
}

/** What a model of solid damping may read of the rest of the scenario. */
export interface SolidSurroundings {
  /** k of the body, N/m (N·m/rad). */
  readonly stiffness: number;
  /** m of the body, kg (kg·m²). */
  readonly inertia: number;
  /** The first harmonic or unbalance among the forces, else among the base terms, Hz; null without one. */
  readonly driveHz: number | null;
}

/** A model of solid damping describes itself once; a new model is one file with one of these and one line in `index.ts`. */
export interface SolidDamping<Model extends string = string, Values = unknown> {
  /** The `model` of saved scenarios: never renamed, never reused. */
  readonly model: Model;
  readonly label: string;
  /** One quiet line beside the label. */
  readonly summary: string;
  /** Part of the body's sentence, after "with"; `{key}` marks a value edited in place. */
  readonly sentence: string;
  readonly fields: readonly Field[];
  readonly choices?: readonly Choice[];
  /** Published source of the model. */
  readonly source: string;
  /** Faults that no single field's bounds can tell; a member faulty in itself reads NaN, so rules about it stay silent. */
  faults(solid: Values, surroundings: SolidSurroundings): readonly KindFault[];
  compile(solid: Values, surroundings: SolidSurroundings): CompiledSolid;
}
