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

export type Solid =
  | { model: "none" }
  | { model: "equivalent-viscous"; lossFactor: number; at: "natural" | "drive" | { hz: number } }
  | { model: "displacement-proportional"; lossFactor: number };

export type Law =
  | { model: "none" }
  | { model: "coulomb"; static: number; kinetic: number }
  | { model: "stribeck"; static: number; kinetic: number; velocity: number; exponent: number; fluid: number }
  | { model: "table"; points: [number, number][] }
  | {
      model: "bristle";
      static: number;
      kinetic: number;
      velocity: number;
      stiffness: number;
      damping: number;
      fluid: number;
    };

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

export type Term =
  | { kind: "constant"; value: number }
  | { kind: "ramp"; rate: number; start: number; stop: number | "none" }
  | { kind: "step"; value: number; start: number }
  | { kind: "harmonic"; amplitude: number; hz: number; phase: number }
  | { kind: "unbalance"; mass: number; eccentricity: number; hz: number; phase: number }
  | {
      kind: "pulse";
      shape: "half-sine" | "rectangle" | "triangle";
      peak: number;
      start: number;
      duration: number;
    }
  | {
      kind: "chirp";
      amplitude: number;
      fromHz: number;
      toHz: number;
      seconds: number;
      spacing: "linear" | "log";
    }
  | { kind: "move"; distance: number; speed: number; acceleration: number; start: number }
  | {
      kind: "staircase";
      increment: number;
      count: number;
      dwell: number;
      speed: number;
      acceleration: number;
      start: number;
    }
  | RecordTerm<"record">
  | RecordTerm<"acceleration-record">;

/** Points carried inline, or named by the SHA-256 of the little-endian Float64 times, then values. */
export type RecordTerm<Kind extends string> =
  | { kind: Kind; times: number[]; values: number[] }
  | { kind: Kind; digest: string; points: number };

export type TermKind = Term["kind"];

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
