import { axisValues, type Scenario, type SweepAxis } from "@restband/solver";
import { formatNumber } from "../../../format/format-number.ts";
import { fromSi, toSi, type Unit } from "../../../format/unit.ts";
import { unitFor } from "../../../format/units.ts";
import { exploreField } from "../explore-field.ts";
import { roundSteps } from "../round-steps.ts";

/** An axis of a map: cells stand side by side at equal distances, so places are counted in cells, 0 to `count`. */
export interface AxisScale {
  readonly name: string;
  readonly unit: Unit;
  readonly count: number;
  readonly values: readonly number[];
  /** The place of a value, SI; null beyond the ends. */
  readonly placeOf: (value: number) => number | null;
  readonly ticks: readonly { readonly place: number; readonly text: string }[];
  /** A value in the axis' unit, without the unit. */
  readonly text: (value: number) => string;
}

export function axisScale(axis: SweepAxis, scenario: Scenario, mostTicks: number): AxisScale {
  const field = exploreField(scenario, axis.path);
  const measure = field?.measure ?? { dimension: "none" as const, motion: scenario.motion };
  const values = axisValues(axis);
  const [first, last] = [values[0], values[values.length - 1]];
  const middle = axis.spacing === "log" ? Math.sqrt(first * last) : Math.max(Math.abs(first), Math.abs(last));
  const unit = unitFor(middle, measure);
  const placeOf = (value: number): number | null => placeAmong(value, values, axis.spacing === "log");
  const text = (value: number): string => formatNumber(fromSi(value, unit), 4);
  const wanted =
    axis.spacing === "listed" ? values : roundValues(fromSi(first, unit), fromSi(last, unit), axis.spacing);
  const si = axis.spacing === "listed" ? wanted : wanted.map((value) => toSi(value, unit));
  const ticks = si.flatMap((value) => {
    const place = placeOf(value);
    return place === null ? [] : [{ place, text: text(value) }];
  });
  return {
    name: field?.name ?? axis.path,
    unit,
    count: values.length,
    values,
    placeOf,
    text,
    ticks: thinned(ticks, mostTicks),
  };
}

/** The middle of cell i is at i + ½; between middles evenly, or by ratio. Half a cell beyond either end still has a place. */
function placeAmong(value: number, values: readonly number[], isLog: boolean): number | null {
  if (values.length === 1) return value === values[0] ? 0.5 : null;
  const rises = values[values.length - 1] > values[0];
  const tell = (each: number): number => (isLog ? Math.log(Math.abs(each)) * Math.sign(each) : each) * (rises ? 1 : -1);
  const wanted = tell(value);
  let i = 0;
  while (i < values.length - 2 && wanted > tell(values[i + 1])) i++;
  const place = i + (wanted - tell(values[i])) / (tell(values[i + 1]) - tell(values[i])) + 0.5;
  return place < -1e-9 || place > values.length + 1e-9 ? null : place;
}

/** Values people read: 1-2-5 steps, or 1, 2, 5 of each decade. */
function roundValues(from: number, to: number, spacing: "linear" | "log"): number[] {
  return spacing === "log" ? decades(from, to) : roundSteps(from, to);
}

function decades(from: number, to: number): number[] {
  const sign = Math.sign(from);
  const [low, high] = [Math.abs(from), Math.abs(to)].sort((a, b) => a - b);
  const many = Math.log10(high / low) > 3;
  const values: number[] = [];
  for (let e = Math.floor(Math.log10(low)); e <= Math.ceil(Math.log10(high)); e++)
    for (const digit of many ? [1] : [1, 2, 5]) {
      const value = Number((digit * 10 ** e).toPrecision(12));
      if (value >= low * (1 - 1e-9) && value <= high * (1 + 1e-9)) values.push(sign * value);
    }
  return values.sort((a, b) => a - b);
}

/** Every n-th, so that no more than so many are left. */
function thinned<T>(items: readonly T[], most: number): T[] {
  const every = Math.ceil(items.length / Math.max(1, most));
  return items.filter((_, i) => i % every === 0);
}
