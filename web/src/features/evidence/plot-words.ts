import { say } from "../../format/format-quantity.ts";
import { nounOf } from "../../format/noun.ts";
import type { Measure } from "../../format/unit.ts";
import type { Interval } from "../../compute/intervals.ts";
import { sayMany } from "../../format/words.ts";
import type { RunView } from "./run-view.ts";

/** The figure in words, for those who cannot see it: what is drawn, between what values, over what time. */
export function figureWords(view: RunView): string {
  const { scenario, samples, inputs, end } = view;
  const measure = (dimension: Measure["dimension"]): Measure => ({ dimension, motion: scenario.motion });
  const between = (values: Float64Array, dimension: Measure["dimension"]): string => {
    const { low, high } = rangeOf(values);
    return `from ${say(low, measure(dimension))} to ${say(high, measure(dimension))}`;
  };
  const band =
    inputs.restBand === null
      ? ""
      : `, with the rest band of ±${say(inputs.restBand, measure("displacement"))} about its equilibrium`;
  return [
    `Over ${say(end, measure("time"))}: displacement of the ${nounOf(scenario)} ${between(samples.x, "displacement")}${band}`,
    `velocity ${between(samples.v, "velocity")}`,
    `friction force ${between(samples.f, "force")}.`,
  ].join("; ");
}

function rangeOf(values: Float64Array): { low: number; high: number } {
  let low = Infinity;
  let high = -Infinity;
  for (const value of values) {
    if (value < low) low = value;
    if (value > high) high = value;
  }
  return { low, high };
}

/** The strip in words: how often it sticks and for what share of the time. */
export function stripWords(intervals: readonly Interval[]): string {
  const total = intervals.reduce((sum, { from, to }) => sum + to - from, 0);
  const stuck = intervals.filter(({ phase }) => phase === 0);
  const share = stuck.reduce((sum, { from, to }) => sum + to - from, 0) / (total || 1);
  if (stuck.length === 0) return "Motion: it slides throughout and is never stuck.";
  if (share === 1) return "Motion: it is stuck throughout.";
  return `Motion: stuck ${sayMany(stuck.length, "time")}, for ${Math.round(100 * share)} % of the time shown.`;
}
