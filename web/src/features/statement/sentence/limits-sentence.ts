import { quantities, type Limit, type Scenario } from "@restband/solver";
import { quantityNamed } from "../../../format/quantities.ts";
import { addLimit } from "../changes.ts";
import { fieldAt, type PathField } from "../scenario-fields.ts";
import { text, type Piece, type WordPiece } from "./piece.ts";

/** "It must keep the share of time stuck at most 0 % and the peak acceleration at most 2 m/s². Another limit." */
export function limitsSentence(scenario: Scenario): Piece[] {
  if (scenario.limits.length === 0) return [adder("No limit"), text(" is set.")];
  const limits = scenario.limits.flatMap((limit, i) => [
    text(separator(i, scenario.limits.length)),
    ...limitWords(scenario, limit, i),
  ]);
  return [text("It must keep "), ...limits, text(". "), { ...adder("Add a limit"), isOffer: true }, text(".")];
}

function separator(index: number, count: number): string {
  if (index === 0) return "";
  return index === count - 1 ? " and " : ", ";
}

function limitWords(scenario: Scenario, limit: Limit, index: number): Piece[] {
  const bound = (key: "min" | "max"): Piece => {
    const path = `limits[${index}].${key}`;
    return { kind: "value", path, field: fieldAt(scenario, path) as PathField };
  };
  const name = text(`the ${lowered(quantityNamed(limit.quantity)?.label ?? limit.quantity)} `);
  if (limit.min !== undefined && limit.max !== undefined)
    return [name, text("between "), bound("min"), text(" and "), bound("max")];
  return limit.min === undefined ? [name, text("at most "), bound("max")] : [name, text("at least "), bound("min")];
}

/** A label inside a sentence: its first letter small unless it is an abbreviation. */
const lowered = (label: string): string =>
  /^[A-Z][a-z ]/.test(label) ? label[0].toLowerCase() + label.slice(1) : label;

function adder(shown: string): WordPiece {
  return {
    kind: "word",
    label: "Limit on",
    value: "",
    text: shown,
    options: [{ value: "", label: shown }, ...quantities.map(({ name, label }) => ({ value: name, label }))],
    choose: (quantity) => (quantity === "" ? { type: "settle" } : addLimit(quantity, 0)),
  };
}
