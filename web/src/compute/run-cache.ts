import type { SolverJob, SolverReply } from "./solver-job.ts";

const ROOM = 60;
const kept = new Map<string, SolverReply>();

/** The identity of a run: all that the solver reads; title, purpose and origins change no result. */
export function runKey({ scenario, options }: SolverJob): string {
  const { title: _title, purpose: _purpose, origins: _origins, ...read } = scenario;
  return JSON.stringify([read, options]);
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
  for (const oldest of kept.keys()) {
    if (kept.size <= ROOM) return;
    kept.delete(oldest);
  }
}
