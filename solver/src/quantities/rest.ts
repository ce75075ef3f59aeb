import type { Motion } from "../motion/motion.ts";
import { isConstantFrom } from "./drive.ts";

/**
 * When the body stands still for good, s; null where it does not, where that could not be settled, and for a body that
 * never moved under inputs that go on changing. It stands for good from its last stop on, or from where the last input
 * became constant if that is later (a move that ends under a stuck body): 0 where it never moved and nothing ever changed.
 */
export function restTimeOf(motion: Motion): number | null {
  const last = motion.count - 1;
  if (motion.nextBreakAway !== Infinity || motion.phase(last) !== 0) return null;
  if (!isConstantFrom(motion.problem, motion.end)) return lastStop(motion);
  let i = last;
  while (i > 0 && motion.phase(i - 1) === 0 && isConstantFrom(motion.problem, motion.from(i - 1))) i--;
  return motion.from(i);
}

function lastStop({ events }: Motion): number | null {
  return events.filter(({ kind }) => kind === "stop").pop()?.t ?? null;
}
