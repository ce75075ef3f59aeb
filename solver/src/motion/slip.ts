import type { Work } from "../numerics/first-zero.ts";
import type { Inputs } from "./inputs.ts";
import type { Stance } from "./stance.ts";

/** What ends a segment: a corner of the inputs (or the limit of the step); v_r or the force that holds it; ḋ = 0; d = 0;
 * the contact's share used up; a corner of the friction law. */
export type Cause = "corner" | "contact" | "element" | "side" | "share" | "law";

/** The first thing that ends a slip, and when; one object is filled again and again. */
export interface Ending {
  tau: number;
  cause: Cause;
  /** True where v_r only touches 0 there. */
  isTouch: boolean;
}

/** What a slip must be watched for besides v_r = 0. */
export interface SlipWatches {
  /** d = 0 (displacement-proportional damping). */
  readonly side: boolean;
  /** ḋ = 0, where that is not v_r = 0 itself. */
  readonly element: boolean;
}

/** The body's values that a slip is told by. */
export interface BodyValues {
  readonly inertia: number;
  /** k, or k (1 ± ρ). */
  readonly stiffness: number;
  /** c + c_h. */
  readonly viscous: number;
  /** k3. */
  readonly cubic: number;
}

/**
 * A slip from a stance to whatever ends it. The exact method has a closed form for it, the adaptive one steps and dense
 * output; the rules of stick and slip are the same for both.
 */
export interface Slip {
  /** d, ḋ, d̈ and v_r at the last `evaluate`. */
  readonly position: number;
  readonly velocity: number;
  readonly acceleration: number;
  readonly slip: number;
  /** Sets up the slip that starts at the stance, the inputs being located there. */
  begin(inputs: Inputs, body: BodyValues, stance: Stance): void;
  /** Follows the slip up to τ = ending.tau, and makes that sooner if something ends it before. */
  follow(ending: Ending, watches: SlipWatches, blur: number, work: Work): void;
  evaluate(tau: number): void;
  /** As `evaluate`, for those who only read: right to rounding of what d and v_r are made of, not of what is left of them. */
  read(tau: number): void;
  /** A stretch from τ on over which nothing turns by more than about one radian, s. */
  panel(tau: number): number;
  /** True where the transient has died away at τ, so that with periodic inputs the slip repeats itself. */
  isSteady(tau: number): boolean;
}
