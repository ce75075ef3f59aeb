import type { LimitVerdict } from "../result.ts";
import type { Scenario } from "../scenario/scenario.ts";
import { between, type Point, type RangePlan } from "./range-verdict-plan.ts";

/** What a run of a point came to: a verdict for each limit, or why there is none. */
export type PointReply = readonly LimitVerdict[] | { readonly reason: string };

/** A scenario to be run, and how far the whole is. */
export interface RangeStep {
  readonly scenario: Scenario;
  readonly done: number;
  readonly total: number;
}

/** A computation that asks for runs and is given what each came to. */
export type Asking<T> = Generator<RangeStep, T, PointReply>;

/** A point and its run; null where its values cannot stand together. */
export interface Sample {
  readonly point: Point;
  readonly reply: PointReply | null;
}

/** The value of a number at a boundary, in SI, and the side it was reached from. */
export interface BoundaryValue {
  readonly path: string;
  readonly entered: number;
  /** The nearest value known to break the limit. */
  readonly breaks: number;
  /** The last value before it known not to. */
  readonly keeps: number;
}

/** Where a limit breaks within the ranges. */
export interface Boundary {
  /** Numbers that break it alone, the others as entered; the nearest within its range first. */
  readonly alone: readonly BoundaryValue[];
  /** Where none does so alone: numbers that break it together, on the straight way to the nearest corner that does. */
  readonly together: readonly BoundaryValue[];
}

interface Search {
  readonly lines: readonly (readonly Sample[])[];
  readonly corners: readonly Sample[];
  readonly within: readonly Sample[];
  /** Which limit. */
  readonly limit: number;
  readonly run: (point: Point) => Asking<PointReply | null>;
}

const halvings = 14;

export const isBroken = (reply: PointReply | null, limit: number): boolean =>
  reply !== null && !("reason" in reply) && reply[limit].kept === false;

/** Where the limit first breaks: along each value alone, else on the way to the nearest corner. */
export function* searchBoundary(plan: RangePlan, search: Search): Asking<Boundary> {
  const start = plan.ranges.map(({ entered }) => entered);
  const alone: { value: BoundaryValue; share: number }[] = [];
  for (const line of search.lines) {
    const first = line.findIndex(({ reply }) => isBroken(reply, search.limit));
    if (first < 0) continue;
    const before = first > 0 ? line[first - 1].point : start;
    const [keeps, breaks] = yield* bisect(plan, search, before, line[first].point);
    alone.push(...movedValues(plan, keeps, breaks).map((value) => ({ value, share: shareOf(plan, breaks) })));
  }
  if (alone.length > 0)
    return { alone: alone.sort((a, b) => a.share - b.share).map(({ value }) => value), together: [] };
  const nearest = yield* fewestMoved(plan, search, nearestBroken(plan, search));
  const [keeps, breaks] = yield* bisect(plan, search, start, nearest);
  return { alone: [], together: movedValues(plan, keeps, breaks) };
}

/** Two neighbouring points on the way from one that keeps the limit to one that breaks it: the last not broken, the first broken. */
function* bisect(plan: RangePlan, search: Search, from: Point, to: Point): Asking<[Point, Point]> {
  let keeps = from;
  let breaks = to;
  for (let i = 0; i < halvings; i++) {
    const middle = plan.ranges.map((range, j) => between(range, keeps[j], breaks[j], 0.5));
    if (isSame(middle, keeps) || isSame(middle, breaks)) break;
    if (isBroken(yield* search.run(middle), search.limit)) breaks = middle;
    else keeps = middle;
  }
  return [keeps, breaks];
}

const isSame = (a: Point, b: Point): boolean => a.every((value, i) => value === b[i]);

/** The corner that breaks it, or where none does the point within, whose values lie nearest to those entered, each by its range. */
function nearestBroken(plan: RangePlan, { corners, within, limit }: Search): Point {
  const broken = [corners, within].map((samples) => samples.filter(({ reply }) => isBroken(reply, limit)));
  const points = (broken[0].length > 0 ? broken[0] : broken[1]).map(({ point }) => point);
  return points.reduce((nearest, point) => (shareOf(plan, point) < shareOf(plan, nearest) ? point : nearest));
}

/** The same point with every value put back as entered that is not needed to break the limit. */
function* fewestMoved({ ranges }: RangePlan, search: Search, point: Point): Asking<Point> {
  let fewest = point;
  for (const [i, { entered }] of ranges.entries()) {
    const less = fewest.map((value, j) => (j === i ? entered : value));
    if (isBroken(yield* search.run(less), search.limit)) fewest = less;
  }
  return fewest;
}

/** How far a point lies from the values entered, each by the width of its range: root of the sum of squares. */
function shareOf({ ranges }: RangePlan, point: Point): number {
  return Math.hypot(...ranges.map(({ entered, low, high }, i) => (point[i] - entered) / (high - low || 1)));
}

function movedValues({ ranges }: RangePlan, keeps: Point, breaks: Point): BoundaryValue[] {
  return ranges.flatMap(({ path, entered }, i) =>
    breaks[i] === entered ? [] : [{ path, entered, breaks: breaks[i], keeps: keeps[i] }],
  );
}
