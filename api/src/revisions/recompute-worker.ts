import { parentPort } from "node:worker_threads";
import { recompute } from "./recompute.ts";
import type { RunOrder } from "./recompute-pool.ts";

/** Runs on a thread of its own, one after another; whoever started it may end it at any time. */
parentPort?.on("message", ({ scenario, claimed }: RunOrder) => parentPort?.postMessage(recompute(scenario, claimed)));
