import * as Comlink from "comlink";
import type { ErrandWorker } from "./errand.ts";
import type { ExploreApi } from "./explore.worker.ts";

/** Starts one module worker that runs what explorations ask for. */
export function startExploreWorker(): ErrandWorker {
  const worker = new Worker(new URL("./explore.worker.ts", import.meta.url), { type: "module" });
  const remote = Comlink.wrap<ExploreApi>(worker);
  return {
    do(errand, tell) {
      if (errand.kind === "runs") return remote.runs(errand.runs);
      const { scenario, plan, tile } = errand;
      return remote.tile(scenario, plan, tile, Comlink.proxy(tell));
    },
    terminate() {
      remote[Comlink.releaseProxy]();
      worker.terminate();
    },
    onCrash(tell) {
      worker.addEventListener("error", tell, { once: true });
      worker.addEventListener("messageerror", tell, { once: true });
    },
  };
}
