import * as Comlink from "comlink";
import {
  answerRun,
  drawsOf,
  readAnswers,
  runDraws,
  runTile,
  toleranceSummary,
  type Draws,
  type ReadAnswers,
  type RunAsk,
  type RunReply,
  type Scenario,
  type SweepPlan,
  type TolerancePlan,
  type ToleranceSummary,
} from "@restband/solver";
import type { TellDone } from "./errand.ts";

const TELL_EVERY_MS = 200;

const api = {
  /** The runs one after the other. */
  runs: (asks: readonly RunAsk[]): RunReply[] => asks.map((ask) => answerRun(ask)),

  /** The rows of a tile, handed over and not copied. */
  tile: (scenario: Scenario, plan: SweepPlan, tile: number, tell: TellDone): Float64Array =>
    handedOver(runTile(scenario, plan, tile, { onCell: throttled(tell) })),

  /** The rows of the draws from one place to another. */
  draws: (scenario: Scenario, plan: TolerancePlan, range: readonly [number, number], tell: TellDone): Float64Array =>
    handedOver(runDraws(scenario, plan, allDraws(plan), range, { onDraw: throttled(tell) })),

  summary: (scenario: Scenario, plan: TolerancePlan, rows: Float64Array): ToleranceSummary =>
    toleranceSummary(plan, scenario, rows),

  answers: (scenario: Scenario, plan: SweepPlan, text: string, seed: number): ReadAnswers =>
    readAnswers(scenario, plan, text.split("\n"), { seed }),
};

export type ExploreApi = typeof api;

let drawn: { key: string; draws: Draws } | null = null;

/** The draws follow from the plan alone: made once for all errands of a study. */
function allDraws(plan: TolerancePlan): Draws {
  const key = JSON.stringify(plan);
  if (drawn?.key !== key) drawn = { key, draws: drawsOf(plan) };
  return drawn.draws;
}

/** Tells at most five times a second. True: rows are called off by ending the worker, since a busy one hears nothing. */
function throttled(tell: TellDone): (done: number) => boolean {
  let last = performance.now();
  return (done) => {
    const now = performance.now();
    if (now - last >= TELL_EVERY_MS) {
      last = now;
      tell(done);
    }
    return true;
  };
}

function handedOver(rows: Float64Array | null): Float64Array {
  const all = rows ?? new Float64Array();
  return Comlink.transfer(all, [all.buffer]);
}

Comlink.expose(api);
