/*
 * What a sweep costs on its page: 100 × 100 cells of a shaken body in one and in two workers, stored as they come and not
 * stored, beside the bare solver in as many threads. The built pages, a server and a database of their own, a real browser
 * without a screen. Nothing here is asserted.
 */
import { cpus, loadavg } from "node:os";
import { join } from "node:path";
import { Worker } from "node:worker_threads";
import { cellCount, tileCount } from "@restband/solver";
import { median } from "./measure.ts";
import { openSite } from "./page/bench-site.ts";
import { measurePageSweep, sweptScenario, type PageSweep } from "./page/sweep-in-page.ts";
import { sweepPlan } from "./sweep-plan.ts";

const ROUNDS = Number(process.env.RESTBAND_BENCH_ROUNDS ?? 5);
const quantities = ["stickFraction"];
const { scenario, plan } = sweepPlan(quantities);
const cells = cellCount(plan);
const load = (): string => loadavg()[0].toFixed(2);

const site = await openSite(join(import.meta.dirname, "../../web/dist"));
try {
  console.log(`\n${cpus().length} × ${cpus()[0].model}, load ${load()}; ${cells} cells, median of ${ROUNDS}`);
  const swept = await sweptScenario(site, scenario);
  const inPage = (workers: number, isKept: boolean) =>
    measurePageSweep(site, swept, { scenario, plan, workers, isKept });
  for (const workers of [1, 2]) {
    const rounds: { bare: number; kept: PageSweep; unkept: PageSweep }[] = [];
    for (let round = 0; round < ROUNDS; round++)
      rounds.push({
        bare: await bare(workers),
        kept: await inPage(workers, true),
        unkept: await inPage(workers, false),
      });
    report(workers, rounds);
  }
} finally {
  await site.close();
}

/** Seconds that as many threads of the bare solver take for all tiles, each warm. */
async function bare(workers: number): Promise<number> {
  const all = Array.from({ length: tileCount(plan) }, (_, tile) => tile);
  const threads = Array.from({ length: workers }, (_, i) => {
    const tiles = all.filter((tile) => tile % workers === i);
    return new Worker(new URL("sweep-worker.mjs", import.meta.url), { workerData: { tiles, quantities } });
  });
  const said = (thread: Worker) => new Promise<void>((resolve) => thread.once("message", () => resolve()));
  await Promise.all(threads.map(said));
  const begun = performance.now();
  await Promise.all(threads.map((thread) => (thread.postMessage("go"), said(thread))));
  const seconds = (performance.now() - begun) / 1000;
  await Promise.all(threads.map((thread) => thread.terminate()));
  return seconds;
}

function report(workers: number, rounds: readonly { bare: number; kept: PageSweep; unkept: PageSweep }[]): void {
  const rateOf = (seconds: readonly number[]): number => cells / median(seconds);
  const solver = rateOf(rounds.map((round) => round.bare));
  const kept = rateOf(rounds.map((round) => round.kept.stored));
  const unkept = rateOf(rounds.map((round) => round.unkept.computed));
  const frames = rounds.flatMap((round) => round.kept.frames).sort((a, b) => a - b);
  const share = (rate: number): string => `${((100 * rate) / solver).toFixed(0)} %`;
  const name = `${workers} worker${workers === 1 ? "" : "s"}`;
  console.log(
    [
      `${name}: bare solver ${solver.toFixed(0)} cells/s`,
      `on the page, stored ${kept.toFixed(0)} (${share(kept)})`,
      `not stored ${unkept.toFixed(0)} (${share(unkept)})`,
      `load ${load()}`,
    ].join(", "),
  );
  console.log(
    [
      `  meanwhile ${(1000 / median(frames)).toFixed(0)} frames a second, p95 of a frame ${frames[Math.floor(0.95 * frames.length)].toFixed(0)} ms`,
      `most memory of the page ${median(rounds.map((round) => round.kept.memory.after)).toFixed(0)} MB (before it began ${median(rounds.map((round) => round.kept.memory.before)).toFixed(0)})`,
    ].join(", "),
  );
}
