import type { Scenario } from "@restband/solver";
import { formatNumber } from "../../format/format-number.ts";
import { joined } from "../../format/format-quantity.ts";
import { fromSi } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";
import { fieldAt, measureOf } from "./scenario-fields.ts";

const digits = 4;

/**
 * A number of a scenario by its name, friction by its symbol: "μs 0.162", "stiffness 3.1 N/μm". Rounded to four digits
 * towards another value (SI), so that it stays on that side.
 */
export function sayField(scenario: Scenario, path: string, value: number, towards: number): string {
  const field = fieldAt(scenario, path);
  if (!field) return `${path} ${formatNumber(value, digits)}`;
  const unit = unitFor(value, measureOf(scenario, field));
  const isCoefficient = field.dimension === "none" && field.symbol !== undefined;
  const name = isCoefficient ? field.symbol : field.label.charAt(0).toLowerCase() + field.label.slice(1);
  const shown = roundedTowards(fromSi(value, unit), fromSi(towards, unit));
  return `${name} ${joined({ text: formatNumber(shown, digits), unit: unit.label })}`;
}

/** A millionth of the last digit aside, which is noise. */
function roundedTowards(value: number, other: number): number {
  if (value === 0) return 0;
  const step = 10 ** (Math.floor(Math.log10(Math.abs(value))) - digits + 1);
  const count = value / step;
  return (other < value ? Math.floor(count + 1e-6) : Math.ceil(count - 1e-6)) * step;
}
