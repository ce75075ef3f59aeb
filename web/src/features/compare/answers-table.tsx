import type { Scenario } from "@restband/solver";
import { DataTable, type Column } from "../../components/data-table.tsx";
import { Figure } from "../../components/figure.tsx";
import { StateMark } from "../../components/state-mark.tsx";
import { readQuantity } from "../../format/format-quantity.ts";
import { measureOfQuantity } from "../../format/quantities.ts";
import type { AnswerComparison, AnswerRow } from "./compare-answers.ts";

interface AnswersTableProps {
  comparison: AnswerComparison;
  names: readonly [string, string];
  motion: Scenario["motion"];
}

/** Long names wrap, so that the verdicts stay in sight. */
const narrow = "whitespace-normal! max-w-40";

/** What came of the one and of the other: outcome, quantities that differ, and what has become of each limit. */
export function AnswersTable({ comparison: { outcomes, rows, same }, names, motion }: AnswersTableProps) {
  const value = (which: 0 | 1) => (row: AnswerRow | null) => {
    if (row === null) return <span className="font-(family-name:--font-text)">{outcomes[which]}</span>;
    const number = row.values[which];
    if (number === null) return <span className="text-quiet">none</span>;
    return <Figure {...readQuantity(number, measureOfQuantity(row.name, motion), { digits: 4 })} />;
  };
  const columns: Column<AnswerRow | null>[] = [
    { key: "label", head: "What came out", cell: (row) => row?.label ?? "Outcome" },
    { key: "a", head: names[0], isFigure: true, cell: value(0), className: narrow },
    { key: "b", head: names[1], isFigure: true, cell: value(1), className: `${narrow} font-semibold` },
    { key: "limit", head: "limit", cell: (row) => row?.limit && <StateMark {...row.limit} /> },
  ];
  return (
    <>
      <DataTable
        caption="What came out"
        columns={columns}
        rows={[null, ...rows]}
        keyOf={(row) => row?.name ?? "outcome"}
      />
      <p className="mt-2 text-13 text-quiet">
        {same} further {same === 1 ? "quantity is" : "quantities are"} the same.
      </p>
    </>
  );
}
