import type { Trace } from "@restband/api/contract";
import { xOfTime, type PlotPlace } from "./leaders.ts";

/** A stretch of one phase, as the motion strip draws it. */
interface Stretch {
  readonly from: number;
  readonly to: number;
  readonly phase: -1 | 0 | 1;
}

/** The stretches of a trace: each point's phase holds up to the next. */
export function stretchesOf({ t, phase }: Trace): Stretch[] {
  const stretches: { from: number; to: number; phase: -1 | 0 | 1 }[] = [];
  for (let i = 0; i + 1 < t.length; i++) {
    const last = stretches.at(-1);
    if (last && last.phase === phase[i]) last.to = t[i + 1];
    else stretches.push({ from: t[i], to: t[i + 1], phase: phase[i] as -1 | 0 | 1 });
  }
  return stretches;
}

/** The velocity as a path; `y` says where a value stands. */
export function pathOf({ t, v }: Trace, plot: PlotPlace, y: (value: number) => number): string {
  const points = t.map((time, i) => `${xOfTime(plot, time).toFixed(1)} ${y(v[i]).toFixed(1)}`);
  return points.length === 0 ? "" : `M${points.join("L")}`;
}

/** Round figures within a range, at most so many and one. */
export function ticksOf(low: number, high: number, count = 4): number[] {
  const raw = (high - low) / count;
  const power = 10 ** Math.floor(Math.log10(raw));
  const step = [1, 2, 5, 10].map((each) => each * power).find((each) => each >= raw) ?? 10 * power;
  const first = Math.ceil(low / step);
  const last = Math.floor(high / step + 1e-9);
  return Array.from({ length: Math.max(0, last - first + 1) }, (_, i) => (first + i) * step);
}
