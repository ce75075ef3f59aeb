import { readInput, joined } from "../../../format/format-quantity.ts";
import type { Scenario } from "@restband/solver";
import { measureOf, numberAt } from "../scenario-fields.ts";
import type { Piece } from "../sentence/piece.ts";

/** A sentence as plain text, for where it is compared and not edited. */
export function plainText(scenario: Scenario, pieces: readonly Piece[]): string {
  return pieces.map((piece) => textOf(scenario, piece)).join("");
}

function textOf(scenario: Scenario, piece: Piece): string {
  switch (piece.kind) {
    case "text":
    case "rows":
      return piece.text;
    case "word": {
      const word = piece.text ?? piece.options.find(({ value }) => value === piece.value)?.label ?? piece.value;
      return piece.isBracketed ? `(${word})` : word;
    }
    case "value": {
      const value = numberAt(scenario, piece.path);
      if (piece.word !== undefined) return piece.word;
      return value === undefined ? "–" : joined(readInput(value, measureOf(scenario, piece.field)));
    }
  }
}
