import type { Exploring, RunReply } from "@restband/solver";
import { BrokenOff } from "./errand.ts";
import type { ErrandPool } from "./errand-pool.ts";

/** How far an exploration is. */
export interface ExploreProgress {
  readonly done: number;
  readonly total: number;
}

interface GoThroughSettings {
  readonly pool: ErrandPool;
  readonly signal: AbortSignal;
  readonly tell?: (progress: ExploreProgress) => void;
}

/**
 * Goes through an exploration: the runs it asks for at a time are shared out among the workers of a pool.
 * @throws CalledOff once the signal is aborted
 */
export async function goThrough<T>(exploring: Exploring<T>, { pool, signal, tell }: GoThroughSettings): Promise<T> {
  let step = exploring.next();
  while (!step.done) {
    const { runs, done, total } = step.value;
    tell?.({ done, total });
    const shares = sharesOf(runs, pool.size);
    const replies = await Promise.all(shares.map((share) => replyTo(share, pool, signal)));
    step = exploring.next(replies.flat());
  }
  return step.value;
}

/** Equal shares in order, one for each worker. */
function sharesOf<T>(items: readonly T[], count: number): T[][] {
  const size = Math.max(1, Math.ceil(items.length / count));
  return Array.from({ length: Math.ceil(items.length / size) }, (_, i) => items.slice(i * size, (i + 1) * size));
}

type Runs = Parameters<ErrandPool["send"]>[0] & { kind: "runs" };

/** A run that two workers died of has no reply but that. */
async function replyTo(runs: Runs["runs"], pool: ErrandPool, signal: AbortSignal): Promise<readonly RunReply[]> {
  try {
    return await pool.send({ kind: "runs", runs }, signal);
  } catch (error) {
    if (!(error instanceof BrokenOff)) throw error;
    if (runs.length === 1) return [{ reason: error.message }];
    const halves = sharesOf(runs, 2);
    return (await Promise.all(halves.map((half) => replyTo(half, pool, signal)))).flat();
  }
}
