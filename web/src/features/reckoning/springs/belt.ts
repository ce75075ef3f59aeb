import { formula, measures, textbook } from "../formula/formula.ts";
import { lengthOf } from "../formula/lengths.ts";

/**
 * Stiffness k = c / L of one free span of belt, rope or strap, N/m.
 * @param specific c = E A, the force that would stretch it to twice its length, N: the maker's specific stiffness
 * @param length L of the free span, m
 */
export const beltStiffness = ({ specific, length }: Record<"specific" | "length", number>): number => specific / length;

export const belt = formula({
  key: "belt",
  label: "Belt span",
  givens: [
    {
      key: "specific",
      label: "Specific stiffness E·A",
      symbol: "c",
      measure: measures.force,
      exclusiveMinimum: 0,
      help: "from the belt’s sheet, for its width",
    },
    lengthOf("length", "Free length of the span", "L"),
  ],
  result: { symbol: "k", measure: measures.springRate },
  expression: "{specific} / {length}",
  source: textbook,
  caveat:
    "One span. Where the other span stays tight it works too: two spans side by side. Teeth in mesh are softer, from memory.",
  value: beltStiffness,
});
