import { jsonText } from "@restband/solver";
import type { SolverJob, SolverReply } from "./solver-job.ts";

/** Runs kept at most, and samples in all of them: about 40 MB. */
const MOST_RUNS = 300;
const MOST_SAMPLES = 800_000;
const kept = new Map<string, SolverReply>();

/** The identity of a run: all that the solver reads; title, purpose and origins change no result. */
export function runKey({ scenario, options }: SolverJob): string {
  return jsonText([{ ...scenario, title: "", purpose: "", origins: {} }, options], "sorted");
}

/** A reply computed before, by its key; looked at again it stays longer. */
export function recall(key: string): SolverReply | undefined {
  const reply = kept.get(key);
  if (reply) remember(key, reply);
  return reply;
}

/** Keeps results and refusals (never what was dropped or failed), the oldest making room. */
export function remember(key: string, reply: SolverReply): void {
  if (reply.kind !== "result" && reply.kind !== "refusal") return;
  kept.delete(key);
  kept.set(key, reply);
  let samples = [...kept.values()].reduce((sum, each) => sum + sizeOf(each), 0);
  for (const [oldest, dropped] of kept) {
    if (kept.size <= MOST_RUNS && samples <= MOST_SAMPLES) return;
    kept.delete(oldest);
    samples -= sizeOf(dropped);
  }
}

function sizeOf(reply: SolverReply): number {
  if (reply.kind !== "result") return 0;
  const { samples, at } = reply.result;
  return (samples?.t.length ?? 0) + (at?.t.length ?? 0);
}
