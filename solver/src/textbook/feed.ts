import type { MotionEvent, Result } from "../result.ts";
import type { Problem } from "../scenario/problem.ts";
import { slidingForce, type TextbookCase } from "./textbook-case.ts";

/**
 * V, the speed at which the base runs past the counterface, m/s (rad/s), > 0: a feed of the base over the ground, or a belt
 * under a spring that stands. Null where there is no such one speed, or a force changes besides.
 */
export function feedSpeed({ base, force, counterface, beltVelocity }: Problem): number | null {
  const isSteady = base.every(({ nature, endlessRate }) => nature === "constant" || endlessRate !== 0);
  if (counterface === "base" || !isSteady || !force.every((term) => term.isConstantFrom(0))) return null;
  const speed = Math.abs(base.reduce((sum, { endlessRate }) => sum + endlessRate, 0) - beltVelocity);
  return speed > 0 ? speed : null;
}

/** V where conditions have made sure of it. */
export const speedOf = ({ problem }: TextbookCase): number => feedSpeed(problem) ?? NaN;

/** The stick–slip cycle at constant V without damping. */
export interface StickSlipCycle {
  /** A = √(d² + V²/ω²) about the steady deflection, with d = (F_s − F_k)/k; m (rad). */
  readonly amplitude: number;
  /** (2/ω)(π − atan(dω/V)), s. */
  readonly slip: number;
  /** 2d/V, s. */
  readonly stick: number;
}

/** Derived here from the harmonic arc of the slip and the straight load-up of the stick; known from textbooks, from memory. */
export function stickSlipCycle(kase: TextbookCase): StickSlipCycle {
  const { staticForce, omega, problem } = kase;
  const jump = (staticForce - slidingForce(kase)) / problem.stiffness;
  const speed = speedOf(kase);
  return {
    amplitude: Math.hypot(jump, speed / omega),
    slip: (2 / omega) * (Math.PI - Math.atan((jump * omega) / speed)),
    stick: (2 * jump) / speed,
  };
}

/** Said of every formula of the cycle where the body is damped. */
export const dampingLeftOut = ({ damping, problem }: TextbookCase): string | null =>
  damping > 0 || problem.solid.proportional > 0 ? "The formula leaves damping out." : null;

/** Mean time from one kind of event to the next of another over the last ten, s; null without any. */
export function meanTime({ events }: Result, from: MotionEvent["kind"], to: MotionEvent["kind"]): number | null {
  const times: number[] = [];
  let begun: number | null = null;
  for (const { kind, t } of events) {
    if (begun !== null && kind === to) times.push(t - begun);
    if (kind === from) begun = t;
    else if (kind === to) begun = null;
  }
  const last = times.slice(-10);
  return last.length === 0 ? null : last.reduce((sum, time) => sum + time, 0) / last.length;
}
