import { parentPort, workerData } from "node:worker_threads";
import { runTile } from "@restband/solver";
import { sweepPlan } from "./sweep-plan.ts";

/* Runs its tiles once to be warm, says so, and runs them again when told to. */

const { tiles, quantities = [] } = workerData as { tiles: number[]; quantities?: string[] };
const { scenario, plan } = sweepPlan(quantities);
const work = () => tiles.forEach((tile) => runTile(scenario, plan, tile));

work();
parentPort?.postMessage("warm");
parentPort?.once("message", () => {
  work();
  parentPort?.postMessage("done");
});
