import type { Glance } from "../glances/glance-book.ts";
import { resultsCsv } from "../results-csv.ts";
import type { Case } from "./build-cases.ts";
import type { Column } from "./columns.ts";

/** The table with what came of each row: its own columns as they were typed, then outcome, limits and quantities. */
export function casesCsv(
  columns: readonly Column[],
  cases: readonly Case[],
  glances: readonly (Glance | undefined)[],
): string {
  const given = columns.flatMap((column, index) => (column.kind === "field" ? [{ column, index }] : []));
  const heads = given.map(({ column: { field, unit } }) =>
    unit.label ? `${field.label} [${unit.label}]` : field.label,
  );
  return resultsCsv(
    heads,
    cases.map(({ title, cells }, i) => ({
      title,
      inputs: given.map(({ index }) => asNumber(cells[index])),
      glance: glances[i],
    })),
  );
}

/** A plain number stays one, so that a sign at its head is no formula. */
function asNumber(text: string): string | number {
  return /^[+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?$/iu.test(text) ? Number(text) : text;
}
