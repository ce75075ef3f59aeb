import { Worker } from "node:worker_threads";
import type { Hindrance, Recomputed } from "./recompute.ts";
import type { KeptResult } from "./revisions-schema.ts";

const MEGABYTES = 512;

/** Runs a scenario beside the server. Null: it took too long and was ended. */
export type Recompute = (text: string, claimed: KeptResult) => Promise<Recomputed | Hindrance | null>;

/**
 * The server's own runs: a few at a time, each on a thread of its own that is ended after so many seconds. Further ones
 * wait for their turn.
 */
export function createRecomputing({ workers, seconds }: { workers: number; seconds: number }): Recompute {
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
  return async (text, claimed) => {
    await take();
    try {
      return await runOnce({ text, claimed }, seconds);
    } finally {
      give();
    }
  };
}

async function runOnce(
  workerData: { text: string; claimed: KeptResult },
  seconds: number,
): Promise<Recomputed | Hindrance | null> {
  const worker = startWorker(workerData);
  let timer: NodeJS.Timeout | undefined;
  try {
    return await new Promise((resolve, reject) => {
      timer = setTimeout(() => resolve(null), seconds * 1000);
      worker.once("message", resolve);
      worker.once("error", reject);
      worker.once("exit", (code) => reject(new Error(`The run's thread ended by itself (${code}).`)));
    });
  } finally {
    clearTimeout(timer);
    await worker.terminate();
  }
}

/** From the bundle beside this one, or from the source by what can read TypeScript. */
function startWorker(workerData: object): Worker {
  const file = import.meta.url.endsWith(".ts") ? "recompute-from-source.mjs" : "recompute-worker.js";
  const resourceLimits = { maxOldGenerationSizeMb: MEGABYTES };
  return new Worker(new URL(file, import.meta.url), { workerData, resourceLimits });
}
