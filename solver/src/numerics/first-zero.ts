import { firstRoot, SafeStep } from "./safe-step.ts";

/**
 * A function whose first zero is looked for: smooth on the interval, with its first two derivatives at hand and a bound
 * of the third ahead. `evaluate(τ)` fills `value`, `first`, `second` and `noise` (what rounding may have done to `value`).
 */
export interface Watched {
  value: number;
  first: number;
  second: number;
  noise: number;
  /** Set by `firstZero`: the zero it found is one that w only touches from above. */
  isTouch: boolean;
  evaluate(tau: number): void;
  /** An upper bound of |w‴| on [τ, τ + reach], τ being where `evaluate` was last called. */
  thirdBound(reach: number): number;
}

/** Counts certificate steps against a cap; one object a run. */
export interface Work {
  spent: number;
  readonly allowed: number;
}

const ulp = 2 ** -52;

/**
 * The first τ in (from, end] at which w, positive just after `from`, reaches zero or touches it (to within its own rounding);
 * Infinity where there is none; NaN where the work ran out.
 *
 * No zero is missed: from a point with w ≥ 0 and |w‴| ≤ M ahead, w(τ + h) ≥ w + w'h + w''h²/2 − Mh³/6, so there is no
 * zero before the first positive root h of that cubic, and the search moves on by h (or to where the bound ends). Near a
 * simple zero this converges quadratically from the left by itself. To save steps a zero r ahead is guessed by Newton's
 * method; the same inequality looking back from r (w(r − h) ≥ −w'h + w''h²/2 − Mh³/6) rules out zeros in (r − h, r), and
 * r is proven the first when the two ruled-out stretches meet. "Proven" is up to rounding of w, w', w'' and M: no
 * outward-rounded interval arithmetic is done.
 *
 * A dip no deeper than its rounding is a touch, and is told at its bottom τ = r − w'/w'': there w' is 0 as exactly as it can
 * be told, whereas r itself is blurred by the square root of the rounding. What truly dips less than that is not told apart.
 *
 * Source: the remainder form of Taylor's theorem; for the scheme of certified marching compare R. E. Moore, Interval
 * Analysis (1966), ch. 7 (from memory).
 *
 * @param scale a time in which w changes appreciably (sets the first reach; the result does not depend on it)
 * @param blur rounding of the clock at `end`, s: a zero that falls on `end` to within it is found there, not lost
 */
export function firstZero(w: Watched, from: number, end: number, scale: number, work: Work, blur = 0): number {
  w.isTouch = false;
  if (!(end > from)) return Infinity;
  let tau = from;
  let reach = Math.min(scale, end - from);
  let guess = Infinity;
  let clearFrom = Infinity; // no zero lies in (clearFrom, guess)
  let last = 0;
  w.evaluate(from);
  let hasRisen = w.value > w.noise;
  for (;;) {
    if (++work.spent > work.allowed) return NaN;
    const span = Math.min(reach, end - tau);
    const { value, first, second, noise } = w;
    if (tau > from && isZero(value, first, noise, hasRisen)) return hasRisen ? bottomOf(w, tau, end) : tau;
    hasRisen ||= value > noise;
    const safe = safeStep(Math.max(0, value), first, second, w.thirdBound(span), span);
    if (tau + safe >= clearFrom) return bottomOf(w, guess, end);
    if (tau + safe >= end) return touchesAt(w, end, blur) ? end : Infinity;
    // below its own rounding a start from zero tells nothing: leave it by half the safe step, where w stands highest, then by
    // doubling steps
    const onwards = hasRisen ? safe : Math.max(safe / 2, 2 * last, 1e3 * ulp * span);
    const step = Math.max(onwards, 2 * ulp * tau);
    if (tau + step >= end) return Infinity;
    if (guess === Infinity && safe < span) {
      const within = Math.min(end - tau, 4 * step + span);
      const bound = w.thirdBound(within);
      guess = newton(w, tau + step, tau + within, tau + modelZero(value, first, second));
      if (guess !== Infinity) clearFrom = guess - safeStep(0, -w.first, w.second, bound, guess - tau);
      if (tau + safe >= clearFrom) return bottomOf(w, guess, end);
    }
    reach = safe < span ? 4 * step : 2 * reach;
    last = step;
    tau += step;
    w.evaluate(tau);
  }
}

/** Down to zero again, or clearly through it where w has not risen above its rounding yet. */
function isZero(value: number, first: number, noise: number, hasRisen: boolean): boolean {
  return hasRisen ? value <= noise && first <= 0 : value < -noise;
}

/** The zero r itself, or the bottom next to it where w dips there by no more than its rounding; marks it as a touch then. */
function bottomOf(w: Watched, r: number, end: number): number {
  w.evaluate(r);
  const { value, first, second, noise } = w;
  if (!(second > 0 && value - (first * first) / (2 * second) >= -2 * noise)) return r;
  const bottom = Math.min(end, r - first / second);
  w.evaluate(bottom);
  w.isTouch = Math.abs(w.value) <= 2 * w.noise;
  return w.isTouch ? bottom : r;
}

function touchesAt(w: Watched, end: number, blur: number): boolean {
  w.evaluate(end);
  return w.value <= w.noise - blur * w.first && w.first <= 0;
}

/** The first positive zero of w + w'h + w''h²/2, Infinity without one. */
function modelZero(value: number, first: number, second: number): number {
  return firstRoot(value, first, second / 2);
}

const ahead = new SafeStep();

function safeStep(value: number, first: number, second: number, bound: number, span: number): number {
  ahead.value = value;
  ahead.first = first;
  ahead.second = second;
  ahead.bound = bound;
  ahead.span = span;
  ahead.find();
  return ahead.step;
}

/** A falling zero in (from, to] by Newton's method, w being left evaluated there; Infinity where it does not lead to one. */
function newton(w: Watched, from: number, to: number, start: number): number {
  let r = start;
  for (let i = 0; i < 12; i++) {
    if (!(r > from && r <= to)) return Infinity;
    w.evaluate(r);
    if (!(w.first < 0)) return Infinity;
    const step = w.value / w.first;
    if (Math.abs(w.value) <= w.noise / 8 || Math.abs(step) <= ulp * r) return r;
    r -= step;
  }
  return Infinity;
}
