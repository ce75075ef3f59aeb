import type { Scenario } from "@restband/solver";
import { readInput, sayInput } from "../../../format/format-quantity.ts";
import { parseTyped, type TypedReading } from "../../../format/parse-typed.ts";
import { parseUnit } from "../../../format/parse-unit.ts";
import { unitByLabel, unitFor } from "../../../format/units.ts";
import type { Measure, Unit } from "../../../format/unit.ts";
import type { Formula, Given, Values } from "./formula.ts";

/** What a person has typed for one number, and the unit it counts in. */
export interface Entry {
  readonly text: string;
  readonly unit: string;
}

/** The entries of a formula's givens, by key. */
export type Entries = Readonly<Record<string, Entry>>;

/** What is to be put right at one field, and the readings to choose from where a text has two. */
export interface EntryFault {
  readonly message: string;
  readonly choices: Extract<TypedReading, { kind: "ambiguous" }>["choices"];
}

/** A formula's entries, read: its numbers where all are there and right. An empty field is missing, not wrong. */
export interface EntriesReading {
  readonly values: Values | null;
  readonly faults: Readonly<Record<string, EntryFault>>;
}

/** What a form starts with: what the scenario knows, else the customary value, else nothing. */
export function startEntries({ givens }: Formula, scenario?: Scenario): Entries {
  return Object.fromEntries(
    givens.map((given) => {
      const start = (scenario && given.from?.(scenario)) ?? given.initial;
      const entry = start === undefined ? { text: "", unit: unitOf(given).label } : entryOf(start, given);
      return [given.key, entry] as const;
    }),
  );
}

/** A number as somebody would have typed it. */
export function entryOf(value: number, given: Given, unit?: Unit): Entry {
  const reading = readInput(value, given.measure, unit ?? unitOf(given, value));
  return { text: reading.text, unit: reading.unit };
}

/** The unit a field starts in. */
const unitOf = ({ measure, unit }: Given, value = 0): Unit => unitByLabel(measure, unit) ?? unitFor(value, measure);

/** The unit of an entry; a unit that was typed may be none of the customary ones. */
export const unitTyped = ({ unit }: Entry, measure: Measure): Unit =>
  unitByLabel(measure, unit) ?? parseUnit(unit, measure) ?? unitFor(0, measure);

/** The entry after typing: a unit behind the number becomes the entry's unit once the whole can be read. */
export function typedEntry(text: string, before: Entry, { measure }: Given): Entry {
  const reading = parseTyped(text, measure, unitTyped(before, measure));
  return { text, unit: reading.kind === "value" ? reading.unit.label : before.unit };
}

/** Reads all givens of a formula, then what holds between them. */
export function readEntries(formula: Formula, entries: Entries): EntriesReading {
  const faults: Record<string, EntryFault> = {};
  const values: Record<string, number> = {};
  for (const given of formula.givens) {
    const read = readEntry(entries[given.key], given);
    if (typeof read === "number") values[given.key] = read;
    else if (read) faults[given.key] = read;
  }
  if (Object.keys(values).length < formula.givens.length) return { values: null, faults };
  const between = formula.fault?.(values);
  if (between) return { values: null, faults: { [between.key]: { message: between.message, choices: [] } } };
  return { values, faults };
}

function readEntry(entry: Entry, given: Given): number | EntryFault | null {
  if (entry.text.trim() === "") return null;
  const reading = parseTyped(entry.text, given.measure, unitTyped(entry, given.measure));
  if (reading.kind === "ambiguous") return { message: reading.message, choices: reading.choices };
  if (reading.kind === "unreadable") return { message: reading.message, choices: [] };
  const message = outside(reading.value, given, reading.unit);
  return message === null ? reading.value : { message, choices: [] };
}

/** What bounds ask, where a value is outside them. */
function outside(value: number, given: Given, unit: Unit): string | null {
  const { minimum = -Infinity, exclusiveMinimum = -Infinity, maximum = Infinity, exclusiveMaximum = Infinity } = given;
  const say = (bound: number): string => sayInput(bound, given.measure, unit);
  if (!Number.isFinite(value)) return "This number is too large.";
  if (given.integer && !Number.isInteger(value)) return `Enter a whole number; it is ${say(value)}.`;
  if (value <= exclusiveMinimum) return `Enter more than ${say(exclusiveMinimum)}.`;
  if (value < minimum) return `Enter ${say(minimum)} or more.`;
  if (value > maximum) return `Enter ${say(maximum)} or less.`;
  return value >= exclusiveMaximum ? `Enter less than ${say(exclusiveMaximum)}.` : null;
}
