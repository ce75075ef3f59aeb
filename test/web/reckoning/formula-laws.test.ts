import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { outsideOf } from "./outside-of.ts";
import { piecesOf } from "../../../web/src/features/reckoning/formula/expression.ts";
import type { Formula, Values } from "../../../web/src/features/reckoning/formula/formula.ts";
import { unitByLabel } from "../../../web/src/format/units.ts";
import { allFormulas } from "./all-formulas.ts";

/** Evaluates what a person reads: the expression's signs turned into the language's, angles into radians. */
function evaluate({ expression, givens }: Formula, values: Values): number {
  const source = expression
    .replace(/\{(\w+)\}/g, (_, key: string) => {
      const isAngle = givens.find((given) => given.key === key)?.measure.dimension === "angle";
      return `(${isAngle ? (values[key] * Math.PI) / 180 : values[key]})`;
    })
    .replace(/·/g, "*")
    .replace(/−/g, "-")
    .replace(/\^/g, "**")
    .replace(/π/g, "Math.PI")
    .replace(/√/g, "Math.sqrt")
    .replace(/\bexp\(/g, "Math.exp(")
    .replace(/\bln\(/g, "Math.log(");
  if (/[^\d.eMathPIsqrtxplog+\-*/() ]/.test(source)) throw new Error(`${expression} has a sign that is not known.`);
  // eslint-disable-next-line @typescript-eslint/no-implied-eval, @typescript-eslint/no-unsafe-call
  return new Function(`return ${source}`)() as number;
}

/** Numbers of an ordinary size inside the bounds of a given. */
function numbersFor({ givens }: Formula): fc.Arbitrary<Record<string, number>> {
  const one = (given: Formula["givens"][number]): fc.Arbitrary<number> => {
    const low = given.minimum ?? given.exclusiveMinimum ?? 0;
    const high = given.maximum ?? given.exclusiveMaximum ?? low + 9;
    if (given.integer) return fc.integer({ min: Math.ceil(low), max: Math.floor(high) });
    return fc.double({ min: low + 0.01 * (high - low), max: low + 0.99 * (high - low), noNaN: true });
  };
  return fc.record(Object.fromEntries(givens.map((given) => [given.key, one(given)])));
}

describe.each(allFormulas)("%s", (_, formula) => {
  it("computes what it shows", () => {
    fc.assert(
      fc.property(numbersFor(formula), (values) => {
        fc.pre(!formula.fault?.(values));
        const shown = evaluate(formula, values);
        expect(Math.abs(formula.value(values) - shown)).toBeLessThanOrEqual(1e-10 * Math.abs(shown));
      }),
      { numRuns: 40 },
    );
  });

  it("names in its expression what it asks for, in units that exist", () => {
    const named = piecesOf(formula).flatMap((piece) => (piece.kind === "given" ? piece.given.key : []));
    const unused = formula.givens.map(({ key }) => key).filter((key) => !named.includes(key));
    // The spread widens the result, the drum's radius goes to its own field: neither is in the expression.
    expect(unused.filter((key) => key !== "spread" && key !== "radius")).toEqual([]);
    expect(formula.expression.match(/\{\w+\}/g)).toHaveLength(named.length);
    for (const { unit, measure } of formula.givens) if (unit) expect(unitByLabel(measure, unit)?.label).toBe(unit);
  });

  it("starts and presets inside its own bounds, each preset with numbers of its own", () => {
    for (const given of formula.givens) {
      if (given.initial !== undefined) expect(outsideOf(given, given.initial)).toBe(false);
    }
    for (const { options } of formula.presets ?? []) {
      expect(new Set(options.map(({ values }) => JSON.stringify(values))).size).toBe(options.length);
      for (const [key, value] of options.flatMap(({ values }) => Object.entries(values))) {
        const given = formula.givens.find((each) => each.key === key);
        expect(given && outsideOf(given, Number(value))).toBe(false);
      }
    }
  });
});

it("has a key of its own for every formula", () => {
  const keys = allFormulas.map(([name]) => name);
  expect(new Set(keys).size).toBe(keys.length);
});
