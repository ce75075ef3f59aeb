import { say } from "../../format/format-quantity.ts";
import { parseTyped } from "../../format/parse-typed.ts";
import type { Unit } from "../../format/unit.ts";
import { closest, type Range } from "./part-of-run.ts";

export const seconds = { dimension: "time", motion: "linear" } as const;

interface Ends {
  readonly from: string;
  readonly to: string;
}

/**
 * Two typed ends as a span of the run, s; or what is amiss, as a sentence. An end that still reads as it was `shown` is
 * what it stands for to the last digit.
 */
export function readSpan(typed: Ends, shown: Ends, range: Range, whole: number, unit: Unit): Range | { fault: string } {
  const ends: number[] = [];
  for (const end of ["from", "to"] as const) {
    const read = parseTyped(typed[end], seconds, unit);
    if (typed[end] === shown[end]) ends.push(range[end]);
    else if (read.kind === "value") ends.push(read.value);
    else return { fault: read.message };
  }
  const [from, to] = ends;
  const told = (t: number): string => say(t, seconds, { unit, digits: 6 });
  // The end as it is shown may be rounded up.
  const slack = 1e-4 * whole;
  if (from < 0 || to > whole + slack) return { fault: `The run goes from 0 to ${told(whole)}; a span lies within it.` };
  if (from >= to) return { fault: `The span begins at ${told(from)}; it has to end after that.` };
  if (to - from < closest(whole))
    return { fault: `A span of this run is ${say(closest(whole), seconds)} long or longer.` };
  return { from, to: Math.min(to, whole) };
}
