import type { Dimension } from "./field.ts";
import { quantityOf } from "./quantities/index.ts";
import type { MotionEvent, Result } from "./result.ts";

/** How far apart two results of one scenario are in one value. */
export interface Deviation {
  /** The quantity's name; of an event `t`, `x`, `v` or `f`. */
  readonly what: string;
  /** Which event, from 0, the one furthest apart; absent for quantities. */
  readonly event?: number;
  readonly values: readonly [number, number];
  /** In the value's own unit. */
  readonly absolute: number;
  /** As a share of the run's peak in that unit. */
  readonly relative: number;
}

export interface Comparison {
  /** What is not the same at all, as plain sentences: how it ended, outcome, verdicts, events, values on one side only. */
  readonly differences: readonly string[];
  /** One for each quantity both have and one for each column of the events, the largest relative first. */
  readonly deviations: readonly Deviation[];
}

export interface Agreement extends Comparison {
  /** `sensitive`: not reproducible to this precision, since inputs moved by 1e-12 move the run as much. */
  readonly verdict: "agrees" | "differs" | "sensitive";
  /** The share of the run's peak that a value may be apart. */
  readonly allowed: number;
  /** What the moved inputs changed, the run that changed most; present only where they were tried. */
  readonly moved?: Comparison;
}

/**
 * Whether two results of one scenario (replay, other machine, other method) say the same: the same end, outcome, verdicts,
 * event kinds and count, and every quantity and event within 1e-9 (both exact) or 1e-6 of the run's peak in that unit.
 *
 * @param rerun repeats the first run with every input moved by sign × 1e-12 relative; asked only where the two do not
 * agree. Without it the verdict is never `sensitive`.
 */
export function agreementOf(first: Result, second: Result, rerun?: (sign: 1 | -1) => Result): Agreement {
  const allowed = first.method === "exact" && second.method === "exact" ? 1e-9 : 1e-6;
  const found = compareResults(first, second);
  if (distance(found) <= allowed) return { verdict: "agrees", allowed, ...found };
  if (rerun === undefined) return { verdict: "differs", allowed, ...found };
  const [up, down] = [compareResults(first, rerun(1)), compareResults(first, rerun(-1))];
  const moved = distance(up) >= distance(down) ? up : down;
  return { verdict: distance(moved) >= distance(found) ? "sensitive" : "differs", allowed, ...found, moved };
}

/** Everything that is not the same in two results, without a verdict. */
export function compareResults(first: Result, second: Result): Comparison {
  const scales = scalesOf(first, second);
  const deviations = [...quantityDeviations(first, second, scales), ...eventDeviations(first, second, scales)];
  return {
    differences: differencesOf(first, second),
    deviations: deviations.sort((a, b) => b.relative - a.relative),
  };
}

/** The largest relative deviation; Infinity where something is not the same at all. */
function distance({ differences, deviations }: Comparison): number {
  return differences.length > 0 ? Infinity : (deviations[0]?.relative ?? 0);
}

function differencesOf(first: Result, second: Result): string[] {
  const verdicts = ({ limits }: Result) => limits.map(({ quantity, kept }) => `${quantity} ${kept}`).join();
  const kinds = ({ events }: Result) => events.map(({ kind }) => kind).join();
  const same = (isSame: boolean, message: string) => (isSame ? [] : [message]);
  return [
    ...same(first.ended === second.ended, `One run ended by ${first.ended}, the other by ${second.ended}.`),
    ...same(first.outcome === second.outcome, `The outcomes are ${first.outcome} and ${second.outcome}.`),
    ...same(verdicts(first) === verdicts(second), "The verdicts on the limits differ."),
    ...same(kinds(first) === kinds(second), `The events differ: ${first.events.length} and ${second.events.length}.`),
    ...namesOf(first, second).flatMap((name) => oneSided(name, first.quantities[name], second.quantities[name])),
  ];
}

function oneSided(name: string, a: number | null | undefined, b: number | null | undefined): string[] {
  const isOneSided = (a ?? null) === null ? (b ?? null) !== null : (b ?? null) === null;
  return isOneSided ? [`${quantityOf(name).label} has a value in one run only.`] : [];
}

function namesOf(first: Result, second: Result): string[] {
  return [...new Set([...Object.keys(first.quantities), ...Object.keys(second.quantities)])];
}

/**
 * What deviations are a share of: the run's peak in each unit, the largest number of that dimension in either result, its
 * samples included where it has them.
 */
type Scales = ReadonlyMap<Dimension, number>;

const columns = { t: "time", x: "displacement", v: "velocity", f: "force" } as const satisfies Partial<
  Record<keyof MotionEvent, Dimension>
>;
type Column = keyof typeof columns;
const columnNames = Object.keys(columns) as Column[];

function scalesOf(...results: readonly Result[]): Scales {
  const peaks = new Map<Dimension, number>();
  const take = (dimension: Dimension, value: number | null) =>
    peaks.set(dimension, Math.max(peaks.get(dimension) ?? 0, Math.abs(value ?? 0)));
  for (const { quantities, events, samples } of results) {
    for (const [name, value] of Object.entries(quantities)) take(quantityOf(name).dimension, value);
    for (const event of events) for (const column of columnNames) take(columns[column], event[column]);
    if (samples) for (const column of columnNames) samples[column].forEach((value) => take(columns[column], value));
  }
  return peaks;
}

function quantityDeviations(first: Result, second: Result, scales: Scales): Deviation[] {
  return Object.entries(first.quantities).flatMap(([name, a]) => {
    const b = second.quantities[name] ?? null;
    return a === null || b === null ? [] : [{ what: name, ...apart(a, b, quantityOf(name).dimension, scales) }];
  });
}

function eventDeviations(first: Result, second: Result, scales: Scales): Deviation[] {
  const count = Math.min(first.events.length, second.events.length);
  if (count === 0) return [];
  return columnNames.map((column) => {
    const off = (i: number) => Math.abs(first.events[i][column] - second.events[i][column]);
    let event = 0;
    for (let i = 1; i < count; i++) if (off(i) > off(event)) event = i;
    const [a, b] = [first.events[event][column], second.events[event][column]];
    return { what: column, event, ...apart(a, b, columns[column], scales) };
  });
}

function apart(
  a: number,
  b: number,
  dimension: Dimension,
  scales: Scales,
): Pick<Deviation, "values" | "absolute" | "relative"> {
  const absolute = Math.abs(a - b);
  // What has no unit has no common peak: a share, a ratio or a count is measured by itself, or by 1.
  const scale = dimension === "none" ? Math.max(1, Math.abs(a), Math.abs(b)) : (scales.get(dimension) ?? 0);
  return { values: [a, b], absolute, relative: absolute === 0 ? 0 : absolute / scale };
}
