import { useState } from "react";
import { DataTable, type Column } from "../../components/data-table.tsx";
import type { FieldComparison, FieldRow } from "./compare-fields.ts";

interface FieldsTableProps {
  comparison: FieldComparison;
  names: readonly [string, string];
}

/** What was asked of the one and of the other, where it is not the same; with the origin of each value. */
export function FieldsTable({ comparison: { rows, same }, names }: FieldsTableProps) {
  const side = (which: 0 | 1) => (row: FieldRow) => (
    <Side value={row.values[which]} origin={row.origins[which] ?? (row.origins[1 - which] && "no origin")} />
  );
  const columns: Column<FieldRow>[] = [
    { key: "label", head: "What was asked", cell: ({ label }) => label, className: "whitespace-normal! min-w-32" },
    { key: "a", head: names[0], cell: side(0), className: "whitespace-normal! min-w-36" },
    { key: "b", head: names[1], cell: side(1), className: "whitespace-normal! min-w-36 font-semibold" },
    { key: "change", head: "change", cell: ({ change }) => <span className="font-normal text-quiet">{change}</span> },
  ];
  return (
    <>
      {rows.length > 0 ? (
        <DataTable caption="What was asked" columns={columns} rows={rows} keyOf={({ path }) => path} />
      ) : (
        <p>Both were asked the same.</p>
      )}
      <p className="mt-2 text-13 text-quiet">
        {same} {same === 1 ? "number is" : "numbers are"} the same.
      </p>
    </>
  );
}

/** Longer texts are cut until somebody asks for the rest. */
const LONG = 150;

function Side({ value, origin }: { value: string; origin: string | null }) {
  const [isWhole, setWhole] = useState(false);
  const isCut = value.length > LONG && !isWhole;
  return (
    <>
      {isCut ? `${value.slice(0, LONG)}…` : value}
      {isCut && (
        <button type="button" className="link ml-1 text-13 font-normal" onClick={() => setWhole(true)}>
          more
        </button>
      )}
      <span className="block text-13 font-normal text-quiet">{origin ?? ""}</span>
    </>
  );
}
