import { ErrandPool } from "./errand-pool.ts";
import { startExploreWorker } from "./start-explore-worker.ts";

const cores = navigator.hardwareConcurrency || 2;

/** What somebody waits for: all cores but the one the page itself needs. */
export const explorePool = new ErrandPool({ start: startExploreWorker, size: Math.min(8, Math.max(1, cores - 1)) });

/** What nobody has asked for yet: one worker beside the others. */
export const idlePool = new ErrandPool({ start: startExploreWorker, size: 1 });
