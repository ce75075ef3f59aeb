import { readInput, joined } from "../../../format/format-quantity.ts";
import type { Scenario } from "@restband/solver";
import { unitTyped } from "../entry/use-number-entry.ts";
import { measureOf, numberAt } from "../scenario-fields.ts";
import type { Piece } from "./piece.ts";

/** A sentence as plain text, for where it is read and not edited; `units`: those chosen for single values, by path. */
export function plainText(
  scenario: Scenario,
  pieces: readonly Piece[],
  units: Readonly<Record<string, string>> = {},
): string {
  return pieces.map((piece) => textOf(scenario, piece, units)).join("");
}

function textOf(scenario: Scenario, piece: Piece, units: Readonly<Record<string, string>>): string {
  switch (piece.kind) {
    case "text":
    case "rows":
      return piece.text;
    case "off":
      return `${piece.text} (off)`;
    case "word": {
      if (piece.isMenu) return "";
      const word = piece.text ?? piece.options.find(({ value }) => value === piece.value)?.label ?? piece.value;
      return piece.isBracketed ? `(${word})` : word;
    }
    case "value": {
      const value = numberAt(scenario, piece.path);
      if (piece.word !== undefined) return piece.word;
      const measure = measureOf(scenario, piece.field);
      const chosen = unitTyped(units[piece.path], measure) ?? undefined;
      return value === undefined ? "–" : joined(readInput(value, measure, chosen));
    }
  }
}
