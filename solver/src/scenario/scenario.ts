import type { Term } from "../excitation/index.ts";
import type { Law } from "../friction/index.ts";
import type { Solid } from "../solid/index.ts";

export type { Term, TermKind } from "../excitation/index.ts";
export type { RecordTerm } from "../excitation/record-term.ts";
export type { Law } from "../friction/index.ts";
export type { Solid } from "../solid/index.ts";

/**
 * `restband-scenario/1` in its canonical form: every default written out. SI base units (m, kg, s, N, rad, N·m),
 * frequencies in Hz, incline and phases in degrees. Angular bodies read moment of inertia for mass, torque for force,
 * radians for metres.
 */
export interface Scenario {
  format: "restband-scenario/1";
  title: string;
  purpose: Purpose;
  motion: "linear" | "angular";
  body: Body;
  solid: Solid;
  contact: Contact;
  /** Degrees, linear bodies only; x points up the incline. */
  incline: number;
  /** Terms of the applied force, N (or N·m), summed. */
  force: Term[];
  /** Terms of the base's position y, m (or rad), summed; or one acceleration record. */
  base: Term[];
  initial: { displacement: number; velocity: number };
  span: { seconds: number; untilRest: boolean; maxEvents: number; maxWork: number };
  settleBand: number | null;
  limits: Limit[];
  origins: Record<string, Origin>;
}

export const purposes = ["feed", "positioning", "holding", "braking", "isolation", "test", "other"] as const;
export type Purpose = (typeof purposes)[number];

export interface Body {
  inertia: number;
  stiffness: number;
  cubic: number;
  viscous: number;
}

export type Counterface = "ground" | "base" | { velocity: number };

export interface Contact {
  law: Law;
  normal: {
    preload: number;
    faces: number;
    weight: boolean;
    ripple: { amplitude: number; hz: number; phase: number } | null;
  };
  /** Effective radius r in m, angular bodies only (1 for linear ones). */
  radius: number;
  counterface: Counterface;
}

export interface Limit {
  quantity: string;
  min?: number;
  max?: number;
}

export const originKinds = ["catalogue", "measured", "standard", "calculated", "assumed"] as const;
export interface Origin {
  kind: (typeof originKinds)[number];
  source?: string;
  /** As the person typed it, unit included. */
  entered?: string;
  low?: number;
  high?: number;
  distribution?: string;
  /** Digest of a fit. */
  measurement?: string;
}

/** A refusal: the path of a field, as `force[0].times[2]`, and a sentence a person can act on. */
export interface Fault {
  path: string;
  message: string;
}

/** The points of stored records, by digest (lower-case hex). */
export type Records = ReadonlyMap<string, { times: Float64Array; values: Float64Array }>;
