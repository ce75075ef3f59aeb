import type { JudgedRun } from "../judge.ts";
import type { Path } from "./inputs.ts";

export interface Trend {
  isGrowing: boolean;
  isSettled: boolean;
}

interface Extent {
  half: number;
  mean: number;
}

/**
 * Where the amplitude is going: half peak-to-peak of x (of x − y under a feed) in equal parts of the window, its limit by
 * Aitken's Δ² from the last three.
 */
export function readTrend(
  run: JudgedRun,
  { from, to, parts }: { from: number; to: number; parts: number },
  feed: Path | null,
): Trend {
  const part = (i: number, of: number) =>
    extent(run, feed, from + ((to - from) * i) / of, from + ((to - from) * (i + 1)) / of);
  const a = Array.from({ length: parts }, (_, i) => part(i, parts).half);
  const limit = aitken(a);
  const last = a[parts - 1];
  const [whole, first, second] = [part(0, 1), part(0, 2), part(1, 2)];
  const room = 0.02 * Math.max(whole.half, Math.abs(whole.mean));
  const drift = limit === null ? Math.max(...a) - Math.min(...a) : Math.abs(limit - last);
  return {
    isGrowing: rises(a, peak(run)) && (limit === null || limit > 2 * last),
    isSettled: drift <= room && Math.abs(second.mean - first.mean) <= room,
  };
}

function rises(a: number[], peakOfRun: number): boolean {
  const last = a[a.length - 1];
  if (last < 1e-9 * peakOfRun) return false;
  return a.every((value, i) => i === 0 || value > a[i - 1]) && last - a[0] > 1e-9 * last;
}

/** Amplitudes nearer than this, relative, are equal to the judge: its own accuracy (1e-9 by the definition). */
const alike = 1e-5;

/** The limit of the last three, null where they do not close in. */
function aitken(a: number[]): number | null {
  const [before, middle, last] = a.slice(-3);
  const step = last - middle;
  const stepBefore = middle - before;
  if (Math.abs(step) <= alike * Math.abs(last)) return last;
  if (Math.abs(step) >= Math.abs(stepBefore)) return null;
  return last - (step * step) / (step - stepBefore);
}

function peak({ x }: JudgedRun): number {
  return x.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
}

/** Half peak-to-peak and mean over time of x, or of x − y, from one time to another. */
function extent({ t, x }: JudgedRun, feed: Path | null, from: number, to: number): Extent {
  let [low, high, area, time] = [Infinity, -Infinity, 0, 0];
  const at = (i: number) => x[i] - (feed?.at(t[i]) ?? 0);
  for (let i = 0; i < t.length; i++) {
    if (t[i] < from || t[i] > to) continue;
    low = Math.min(low, at(i));
    high = Math.max(high, at(i));
    if (i === 0 || t[i - 1] < from) continue;
    area += ((t[i] - t[i - 1]) * (at(i) + at(i - 1))) / 2;
    time += t[i] - t[i - 1];
  }
  return { half: (high - low) / 2, mean: area / time };
}
