import type { Entries } from "../formula/entries.ts";
import { expressionText, valuesText } from "../formula/expression.ts";
import type { Values } from "../formula/formula.ts";
import { asShown, type Taken } from "../taken.ts";
import type { Way } from "./way.ts";

/** The result and what goes with it; each origin says the formula and the numbers put in. */
export function takenFrom(way: Way, path: string, values: Values, entries: Entries): Taken[] {
  const formula = `${way.result.symbol} = ${expressionText(way)}`;
  const source = `${formula}, ${way.label}, with ${valuesText(way, values, entries)} (${way.source})`;
  const origin = { kind: "calculated", source } as const;
  const others = way.also?.(values) ?? [];
  const range = way.range?.(values);
  const span = range && { low: asShown(range.low), high: asShown(range.high) };
  return [
    { path, value: asShown(way.value(values)), origin: { ...origin, ...span } },
    ...others.map((other) => ({ path: other.path, value: other.value, origin })),
  ];
}
