import * as Comlink from "comlink";
import type { SolverWorker } from "./solver-job.ts";
import type { SolverApi } from "./solver.worker.ts";

/** Starts one module worker that runs the solver. */
export function startWorker(): SolverWorker {
  const worker = new Worker(new URL("./solver.worker.ts", import.meta.url), { type: "module" });
  const remote = Comlink.wrap<SolverApi>(worker);
  return {
    run: (job, onProgress) => remote.run(job.scenario, job.options, Comlink.proxy(onProgress)),
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
