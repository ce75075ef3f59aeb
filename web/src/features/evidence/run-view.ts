import { compileProblem, lowestHz, type Result, type Samples, type Scenario } from "@restband/solver";
import { inputsOf, type Inputs } from "../../compute/inputs.ts";
import { intervalsOf, shownEnd, type Interval } from "../../compute/intervals.ts";
import { driveForceOf, type DriveForce } from "./drive-force.ts";

type Channel = "x" | "v" | "a" | "f";

/** A run made ready to be looked at: everything that does not hang on what part of it is seen. */
export interface RunView {
  readonly scenario: Scenario;
  readonly result: Result;
  readonly samples: Samples;
  /** The largest size of each channel over the run: what is a ten-billionth of it is noise. */
  readonly peaks: Readonly<Record<Channel, number>>;
  readonly intervals: readonly Interval[];
  readonly inputs: Inputs;
  /** The force that drives the body; null where nothing does, or where it cannot be told. */
  readonly drive: DriveForce | null;
  /** The lowest frequency that drives the body, Hz; null without one. */
  readonly driveHz: number | null;
  /** The samples at which something happens, sorted. */
  readonly eventIndices: readonly number[];
  /** Times of the events, sorted, each once. */
  readonly eventTimes: readonly number[];
  /** What is shown ends here, s. */
  readonly end: number;
}

const views = new WeakMap<Result, RunView>();

/** Null where a result has no samples to draw. The same result has the same view: all parts of a page share it. */
export function runViewOf(scenario: Scenario, result: Result): RunView | null {
  const known = views.get(result);
  if (known?.scenario === scenario) return known;
  const view = makeView(scenario, result);
  if (view) views.set(result, view);
  return view;
}

function makeView(scenario: Scenario, result: Result): RunView | null {
  const { samples } = result;
  if (!samples || samples.t.length === 0) return null;
  const end = shownEnd(scenario, result);
  const held = standingOn(samples, end);
  const inputs = inputsOf(scenario);
  return {
    scenario,
    result,
    samples: held,
    peaks: { x: peakOf(held.x), v: peakOf(held.v), a: peakOf(held.a), f: peakOf(held.f) },
    intervals: intervalsOf(held, end),
    inputs,
    drive: driveForceOf(scenario, inputs),
    driveHz: lowestHz(compileProblem(scenario)),
    eventIndices: phaseChanges(held),
    eventTimes: [...new Set(result.events.map(({ t }) => t))],
    end,
  };
}

const peakOf = (values: Float64Array): number => values.reduce((peak, value) => Math.max(peak, Math.abs(value)), 0);

/** A body that rests goes on standing to the end of what is shown. */
function standingOn(samples: Samples, end: number): Samples {
  const last = samples.t.length - 1;
  if (samples.t[last] >= end) return samples;
  const longer = (values: Float64Array, value: number): Float64Array => Float64Array.from([...values, value]);
  const { t, x, v, a, f, phase } = samples;
  return {
    t: longer(t, end),
    x: longer(x, x[last]),
    v: longer(v, v[last]),
    a: longer(a, a[last]),
    f: longer(f, f[last]),
    phase: longer(phase, phase[last]),
  };
}

/** The samples at which a new phase begins. */
export function phaseChanges({ phase }: Samples): number[] {
  const indices: number[] = [];
  for (let i = 1; i < phase.length; i++) if (phase[i] !== phase[i - 1]) indices.push(i);
  return indices;
}

/** The event before or after a time, or null; events at the time itself do not count. */
export function neighbourEvent({ eventTimes }: RunView, t: number, direction: 1 | -1): number | null {
  const beyond = direction === 1 ? eventTimes.find((time) => time > t) : lastBefore(eventTimes, t);
  return beyond ?? null;
}

function lastBefore(times: readonly number[], t: number): number | undefined {
  for (let i = times.length - 1; i >= 0; i--) if (times[i] < t) return times[i];
  return undefined;
}

/** Where the cursor stands until somebody moves it: half way from the event in the middle of the run to the next. */
export function firstCursor({ eventTimes, end }: RunView): number {
  const middle = Math.floor((eventTimes.length - 1) / 2);
  return ((eventTimes[middle] ?? 0) + (eventTimes[middle + 1] ?? end)) / 2;
}

/** Where the body stands as its spring feels it: x, or from the drive where that moves; m (rad). */
export const fromDrive = ({ inputs }: RunView, { t, x }: { t: number; x: number }): number => x - inputs.base(t);

/** The cycles that are shown where nobody chose how many. */
export const usualCycles = 3;

/**
 * The last cycles of a run: of a drive that swings its periods, to the end; else from break-away to break-away. Null where
 * there are not so many, and one more.
 */
export function lastCycles(
  { result, end, driveHz }: RunView,
  count = usualCycles,
): { from: number; to: number } | null {
  if (driveHz !== null) return (count + 1) / driveHz > end ? null : { from: end - count / driveHz, to: end };
  const starts = result.events.filter(({ kind }) => kind === "break-away").map(({ t }) => t);
  const last = starts.length - 1;
  return last < count + 1 ? null : { from: starts[last - count], to: Math.min(end, starts[last]) };
}
