import { Worker } from "node:worker_threads";

const MEGABYTES = 512;
/** A thread that nobody has needed for so long is ended. */
const IDLE_MS = 60_000;

export type Threads = ReturnType<typeof createThreads>;

/** Threads for runs. One that is done is kept for a while: to start one takes longer than most runs. */
export function createThreads() {
  const idle = new Map<Worker, NodeJS.Timeout>();
  return {
    take(): Worker {
      const [thread] = idle.keys();
      if (!thread) return start();
      clearTimeout(idle.get(thread));
      idle.delete(thread);
      thread.ref();
      return thread;
    },

    /** Gives back a thread that has nothing to do; it holds no process up. */
    give(thread: Worker): void {
      const end = () => {
        idle.delete(thread);
        void thread.terminate();
      };
      thread.unref();
      idle.set(thread, setTimeout(end, IDLE_MS).unref());
    },
  };
}

/** From the bundle beside this one, or from the source by what can read TypeScript. */
function start(): Worker {
  const file = import.meta.url.endsWith(".ts") ? "recompute-from-source.mjs" : "recompute-worker.js";
  return new Worker(new URL(file, import.meta.url), { resourceLimits: { maxOldGenerationSizeMb: MEGABYTES } });
}
