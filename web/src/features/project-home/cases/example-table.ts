import { readInput } from "../../../format/format-quantity.ts";
import { fromSi } from "../../../format/unit.ts";
import { unitFor } from "../../../format/units.ts";
import type { CaseField } from "./case-field.ts";

const MOST = 6;

/** A table to begin with: the base's own numbers under their names and units, one row. Its numbers are read as typed. */
export function exampleTable(title: string, fields: readonly CaseField[]): string {
  const chosen = fields.filter(({ path, value }) => value !== 0 && !/^(?:span|limits)/u.test(path)).slice(0, MOST);
  const isAlone = ({ label }: CaseField) => fields.filter((each) => each.label === label).length === 1;
  const head = chosen.map((field) => (isAlone(field) ? field.label : field.path));
  const units = chosen.map(({ value, measure }) => readInput(value, measure).unit);
  const values = chosen.map(({ value, measure }) => String(fromSi(value, unitFor(value, measure))));
  return [
    ["Title", ...head],
    ["", ...units],
    [`${title}, case 1`, ...values],
  ]
    .map((row) => row.join("\t"))
    .join("\n");
}
