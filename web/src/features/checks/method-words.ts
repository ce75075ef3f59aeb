import type { Note, Result, Scenario } from "@restband/solver";
import { formatNumber } from "../../format/format-number.ts";
import { say } from "../../format/format-quantity.ts";
import { sayMany } from "../../format/words.ts";

const time = { dimension: "time", motion: "linear" } as const;

/** Method, tolerance and end of a run in plain sentences. */
export function methodWords(scenario: Scenario, result: Result): string[] {
  const counted = result.events.filter(({ kind }) => kind !== "start" && kind !== "end").length;
  return [
    methodLine(result.method),
    `${endLine(scenario, result)} It has ${sayMany(counted, "event")}.`,
    `Solver version ${result.solverVersion}.`,
  ];
}

const methodLine = (method: Result["method"]): string =>
  method === "exact"
    ? "Exact method: each stretch of the motion is a closed form, and every stop, turn and break-away is a root of it that cannot be missed. There is no time step and no tolerance; what is left is rounding."
    : "Adaptive method: Gragg–Bulirsch–Stoer with dense output, restarted at every event, to a relative tolerance of 10⁻⁹ for each step.";

function endLine({ span }: Scenario, { ended, events }: Result): string {
  const end = events.length > 0 ? say(events[events.length - 1].t, time, { digits: 4 }) : say(span.seconds, time);
  switch (ended) {
    case "rest":
      return `The run ends at ${end}, where the body rests for good.`;
    case "time":
      return `The run ends at ${end}, the time asked for.`;
    case "max-events":
      return `The run was cut off at ${end}, after the ${formatNumber(span.maxEvents, 9)} events it is allowed.`;
    case "max-work":
      return `The run was cut off at ${end}, after the ${formatNumber(span.maxWork, 9)} steps of work it is allowed.`;
    case "cancelled":
      return `The run was cancelled at ${end}.`;
  }
}

/** A note of the run, with the time it speaks of where its own words leave it out. */
export function noteWords({ message, t }: Note): string {
  const sentence = /[.!?]$/.test(message) ? message : `${message}.`;
  return t === undefined || /\d/.test(message) ? sentence : `${sentence} (at ${say(t, time, { digits: 4 })})`;
}
