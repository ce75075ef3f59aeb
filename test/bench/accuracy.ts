import { spawnSync } from "node:child_process";
import { fileURLToPath } from "node:url";
import { simulate, type Scenario } from "@restband/solver";
import { p1, p2, p5 } from "./problems.ts";

const script = fileURLToPath(new URL("yardsticks/forty_digits.py", import.meta.url));

/** How far the exact method's events are from those worked out to forty digits, at most: s and m. */
export interface Accuracy {
  problem: string;
  events: number;
  t: number;
  x: number;
}

/** P1, P2 and P5, or why they could not be told; about a minute. */
export function accuracies(recordFile: string): Accuracy[] | string {
  const found: Accuracy[] = [];
  for (const [problem, scenario] of Object.entries({ P1: p1, P2: p2, P5: p5 })) {
    const told = spawnSync("python3", [script, problem, recordFile], { encoding: "utf8" });
    if (told.status !== 0) return "python3 with mpmath is not here";
    found.push(compare(problem, scenario, told.stdout.trim().split("\n")));
  }
  return found;
}

function compare(problem: string, scenario: Scenario, lines: string[]): Accuracy {
  const result = simulate(scenario, { samples: 0, quantities: [], energy: false });
  if ("error" in result) throw new Error(result.error.message);
  const own = result.events.slice(1, -1);
  if (own.length !== lines.length) throw new Error(`${problem}: ${own.length} events, to forty digits ${lines.length}`);
  const off = (column: "t" | "x", n: number): number =>
    Math.max(...lines.map((line, i) => Math.abs(difference(own[i][column], line.split(" ")[n]))));
  return { problem, events: lines.length, t: off("t", 0), x: off("x", 1) };
}

/** A double less a number written with 25 digits, whose tail the nearest double would lose. */
function difference(value: number, digits: string): number {
  const nearest = Number(digits);
  if (digits.includes("e")) return value - nearest;
  const places = digits.split(".")[1]?.length ?? 0;
  const scaled = (text: string): bigint => BigInt(text.replace(".", ""));
  const tail = scaled(digits) - scaled(nearest.toFixed(Math.min(places, 100)));
  return value - nearest - Number(tail) / 10 ** places;
}
