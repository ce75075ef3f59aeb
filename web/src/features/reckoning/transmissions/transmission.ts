import type { Motion } from "../../../format/unit.ts";
import type { Formula } from "../formula/formula.ts";

/**
 * What ties the motion of some members to that of the rest: its value is the ratio n, motion behind it per motion in front.
 * Stiffness and inertia behind it count n² times in front: the energies k x²/2 and m v²/2 are the same on both sides.
 */
export interface Transmission extends Formula {
  /** How things move on the side of the body, and behind it. */
  readonly front: Motion;
  readonly behind: Motion;
}
