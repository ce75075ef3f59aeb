import type { Phase, Result, Samples, Scenario } from "@restband/solver";

/** A stretch of one phase: slip forward (1), back (−1) or stick (0), from and to in s. */
export interface Interval {
  readonly from: number;
  readonly to: number;
  readonly phase: Phase;
}

/** The end of what is drawn, s: a motion that ended at rest is shown a little longer, standing. */
export function shownEnd(scenario: Scenario, result: Result): number {
  const end = result.events[result.events.length - 1]?.t ?? lastOf(result.samples) ?? scenario.span.seconds;
  if (result.ended !== "rest") return end > 0 ? end : scenario.span.seconds;
  return end > 0 ? Math.min(scenario.span.seconds, 1.1 * end) : scenario.span.seconds;
}

/** The phases of a run in order, up to `end`; exact, since the samples hold every event with its right-hand phase. */
export function intervalsOf(samples: Samples, end: number): Interval[] {
  const { t, phase } = samples;
  const intervals: Interval[] = [];
  let first = 0;
  for (let i = 1; i <= t.length; i++) {
    if (i < t.length && phase[i] === phase[first]) continue;
    const to = i < t.length ? t[i] : Math.max(end, t[t.length - 1]);
    if (to > t[first]) intervals.push({ from: t[first], to, phase: Math.sign(phase[first]) as Phase });
    first = i;
  }
  return intervals;
}

const lastOf = (samples: Samples | null): number | undefined => samples?.t[samples.t.length - 1];
