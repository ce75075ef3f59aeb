import { parentPort, workerData } from "node:worker_threads";
import { recompute } from "./recompute.ts";
import type { KeptResult } from "./revisions-schema.ts";

/** One run on a thread of its own, which whoever started it may end at any time. */
const { text, claimed } = workerData as { text: string; claimed: KeptResult };
parentPort?.postMessage(recompute(text, claimed));
