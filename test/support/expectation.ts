import type { MotionEvent, Result, Samples } from "@restband/solver";

/** One expected value of a reference case; `tol` is allowed either side, as a share of the value or as it stands. */
export interface Expectation {
  what: string;
  value: number | string | boolean | null;
  tol: number;
  tolKind: "absolute" | "relative";
  source: string;
}

type Found = number | string | boolean | null | undefined;

/**
 * Reads what an expectation names from a result; undefined where the result has no such thing. The names:
 * a quantity; `ended`, `outcome`, `method`; `energy:NAME`; `count:KIND`; `event:KIND:n:FIELD` (the n-th from 1, or from the
 * end if negative) or `event:k:FIELD` (k from 0, of all events); `x(t=…)`, `v`, `a`, `f`, `phase`, which must have been asked
 * for through `at`; `limit:i:kept|margin|value` (i from 0); `note:CODE` (whether there is one) and `note:CODE:t`.
 * Break-aways at t = 0 are not counted.
 */
export function look(result: Result, what: string): Found {
  const instant = /^([a-z]+)\(t=([^)]+)\)$/.exec(what);
  if (instant) return atTime(result.at, instant[1], Number(instant[2]));
  if (what === "ended" || what === "outcome" || what === "method") return result[what];
  const [group, ...rest] = what.split(":");
  switch (group) {
    case "energy":
      return member(result.energy, rest[0]);
    case "count":
      return countedEvents(result, rest[0]).length;
    case "event":
      return eventValue(result, rest);
    case "limit":
      return member(result.limits[Number(rest[0])], rest[1] ?? "kept");
    case "note":
      return noteValue(result, rest);
    default:
      return result.quantities[what];
  }
}

/** The complaint about a value that does not hold, null where it holds. */
export function complaint({ what, value, tol, tolKind }: Expectation, found: Found): string | null {
  if (found === undefined) return `${what} is missing`;
  if (typeof value !== "number") return found === value ? null : `${what} is ${found}, expected ${value}`;
  if (typeof found !== "number" || !Number.isFinite(found)) return `${what} is ${found}, expected ${value}`;
  const allowed = tolKind === "relative" ? tol * Math.abs(value) : tol;
  const off = Math.abs(found - value);
  return off <= allowed ? null : `${what} is ${found}, expected ${value}, off by ${off}, allowed ${allowed}`;
}

function member(of: object | undefined, name: string): Found {
  return of && name in of ? (of as Record<string, Found>)[name] : undefined;
}

function atTime(at: Samples | undefined, field: string, t: number): Found {
  const i = at ? at.t.findIndex((time) => Math.abs(time - t) <= 1e-12 * Math.max(1, Math.abs(t))) : -1;
  return at && i >= 0 && field in at ? at[field as keyof Samples][i] : undefined;
}

function countedEvents({ events }: Result, kind: string): MotionEvent[] {
  return events.filter((event) => event.kind === kind && !(kind === "break-away" && event.t === 0));
}

function eventValue(result: Result, [first, ...rest]: string[]): Found {
  if (/^-?\d+$/.test(first)) return member(result.events.at(Number(first)), rest[0]);
  const n = Number(rest[0]);
  return member(countedEvents(result, first).at(n > 0 ? n - 1 : n), rest[1]);
}

function noteValue({ notes }: Result, [code, field]: string[]): Found {
  const note = notes.find((candidate) => candidate.code === code);
  return field === undefined ? note !== undefined : member(note, field);
}
