import { checkScenario, type Fault, type Scenario } from "@restband/solver";
import { parseNumber } from "../../../format/parse-number.ts";
import { parseTyped } from "../../../format/parse-typed.ts";
import type { CaseField, WriteNumber } from "./case-field.ts";
import type { Column } from "./columns.ts";
import type { TableRow } from "./read-table.ts";

export type Decimal = "," | ".";

/** One row as a scenario, or what is to be put right in it. */
export interface Case {
  readonly line: number;
  readonly title: string;
  readonly cells: readonly string[];
  /** What each cell was read as, SI; null for a cell that gives no number. */
  readonly values: readonly (number | null)[];
  /** Null where the row has a fault. */
  readonly scenario: Scenario | null;
  /** `column` null: of the row as a whole. */
  readonly faults: readonly { readonly column: number | null; readonly message: string }[];
}

interface CaseSettings {
  readonly base: Scenario;
  readonly columns: readonly Column[];
  readonly write: WriteNumber;
  readonly decimal: Decimal | null;
}

/** Makes a scenario of each row: the base with the numbers of the row in place. An empty cell leaves the base's number. */
export function buildCases(rows: readonly TableRow[], settings: CaseSettings): Case[] {
  return rows.map((row, index) => buildCase(row, index, settings));
}

function buildCase({ line, cells }: TableRow, index: number, { base, columns, write, decimal }: CaseSettings): Case {
  const titleAt = columns.findIndex(({ kind }) => kind === "title");
  const title = cells[titleAt] || `${base.title || "Untitled"}, case ${index + 1}`;
  const faults: Case["faults"][number][] = [];
  const values: (number | null)[] = cells.map(() => null);
  let scenario: Scenario = { ...base, title };
  columns.forEach((column, i) => {
    if (column.kind !== "field" || cells[i] === "") return;
    const value = valueOf(cells[i], column, decimal);
    if (typeof value === "string") faults.push({ column: i, message: value });
    else {
      values[i] = value;
      scenario = put(scenario, column.field, value, write);
    }
  });
  if (faults.length === 0) {
    const checked = checkScenario(scenario);
    if (checked.scenario) return { line, title, cells, values, scenario: checked.scenario, faults };
    faults.push(
      ...checked.faults.map((fault) => ({ column: columnOf(fault, columns), message: wordsOf(fault, columns) })),
    );
  }
  return { line, title, cells, values, scenario: null, faults };
}

/** Another number comes from elsewhere than the base's: its origin is not that of this one. */
function put(scenario: Scenario, { path, value: before }: CaseField, value: number, write: WriteNumber): Scenario {
  if (value === before) return scenario;
  const origins = Object.fromEntries(Object.entries(scenario.origins).filter(([key]) => key !== path));
  return { ...write(scenario, path, value), origins };
}

/** The number of a cell in SI, or why it is none. */
function valueOf(text: string, { field, unit }: Column & { kind: "field" }, decimal: Decimal | null): number | string {
  const reading = parseTyped(decimal === "," ? withPoint(text) : text, field.measure, unit);
  if (reading.kind === "value") return reading.value;
  if (reading.kind === "unreadable") return reading.message;
  if (decimal === null) return reading.message.replace(/ Choose.*$/u, " Choose above which sign parts the decimals.");
  // Read as decimals first, as groups of thousands second.
  return reading.choices[decimal === "," ? 0 : 1].value;
}

/** A number written with a comma for the decimals and points between thousands. */
function withPoint(text: string): string {
  return text
    .replace(/^[+\-−]?\d{1,3}(?:\.\d{3})+(?=,|\s|$)/u, (whole) => whole.replaceAll(".", ""))
    .replace(/^([+\-−]?\d+),(?=\d)/u, "$1.");
}

function columnOf({ path }: Fault, columns: readonly Column[]): number | null {
  const index = columns.findIndex((column) => column.kind === "field" && column.field.path === path);
  return index < 0 ? null : index;
}

const wordsOf = (fault: Fault, columns: readonly Column[]): string =>
  columnOf(fault, columns) === null && fault.path !== "" ? `${fault.path}: ${fault.message}` : fault.message;

/**
 * The sign that parts the decimals, as far as the cells tell: "0,15" tells of a comma, "0.15" of a point, "1,200" of
 * neither. Null where they tell of both or of none: then it has to be asked, if it matters.
 */
export function decimalOf(rows: readonly TableRow[], columns: readonly Column[]): Decimal | null {
  const signs = new Set<Decimal>();
  for (const { cells } of rows)
    columns.forEach(({ kind }, i) => {
      const sign = kind === "field" ? signOf(cells[i]) : null;
      if (sign) signs.add(sign);
    });
  return signs.size === 1 ? [...signs][0] : null;
}

function signOf(text: string): Decimal | null {
  const number = /^[+\-−]?[\d.,]+/u.exec(text)?.[0] ?? "";
  const reading = parseNumber(number);
  if (!reading || "readings" in reading) return null;
  const [comma, point] = [number.lastIndexOf(","), number.lastIndexOf(".")];
  if (comma < 0 && point < 0) return null;
  if (comma < 0 && /^[+\-−]?[1-9]\d{0,2}\.\d{3}$/u.test(number)) return null;
  return comma > point ? "," : ".";
}

/** True where a cell can be read in two ways. */
export const hasDoubt = (rows: readonly TableRow[], columns: readonly Column[]): boolean =>
  rows.some(({ cells }) =>
    columns.some(({ kind }, i) => {
      const number = kind === "field" ? /^[+\-−]?[\d.,]+/u.exec(cells[i])?.[0] : undefined;
      const reading = number === undefined ? null : parseNumber(number);
      return reading !== null && "readings" in reading;
    }),
  );
