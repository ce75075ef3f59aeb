import * as Comlink from "comlink";
import { answerRun, runTile, type RunAsk, type RunReply, type Scenario, type SweepPlan } from "@restband/solver";
import type { TellDone } from "./errand.ts";

const TELL_EVERY_MS = 200;

const api = {
  /** The runs one after the other. */
  runs: (asks: readonly RunAsk[]): RunReply[] => asks.map((ask) => answerRun(ask)),

  /** The rows of a tile, handed over and not copied. How far it is is told at most five times a second. */
  tile(scenario: Scenario, plan: SweepPlan, tile: number, tell: TellDone): Float64Array {
    let last = performance.now();
    const onCell = (done: number): boolean => {
      const now = performance.now();
      if (now - last >= TELL_EVERY_MS) {
        last = now;
        tell(done);
      }
      return true; // a tile is called off by ending its worker: a busy worker hears no message
    };
    const rows = runTile(scenario, plan, tile, { onCell }) ?? new Float64Array();
    return Comlink.transfer(rows, [rows.buffer]);
  },
};

export type ExploreApi = typeof api;

Comlink.expose(api);
