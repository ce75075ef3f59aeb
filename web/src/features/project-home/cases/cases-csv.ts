import { fromSi } from "../../../format/unit.ts";
import type { Glance } from "../glances/glance-book.ts";
import { resultsCsv } from "../results-csv.ts";
import type { Case } from "./build-cases.ts";
import type { Column } from "./columns.ts";

/** The table with what came of each row: its own numbers in the units of its columns, then outcome, limits and quantities. */
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
    cases.map(({ title, values }, i) => ({
      title,
      inputs: given.map(({ column: { field, unit }, index }) => fromSi(values[index] ?? field.value, unit)),
      glance: glances[i],
    })),
  );
}
