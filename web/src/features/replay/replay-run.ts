import { keptResultOf, resultOf, type KeptResult, type ReplayDraft } from "@restband/api/contract";
import {
  agreementOf,
  compareResults,
  movedInputs,
  needsAdaptive,
  type Agreement,
  type Comparison,
  type Result,
  type Scenario,
} from "@restband/solver";
import type { RunOptions } from "../../compute/solver-job.ts";

export type ReplayWay = ReplayDraft["way"];

/** What is replayed: a frozen scenario and what it came to. */
export interface Frozen {
  readonly scenario: Scenario;
  readonly result: KeptResult;
}

/** Runs a scenario and gives its result; throws Error with a sentence where there is none. */
export type Ask = (scenario: Scenario, options: RunOptions) => Promise<Result>;

/** Where only the adaptive method applies: well above the tolerance of the frozen run, and below it. */
const tolerances = [1e-6, 1e-11] as const;
/** As many as a replay keeps. */
const mostDifferences = 50;
const mostDeviations = 100;

/** The ways to run a revision again on this page, in order: as it was run, and by another method or other tolerances. */
export function waysOf({ scenario, result }: Frozen): readonly ReplayWay[] {
  const hasOther = result.method === "exact" || needsAdaptive(scenario) === null;
  return ["same-method", hasOther ? "other-method" : "tolerances"];
}

/** Runs a revision again in one of these ways and tells how far it is from what was frozen. */
export async function replay(way: ReplayWay, frozen: Frozen, ask: Ask): Promise<ReplayDraft> {
  const again = (options: RunOptions) => ask(frozen.scenario, { samples: 0, ...options });
  if (way === "tolerances") return replayTolerances(frozen, again, ask);
  const isSame = way === "same-method";
  const other = frozen.result.method === "exact" ? "adaptive" : "exact";
  const result = await again({ method: isSame ? frozen.result.method : other });
  return draftOf(way, result, await agreementWith(frozen, result, ask));
}

async function replayTolerances(
  frozen: Frozen,
  again: (options: RunOptions) => Promise<Result>,
  ask: Ask,
): Promise<ReplayDraft> {
  const [wide, narrow] = tolerances;
  const wider = await again({ method: "adaptive", tolerance: wide });
  const narrower = await again({ method: "adaptive", tolerance: narrow });
  const draft = draftOf("tolerances", narrower, await agreementWith(frozen, narrower, ask));
  const first = resultOf(frozen.result);
  const convergence = [
    { tolerance: wide, relative: farthest(compareResults(first, comparable(wider))) },
    { tolerance: narrow, relative: farthest(compareResults(first, comparable(narrower))) },
  ];
  return { ...draft, convergence };
}

/**
 * The agreement of a new run with the frozen one. Where they do not agree, the frozen method is run here as it is and with
 * every input moved by ±1e-12: what that moves as much cannot be told. The frozen figures have no part in that, so that a
 * wrong one is never called sensitive.
 */
async function agreementWith({ scenario, result }: Frozen, second: Result, ask: Ask): Promise<Agreement> {
  const found = withCounts(agreementOf(resultOf(result), comparable(second)), result, second);
  if (found.verdict === "agrees") return found;
  const options: RunOptions = { samples: 0, method: result.method };
  const here = await ask(scenario, options);
  const moved: Comparison[] = [];
  for (const sign of [1, -1] as const)
    moved.push(compareResults(here, await ask(movedInputs(scenario, sign), options)));
  const reach = Math.max(...moved.map(distance));
  return reach >= distance(found) ? { ...found, verdict: "sensitive" } : found;
}

/** The largest relative deviation; Infinity where the two are not the same kind of motion. */
const distance = ({ differences, deviations }: Comparison): number =>
  differences.length > 0 ? Infinity : (deviations[0]?.relative ?? 0);

/** A result with only the events that a revision keeps. */
const comparable = (result: Result): Result => resultOf(keptResultOf(result));

/** Events beyond those that are kept are compared by their count. */
function withCounts(found: Agreement, { eventCount }: KeptResult, { events }: Result): Agreement {
  if (events.length === eventCount) return found;
  const difference = `There are ${eventCount} events in the revision and ${events.length} here.`;
  const verdict = found.verdict === "agrees" ? "differs" : found.verdict;
  return { ...found, verdict, differences: [...found.differences, difference] };
}

function draftOf(way: ReplayWay, result: Result, found: Agreement): ReplayDraft {
  const { verdict, allowed, differences, deviations } = found;
  return {
    way,
    solverVersion: result.solverVersion,
    verdict,
    allowed,
    differences: differences.slice(0, mostDifferences),
    deviations: deviations.slice(0, mostDeviations).map((each) => ({ ...each, values: [...each.values] })),
    convergence: [],
  };
}

/** The largest deviation; all of the run where the two are not the same kind of motion. */
const farthest = ({ differences, deviations }: Comparison): number =>
  differences.length > 0 ? 1 : (deviations[0]?.relative ?? 0);
