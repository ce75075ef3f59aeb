import type { Outcome, Scenario } from "@restband/solver";
import type { JudgedRun } from "../judge.ts";
import { slipSide, type JudgedBody } from "./body.ts";
import type { Inputs, Path } from "./inputs.ts";
import { readTrend } from "./trend.ts";

/** The stretch of a run that the outcome is read from, s; `parts` are the trend's. */
interface Window {
  from: number;
  to: number;
  parts: number;
}

/** How the run is judged: the first outcome of the list that applies. Equalities hold to the judge's own accuracy only. */
export function judgeOutcome(scenario: Scenario, run: JudgedRun, inputs: Inputs, body: JudgedBody): Outcome {
  const window = steadyWindow(scenario);
  const breakAways = run.events.filter((event) => event.kind === "break-away");
  const stops = run.events.filter((event) => event.kind === "stop");
  const endsStuck = run.phase.at(-1) === 0;
  const rests = endsStuck && staysStuck(scenario, run, inputs, body);
  if (rests && run.phase[0] === 0 && breakAways.length === 0) return "never-moved";
  if (rests) return "came-to-rest";
  if (endsStuck && breakAways.filter((event) => event.t >= window.from).length < 2) return "too-short";
  const trend = readTrend(run, window, isFeed(scenario) ? inputs.stretchFrom(window.from).base : null);
  if (trend.isGrowing) return "growing";
  if (stops.some((event) => event.t >= window.from)) return "stick-slip";
  if (stops.length === 0 && inputs.isConstantAfter(window.to) && isSlowAtLast(run, inputs)) return "settles";
  return trend.isSettled || isEven(lastTenth(run).map((i) => run.v[i])) ? "smooth-sliding" : "not-settled";
}

const isSteady = (kind: string): boolean => kind === "harmonic" || kind === "unbalance";

function steadyWindow({ force, base, span, contact }: Scenario): Window {
  const to = span.seconds;
  const inputs = [...force, ...base];
  if (
    inputs.some((term) => isSteady(term.kind)) &&
    inputs.every((term) => isSteady(term.kind) || term.kind === "constant")
  ) {
    const lowest = Math.min(...inputs.flatMap((term) => ("hz" in term ? [term.hz] : [])));
    const from = to - 10 / lowest;
    return from >= 0 ? { from, to, parts: 10 } : { from: 0, to, parts: 4 };
  }
  const half = isFeed({ base }) || typeof contact.counterface === "object";
  return { from: half ? to / 2 : 0, to, parts: 4 };
}

/** Base terms only ramps and constants, with at least one ramp. */
function isFeed({ base }: Pick<Scenario, "base">): boolean {
  return (
    base.some((term) => term.kind === "ramp") && base.every((term) => term.kind === "ramp" || term.kind === "constant")
  );
}

/** Looks ahead: what a body that ends stuck will meet, to the last corner and over a thousand of the slowest periods at most. */
function staysStuck(scenario: Scenario, run: JudgedRun, inputs: Inputs, body: JudgedBody): boolean {
  const end = run.t.at(-1)!;
  const frequencies = hzOf(scenario);
  if (carriesOn(scenario, inputs.stretchFrom(Math.max(end, inputs.corners.at(-1) ?? 0)).face, body)) return false;
  const slowest = frequencies.length ? 1 / Math.min(...frequencies) : 0;
  const fine = frequencies.length ? 1 / Math.max(...frequencies) / 400 : Infinity;
  const times = lookAhead(end, inputs.corners, commonPeriods(frequencies) * slowest, fine);
  const x = (t: number) => run.x.at(-1)! + ridden(inputs, end, t);
  return times.every((t) => slipSide(body, inputs.stretchFrom(t), t, x(t)) === 0);
}

/** A ramp that never stops, or a belt on a spring. */
function carriesOn({ force, base, contact }: Scenario, face: Path, body: JudgedBody): boolean {
  const endless = (terms: Scenario["force"]) =>
    terms.some((term) => term.kind === "ramp" && term.stop === "none" && term.rate !== 0);
  const isPulled = endless(base) && contact.counterface !== "base";
  const isBelt = typeof contact.counterface === "object" && face.rate(0) !== 0;
  return endless(force) || ((isPulled || isBelt) && body.stiffness > 0);
}

function hzOf({ force, base, contact }: Scenario): number[] {
  const { ripple } = contact.normal;
  return [...[...force, ...base].flatMap((term) => ("hz" in term ? [term.hz] : [])), ...(ripple ? [ripple.hz] : [])];
}

/** How many of the slowest periods hold a whole number of each, 1,000 at most. */
function commonPeriods(frequencies: number[]): number {
  const slowest = Math.min(...frequencies);
  const fits = (n: number) =>
    frequencies.every((hz) => Math.abs((n * hz) / slowest - Math.round((n * hz) / slowest)) < 1e-9);
  for (let n = 1; n < 1000; n++) if (fits(n)) return n;
  return 1000;
}

function lookAhead(end: number, corners: readonly number[], horizon: number, fine: number): number[] {
  const ahead = corners.filter((t) => t > end);
  const quiet = Math.max(end, ...ahead);
  const stretches = [end, ...ahead].flatMap((from, i) => grid(from, ahead[i] ?? from, fine));
  return [...stretches, ...grid(quiet, quiet + horizon, fine)];
}

/** Times from `from` on to just before `to`, at most `fine` and a hundredth of the way apart. */
function grid(from: number, to: number, fine: number): number[] {
  const count = to > from ? Math.max(100, Math.ceil((to - from) / fine)) : 0;
  return [from, ...Array.from({ length: count }, (_, i) => from + ((to - from) * (i + 1 - 1e-9)) / count)];
}

/** How far the counterface travels from t0 to t. */
function ridden(inputs: Inputs, t0: number, t: number): number {
  return inputs.stretchFrom(t).face.at(t) - inputs.stretchFrom(t0).face.at(t0);
}

function isSlowAtLast(run: JudgedRun, inputs: Inputs): boolean {
  const slip = run.t.map((t, i) => Math.abs(run.v[i] - inputs.stretchFrom(t).face.rate(t)));
  const late = Math.max(...lastTenth(run).map((i) => slip[i]));
  return late < 1e-3 * slip.reduce((most, v) => Math.max(most, v), 0);
}

function lastTenth({ t }: JudgedRun): number[] {
  const from = 0.9 * t.at(-1)!;
  return t.flatMap((time, i) => (time >= from ? [i] : []));
}

/** Varies by less than 2 % of its mean. */
function isEven(values: number[]): boolean {
  const low = values.reduce((least, v) => Math.min(least, v), Infinity);
  const high = values.reduce((most, v) => Math.max(most, v), -Infinity);
  const mean = values.reduce((total, v) => total + v, 0) / values.length;
  return high - low < 0.02 * Math.abs(mean);
}
