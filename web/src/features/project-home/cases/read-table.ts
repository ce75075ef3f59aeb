import { mostCases } from "@restband/api/contract";
import Papa from "papaparse";
import { parseNumber } from "../../../format/parse-number.ts";

/** A table as it was pasted: the words of its head, and its cells. Every row has as many cells as the head. */
export interface Table {
  /** "Column 1" and so on where the first row holds numbers only. */
  readonly head: readonly string[];
  readonly rows: readonly TableRow[];
}

export interface TableRow {
  /** Where it stands in the text, from 1: faults name it. */
  readonly line: number;
  readonly cells: readonly string[];
}

export type TableRead = { table: Table; fault: null } | { table: null; fault: string };

/** Reads a pasted or uploaded table: columns parted by tabs, semicolons, commas or bars; empty lines count for nothing. */
export function readTable(text: string): TableRead {
  const { data } = Papa.parse<string[]>(text.replace(/^\uFEFF/u, ""), { delimitersToGuess: ["\t", ";", ",", "|"] });
  const lines = data
    .map((cells, index) => ({ line: index + 1, cells: cells.map((cell) => cell.trim()) }))
    .filter(({ cells }) => cells.some((cell) => cell !== ""));
  if (lines.length === 0) return refused("The table is empty.");
  const isHeadless = lines[0].cells.every((cell) => cell === "" || parseNumber(cell) !== null);
  const head = isHeadless ? lines[0].cells.map((_, i) => `Column ${i + 1}`) : lines[0].cells;
  const rows = isHeadless ? lines : lines.slice(1);
  const long = rows.find(({ cells }) => cells.slice(head.length).some((cell) => cell !== ""));
  if (long) return refused(`Line ${long.line} has more cells than the head has columns (${head.length}).`);
  if (rows.length === 0) return refused("The table has a head and no row yet.");
  // One more than cases are allowed: there may be a row of units.
  if (rows.length > mostCases + 1)
    return refused(`The table has ${rows.length} rows; at most ${mostCases} go at once.`);
  return {
    table: { head, rows: rows.map(({ line, cells }) => ({ line, cells: head.map((_, i) => cells[i] ?? "") })) },
    fault: null,
  };
}

const refused = (fault: string): TableRead => ({ table: null, fault });
