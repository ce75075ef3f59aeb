import type { Motion } from "../motion/motion.ts";

/** Share of the time from `from` to `to` that the body is stuck, 0…1; exactly 1 where it never slips in between. */
export function stuckShare(motion: Motion, from: number, to: number): number {
  if (!(to > from)) return motion.phase(motion.find(to)) === 0 ? 1 : 0;
  let stuck = 0;
  let slipping = 0;
  for (let i = motion.find(from); i < motion.count && motion.from(i) < to; i++) {
    const time = Math.min(to, motion.to(i)) - Math.max(from, motion.from(i));
    if (motion.phase(i) === 0) stuck += time;
    else slipping += time;
  }
  return stuck / (stuck + slipping);
}
