import { hasNoReidDamping, hasStraightSpring, isUnderdamped, slidesAtOneForce, swingsFreely } from "./conditions.ts";
import { freeSwings, type TurningPoint } from "./free-swings.ts";
import type { TextbookCase } from "./textbook-case.ts";
import type { Condition } from "./textbook-companion.ts";

const isFollowed: Condition = (kase) =>
  freeSwings(kase).length > 0 ? null : "It would take more than 10,000 half cycles to come to rest.";

/** Where the swings of a body left to itself can be counted to its rest. */
export const restsByFriction: readonly Condition[] = [
  swingsFreely,
  hasStraightSpring,
  slidesAtOneForce,
  isUnderdamped,
  hasNoReidDamping,
  isFollowed,
];

/** The last turning point of the recursion: the rest. */
export function restOf(kase: TextbookCase): TurningPoint {
  const points = freeSwings(kase);
  return points[points.length - 1];
}
