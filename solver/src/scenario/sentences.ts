import type { Bounds, Field } from "../field.ts";

/** A value as a message quotes it, cut where it is long. */
export function quoted(value: unknown): string {
  if (typeof value === "number") return String(value);
  if (Array.isArray(value)) return "a list";
  if (typeof value === "object" && value !== null) return "an object";
  if (typeof value === "string") return JSON.stringify(value.length > 40 ? `${value.slice(0, 40)}…` : value);
  return typeof value === "function" || typeof value === "symbol" ? "no data" : String(value);
}

/** `must be 0 or more; it is -3.` or `is missing.`, with what is asked for in words. */
export function demand(label: string, asked: string, value: unknown): string {
  return value === undefined
    ? `${label} is missing. Enter ${asked}.`
    : `${label} must be ${asked}; it is ${quoted(value)}.`;
}

/** Why a value cannot be this field's number. */
export function numberSentence(field: Field, value: unknown): string {
  if (typeof value !== "number") return demand(field.label, allowed(field), value);
  if (!Number.isFinite(value)) return demand(field.label, "a finite number", value);
  return demand(field.label, field.integer ? allowed(field) : rangeOf(field), value);
}

/** What the bounds allow, in words: "a whole number, 1 or more". */
export function allowed(bounds: Bounds): string {
  const noun = bounds.integer ? "a whole number" : "a number";
  const range = rangeOf(bounds);
  return range === "" ? noun : `${noun}, ${range}`;
}

function rangeOf({ minimum, exclusiveMinimum, maximum, exclusiveMaximum }: Bounds): string {
  if (minimum !== undefined && maximum !== undefined) return `between ${minimum} and ${maximum}`;
  const parts = [
    exclusiveMinimum === undefined ? "" : `more than ${exclusiveMinimum}`,
    minimum === undefined ? "" : `${minimum} or more`,
    maximum === undefined ? "" : `at most ${maximum}`,
    exclusiveMaximum === undefined ? "" : `less than ${exclusiveMaximum}`,
  ];
  return parts.filter((part) => part !== "").join(" and ");
}

/** `"a"`, `"a" or "b"`, `"a", "b" or "c"`: the words a member may be; of a long list the first few. */
export function oneOf(words: readonly string[]): string {
  if (words.length > 12) return `one of ${words.length} names, ${oneOf(words.slice(0, 3))} among them`;
  const list = words.map((word) => JSON.stringify(word));
  return list.length < 2 ? list.join("") : `${list.slice(0, -1).join(", ")} or ${list[list.length - 1]}`;
}
