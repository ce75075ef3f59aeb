import { formatExactly } from "./format-number.ts";
import { parseNumber } from "./parse-number.ts";
import { parseUnit } from "./parse-unit.ts";
import { toSi, type Measure, type Unit } from "./unit.ts";
import { unitsOf } from "./units.ts";

/** A typed text read as a value; or why it cannot be, with the readings to choose from where there are two. */
export type TypedReading =
  | { kind: "value"; value: number; unit: Unit }
  | { kind: "ambiguous"; message: string; choices: { label: string; value: number; unit: Unit }[] }
  | { kind: "unreadable"; message: string };

/**
 * Reads "2 mm/min", "3 in", "0,15" or "38 %" into SI. A number alone counts in `unit`, the one shown beside the field.
 * "1,200" asks which is meant.
 */
export function parseTyped(typed: string, measure: Measure, unit: Unit): TypedReading {
  const text = typed.trim();
  if (text === "") return unreadable("A number is missing here.");
  const parts = splitUnit(text);
  if (!parts) return unreadable(`“${text}” is not a number.`);
  const typedUnit = parts.unit === "" ? unit : parseUnit(parts.unit, measure);
  if (!typedUnit) return unreadable(`“${parts.unit}” is not a unit that fits here. ${offer(measure)}`);
  const reading = parseNumber(parts.number);
  if (!reading) return unreadable(`“${parts.number}” is not a number.`);
  if ("value" in reading) return { kind: "value", value: toSi(reading.value, typedUnit), unit: typedUnit };
  return ambiguous(parts.number, reading.readings, typedUnit);
}

/** Number first, then anything that does not belong to it. */
function splitUnit(text: string): { number: string; unit: string } | null {
  const number =
    /^[+\-−–]?\s*[\d.,](?:[\d.,'’ \u00a0\u2009\u202f]*\d\.?)?\.?(?:e[+\-−]?\d+|\s*[·×x*]\s*10\s*(?:\^\s*[+\-−]?\d+|[⁻⁰¹²³⁴⁵⁶⁷⁸⁹]+))?/i.exec(
      text,
    );
  if (!number) return null;
  return { number: number[0].replace(/^([+\-−–])\s+/, "$1"), unit: text.slice(number[0].length).trim() };
}

function ambiguous(typed: string, readings: [number, number], unit: Unit): TypedReading {
  const labels = readings.map((value) => `${formatExactly(value)} ${unit.label}`.trim());
  return {
    kind: "ambiguous",
    message: `“${typed}” can be ${labels[0]} or ${labels[1]}. Choose which is meant.`,
    choices: readings.map((value, i) => ({ label: labels[i], value: toSi(value, unit), unit })),
  };
}

function offer(measure: Measure): string {
  const labels = unitsOf(measure).map((unit) => unit.label);
  const named = labels.filter((label) => label !== "");
  return named.length === 1 && named[0] === "%"
    ? "A number alone or % fits."
    : `Among those that fit: ${named.join(", ")}.`;
}

const unreadable = (message: string): TypedReading => ({ kind: "unreadable", message });
