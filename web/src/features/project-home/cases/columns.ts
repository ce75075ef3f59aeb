import { parseNumber } from "../../../format/parse-number.ts";
import { parseUnit } from "../../../format/parse-unit.ts";
import type { Unit } from "../../../format/unit.ts";
import { siOf, unitByLabel, unitsOf } from "../../../format/units.ts";
import type { CaseField } from "./case-field.ts";
import type { Table, TableRow } from "./read-table.ts";

/** What a column of the table is for. */
export type Column =
  | { readonly kind: "title"; readonly head: string }
  | { readonly kind: "unused"; readonly head: string }
  | { readonly kind: "field"; readonly head: string; readonly field: CaseField; readonly unit: Unit };

/** What a person chose for a column instead of what its head says: "title", "unused" or a field's path; a unit's label. */
export interface ColumnChoice {
  readonly target?: string;
  readonly unit?: string;
}

export interface ReadColumns {
  readonly columns: readonly Column[];
  /** The rows without the row of units, if there is one. */
  readonly rows: readonly TableRow[];
  /** Sentences about columns that cannot be as they are. */
  readonly faults: readonly string[];
}

/** Finds what each column is for, by its head, by the row of units below it, and by what was chosen. */
export function readColumns(
  { head, rows }: Table,
  fields: readonly CaseField[],
  choices: Readonly<Record<number, ColumnChoice>>,
): ReadColumns {
  const heads = head.map((text) => splitHead(text, fields));
  const targets = heads.map(({ name }, i) => choices[i]?.target ?? guess(name, fields));
  const unitRow = isUnitRow(rows[0], targets, fields) ? rows[0] : null;
  const faults: string[] = [];
  const columns = targets.map((target, i): Column => {
    if (target === "title" || target === "unused") return { kind: target, head: head[i] };
    const field = fields.find(({ path }) => path === target);
    if (!field) return { kind: "unused", head: head[i] };
    const { unit, fault } = unitOf(field, [choices[i]?.unit, unitRow?.cells[i], heads[i].unit]);
    if (fault) faults.push(`Column “${head[i]}”: ${fault}`);
    return { kind: "field", head: head[i], field, unit };
  });
  return { columns, rows: unitRow ? rows.slice(1) : rows, faults: [...faults, ...repeated(columns)] };
}

/** "Feed [mm/min]", "Feed (mm/min)", "Feed, mm/min" → name and unit; a label of ours that has a comma stays whole. */
function splitHead(head: string, fields: readonly CaseField[]): { name: string; unit: string } {
  const whole = { name: head, unit: "" };
  const [, name, unit] = /^(.*?)\s*[[(]([^\])]*)[\])]\s*$/u.exec(head) ?? [];
  if (name !== undefined) return { name, unit };
  const [, before, after] = /^(.*?)\s*,\s*([^,]*)$/u.exec(head) ?? [];
  return before === undefined || guess(head, fields) !== "unused" ? whole : { name: before, unit: after };
}

/** What the trade calls a number whose field has another name. */
const customary: Readonly<Record<string, RegExp>> = { feed: /^base\[\d+\]\.rate$/u, belt: /^contact\.counterface\./u };

const plain = (text: string): string => text.toLowerCase().replace(/[\s_-]+/gu, "");

function guess(name: string, fields: readonly CaseField[]): string {
  const wanted = plain(name);
  if (["title", "name", "case", ""].includes(wanted)) return wanted === "" ? "unused" : "title";
  const names = [
    ({ path }: CaseField) => path,
    ({ label }: CaseField) => label,
    ({ symbol }: CaseField) => symbol ?? "",
    ({ path }: CaseField) => path.slice(path.lastIndexOf(".") + 1),
  ];
  for (const nameOf of names) {
    const found = fields.filter((field) => plain(nameOf(field)) === wanted);
    if (found.length > 0) return found[0].path;
  }
  return fields.find(({ path }) => customary[wanted]?.test(path))?.path ?? "unused";
}

/** A row in which no column of a field has a number, and at least one has a unit that fits. */
function isUnitRow(
  row: TableRow | undefined,
  targets: readonly string[],
  fields: readonly CaseField[],
): row is TableRow {
  if (!row) return false;
  const cells = targets.flatMap((target, i) => {
    const field = fields.find(({ path }) => path === target);
    return field && row.cells[i] !== "" ? [{ field, text: bare(row.cells[i]) }] : [];
  });
  return (
    cells.every(({ text }) => parseNumber(text) === null && !/^[\d.,+\-−]/u.test(text)) &&
    cells.some(({ field, text }) => parseUnit(text, field.measure) !== null)
  );
}

const bare = (text: string): string => text.replace(/^[[(]\s*|\s*[\])]$/gu, "");

/** The first unit that is named; SI where none is. One that does not fit is told. */
function unitOf({ measure }: CaseField, named: readonly (string | undefined)[]): { unit: Unit; fault: string | null } {
  const si = unitByLabel(measure, siOf(measure)) ?? unitsOf(measure)[0];
  const text = named.map((each) => bare(each ?? "")).find((each) => each !== "");
  if (text === undefined) return { unit: si, fault: null };
  const unit = unitByLabel(measure, text) ?? parseUnit(text, measure);
  if (unit) return { unit, fault: null };
  const offer = unitsOf(measure)
    .map(({ label }) => label)
    .filter(Boolean)
    .join(", ");
  return {
    unit: si,
    fault: `“${text}” is not a unit that fits here.${offer ? ` Among those that fit: ${offer}.` : ""}`,
  };
}

function repeated(columns: readonly Column[]): string[] {
  const seen = new Map<string, string>();
  return columns.flatMap((column) => {
    if (column.kind === "unused") return [];
    const key = column.kind === "field" ? column.field.path : "title";
    const before = seen.get(key);
    seen.set(key, column.head);
    return before === undefined ? [] : [`Columns “${before}” and “${column.head}” are for the same: leave one out.`];
  });
}
