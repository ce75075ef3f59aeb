import type { PointReply, RangeReport, RangeStep, Scenario } from "@restband/solver";
import { useCallback, useEffect, useMemo, useState } from "react";
import { laterPart } from "../later-part.ts";
import { runKey } from "./run-cache.ts";
import type { SolverJob } from "./solver-job.ts";
import { rangePool } from "./solver-pool.ts";
import type { Computed } from "./use-run.ts";

/** How far the ranges of a scenario have been gone through. */
export type RangeState =
  /** No value is known as a range, or no limit asks for it. */
  | { readonly kind: "none" }
  | { readonly kind: "waiting" }
  | { readonly kind: "running"; readonly done: number; readonly total: number }
  /** It takes so long that it waits to be asked. */
  | { readonly kind: "long"; readonly seconds: number }
  | { readonly kind: "cancelled" }
  | { readonly kind: "done"; readonly report: RangeReport };

export interface RangeRun {
  readonly state: RangeState;
  readonly cancel: () => void;
  /** Goes through the ranges however long it takes. */
  readonly begin: () => void;
}

// Going through ranges needs the check of scenarios; it begins long after the first paint.
const exploring = laterPart(() => import("./range-exploring.ts"));

const REST_BEFORE_MS = 600;
/** What takes longer is not begun unasked. */
const LONGEST_UNASKED_S = 30;
/** The time of so many runs tells that of all. */
const RUNS_TO_TELL = 3;
const TELL_EVERY_MS = 100;
const MOST_REPORTS = 50;
const reports = new Map<string, RangeReport>();
const none: RangeState = { kind: "none" };
const waiting: RangeState = { kind: "waiting" };

/**
 * Goes through the ranges of the scenario a result is of, in the background and one run at a time, once it has been left
 * alone for a moment. An edit ends it. `computed` null or stale asks for nothing.
 */
export function useRanges(computed: Computed | null, isStale: boolean): RangeRun {
  const [client] = useState(() => Symbol("ranges"));
  const [asked, setAsked] = useState<{ key: string | null; turn: number }>({ key: null, turn: 0 });
  const [known, setKnown] = useState<{ key: string; state: RangeState }>({ key: "", state: waiting });
  const key = useMemo(() => (computed && "result" in computed ? keyOf(computed.scenario) : null), [computed]);

  useEffect(() => {
    if (isStale || key === null || !computed || !("result" in computed)) return;
    let isWanted = true;
    const isAsked = asked.key === key;
    const tell = (state: RangeState): void => {
      if (isWanted) setKnown({ key, state });
    };
    const ready = reports.get(key);
    if (ready) return tell({ kind: "done", report: ready });
    const { scenario, result } = computed;
    const explore = async (): Promise<void> => {
      const { exploreRanges, hasRanges } = await exploring.ask();
      if (!hasRanges(scenario)) return tell(none);
      const end = await follow({ client, steps: exploreRanges(scenario, result.limits), isAsked, tell });
      if (end.kind === "done") keep(key, end.report);
      tell(end);
    };
    const timer = setTimeout(() => void explore(), isAsked ? 0 : REST_BEFORE_MS);
    return () => {
      isWanted = false;
      clearTimeout(timer);
      rangePool.leave(client);
    };
    // The key stands for the scenario and its result.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [client, key, isStale, asked]);

  const cancel = useCallback(() => rangePool.cancel(client), [client]);
  const begin = useCallback(() => setAsked(({ turn }) => ({ key, turn: turn + 1 })), [key]);
  const state = key === null ? none : known.key === key ? known.state : waiting;
  return { state, cancel, begin };
}

/** What the ranges are gone through for: all that a run reads, and the ranges; null where no limit or no range asks for it. */
function keyOf(scenario: Scenario): string | null {
  const known = Object.entries(scenario.origins).flatMap(([path, { low, high }]) =>
    low === undefined && high === undefined ? [] : [[path, low, high]],
  );
  if (scenario.limits.length === 0 || known.length === 0) return null;
  return JSON.stringify([runKey({ scenario, options: {} }), known]);
}

interface Following {
  readonly client: symbol;
  readonly steps: Generator<RangeStep, RangeReport, PointReply>;
  readonly isAsked: boolean;
  readonly tell: (state: RangeState) => void;
}

/** Runs step after step; ends early where it is cancelled or would take too long unasked. */
async function follow({ client, steps, isAsked, tell }: Following): Promise<RangeState> {
  const started = performance.now();
  let told = 0;
  let step = steps.next();
  for (let count = 1; !step.done; count++) {
    const { scenario, done, total } = step.value;
    const reply = await replyOf(client, scenario);
    if (reply === null) return { kind: "cancelled" };
    const elapsed = performance.now() - started;
    const seconds = (elapsed / count / 1000) * total;
    if (!isAsked && count === RUNS_TO_TELL && seconds > LONGEST_UNASKED_S) return { kind: "long", seconds };
    if (elapsed - told > TELL_EVERY_MS) {
      told = elapsed;
      tell({ kind: "running", done: done + 1, total });
    }
    step = steps.next(reply);
  }
  return { kind: "done", report: step.value };
}

/** A run of one point: only its limits are wanted. Null where it was ended. */
async function replyOf(client: symbol, scenario: Scenario): Promise<PointReply | null> {
  const job: SolverJob = { scenario, options: { samples: 0, events: false, energy: false, quantities: [] } };
  const reply = await rangePool.request(client, job);
  if (reply.kind === "result") return reply.result.limits;
  if (reply.kind === "refusal") return { reason: reply.refusal.message };
  return reply.kind === "failed" ? { reason: reply.message } : null;
}

function keep(key: string, report: RangeReport): void {
  reports.set(key, report);
  if (reports.size > MOST_REPORTS) reports.delete([...reports.keys()][0]);
}
