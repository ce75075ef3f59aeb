import { once } from "node:events";
import type { Worker } from "node:worker_threads";
import type { Scenario } from "@restband/solver";
import type { Hindrance, Recomputed } from "./recompute.ts";
import { createThreads } from "./recompute-threads.ts";
import type { KeptResult } from "./revisions-schema.ts";

/** What a run is asked with: the scenario with all its points, and what is claimed of it. */
export interface RunOrder {
  readonly scenario: Scenario;
  readonly claimed: KeptResult;
}

type Answer = Recomputed | Hindrance;

/** Runs a scenario beside the server. Null: it took too long or too much memory, and was ended. */
export type Recompute = (order: RunOrder) => Promise<Answer | null>;

/**
 * The server's own runs: a few at a time, each on a thread that is ended where it takes longer than so many seconds.
 * Further ones wait for their turn.
 */
export function createRecomputing({ workers, seconds }: { workers: number; seconds: number }): Recompute {
  const threads = createThreads();
  const waiting: (() => void)[] = [];
  let running = 0;
  const take = async () => {
    if (running < workers) running += 1;
    else await new Promise<void>((resolve) => waiting.push(resolve));
  };
  /** Hands its turn on to the one who waits longest. */
  const give = () => {
    const next = waiting.shift();
    if (next) next();
    else running -= 1;
  };
  return async (order) => {
    await take();
    const thread = threads.take();
    try {
      const answer = await answerOf(thread, order, seconds);
      if (answer) threads.give(thread);
      else await thread.terminate();
      return answer;
    } catch (error) {
      await thread.terminate();
      throw error;
    } finally {
      give();
    }
  };
}

/** Null where there is no answer within so many seconds, or the thread ran out of memory. */
async function answerOf(thread: Worker, order: RunOrder, seconds: number): Promise<Answer | null> {
  const over = new AbortController();
  const { signal } = over;
  const timer = setTimeout(() => over.abort(), seconds * 1000);
  thread.postMessage(order);
  try {
    // The first thing that a thread tells is its answer; it fails with what it could not catch.
    const [answer] = (await once(thread, "message", { signal })) as [Answer];
    return answer;
  } catch (error) {
    if (signal.aborted || (error as { code?: string }).code === "ERR_WORKER_OUT_OF_MEMORY") return null;
    throw error;
  } finally {
    clearTimeout(timer);
  }
}
