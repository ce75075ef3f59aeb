import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { cpus, loadavg, tmpdir } from "node:os";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import { accuracies, type Accuracy } from "./accuracy.ts";
import { allocationOf, median, timeOf } from "./measure.ts";
import { floorAcceleration } from "./problems.ts";
import { subjects, waysOf, type Tally } from "./subjects.ts";
import { verdicts } from "./targets.ts";
import { inC, inCvode, inSciPy, type Yardstick } from "./yardsticks.ts";

/*
 * `npm run bench`: what a simulation costs, beside yardsticks on the same machine in the same run. Processor time, medians
 * of rounds in which all take their turn, so that a busy machine troubles all alike. Nothing here is asserted.
 */

const rounds = Number(process.env.RESTBAND_BENCH_ROUNDS ?? 5);
const root = fileURLToPath(new URL("../..", import.meta.url));

interface Row {
  problem: string;
  way: string;
  seconds: number;
  events: number;
  x: number;
  /** Times of the propagation in the same run. */
  ratio: number;
  allocation?: number;
}

interface Series extends Tally {
  problem: string;
  way: string;
  times: number[];
  allocation?: number;
}

const scratch = mkdtempSync(join(tmpdir(), "restband-bench-"));
try {
  const recordFile = join(scratch, "record.txt");
  writeFileSync(recordFile, floorAcceleration().join("\n"));
  const yardsticks = [inC(recordFile, scratch), inCvode(recordFile, scratch), inSciPy(recordFile)];
  report(measure(yardsticks), yardsticks, accuracies(recordFile));
} finally {
  rmSync(scratch, { recursive: true, force: true });
}

function measure(yardsticks: readonly Yardstick[]): Row[] {
  const series = new Map<string, Series>();
  const take = (problem: string, way: string, seconds: number, { events, x }: Tally): void => {
    const key = `${problem} ${way}`;
    const one = series.get(key) ?? { problem, way, times: [], events, x };
    one.times.push(seconds);
    series.set(key, one);
  };
  const own = subjects.map((subject) => ({ name: subject.name, ways: Object.entries(waysOf(subject)) }));
  for (const { ways } of own) for (const [, { work }] of ways) timeOf(work, 0.3); // warm-up
  for (let round = 0; round < rounds; round++) {
    for (const { name, ways } of own) {
      for (const [way, { share, work, tell }] of ways) take(name, way, timeOf(work) / share, tell());
    }
    for (const yardstick of yardsticks) {
      if ("absent" in yardstick) continue;
      for (const [name, timed] of yardstick.round()) take(name, yardstick.name, timed.seconds, timed);
    }
  }
  for (const { name, ways } of own) {
    const { share, work } = Object.fromEntries(ways).propagation;
    series.get(`${name} propagation`)!.allocation = allocationOf(work) / share;
  }
  return rowsOf([...series.values()]);
}

function rowsOf(series: readonly Series[]): Row[] {
  const base = new Map(series.filter(({ way }) => way === "propagation").map((s) => [s.problem, median(s.times)]));
  const ordered = subjects.flatMap(({ name }) => series.filter(({ problem }) => problem === name));
  return ordered.map(({ times, ...one }) => ({
    ...one,
    seconds: median(times),
    ratio: median(times) / base.get(one.problem)!,
  }));
}

function report(rows: readonly Row[], yardsticks: readonly Yardstick[], accuracy: Accuracy[] | string): void {
  const [{ model }] = cpus();
  const absent = yardsticks.flatMap((one) => ("absent" in one ? [`${one.name}: ${one.absent}`] : []));
  const machine = { model, cores: cpus().length, node: process.version, load: loadavg()[0], rounds };
  const file = join(root, ".local/bench.json");
  mkdirSync(join(root, ".local"), { recursive: true });
  writeFileSync(file, JSON.stringify({ machine, rows, accuracy, absent }, null, 2));
  console.log(
    `${model}, ${machine.cores} cores, Node ${machine.node}, load ${machine.load.toFixed(1)}, median of ${rounds}`,
  );
  for (const { name, what } of subjects) {
    console.log(`\n${name}  ${what}`);
    for (const row of rows.filter(({ problem }) => problem === name)) console.log(lineOf(row));
  }
  console.log("\nEvents of the exact method beside forty digits, at most apart");
  if (typeof accuracy === "string") console.log(`  ${accuracy}`);
  else for (const { problem, events, t, x } of accuracy) console.log(`  ${problem}  ${events} events  ${t} s  ${x} m`);
  console.log("\nTargets");
  for (const line of verdicts(rows, accuracy)) console.log(`  ${line}`);
  console.log(`\n${absent.join("\n")}`);
  console.log("all of it in .local/bench.json");
}

function lineOf({ way, seconds, ratio, events, x, allocation }: Row): string {
  const time = `${(seconds * 1e6).toPrecision(4)} µs`;
  const told = Number.isNaN(events) ? "" : `${events} events, x ${x.toPrecision(10)}`;
  const bytes = allocation === undefined ? "" : `, ${Math.round(allocation)} bytes`;
  return `  ${way.padEnd(24)} ${time.padStart(13)}  × ${ratio.toPrecision(3).padEnd(8)} ${told}${bytes}`;
}
