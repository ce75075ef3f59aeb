import type { Samples } from "./result.ts";
import type { Motion } from "./motion/motion.ts";
import { emptyState } from "./motion/state.ts";

const state = emptyState();

/** Values at the given times in the order given: right-hand ones at events, those of the end past the end of the run. */
export function valuesAt(motion: Motion, times: readonly number[]): Samples {
  const samples = emptySamples(times.length);
  times.forEach((t, i) => {
    const within = Math.min(t, motion.end);
    fill(motion, motion.find(within), within, samples, i);
    samples.t[i] = t;
  });
  return samples;
}

/**
 * `points` instants evenly over the run, and every event once (with its own right-hand values), in time order.
 * An instant of the grid that falls on an event is left to the event.
 */
export function sampleMotion(motion: Motion, points: number): Samples {
  const marks = motion.events.filter((mark) => mark.kind !== "start" && mark.kind !== "end");
  const onGrid = (n: number): number => (points === 1 ? 0 : (motion.end * n) / (points - 1));
  const samples = emptySamples(points + marks.length);
  let count = 0;
  let next = 0;
  for (let n = 0; n < points; n++) {
    const t = onGrid(n);
    let isOnEvent = false;
    while (next < marks.length && marks[next].t <= t) {
      isOnEvent = marks[next].t === t;
      fill(motion, marks[next].segment, marks[next].t, samples, count++);
      next++;
    }
    if (!isOnEvent) fill(motion, motion.find(t), t, samples, count++);
  }
  return shortened(samples, count);
}

function fill(motion: Motion, segment: number, t: number, samples: Samples, i: number): void {
  motion.read(segment, t, state);
  samples.t[i] = t;
  samples.x[i] = state.x;
  samples.v[i] = state.v;
  samples.a[i] = state.a;
  samples.f[i] = state.f;
  samples.phase[i] = state.phase;
}

function emptySamples(length: number): Samples {
  const column = (): Float64Array => new Float64Array(length);
  return { t: column(), x: column(), v: column(), a: column(), f: column(), phase: column() };
}

function shortened(samples: Samples, length: number): Samples {
  const cut = (column: Float64Array): Float64Array => column.slice(0, length);
  const { t, x, v, a, f, phase } = samples;
  return { t: cut(t), x: cut(x), v: cut(v), a: cut(a), f: cut(f), phase: cut(phase) };
}
