import { equilibrium, slidingOffset, type TextbookCase } from "./textbook-case.ts";

/** A turning point: when, and how far from the friction-free equilibrium (signed), s and m (rad). */
export interface TurningPoint {
  readonly t: number;
  readonly offset: number;
}

/** Swings beyond this number are not followed: the formulas then say nothing about the rest. */
const mostSwings = 10_000;

/**
 * The turning points of a body left to itself with Coulomb friction and damping ζ < 1, its start (where it starts at rest)
 * first, its rest last. From each the body swings about the side's own centre ∓x_k: |u| → B|u| − (1 + B)x_k, B =
 * exp(−πζ/√(1−ζ²)), each half cycle lasting π/ω_d; it rests at the first turning point with |u| ≤ x_s.
 *
 * Source: exact between turning points, by the equation itself; textbook knowledge, from memory. Empty where it would take
 * more than 10,000 swings.
 */
export function freeSwings(kase: TextbookCase): readonly TurningPoint[] {
  const { omega, ratio, staticForce, problem } = kase;
  const own = Math.sqrt(1 - ratio * ratio);
  const half = Math.PI / (omega * own);
  const shrink = Math.exp((-Math.PI * ratio) / own);
  const held = (staticForce / problem.stiffness) * (1 + 1e-12);
  const centre = slidingOffset(kase);
  const points = [firstTurningPoint(kase)];
  for (let last = points[0]; Math.abs(last.offset) > held; points.push(last)) {
    if (points.length > mostSwings) return [];
    const side = Math.sign(last.offset) * centre;
    last = { t: last.t + half, offset: side - shrink * (last.offset - side) };
  }
  return points;
}

/** Where the velocity first is zero: at the start, or at the end of the arc a push begins. */
export function firstTurningPoint(kase: TextbookCase): TurningPoint {
  const { omega, ratio, problem } = kase;
  const { displacement, velocity } = problem.initial;
  const offset = displacement - equilibrium(kase);
  if (velocity === 0) return { t: 0, offset };
  const own = omega * Math.sqrt(1 - ratio * ratio);
  const side = -Math.sign(velocity) * slidingOffset(kase);
  const from = offset - side;
  // u = side + e^(−ζωt)(from cos + b sin), and u̇ = e^(−ζωt)(v cos − (ζωv + ω² from)/ω_d sin): its first zero
  const fall = (ratio * omega * velocity + omega * omega * from) / own;
  const angle = Math.atan2(Math.abs(velocity), Math.sign(velocity) * fall);
  const t = angle / own;
  const b = (velocity + ratio * omega * from) / own;
  return { t, offset: side + Math.exp(-ratio * omega * t) * (from * Math.cos(angle) + b * Math.sin(angle)) };
}

/** The turning points of a run: its start where it starts at rest, each turn and each stop. */
export function turningPointsOf(kase: TextbookCase): readonly TurningPoint[] {
  const centre = equilibrium(kase);
  return kase.result.events
    .filter(({ kind, v }) => kind === "turn" || kind === "stop" || (kind === "start" && v === 0))
    .map(({ t, x }) => ({ t, offset: x - centre }));
}

/**
 * How far short of its mirror image each swing of a run ends, m (rad): |u_i| − |u_(i+1)| where it crosses the equilibrium,
 * more where it does not.
 */
export function shortfalls(points: readonly TurningPoint[]): readonly number[] {
  return points.slice(1).map(({ offset }, i) => Math.sign(points[i].offset) * (points[i].offset + offset));
}

/**
 * Mean logarithmic decrement per cycle of a run's turning points, over all whole cycles above a millionth of the first;
 * null without one.
 */
export function decrementOf(points: readonly TurningPoint[]): { perCycle: number; cycles: number } | null {
  if (points.length < 3 || points[0].offset === 0) return null;
  const first = Math.abs(points[0].offset);
  const above = points.findIndex(({ offset }) => Math.abs(offset) < 1e-6 * first);
  const cycles = Math.floor(((above === -1 ? points.length : above) - 1) / 2);
  if (cycles < 1) return null;
  return { perCycle: Math.log(first / Math.abs(points[2 * cycles].offset)) / cycles, cycles };
}
