import { execFileSync } from "node:child_process";
import { cpus, loadavg } from "node:os";
import { fileURLToPath } from "node:url";
import { Worker } from "node:worker_threads";
import { cellOf, compileProblem, runTile, tileCells, type Scenario } from "@restband/solver";
import { runExact } from "../../solver/src/motion/exact/run-exact.ts";
import { median, timeOf } from "./measure.ts";
import { sweepPlan } from "./sweep-plan.ts";

/*
 * What a sweep costs: friction 0…1 by frequency 0.2…2 rad/s, 100 × 100 cells of 100 periods, of which every eighth tile is run.
 * Processor time a cell, beside the propagation of the same cells alone, with more quantities, by two workers, and beside
 * SciPy with a pool of two processes on a few of the cells. Nothing here is asserted.
 */

const rounds = Number(process.env.RESTBAND_BENCH_ROUNDS ?? 5);
const five = ["amplitude", "peakVelocity", "stickFraction", "restTime", "driveForcePeak"];
const { scenario: base, plan, tiles } = sweepPlan([]);
const cells = tiles.flatMap((tile) => [...tileCells(plan, tile)]);
const problems = cells.map((index) => compileProblem(cellOf(base, plan, index).scenario as Scenario));

const ways: Record<string, () => void> = {
  "propagation alone": () => problems.forEach((problem) => runExact(problem)),
  "sweep, outcomes": () => tiles.forEach((tile) => runTile(base, plan, tile)),
  "sweep, five quantities": () => tiles.forEach((tile) => runTile(base, sweepPlan(five).plan, tile)),
};

/** Wall and processor seconds of workers that share the tiles, from when all are warm until the last is done. */
async function shared(workers: number): Promise<{ wall: number; processor: number }> {
  const file = new URL("sweep-worker.mjs", import.meta.url);
  const all = Array.from({ length: workers }, (_, i) => {
    const own = tiles.filter((_tile, place) => place % workers === i);
    return new Worker(file, { workerData: { tiles: own } });
  });
  const said = (worker: Worker) => new Promise<void>((resolve) => worker.once("message", () => resolve()));
  await Promise.all(all.map(said));
  const [started, before] = [performance.now(), process.cpuUsage()];
  await Promise.all(all.map((worker) => (worker.postMessage("go"), said(worker))));
  const { user, system } = process.cpuUsage(before);
  const wall = (performance.now() - started) / 1000;
  await Promise.all(all.map((worker) => worker.terminate()));
  return { wall, processor: (user + system) / 1e6 };
}

/** Processor seconds a cell of SciPy with two processes; null where it is not here. */
function inSciPy(): number | null {
  const script = fileURLToPath(new URL("yardsticks/sweep.py", import.meta.url));
  try {
    return Number(execFileSync("python3", [script], { encoding: "utf8", stdio: ["ignore", "pipe", "ignore"] }));
  } catch {
    return null;
  }
}

const show = (name: string, seconds: number, note: string) =>
  console.log(
    `  ${name.padEnd(26)} ${(seconds * 1e6).toPrecision(4).padStart(8)} µs a cell  ${(1 / seconds).toFixed(0).padStart(6)} cells/s  ${note}`,
  );

console.log(
  `Sweep of ${cells.length} of 10,000 cells; ${cpus().length} cores, load ${loadavg()[0].toFixed(1)}, median of ${rounds}`,
);
const times = new Map(Object.keys(ways).map((name): [string, number[]] => [name, []]));
for (const work of Object.values(ways)) work();
for (let round = 0; round < rounds; round++)
  for (const [name, work] of Object.entries(ways)) times.get(name)?.push(timeOf(work) / cells.length);
const alone = median(times.get("propagation alone") ?? []);
for (const [name, each] of times) show(name, median(each), `× ${(median(each) / alone).toPrecision(3)}`);

const counts = [1, 2];
const runs = new Map(counts.map((count): [number, { wall: number; processor: number }[]] => [count, []]));
for (let round = 0; round < rounds; round++) for (const count of counts) runs.get(count)?.push(await shared(count));
for (const [count, each] of runs) {
  const wall = median(each.map((one) => one.wall));
  show(
    `${count} worker${count > 1 ? "s" : ""}`,
    median(each.map((one) => one.processor)) / cells.length,
    `wall ${wall.toPrecision(3)} s`,
  );
}

const python = inSciPy();
if (python === null) console.log("  SciPy: python3 with SciPy is not here");
else show("SciPy, pool of two", python, `× ${(python / alone).toPrecision(3)}`);
