import type { CompiledTerm } from "./excitation-term.ts";
import { addParabola, type Stretch } from "./piecewise.ts";
import { stillTerm } from "./still-term.ts";

/** `count` equal moves, one every `dwell` from `start` on; distances in m (rad), speed and acceleration > 0. */
export interface Travelling {
  increment: number;
  count: number;
  dwell: number;
  speed: number;
  acceleration: number;
  start: number;
}

/** Time of one move of the given distance, s: trapezoidal, or triangular when it is too short to reach its speed. */
export function moveDuration(distance: number, speed: number, acceleration: number): number {
  const length = Math.abs(distance);
  const ramps = speed ** 2 / acceleration;
  return length > ramps ? speed / acceleration + length / speed : 2 * Math.sqrt(length / acceleration);
}

/** A stretch of one move, times from its begin; `arrived` where its polynomial is about the place it ends at. */
interface MovePart extends Stretch {
  readonly arrived: 0 | 1;
}

/**
 * The slowing half is told from where the move ends, so that it arrives there exactly, at exactly no speed: what a body
 * does after a move must not hang on rounding.
 */
function partsOfMove(distance: number, speed: number, acceleration: number): readonly MovePart[] {
  const duration = moveDuration(distance, speed, acceleration);
  const rising = Math.min(speed / acceleration, duration / 2);
  const bend = (Math.sign(distance) * acceleration) / 2;
  const begin = { from: 0, anchor: 0, c0: 0, c1: 0, c2: bend, arrived: 0 } as const;
  const cruise = {
    from: rising,
    anchor: rising,
    c0: bend * rising ** 2,
    c1: 2 * bend * rising,
    c2: 0,
    arrived: 0,
  } as const;
  const slow = { from: duration - rising, anchor: duration, c0: 0, c1: 0, c2: -bend, arrived: 1 } as const;
  const after = { from: duration, anchor: 0, c0: 0, c1: 0, c2: 0, arrived: 1 } as const;
  return rising < duration / 2 ? [begin, cruise, slow, after] : [begin, slow, after];
}

/** Equal moves of a base one after another, found by division: a million steps cost no more than one. */
export function travelProfile({ increment, count, dwell, speed, acceleration, start }: Travelling): CompiledTerm {
  if (increment === 0) return stillTerm;
  const parts = partsOfMove(increment, speed, acceleration);
  const duration = parts[parts.length - 1].from;
  const beginOf = (step: number) => start + step * dwell;
  /** The step under way at t, −1 before the first. Division may be off by one next to a corner: `beginOf` decides. */
  const stepAt = (t: number) => {
    let step = Math.max(-1, Math.min(count - 1, Math.floor((t - start) / dwell)));
    if (step + 1 < count && t >= beginOf(step + 1)) step++;
    else if (step >= 0 && t < beginOf(step)) step--;
    return step;
  };
  const travelOf = (step: number) => ({ from: beginOf(step), to: beginOf(step) + duration, distance: increment });
  return {
    ...stillTerm,
    nextCorner: (t) => {
      const step = stepAt(t);
      const next = step + 1 < count ? beginOf(step + 1) : Infinity;
      if (step < 0) return next;
      for (const { from } of parts) {
        const corner = beginOf(step) + from;
        if (corner > t) return Math.min(corner, next);
      }
      return next;
    },
    addPolynomial: (t, into) => {
      const step = stepAt(t);
      if (step < 0) return;
      const begin = beginOf(step);
      let i = parts.length - 1;
      while (i > 0 && t < begin + parts[i].from) i--;
      into[0] += (step + parts[i].arrived) * increment;
      // Anchors are absolute times as the corners are, so that the arrival is where the last corner says.
      addParabola(parts[i], t - (begin + parts[i].anchor), into);
    },
    isConstantFrom: (t) => t >= beginOf(count - 1) + duration,
    travels: count === 1 ? [travelOf(0)] : [travelOf(0), travelOf(count - 1)],
  };
}
