import type { LimitVerdict } from "../result.ts";
import type { Scenario } from "../scenario/scenario.ts";
import {
  isBroken,
  searchBoundary,
  type Asking,
  type Boundary,
  type PointReply,
  type Sample,
} from "./range-verdict-boundary.ts";
import { planRanges, scenarioAt, type Point, type RangePlan } from "./range-verdict-plan.ts";

/** What is known of a limit where values are known as ranges. */
export type RangeVerdict =
  /** Kept as entered and at every point run: these are samples, not a proof. */
  | { readonly kind: "kept" }
  /** Kept as entered, broken somewhere in the ranges; `alone` holds what breaks it by itself, the nearest first. */
  | ({ readonly kind: "breaks" } & Boundary)
  | { readonly kind: "broken" }
  | { readonly kind: "unjudged"; readonly reason: string };

export interface RangeReport {
  readonly plan: RangePlan;
  /** How many of the planned points were run; one point may stand in more than one list. */
  readonly ran: { readonly corners: number; readonly along: number; readonly within: number };
  /** Points whose values cannot stand together (static friction below kinetic): not failures, and not run. */
  readonly notPossible: number;
  /** One for each limit, in the order of the scenario. */
  readonly verdicts: readonly RangeVerdict[];
}

/**
 * Goes through the ranges of a checked scenario. Pure: it yields each scenario to be run and is given what the run came
 * to, so that the caller decides where, when and whether runs take place.
 *
 * @param entered the verdicts of the run as entered
 * @returns a verdict for each limit. Between the points run it knows nothing: a limit may break there unseen.
 */
export function* exploreRanges(scenario: Scenario, entered: readonly LimitVerdict[]): Asking<RangeReport> {
  const plan = planRanges(scenario);
  const run = runner(scenario, plan);
  const corners = yield* run.all(plan.corners);
  const lines: Sample[][] = [];
  for (const line of plan.lines) lines.push(yield* run.all(line));
  const within = yield* run.all(plan.within);
  const along = lines.flat();
  const samples = [...corners, ...along, ...within];
  const verdicts: RangeVerdict[] = [];
  for (const [i, { kept, reason }] of entered.entries()) {
    if (kept === null) verdicts.push({ kind: "unjudged", reason: reason ?? "" });
    else if (!kept) verdicts.push({ kind: "broken" });
    else if (!samples.some(({ reply }) => isBroken(reply, i))) verdicts.push(unbroken(samples, i));
    else
      verdicts.push({
        kind: "breaks",
        ...(yield* searchBoundary(plan, { lines, corners, within, limit: i, run: run.one })),
      });
  }
  return {
    plan,
    ran: { corners: possible(corners), along: possible(along), within: possible(within) },
    notPossible: samples.length - possible(samples),
    verdicts,
  };
}

const possible = (samples: readonly Sample[]): number => samples.filter(({ reply }) => reply !== null).length;

/** Nothing breaks the limit; where a point has no verdict, it cannot be judged. */
function unbroken(samples: readonly Sample[], limit: number): RangeVerdict {
  for (const { reply } of samples) {
    if (reply === null) continue;
    if ("reason" in reply) return { kind: "unjudged", reason: reply.reason };
    const { kept, reason } = reply[limit];
    if (kept === null) return { kind: "unjudged", reason: reason ?? "" };
  }
  return { kind: "kept" };
}

/** Runs points by asking for them, each once: one that comes again is answered from what is known. */
function runner(scenario: Scenario, { ranges, corners, lines, within }: RangePlan) {
  const known = new Map<string, PointReply | null>();
  const planned = corners.length + lines.flat().length + within.length;
  let done = 0;

  function* one(point: Point): Asking<PointReply | null> {
    const key = point.join(" ");
    const before = known.get(key);
    if (before !== undefined) return before;
    const moved = scenarioAt(scenario, ranges, point);
    const total = Math.max(planned, done + 1);
    const reply = moved === null ? null : yield { scenario: moved, done, total };
    done += 1;
    known.set(key, reply);
    return reply;
  }

  function* all(points: readonly Point[]): Asking<Sample[]> {
    const samples: Sample[] = [];
    for (const point of points) samples.push({ point, reply: yield* one(point) });
    return samples;
  }

  return { one, all };
}
