import type { Phase, Samples } from "@restband/solver";

/** The body at one instant; SI. */
export interface Instant {
  readonly t: number;
  readonly x: number;
  readonly v: number;
  readonly a: number;
  /** Contact force on the body. */
  readonly f: number;
  readonly phase: Phase;
}

/**
 * The body at any t of a run: at a sample exactly, in between x by the cubic through x and v, v by that through v and a,
 * a and f straight. Before an event at the end of an interval a and f go on as they were: they may jump there.
 */
export function instantAt(samples: Samples, t: number): Instant {
  const { t: times, x, v, a, f, phase } = samples;
  const last = times.length - 1;
  const i = indexAt(times, t);
  const here = { t, x: x[i], v: v[i], a: a[i], f: f[i], phase: Math.sign(phase[i]) as Phase };
  if (i === last || t <= times[i]) return i === last ? { ...here, ...(t > times[i] && atRest) } : here;
  const step = times[i + 1] - times[i];
  const s = (t - times[i]) / step;
  const isJump = phase[i + 1] !== phase[i];
  const straight = (values: Float64Array): number =>
    isJump ? ahead(times, values, phase, i, t) : values[i] + s * (values[i + 1] - values[i]);
  return {
    ...here,
    x: hermite(s, step, x[i], x[i + 1], v[i], v[i + 1]),
    v: isJump ? v[i] + s * (v[i + 1] - v[i]) : hermite(s, step, v[i], v[i + 1], a[i], a[i + 1]),
    a: straight(a),
    f: straight(f),
  };
}

const atRest = { v: 0, a: 0 };

/** The last sample at or before t. */
export function indexAt(times: Float64Array, t: number): number {
  let low = 0;
  let high = times.length - 1;
  while (low < high) {
    const middle = (low + high + 1) >> 1;
    if (times[middle] <= t) low = middle;
    else high = middle - 1;
  }
  return low;
}

/** The value just before the next sample, where the curve jumps: on from the two samples before, if they are of one phase. */
export function ahead(times: Float64Array, values: Float64Array, phase: Float64Array, i: number, t: number): number {
  if (i === 0 || phase[i - 1] !== phase[i] || times[i] === times[i - 1]) return values[i];
  const slope = (values[i] - values[i - 1]) / (times[i] - times[i - 1]);
  return values[i] + slope * (t - times[i]);
}

function hermite(s: number, step: number, from: number, to: number, slopeFrom: number, slopeTo: number): number {
  const [s2, s3] = [s * s, s * s * s];
  return (
    (2 * s3 - 3 * s2 + 1) * from +
    (s3 - 2 * s2 + s) * step * slopeFrom +
    (3 * s2 - 2 * s3) * to +
    (s3 - s2) * step * slopeTo
  );
}
