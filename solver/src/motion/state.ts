import type { Phase } from "../result.ts";

/**
 * All there is to know at one instant of a run. SI; with an acceleration record x, v, a are those of d, and y and ẏ
 * read 0. One object is filled again and again: copy what must last.
 */
export interface State {
  t: number;
  /** Sign of v_r; 0 while stuck. */
  phase: Phase;
  x: number;
  /** ẋ; exactly the counterface's velocity while stuck. */
  v: number;
  /** ẍ. */
  a: number;
  /** d = x − y, and ḋ. */
  d: number;
  stretchRate: number;
  /** Sliding velocity v_r = ẋ − u̇; exactly 0 while stuck. */
  slip: number;
  /** Contact force on the body. */
  f: number;
  /** Solid damping S. */
  solid: number;
  /** F, without the weight. */
  force: number;
  /** y, ẏ, ÿ. */
  base: number;
  baseVelocity: number;
  baseAcceleration: number;
  /** u̇. */
  counterfaceVelocity: number;
  /** N. */
  normal: number;
}

export function emptyState(): State {
  return {
    t: 0,
    phase: 0,
    x: 0,
    v: 0,
    a: 0,
    d: 0,
    stretchRate: 0,
    slip: 0,
    f: 0,
    solid: 0,
    force: 0,
    base: 0,
    baseVelocity: 0,
    baseAcceleration: 0,
    counterfaceVelocity: 0,
    normal: 0,
  };
}
