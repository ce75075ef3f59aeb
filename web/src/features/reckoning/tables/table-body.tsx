import { useId, useState } from "react";
import { Button } from "../../../components/button.tsx";
import { Caution } from "../../../components/caution.tsx";
import { DataTable, type Column } from "../../../components/data-table.tsx";
import { DialogActions } from "../../../components/dialog.tsx";
import { PowerText } from "../../../components/power-text.tsx";
import { formatExactly } from "../../../format/format-number.ts";
import { capitalised, listed } from "../../../format/words.ts";
import type { ReckoningBodyProps } from "../reckoning-body.ts";
import type { Taken } from "../taken.ts";
import { frictionPairs } from "./friction-pairs.ts";
import { lossFactors } from "./loss-factors.ts";
import { takenFrom, type Table, type TableRow } from "./table.ts";

const tables: Readonly<Record<string, Table>> = { "friction-pairs": frictionPairs, "loss-factors": lossFactors };

/** A table of printed values: one row is chosen, and says where it is from and what it fills in. */
export function TableBody({ reckoning, onTake, onClose }: ReckoningBodyProps) {
  const table = tables[reckoning.key];
  const [chosen, setChosen] = useState<TableRow | null>(null);
  const name = useId();
  const columns: readonly Column<TableRow>[] = [
    {
      key: "name",
      head: table.head,
      className: "max-desk:whitespace-normal",
      cell: (row) => (
        <label className="flex items-baseline gap-2.5 py-0.5 pointer-coarse:py-2">
          <input
            type="radio"
            name={name}
            className="size-4 shrink-0 translate-y-0.5 accent-slip"
            checked={row === chosen}
            onChange={() => setChosen(row)}
            data-first-focus={row === table.rows[0] || undefined}
          />
          <span>
            {row.name} <span className="text-13 text-quiet max-desk:block desk:sr-only">{row.condition}</span>
          </span>
        </label>
      ),
    },
    { key: "condition", head: "Condition", cell: ({ condition }) => condition, className: "max-desk:hidden" },
    ...table.columns.map(({ path, label }) => ({
      key: path,
      head: label,
      cell: ({ printed }: TableRow) => <Span printed={printed[path]} />,
    })),
  ];
  return (
    <div className="flex min-h-0 flex-col gap-5">
      <DataTable
        caption={table.caption}
        columns={columns}
        rows={table.rows}
        keyOf={({ key }) => key}
        isCurrent={(row) => row === chosen}
        className="min-h-72"
      />
      <Caution>
        <p>{table.caution}</p>
      </Caution>
      <Choice table={table} row={chosen} onTake={onTake} onClose={onClose} />
    </div>
  );
}

function Span({ printed }: { printed: TableRow["printed"][string] | undefined }) {
  if (!printed) return <span className="text-quiet">not printed</span>;
  const { low, high } = printed;
  return (
    <span className="figures">
      <PowerText text={formatExactly(low)} />
      {high > low && (
        <>
          –<PowerText text={formatExactly(high)} />
        </>
      )}
    </span>
  );
}

interface ChoiceProps {
  table: Table;
  row: TableRow | null;
  onTake: (taken: readonly Taken[]) => void;
  onClose: () => void;
}

/** What the chosen row says in full, and the button that takes it. */
function Choice({ table, row, onTake, onClose }: ChoiceProps) {
  const taken = row ? takenFrom(table, row) : [];
  return (
    <div className="border-t border-edge pt-4">
      <div aria-live="polite">
        {row ? <RowWords table={table} row={row} taken={taken} /> : <p className="text-18 text-quiet">Choose a row.</p>}
      </div>
      <DialogActions>
        <Button kind="primary" isBusy={!row} onClick={() => onTake(taken)}>
          Take it
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </DialogActions>
    </div>
  );
}

function RowWords({ table, row, taken }: { table: Table; row: TableRow; taken: readonly Taken[] }) {
  const labelOf = (path: string): string =>
    (table.columns.find((column) => column.path === path)?.label ?? path).toLowerCase();
  const left = table.columns.filter(({ path }) => !row.printed[path]).map(({ path }) => labelOf(path));
  const hasSpan = taken.some(({ origin }) => origin.low !== undefined);
  return (
    <>
      <p className="text-18 font-semibold">
        <PowerText
          text={`${capitalised(listed(taken.map(({ path, value }) => `${labelOf(path)} ${formatExactly(value)}`)))}`}
        />
      </p>
      <p className="mt-1 text-15">
        Printed:{" "}
        {Object.entries(row.printed).map(([path, { text }], i) => (
          <span key={path}>
            {i > 0 && "; "}
            {labelOf(path)} <PowerText text={text} />
          </span>
        ))}
        .{" "}
        {hasSpan
          ? `Taken is ${table.middleWords}; the whole span goes along as the range.`
          : "No spread is printed, so no range goes along."}
        {left.length > 0 && ` ${capitalised(listed(left))} is not printed and stays as it is.`}
      </p>
      {row.caveat && <p className="mt-1 text-15">{row.caveat}</p>}
      <p className="mt-1 text-13 text-quiet">{row.source}</p>
    </>
  );
}
