import {
  hasNoReidDamping,
  hasStraightSpring,
  holdsMoreThanItSlides,
  isDamped,
  isFed,
  isUnderdamped,
  slidesAtOneForce,
} from "./conditions.ts";
import { feedSpeed, speedOf } from "./feed.ts";
import { slidingForce, type TextbookCase } from "./textbook-case.ts";
import type { Condition } from "./textbook-companion.ts";

/** What a lowest feed asks of a case, whatever its formula. */
export const hasCriticalFeed: readonly Condition[] = [
  isFed,
  hasStraightSpring,
  slidesAtOneForce,
  holdsMoreThanItSlides,
  isDamped,
  isUnderdamped,
  hasNoReidDamping,
];

/**
 * The speed above which a slip never regains the speed of the counterface, in units (F_s − F_k)/√(km), for 0 < ζ < 1 and a
 * damper beside the spring. About the sliding rest point the body leaves u = 1 − 2ζV at v = V (it breaks away where
 * k x + c V = F_s); v = e^(−ζt)(V cos st − B sin st), B = (ζV + u)/s, has its next maximum half a turn after its first
 * minimum. The speed is where that maximum equals V; found by halving to rounding.
 *
 * Source: derived here from the closed form of the slip.
 */
export function criticalSpeedRatio(ratio: number): number {
  let [low, high] = [0, 1 / Math.sqrt(4 * Math.PI * ratio)];
  for (let i = 0; i < 100; i++) {
    const middle = (low + high) / 2;
    if (regains(middle, ratio)) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

function regains(speed: number, ratio: number): boolean {
  const s = Math.sqrt(1 - ratio * ratio);
  const B = (ratio * speed + 1 - 2 * ratio * speed) / s;
  const trough = Math.atan2(ratio * speed + s * B, ratio * B - s * speed);
  const top = (trough + Math.PI) / s;
  return Math.exp(-ratio * top) * (speed * Math.cos(s * top) - B * Math.sin(s * top)) > speed;
}

/** ΔF/√(km), the unit of critical speeds, m/s (rad/s). */
export const jumpSpeed = (kase: TextbookCase): number =>
  (kase.staticForce - slidingForce(kase)) / Math.sqrt(kase.problem.stiffness * kase.problem.inertia);

/** What the run itself says about its own feed beside a critical one, as a sentence. */
export function feedBeside(kase: TextbookCase, critical: number): string | null {
  const { outcome } = kase.result;
  if (feedSpeed(kase.problem) === null || outcome === null) return null;
  const share = (speedOf(kase) / critical).toPrecision(3);
  const words = outcome === "stick-slip" ? "sticks and slips" : "does not stick and slip";
  return `This run is fed at ${share} of it and ${words}.`;
}
