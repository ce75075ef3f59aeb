/** `restband-result/1` and its parts. Signs and units are those of the scenario format. */

/** Why a run ended. */
export type Ended = "rest" | "time" | "max-events" | "max-work" | "cancelled";

/** How a run is judged; the first that applies in the order of `outcome.ts`. */
export type Outcome =
  | "never-moved"
  | "came-to-rest"
  | "too-short"
  | "growing"
  | "stick-slip"
  | "settles"
  | "not-settled"
  | "smooth-sliding";

/** `break-away`: stick → slip. `stop`: slip → stick. `turn`: the slip reverses without sticking. */
export type EventKind = "start" | "break-away" | "stop" | "turn" | "end";

/** Slip back (−1), stick (0), slip forward (+1): the sign of the sliding velocity v_r. */
export type Phase = -1 | 0 | 1;

/** x in m (rad), v = ẋ, f the contact force on the body; right-hand values where one jumps. */
export interface MotionEvent {
  t: number;
  kind: EventKind;
  x: number;
  v: number;
  f: number;
}

export interface Note {
  code: "contact-lost" | "steady-state-depends-on-start" | "next-break-away" | "solid-steady-only" | "one-sided-limit";
  message: string;
  t?: number;
}

/** `kept` null: cannot be judged, which is not kept; `reason` then says why. */
export interface LimitVerdict {
  quantity: string;
  min?: number;
  max?: number;
  value: number | null;
  kept: boolean | null;
  margin: number | null;
  reason?: string;
}

export interface Samples {
  t: Float64Array;
  x: Float64Array;
  v: Float64Array;
  a: Float64Array;
  f: Float64Array;
  /** −1, 0 or +1 each. */
  phase: Float64Array;
}

export interface Energy {
  workForce: number;
  workBase: number;
  workWeight: number;
  workCounterface: number;
  heatContact: number;
  heatViscous: number;
  heatSolid: number;
  changeKinetic: number;
  changeStored: number;
  /** work − heat − change; not forced to zero: the run's own check. */
  residual: number;
}

export interface Result {
  format: "restband-result/1";
  method: "exact" | "adaptive";
  solverVersion: string;
  ended: Ended;
  outcome: Outcome | null;
  notes: Note[];
  events: MotionEvent[];
  limits: LimitVerdict[];
  /** By the names of `quantities/index.ts`; null where a quantity has no meaning. */
  quantities: Record<string, number | null>;
  /** Absent where not asked for. */
  energy?: Energy;
  samples: Samples | null;
  /** Values at the times asked for, in the order asked; present only when asked. */
  at?: Samples;
}
