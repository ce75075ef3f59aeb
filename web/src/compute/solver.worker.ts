import * as Comlink from "comlink";
import { simulate, type Refusal, type Result, type Samples, type Scenario } from "@restband/solver";
import type { RunOptions } from "./solver-job.ts";

const PROGRESS_EVERY_MS = 60;

const api = {
  /** One run. Progress is told at most every 60 ms; the arrays of the samples are handed over, not copied. */
  run(scenario: Scenario, options: RunOptions, onProgress: (fraction: number) => void): Result | Refusal {
    const outcome = simulate(scenario, { ...options, progress: throttled(onProgress) });
    return "error" in outcome ? outcome : Comlink.transfer(outcome, buffersOf(outcome.samples));
  },
};

export type SolverApi = typeof api;

function throttled(tell: (fraction: number) => void): (fraction: number) => boolean {
  let last = performance.now();
  return (fraction) => {
    const now = performance.now();
    if (now - last >= PROGRESS_EVERY_MS) {
      last = now;
      tell(fraction);
    }
    return true; // a run is cancelled by ending its worker: a busy worker hears no message
  };
}

const buffersOf = (samples: Samples | null): ArrayBufferLike[] =>
  samples ? Object.values(samples).map((array: Float64Array) => array.buffer) : [];

Comlink.expose(api);
