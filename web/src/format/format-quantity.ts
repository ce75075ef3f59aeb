import { formatExactly, formatFully, formatNumber } from "./format-number.ts";
import { fromSi, type Measure, type Unit } from "./unit.ts";
import { siOf, unitFor } from "./units.ts";

/** A value ready to be shown: its number, its unit, and all its digits for those who ask. */
export interface Reading {
  readonly text: string;
  readonly unit: string;
  readonly full: string;
}

/** A computed value (SI in) to `digits` significant digits, in the unit chosen or the customary one. */
export function readQuantity(value: number, measure: Measure, options: { unit?: Unit; digits?: number } = {}): Reading {
  const unit = options.unit ?? unitFor(value, measure);
  return reading(value, measure, unit, formatNumber(fromSi(value, unit), options.digits ?? 3));
}

/**
 * A value somebody entered (SI in), with every digit it was given; to four where it is shown in a unit it was not entered
 * in and would have no end. `chosen`: the unit it was entered in.
 */
export function readInput(value: number, measure: Measure, chosen?: Unit): Reading {
  const unit = chosen ?? unitFor(value, measure);
  const inUnit = fromSi(value, unit);
  const isRounded = !chosen && isEndless(value, unit);
  return reading(value, measure, unit, isRounded ? formatNumber(inUnit, 4) : formatExactly(inUnit));
}

/** True where a value (SI in) has no last digit in a unit: nobody entered it in that. */
export function isEndless(value: number, unit: Unit): boolean {
  const inUnit = fromSi(value, unit);
  return Number(inUnit.toPrecision(9)) !== Number(inUnit.toPrecision(12));
}

/** A computed value in running text: "77.2 μm", "38 %", "12°". */
export function say(value: number, measure: Measure, options: { unit?: Unit; digits?: number } = {}): string {
  return joined(readQuantity(value, measure, options));
}

/** An entered value in running text. */
export function sayInput(value: number, measure: Measure, chosen?: Unit): string {
  return joined(readInput(value, measure, chosen));
}

/** Number and unit kept on one line; a degree sign stands without a space. */
export function joined({ text, unit }: Pick<Reading, "text" | "unit">): string {
  if (unit === "") return text;
  return unit.startsWith("°") ? text + unit : `${text}\u00a0${unit}`;
}

/** A share (0…1) as a percentage: "39.6 %". */
export function sayShare(value: number, digits = 3): string {
  return `${formatNumber(value * 100, digits)}\u00a0%`;
}

/** How much of a hold is used, to two digits; more where rounding would say that all of it is: "62 %", "99.96 %". */
export function sayUse(value: number): string {
  const digits = [2, 3, 4, 5, 6].find((each) => Number((100 * value).toPrecision(each)) < 100);
  return sayShare(value, value < 1 ? (digits ?? 12) : 3);
}

function reading(value: number, measure: Measure, unit: Unit, text: string): Reading {
  return { text, unit: unit.label, full: joined({ text: formatFully(value), unit: siOf(measure) }) };
}
