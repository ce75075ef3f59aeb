import type { Measure, Unit } from "../../../format/unit.ts";
import { formatFully } from "../../../format/format-number.ts";
import { parseTyped } from "../../../format/parse-typed.ts";
import { fromSi } from "../../../format/unit.ts";

/** A column of rows as it is typed: what it measures and the unit it is typed in. */
export interface TypedColumn {
  readonly label: string;
  readonly measure: Measure;
  readonly unit: Unit;
}

/** Rows (SI) as text, one a line, two numbers parted by a tab. */
export function writeRows(
  rows: readonly (readonly [number, number])[],
  columns: readonly [TypedColumn, TypedColumn],
): string {
  const shown = (value: number, { unit }: TypedColumn): string =>
    formatFully(Number(fromSi(value, unit).toPrecision(12))).replace("\u2212", "-");
  return rows.map(([a, b]) => `${shown(a, columns[0])}\t${shown(b, columns[1])}`).join("\n");
}

/** Reads rows back into SI. Numbers are parted by a tab, semicolon or spaces; empty lines do not count. The first fault is told. */
export function readRows(
  text: string,
  columns: readonly [TypedColumn, TypedColumn],
): { rows: [number, number][] } | { message: string } {
  const rows: [number, number][] = [];
  for (const [i, line] of text.split(/\r?\n/).entries()) {
    if (line.trim() === "") continue;
    const cells = line.trim().split(/\s*[\t;]\s*|\s+/);
    if (cells.length !== 2)
      return { message: `Line ${i + 1} has ${cells.length} numbers; two are needed, parted by a space or tab.` };
    const read = cells.map((cell, c) => parseTyped(cell, columns[c].measure, columns[c].unit));
    const [first, second] = read;
    if (first.kind !== "value") return { message: `Line ${i + 1}, ${columns[0].label}: ${first.message}` };
    if (second.kind !== "value") return { message: `Line ${i + 1}, ${columns[1].label}: ${second.message}` };
    rows.push([first.value, second.value]);
  }
  return { rows };
}
