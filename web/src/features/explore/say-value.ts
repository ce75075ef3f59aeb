import { formatNumber } from "../../format/format-number.ts";
import { joined } from "../../format/format-quantity.ts";
import { fromSi, type Measure, type Unit } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";

/** Which way a value may be rounded without changing what it says. */
export type Side = "up" | "down";

/** A value (SI) rounded to one side and in running text: a feed needed "8.345 mm/s", a friction allowed "0.127". */
export function sayTowards(
  value: number,
  measure: Measure,
  side: Side,
  options: { digits?: number; unit?: Unit } = {},
) {
  const { digits = 4, unit = unitFor(value, measure) } = options;
  return joined({ text: formatNumber(roundedTo(fromSi(value, unit), digits, side), digits), unit: unit.label });
}

/** The same value rounded, SI: what a scenario is made with when it is made of what was said. */
export function roundedTo(value: number, digits: number, side: Side): number {
  if (value === 0) return 0;
  const step = 10 ** (Math.floor(Math.log10(Math.abs(value))) - digits + 1);
  const count = value / step;
  // A millionth of the last digit is noise of the conversion.
  const whole = side === "up" ? Math.ceil(count - 1e-6) : Math.floor(count + 1e-6);
  return Number((whole * step).toPrecision(12));
}
