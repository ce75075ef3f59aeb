import { execFileSync, spawnSync } from "node:child_process";
import { join } from "node:path";
import { fileURLToPath } from "node:url";
import type { Tally } from "./subjects.ts";

const folder = fileURLToPath(new URL("yardsticks", import.meta.url));

/** A program of ours in another language, or why it is not there. */
export type Yardstick = { name: string; absent: string } | { name: string; round: () => Map<string, Timed> };

/** Processor seconds a simulation, and what came of it. */
export interface Timed extends Tally {
  seconds: number;
}

/** The closed form in C; `scratch` is a folder for the program. */
export function inC(recordFile: string, scratch: string): Yardstick {
  return compiled("C closed form", "exact", [], recordFile, scratch);
}

/** CVODE started anew at every event; needs Debian's libsundials-dev. */
export function inCvode(recordFile: string, scratch: string): Yardstick {
  const libraries = ["-lsundials_cvode", "-lsundials_nvecserial", "-lsundials_generic"];
  return compiled("CVODE Adams", "cvode", libraries, recordFile, scratch);
}

function compiled(name: string, file: string, libraries: string[], recordFile: string, scratch: string): Yardstick {
  const program = join(scratch, file);
  const source = join(folder, `${file}.c`);
  const made = spawnSync("cc", ["-O3", "-march=native", "-o", program, source, ...libraries, "-lm"]);
  if (made.error) return { name, absent: "no C compiler here" };
  if (made.status !== 0) return { name, absent: String(made.stderr).split("\n", 1)[0] };
  return { name, round: () => read(execFileSync(program, [recordFile, "1"], { encoding: "utf8" })) };
}

/** SciPy's solve_ivp; slow, so that each problem is run once a round. */
export function inSciPy(recordFile: string): Yardstick {
  const name = "SciPy solve_ivp";
  const found = spawnSync("python3", ["-c", "import scipy; print(scipy.__version__)"], { encoding: "utf8" });
  if (found.status !== 0) return { name, absent: "python3 with SciPy is not here" };
  const script = join(folder, "solve_ivp.py");
  const run = (problem: string): string =>
    execFileSync("python3", [script, recordFile, problem, "1"], { encoding: "utf8" });
  return {
    name: `${name} ${found.stdout.trim()}`,
    round: () => read(["P1", "P2", "P3", "P4", "P5"].map(run).join("")),
  };
}

function read(text: string): Map<string, Timed> {
  const rows = text
    .trim()
    .split("\n")
    .map((line) => line.split(" "));
  return new Map(
    rows.map(([name, ...numbers]) => {
      const [seconds, events, x] = numbers.map(Number);
      return [name, { seconds, events, x }];
    }),
  );
}
