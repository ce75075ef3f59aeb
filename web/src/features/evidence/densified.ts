import type { Samples } from "@restband/solver";
import { indexAt, instantAt } from "../../compute/instant.ts";

/** Where fewer samples are seen than a smooth curve takes, instants between them are added. */
const FEWEST = 1000;

/** The samples about a part of a run, with instants in between where they are few: seen closely a curve stays a curve. */
export function densified(samples: Samples, { from, to }: { from: number; to: number }): Samples {
  const first = Math.max(0, indexAt(samples.t, from) - 1);
  const last = Math.min(samples.t.length - 1, indexAt(samples.t, to) + 1);
  if (last - first >= FEWEST) return samples;
  const dense: Record<keyof Samples, number[]> = { t: [], x: [], v: [], a: [], f: [], phase: [] };
  for (let i = first; i <= last; i++)
    for (const t of timesFrom(samples.t, i, last, (to - from) / FEWEST)) add(dense, samples, t);
  return {
    t: Float64Array.from(dense.t),
    x: Float64Array.from(dense.x),
    v: Float64Array.from(dense.v),
    a: Float64Array.from(dense.a),
    f: Float64Array.from(dense.f),
    phase: Float64Array.from(dense.phase),
  };
}

/** A sample's own time and, up to the next one, times not further apart than `step`. */
function timesFrom(times: Float64Array, i: number, last: number, step: number): number[] {
  if (i === last) return [times[i]];
  const gap = times[i + 1] - times[i];
  const parts = Math.max(1, Math.ceil(gap / step));
  return Array.from({ length: parts }, (_, k) => times[i] + (k * gap) / parts);
}

function add(dense: Record<keyof Samples, number[]>, samples: Samples, t: number): void {
  const here = instantAt(samples, t);
  for (const channel of ["t", "x", "v", "a", "f", "phase"] as const) dense[channel].push(here[channel]);
}
