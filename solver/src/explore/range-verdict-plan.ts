import { checkScenario } from "../scenario/check-scenario.ts";
import { fieldPaths } from "../scenario/field-paths.ts";
import { numberAt, withNumber } from "../scenario/path.ts";
import type { Origin, Scenario } from "../scenario/scenario.ts";

/** A number of a scenario whose origin says within what it is known; SI. An end that is not given is the value entered. */
export interface KnownRange {
  readonly path: string;
  readonly entered: number;
  readonly low: number;
  readonly high: number;
  /** True where only whole numbers are allowed (faces). */
  readonly isWhole: boolean;
}

/** A value for each range, in their order. */
export type Point = readonly number[];

/** The points at which a scenario with ranges is run, besides as it was entered. */
export interface RangePlan {
  readonly ranges: readonly KnownRange[];
  /** Origins with a range that are no single number (the points of a table): their ranges are not run. */
  readonly leftOut: readonly string[];
  readonly corners: readonly Point[];
  /** All 2^n corners there are; `corners` holds fewer of more than six ranges. */
  readonly allCorners: number;
  /** One value alone away from the others as entered, from the nearest on: one list for each range and side. */
  readonly lines: readonly (readonly Point[])[];
  readonly within: readonly Point[];
}

const mostCompleteRanges = 6;
const pointsPerSide = 4;
const pointsWithin = 24;

/**
 * The points to run: every corner of the ranges (a spread part of them beyond six ranges), `pointsPerSide` points on each
 * side of every value alone, and `pointsWithin` inside. The same scenario always gives the same points.
 */
export function planRanges(scenario: Scenario): RangePlan {
  const ranges = rangesOf(scenario);
  const numbers = new Set(fieldPaths(scenario));
  const leftOut = Object.entries(scenario.origins).flatMap(([path, { low, high }]) =>
    (low !== undefined || high !== undefined) && !numbers.has(path) ? [path] : [],
  );
  const isEmpty = ranges.length === 0;
  return {
    ranges,
    leftOut,
    corners: isEmpty ? [] : cornersOf(ranges),
    allCorners: isEmpty ? 0 : 2 ** ranges.length,
    lines: ranges.flatMap((_range, i) => linesOf(ranges, i)),
    within: isEmpty ? [] : insideOf(ranges),
  };
}

function rangesOf(scenario: Scenario): KnownRange[] {
  return fieldPaths(scenario).flatMap((path) => {
    const origin: Partial<Origin> = Object.hasOwn(scenario.origins, path) ? scenario.origins[path] : {};
    const entered = numberAt(scenario, path);
    const { low = Math.min(entered, origin.high ?? entered), high = Math.max(entered, origin.low ?? entered) } = origin;
    if (low === entered && high === entered) return [];
    return [{ path, entered, low, high, isWhole: isWhole(scenario, path, low, high) }];
  });
}

/** Bounds of a number leave no gaps: if both ends are allowed and a half between them is not, it must be whole. */
function isWhole(scenario: Scenario, path: string, low: number, high: number): boolean {
  if (!Number.isInteger(low) || !Number.isInteger(high) || low === high) return false;
  const isAllowed = (value: number) => checkScenario(withNumber(scenario, path, value)).scenario !== null;
  return isAllowed(low) && isAllowed(high) && !isAllowed(low + 0.5);
}

/**
 * All corners of up to six ranges. Of more, a two-level design of strength 3: each three ranges meet in all eight
 * combinations of their ends equally often, all low and all high among them (Rao 1947; from memory). Range i is high in
 * run r where r and its mask, a number with an odd count of ones, have an odd count of ones in common.
 */
function cornersOf(ranges: readonly KnownRange[]): Point[] {
  const bits = Math.min(ranges.length, Math.max(mostCompleteRanges, 1 + Math.ceil(Math.log2(ranges.length))));
  const runs = Array.from({ length: 2 ** bits }, (_, run) => run);
  const masks = runs.filter((mask) => onesIn(mask) % 2 === 1).sort((a, b) => onesIn(a) - onesIn(b) || a - b);
  return runs.map((run) => ranges.map(({ low, high }, i) => (onesIn(run & masks[i]) % 2 === 1 ? high : low)));
}

const onesIn = (bits: number): number => bits.toString(2).replaceAll("0", "").length;

function linesOf(ranges: readonly KnownRange[], i: number): Point[][] {
  const { entered, low, high } = ranges[i];
  const start = ranges.map((range) => range.entered);
  return [low, high]
    .filter((end) => end !== entered)
    .map((end) => {
      const steps = Array.from({ length: pointsPerSide }, (_, step) => (step + 1) / pointsPerSide);
      const values = steps.map((share) => between(ranges[i], entered, end, share));
      const moved = [...new Set(values)].filter((value) => value !== entered);
      return moved.map((value) => start.map((other, j) => (j === i ? value : other)));
    });
}

/**
 * Evenly spread without a pattern: the fractional parts of n √p for the primes p, one for each range (Richtmyer 1951; from
 * memory). Pure, so no seed is needed.
 */
function insideOf(ranges: readonly KnownRange[]): Point[] {
  const steps = firstPrimes(ranges.length).map(Math.sqrt);
  return Array.from({ length: pointsWithin }, (_, n) =>
    ranges.map((range, i) => between(range, range.low, range.high, ((n + 1) * steps[i]) % 1)),
  );
}

/** The value a share of the way from one value of a range to another; exactly the other at 1. */
export function between({ isWhole }: KnownRange, from: number, to: number, share: number): number {
  const value = share === 1 ? to : from + share * (to - from);
  return isWhole ? Math.round(value) : value;
}

function firstPrimes(count: number): number[] {
  const primes: number[] = [];
  for (let n = 2; primes.length < count; n++) if (primes.every((prime) => n % prime !== 0)) primes.push(n);
  return primes;
}

/** The scenario with a point's values in place of those entered; null where they cannot stand together (μs below μk). */
export function scenarioAt(scenario: Scenario, ranges: readonly KnownRange[], point: Point): Scenario | null {
  const moved = ranges.reduce((at, { path }, i) => withNumber(at, path, point[i]), scenario);
  return checkScenario(moved).scenario;
}
