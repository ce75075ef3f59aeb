import type { Scenario, Term } from "@restband/solver";
import { piecesOf, type Piece } from "./pieces.ts";

const GRAVITY = 9.80665;

/** Everything that acts on the body from outside, smooth between two corners. */
export interface Stretch {
  /** F, N. */
  readonly applied: (t: number) => number;
  /** −m ÿ under an acceleration record, else 0, N. */
  readonly shake: (t: number) => number;
  /** W, N. */
  readonly weight: number;
  /** Base: position and its first two derivatives. */
  readonly base: Path;
  /** Counterface: the same. */
  readonly face: Path;
}

/** A prescribed motion. */
export interface Path {
  readonly at: (t: number) => number;
  readonly rate: (t: number) => number;
  readonly bend: (t: number) => number;
}

export interface Inputs {
  /** Times in (0, ∞) at which an input changes its formula, rising. */
  readonly corners: readonly number[];
  /** The stretch that acts from t on. */
  readonly stretchFrom: (t: number) => Stretch;
  /** A change of the counterface's velocity above this is a jump, m/s (below it, rounding). */
  readonly jumpFloor: number;
  /** True where no input changes any more after t. */
  readonly isConstantAfter: (t: number) => boolean;
}

export function readInputs(scenario: Scenario): Inputs {
  const relative = scenario.base[0]?.kind === "acceleration-record";
  const force = scenario.force.map(piecesOf);
  const base = scenario.base.map(piecesOf);
  const corners = [...new Set([...force, ...base].flat().map((piece) => piece.from))]
    .filter((t) => t > 0 && t < Infinity)
    .sort((a, b) => a - b);
  const weight = weightOf(scenario);
  const { inertia } = scenario.body;
  return {
    corners,
    jumpFloor: 1e-9 * fastestOf(base),
    stretchFrom(t) {
      const shaking = pathOf(activeAt(base, t));
      const moving = relative ? still : shaking;
      return {
        applied: pathOf(activeAt(force, t)).at,
        shake: relative ? (at) => -inertia * shaking.at(at) : () => 0,
        weight,
        base: moving,
        face: faceOf(scenario, moving),
      };
    },
    isConstantAfter: (t) =>
      corners.every((corner) => corner <= t) && [...scenario.force, ...scenario.base].every(isQuietAtLast),
  };
}

/** All that pushes the body from outside: F + W, and −m ÿ under an acceleration record, N. */
export function forceOn({ applied, shake, weight }: Stretch, t: number): number {
  return applied(t) + shake(t) + weight;
}

/** W = −m g sin θ, N. */
function weightOf({ motion, body, incline }: Scenario): number {
  return motion === "linear" ? -body.inertia * GRAVITY * Math.sin((incline * Math.PI) / 180) : 0;
}

/** N(t) = max(0, faces × preload + weight share + ripple), N. */
export function readNormal({ motion, body, contact, incline }: Scenario): (t: number) => number {
  const { preload, faces, weight, ripple } = contact.normal;
  const share = weight && motion === "linear" ? body.inertia * GRAVITY * Math.cos((incline * Math.PI) / 180) : 0;
  const mean = faces * preload + share;
  if (!ripple) return () => Math.max(0, mean);
  const omega = 2 * Math.PI * ripple.hz;
  const phase = (ripple.phase * Math.PI) / 180;
  return (t) => Math.max(0, mean + ripple.amplitude * Math.cos(omega * t + phase));
}

/** The largest |ẏ| at the corners of the base's terms, m/s. */
function fastestOf(terms: Piece[][]): number {
  const starts = terms.flatMap((pieces) => pieces.filter((piece) => piece.from > -Infinity));
  return Math.max(0, ...starts.map((piece) => Math.abs(piece.rate(piece.from))));
}

const still: Path = { at: () => 0, rate: () => 0, bend: () => 0 };

function activeAt(terms: Piece[][], t: number): Piece[] {
  return terms.map((pieces) => pieces.filter((piece) => piece.from <= t).at(-1)!);
}

function pathOf(pieces: Piece[]): Path {
  if (pieces.length === 0) return still;
  if (pieces.length === 1) return { at: pieces[0].value, rate: pieces[0].rate, bend: pieces[0].bend };
  const sum = (read: (piece: Piece) => number) => pieces.reduce((total, piece) => total + read(piece), 0);
  return {
    at: (t) => sum((piece) => piece.value(t)),
    rate: (t) => sum((piece) => piece.rate(t)),
    bend: (t) => sum((piece) => piece.bend(t)),
  };
}

function faceOf({ contact }: Scenario, base: Path): Path {
  if (contact.counterface === "ground") return still;
  if (contact.counterface === "base") return base;
  const { velocity } = contact.counterface;
  return { at: (t) => velocity * t, rate: () => velocity, bend: () => 0 };
}

function isQuietAtLast(term: Term): boolean {
  if (term.kind === "ramp") return term.stop !== "none" || term.rate === 0;
  return term.kind !== "harmonic" && term.kind !== "unbalance";
}
