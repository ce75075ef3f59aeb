import type { MotionEvent } from "@restband/solver";
import { formatFixed } from "../../format/format-number.ts";
import { fromSi, type Measure, type Unit } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";
import { eventWords } from "./event-words.ts";
import type { RunView } from "./run-view.ts";

export interface EventColumn {
  readonly head: string;
  /** The number of a cell, in the column's unit, or empty. */
  readonly value: (event: MotionEvent, index: number) => number | null;
  readonly cell: (event: MotionEvent, index: number) => string;
}

/** Time, place, distance from the drive where there is one, friction, and time to the next event; one unit each. */
export function columnsOf({ result, scenario, inputs }: RunView): EventColumn[] {
  const { events } = result;
  const unit = (dimension: Measure["dimension"], values: readonly number[]): Unit =>
    unitFor(largest(values), { dimension, motion: scenario.motion });
  const behind = (event: MotionEvent): number => event.x - inputs.base(event.t);
  const until = (_: MotionEvent, i: number): number | null =>
    i + 1 < events.length ? events[i + 1].t - events[i].t : null;
  const gaps = events.flatMap((event, i) => until(event, i) ?? []);
  return [
    column("time", { label: "s", factor: 1 }, ({ t }) => t, 6),
    column(
      "position",
      unit(
        "displacement",
        events.map(({ x }) => x),
      ),
      ({ x }) => x,
      4,
    ),
    ...(scenario.base.length > 0
      ? [column("from the drive", unit("displacement", events.map(behind)), behind, 2)]
      : []),
    column(
      "friction",
      unit(
        "force",
        events.map(({ f }) => f),
      ),
      ({ f }) => f,
      1,
    ),
    column("until next", unit("time", gaps), until, 3),
  ];
}

function column(name: string, unit: Unit, value: EventColumn["value"], decimals: number): EventColumn {
  const inUnit: EventColumn["value"] = (event, i) => {
    const si = value(event, i);
    return si === null ? null : fromSi(si, unit);
  };
  return {
    head: `${name}, ${unit.label}`,
    value: inUnit,
    cell: (event, i) => {
      const shown = inUnit(event, i);
      return shown === null ? "–" : formatFixed(shown, decimals);
    },
  };
}

/** The largest size of a list that may be too long to spread. */
const largest = (values: readonly number[]): number =>
  values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);

/** All events as CSV with full digits, a point for the decimals and the units in the first line. */
export function eventsCsv(view: RunView): string {
  const columns = columnsOf(view);
  const head = ["event", ...columns.map((each) => each.head)].map((text) => `"${text}"`).join(",");
  const rows = view.result.events.map((event, i) =>
    [`"${eventWords[event.kind]}"`, ...columns.map((each) => each.value(event, i) ?? "")].join(","),
  );
  return [head, ...rows].join("\r\n");
}
