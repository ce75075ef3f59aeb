import { once } from "node:events";
import type { Worker } from "node:worker_threads";
import type { Scenario } from "@restband/solver";
import { Refusal } from "../errors.ts";
import type { Hindrance, Recomputed } from "./recompute.ts";
import { createThreads } from "./recompute-threads.ts";
import type { KeptResult } from "./revisions-schema.ts";

/** Runs of one person that are under way or wait at a time. */
const MOST_OF_ONE = 3;

/** What a run is asked with: the scenario with all its points, and what is claimed of it. */
export interface RunOrder {
  readonly scenario: Scenario;
  readonly claimed: KeptResult;
}

type Answer = Recomputed | Hindrance;

/**
 * Runs a scenario beside the server. Null: it took too long or too much memory, and was ended.
 * @throws Refusal 429 where the person has asked for too many already
 */
export type Recompute = (order: RunOrder, accountId: string) => Promise<Answer | null>;

/**
 * The server's own runs: a few at a time, each on a thread that is ended where it takes longer than so many seconds.
 * Further ones wait for their turn, so many of each person that nobody waits long for others.
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
  const run = async (order: RunOrder) => {
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
  const counts = new Map<string, number>();
  return async (order, accountId) => {
    const count = counts.get(accountId) ?? 0;
    if (count >= MOST_OF_ONE) throw tooManyRuns();
    counts.set(accountId, count + 1);
    try {
      return await run(order);
    } finally {
      const left = (counts.get(accountId) ?? 1) - 1;
      if (left > 0) counts.set(accountId, left);
      else counts.delete(accountId);
    }
  };
}

function tooManyRuns(): Refusal {
  const message = `${MOST_OF_ONE} of your revisions are being computed. Freeze the next one when one of them is done.`;
  return new Refusal(429, "too-many-runs", message, { retryAfterSeconds: 5 });
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
