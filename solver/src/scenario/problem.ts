import type { CompiledTerm, Harmonic } from "../excitation/excitation-term.ts";
import type { CompiledLaw } from "../friction/friction-law.ts";
import type { CompiledSolid } from "../solid/solid-damping.ts";
import type { Limit } from "./scenario.ts";

/** A checked scenario as plain numbers: all a run reads. SI; angles in rad. */
export interface Problem {
  readonly isLinear: boolean;
  /** m, kg or kg·m². */
  readonly inertia: number;
  /** k. */
  readonly stiffness: number;
  /** k3. */
  readonly cubic: number;
  /** c, without solid damping. */
  readonly viscous: number;
  readonly solid: CompiledSolid;
  readonly law: CompiledLaw;
  /** The law's name: `none` has no stops. */
  readonly model: string;
  /** N without ripple: faces × preload + weight share, ≥ 0. */
  readonly normal: number;
  /** Ripple of N, null without; its phase in rad, origin 0. */
  readonly ripple: Harmonic | null;
  /** r. */
  readonly radius: number;
  readonly counterface: "ground" | "base" | "belt";
  /** V of a belt, else 0. */
  readonly beltVelocity: number;
  /** W = −m g sin θ, N. */
  readonly weight: number;
  readonly force: readonly CompiledTerm[];
  readonly base: readonly CompiledTerm[];
  /** True with an acceleration record: x means d, and y and ẏ read 0. */
  readonly isRelative: boolean;
  readonly initial: { readonly displacement: number; readonly velocity: number };
  readonly seconds: number;
  readonly untilRest: boolean;
  readonly maxEvents: number;
  readonly maxWork: number;
  readonly settleBand: number | null;
  readonly limits: readonly Limit[];
}
