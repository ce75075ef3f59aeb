import * as Comlink from "comlink";
import { simulate, type Refusal, type Result, type Samples, type Scenario } from "@restband/solver";
import type { EvenTimes, RunOptions } from "./solver-job.ts";

const PROGRESS_EVERY_MS = 60;

const api = {
  /** One run. Progress is told at most every 60 ms; the arrays of the samples are handed over, not copied. */
  run(
    scenario: Scenario,
    { evenly, ...options }: RunOptions,
    onProgress: (fraction: number) => void,
  ): Result | Refusal {
    const at = evenly && timesOf(evenly);
    const outcome = simulate(scenario, { ...options, at, progress: throttled(onProgress) });
    if ("error" in outcome) return outcome;
    return Comlink.transfer(outcome, [...buffersOf(outcome.samples), ...buffersOf(outcome.at)]);
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

const timesOf = ({ from, to, count }: EvenTimes): number[] =>
  Array.from({ length: count }, (_, i) => from + (i * (to - from)) / count);

const buffersOf = (samples: Samples | null | undefined): ArrayBufferLike[] =>
  samples ? Object.values(samples).map((array: Float64Array) => array.buffer) : [];

Comlink.expose(api);
