import { quantities, type Quantity } from "@restband/solver";
import Papa from "papaparse";
import { outcomeWords } from "../../format/outcomes.ts";
import { measureOfQuantity } from "../../format/quantities.ts";
import type { Motion } from "../../format/unit.ts";
import { siOf } from "../../format/units.ts";
import type { Glance } from "./glances/glance-book.ts";
import { limitsWords } from "./headline.ts";

/** A row of results: the scenario's title, what was put in, and what came of it. */
export interface ResultRow {
  readonly title: string;
  readonly inputs: readonly (string | number)[];
  readonly glance: Glance | undefined;
}

/**
 * Results as a file for spreadsheets: a row each, every quantity in SI with all its digits, the unit in the head. Text
 * that a spreadsheet would run as a formula is made plain text. Begins with the mark by which they know UTF-8.
 */
export function resultsCsv(inputHeads: readonly string[], rows: readonly ResultRow[]): string {
  const motions = [...new Set(rows.flatMap(({ glance }) => glance?.computed?.scenario.motion ?? []))];
  const told = quantities.filter((quantity) => rows.some(({ glance }) => valueOf(glance, quantity) !== null));
  const head = ["Title", ...inputHeads, "Outcome", "Limits", ...told.map((quantity) => headOf(quantity, motions))];
  const cells = rows.map(({ title, inputs, glance }) => [
    title,
    ...inputs,
    ...wordsOf(glance),
    ...told.map((quantity) => valueOf(glance, quantity) ?? ""),
  ]);
  return `\uFEFF${Papa.unparse([head, ...cells], { escapeFormulae: true })}\r\n`;
}

function valueOf(glance: Glance | undefined, { name }: Quantity): number | null {
  if (!glance?.computed || "refusal" in glance.computed) return null;
  return glance.computed.result.quantities[name] ?? null;
}

function wordsOf(glance: Glance | undefined): [string, string] {
  if (!glance?.computed) return [glance?.failure ?? "", ""];
  const { computed } = glance;
  if ("refusal" in computed) return [computed.refusal.message, ""];
  const { outcome, limits, ended } = computed.result;
  return [outcome === null ? `no answer: ${ended}` : outcomeWords[outcome], limitsWords(limits)];
}

function headOf({ name, label }: Quantity, motions: readonly Motion[]): string {
  const units = [...new Set(motions.map((motion) => siOf(measureOfQuantity(name, motion))))].filter(Boolean);
  return units.length > 0 ? `${label} [${units.join(" or ")}]` : label;
}
