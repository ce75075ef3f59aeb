import { sayInput } from "../../../format/format-quantity.ts";
import { unitTyped, type Entries } from "./entries.ts";
import type { Formula, Given, Values } from "./formula.ts";

/** A stretch of a formula on the page: plain signs, a given, or a power set above the line. */
export type ExpressionPiece =
  | { readonly kind: "signs"; readonly text: string }
  | { readonly kind: "given"; readonly given: Given; /** A power follows. */ readonly isBase: boolean }
  | { readonly kind: "power"; readonly text: string };

/** Takes a formula's expression apart, in its order. */
export function piecesOf({ expression, givens }: Formula): ExpressionPiece[] {
  const parts = expression.split(/(\{\w+\}|\^\d+)/).filter((part) => part !== "");
  return parts.map((part, i): ExpressionPiece => {
    if (part.startsWith("^")) return { kind: "power", text: part.slice(1) };
    const given = givens.find(({ key }) => part === `{${key}}`);
    return given
      ? { kind: "given", given, isBase: parts[i + 1]?.startsWith("^") ?? false }
      : { kind: "signs", text: part };
  });
}

/** A formula in a line of plain text: "E · π · d^2 / (4 · L)". */
export const expressionText = (formula: Formula): string =>
  piecesOf(formula)
    .map((piece) =>
      piece.kind === "given"
        ? piece.given.symbol.replace("_", "")
        : piece.kind === "power"
          ? `^${piece.text}`
          : piece.text,
    )
    .join("");

/** The numbers put in, each in the unit it was typed in: "E 210 GPa, d 20 mm, L 500 mm". */
export const valuesText = ({ givens }: Formula, values: Values, entries: Entries): string =>
  givens
    .map(({ key, symbol, measure }) => {
      const said = sayInput(values[key], measure, unitTyped(entries[key], measure));
      return `${symbol.replace("_", "")} ${said}`;
    })
    .join(", ");
