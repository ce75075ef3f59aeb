import type { Entries } from "../formula/entries.ts";
import { expressionText, valuesText } from "../formula/expression.ts";
import type { Values } from "../formula/formula.ts";
import type { Taken } from "../taken.ts";
import type { Way } from "./way.ts";

/** The result and what goes with it; each origin says the formula and the numbers put in. */
export function takenFrom(way: Way, path: string, values: Values, entries: Entries): Taken[] {
  const formula = `${way.result.symbol} = ${expressionText(way)}`;
  const source = `${formula}, ${way.label}, with ${valuesText(way, values, entries)} (${way.source})`;
  const origin = { kind: "calculated", source } as const;
  const others = way.also?.(values) ?? [];
  return [
    { path, value: way.value(values), origin: { ...origin, ...way.range?.(values) } },
    ...others.map((other) => ({ path: other.path, value: other.value, origin })),
  ];
}
