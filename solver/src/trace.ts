import type { Samples } from "./result.ts";

/** Points that are drawn small without being thinned. */
const ENOUGH = 900;
/** Where there are more: so many stretches of time, of each its first point and the extremes of x and v. */
const STRETCHES = 180;
const DIGITS = 6;

/** A run drawn small, column by column as in `Samples`. */
export interface Trace {
  t: number[];
  x: number[];
  v: number[];
  f: number[];
  phase: number[];
}

/**
 * What a run is drawn from where nobody computes it again: at most some 900 points, of six digits each, below 64 kB as JSON.
 * Where there are more samples, the extremes of x and v of each of 180 stretches stay; of the phase what falls on them.
 */
export function traceOf(samples: Samples): Trace {
  const chosen = samples.t.length <= ENOUGH ? [...samples.t.keys()] : thinned(samples);
  const of = (column: Float64Array) => chosen.map((i) => Number(column[i].toPrecision(DIGITS)));
  return { t: of(samples.t), x: of(samples.x), v: of(samples.v), f: of(samples.f), phase: of(samples.phase) };
}

function thinned({ t, x, v }: Samples): number[] {
  const last = t.length - 1;
  const chosen = new Set([0, last]);
  for (let stretch = 0; stretch < STRETCHES; stretch++) {
    const from = Math.floor((stretch * last) / STRETCHES);
    const to = Math.floor(((stretch + 1) * last) / STRETCHES);
    for (const i of [from, ...extremes(x, from, to), ...extremes(v, from, to)]) chosen.add(i);
  }
  return [...chosen].sort((a, b) => a - b);
}

function extremes(column: Float64Array, from: number, to: number): [number, number] {
  let [low, high] = [from, from];
  for (let i = from + 1; i < to; i++) {
    if (column[i] < column[low]) low = i;
    if (column[i] > column[high]) high = i;
  }
  return [low, high];
}
