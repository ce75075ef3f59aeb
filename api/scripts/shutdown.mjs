import { endRunning } from "./processes.mjs";

/**
 * Runs what a command starts, and at its end, however that comes, stops it again in reverse order. `work` gets `atEnd`, to
 * name what there is to stop, and returns a promise of the exit code; Ctrl-C and SIGTERM end it with 0.
 */
export async function untilStopped(work) {
  const stops = [];
  const asked = new Promise((resolve) => {
    for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) process.on(signal, () => resolve(0));
  });
  const atEnd = (stop) => void stops.unshift(stop);
  const working = work(atEnd);
  working.catch(() => {});
  try {
    return await Promise.race([asked, working]);
  } finally {
    endRunning();
    for (const stop of stops) await stop();
  }
}
