import type { Dimension } from "../field.ts";
import { quantityOf } from "../quantities/index.ts";
import type { MotionEvent } from "../result.ts";
import type { Scenario } from "../scenario/scenario.ts";
import { pythonNumber as n, pythonText, pythonValue } from "./literals.ts";

const dimensions = ["displacement", "velocity", "acceleration", "force", "power"] as const;

/** Events are written out up to so many; of more, the first are compared one by one, and all by their count. */
const mostEvents = 5_000;

export interface Frozen {
  readonly quantities: Readonly<Record<string, number | null>>;
  /** All events of the run, or the first of them. */
  readonly events: readonly MotionEvent[];
  /** Of the whole run, `start` and `end` counted. */
  readonly eventCount: number;
}

/** What is checked, as Python data: quantities with their units, and events. */
export function frozenPart(motion: Scenario["motion"], { quantities, events, eventCount }: Frozen): string {
  const names = Object.keys(quantities);
  const unit = (dimension: Dimension) => unitOf(dimension, motion);
  const rows = events.slice(0, mostEvents);
  return [
    "CLAIM = {",
    ...names.map((name) => `    ${pythonText(name)}: ${pythonValue(quantities[name])},`),
    "}",
    "UNITS = {",
    ...names.map((name) => `    ${pythonText(name)}: ${pythonText(unit(quantityOf(name).dimension))},`),
    "}",
    `UNIT_OF = {${dimensions.map((d) => `${pythonText(d)}: ${pythonText(unit(d))}`).join(", ")}}`,
    'EVENT_UNITS = ("s", UNIT_OF["displacement"], UNIT_OF["velocity"], UNIT_OF["force"])',
    "# kind, t, x, v, f just after it",
    "EVENTS = [",
    ...rows.map(({ kind, t, x, v, f }) => `    (${pythonText(kind)}, ${[t, x, v, f].map(n).join(", ")}),`),
    "]",
    `EVENT_COUNT = ${eventCount}`,
    "",
  ].join("\n");
}

/** SI units of what quantities are told in. */
function unitOf(dimension: Dimension, motion: Scenario["motion"]): string {
  const isLinear = motion === "linear";
  switch (dimension) {
    case "displacement":
      return isLinear ? "m" : "rad";
    case "velocity":
      return isLinear ? "m/s" : "rad/s";
    case "acceleration":
      return isLinear ? "m/s2" : "rad/s2";
    case "force":
      return isLinear ? "N" : "N m";
    case "frequency":
      return "Hz";
    case "time":
      return "s";
    case "power":
      return "W";
    case "none":
      return "";
    default:
      return dimension;
  }
}
