import * as Comlink from "comlink";
import type { ErrandWorker } from "./errand.ts";
import type { ExploreApi } from "./explore.worker.ts";

/** Starts one module worker that runs what explorations ask for. */
export function startExploreWorker(): ErrandWorker {
  const worker = new Worker(new URL("./explore.worker.ts", import.meta.url), { type: "module" });
  const remote = Comlink.wrap<ExploreApi>(worker);
  return {
    do(errand, tell) {
      switch (errand.kind) {
        case "runs":
          return remote.runs(errand.runs);
        case "tile":
          return remote.tile(errand.scenario, errand.plan, errand.tile, Comlink.proxy(tell));
        case "draws":
          return remote.draws(errand.scenario, errand.plan, [errand.from, errand.to], Comlink.proxy(tell));
        case "summary":
          return remote.summary(errand.scenario, errand.plan, errand.rows);
        case "answers":
          return remote.answers(errand.scenario, errand.plan, errand.text, errand.seed);
      }
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
