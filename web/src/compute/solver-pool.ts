import { Pool } from "./pool.ts";
import { startWorker } from "./start-worker.ts";

/** The page's one pool: a second worker only where the machine has a core to spare. */
export const solverPool = new Pool({
  start: startWorker,
  size: (navigator.hardwareConcurrency || 2) > 2 ? 2 : 1,
  patience: 250,
});

/** Ranges are gone through by a worker of their own, so that no run of the page waits for them; an edit ends it soon. */
export const rangePool = new Pool({ start: startWorker, size: 1, patience: 50 });
