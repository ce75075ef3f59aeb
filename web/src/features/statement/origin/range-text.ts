import { joined, readInput } from "../../../format/format-quantity.ts";
import { parseNumber } from "../../../format/parse-number.ts";
import { parseTyped } from "../../../format/parse-typed.ts";
import type { Measure, Unit } from "../../../format/unit.ts";

/** The range a value is known to lie in, SI; a side that is not known is left out. */
export interface ValueRange {
  readonly low?: number;
  readonly high?: number;
}

/** How a range is read: what its numbers measure, the unit of one without any, and the value it is about. */
interface RangeReading {
  readonly measure: Measure;
  readonly unit: Unit;
  readonly value: number;
}

/** "0.12 to 0.18 mm", "0.12 mm or more"; empty without a range. */
export function writeRange({ low, high }: ValueRange, { measure, unit }: Omit<RangeReading, "value">): string {
  const say = (value: number): string => joined(readInput(value, measure, unit));
  if (low !== undefined && high !== undefined) return `${readInput(low, measure, unit).text} to ${say(high)}`;
  if (low !== undefined) return `${say(low)} or more`;
  return high === undefined ? "" : `${say(high)} or less`;
}

/** Reads "0.12 to 0.18", "0.12–0.18", "±10 %", "± 0.02", "0.12 or more", "0.18 or less"; an empty text is no range. */
export function readRange(text: string, reading: RangeReading): ValueRange | { message: string } {
  const typed = text.trim();
  if (typed === "") return {};
  const around = /^(?:±|\+\/?-)\s*(.+)$/u.exec(typed);
  if (around) return readAround(around[1], reading);
  const side = /^(.+?)\s+or\s+(more|less)$/iu.exec(typed);
  if (side) return readSide(side[1], side[2].toLowerCase() === "more", reading);
  const ends = /^(.+?)(?:\s+to\s+|\s*[–…]\s*|\s+[-−]\s+)(.+)$/u.exec(typed);
  return ends ? readEnds(ends[1], ends[2], reading) : { message: HOW };
}

const HOW = "A range reads “0.12 to 0.18”, “±10 %” or “0.12 or more”.";

/** A percentage is of the value itself, whatever it measures. */
function readAround(text: string, { measure, unit, value }: RangeReading): ValueRange | { message: string } {
  const percent = /^(.+?)\s*%$/u.exec(text);
  const share = percent && parseNumber(percent[1]);
  if (share && "value" in share) return spread(value, Math.abs((value * share.value) / 100));
  const read = parseTyped(text, measure, unit);
  return read.kind === "value" ? spread(value, Math.abs(read.value)) : { message: read.message };
}

/** Free of the noise that a sum leaves after the twelfth digit. */
function spread(value: number, by: number): ValueRange {
  const clean = (end: number): number => Number(end.toPrecision(12));
  return { low: clean(value - by), high: clean(value + by) };
}

function readSide(text: string, isLow: boolean, { measure, unit }: RangeReading): ValueRange | { message: string } {
  const read = parseTyped(text, measure, unit);
  if (read.kind !== "value") return { message: read.message };
  return isLow ? { low: read.value } : { high: read.value };
}

/** A unit behind the second number alone counts for both. */
function readEnds(first: string, second: string, { measure, unit }: RangeReading): ValueRange | { message: string } {
  const high = parseTyped(second, measure, unit);
  if (high.kind !== "value") return { message: high.message };
  const low = parseTyped(first, measure, high.unit);
  if (low.kind !== "value") return { message: low.message };
  if (low.value > high.value) return { message: "The first end of a range is the lower one." };
  return { low: low.value, high: high.value };
}
