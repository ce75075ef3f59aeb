import { cellValues, type Scenario } from "@restband/solver";
import { useState } from "react";
import { Button } from "../../../components/button.tsx";
import { DataTable, type Column } from "../../../components/data-table.tsx";
import { say } from "../../../format/format-quantity.ts";
import { outcomeWords } from "../../../format/outcomes.ts";
import { measureOfQuantity, quantityNamed } from "../../../format/quantities.ts";
import type { AxisScale } from "./axis-scale.ts";
import type { SweepCells } from "./sweep-cells.ts";

interface SweepTableProps {
  cells: SweepCells;
  scenario: Scenario;
  scales: readonly AxisScale[];
  selected: number | null;
  onSelect: (cell: number) => void;
}

const PAGE = 50;

/** The cells as a table, fifty at a time. */
export function SweepTable({ cells, scenario, scales, selected, onSelect }: SweepTableProps) {
  const [page, setPage] = useState(0);
  const pages = Math.ceil(cells.count / PAGE);
  const rows = Array.from({ length: Math.min(PAGE, cells.count - page * PAGE) }, (_, i) => page * PAGE + i);
  return (
    <div>
      <DataTable
        caption="Cells of the sweep"
        rows={rows}
        keyOf={String}
        isCurrent={(cell) => cell === selected}
        columns={columnsOf(cells, scenario, scales, selected, onSelect)}
      />
      {pages > 1 && (
        <div className="mt-3 flex items-center gap-3 text-13 text-quiet">
          <Button disabled={page === 0} onClick={() => setPage(page - 1)}>
            Before
          </Button>
          <span>
            Cells {page * PAGE + 1} to {Math.min(cells.count, (page + 1) * PAGE)} of {cells.count}
          </span>
          <Button disabled={page === pages - 1} onClick={() => setPage(page + 1)}>
            Next
          </Button>
        </div>
      )}
    </div>
  );
}

function columnsOf(
  cells: SweepCells,
  { motion }: Scenario,
  scales: readonly AxisScale[],
  selected: number | null,
  onSelect: (cell: number) => void,
): Column<number>[] {
  const axes = scales.map((scale, i): Column<number> => ({
    key: `axis ${i}`,
    head: scale.unit.label ? `${scale.name}, ${scale.unit.label}` : scale.name,
    isFigure: true,
    cell: (cell) => scale.text(cellValues(cells.plan, cell)[i]),
  }));
  const quantities = cells.plan.quantities.map((name, i): Column<number> => ({
    key: name,
    head: quantityNamed(name)?.label ?? name,
    isFigure: true,
    cell: (cell) => {
      const value = cells.read(cell)?.quantities[i] ?? null;
      return value === null ? "–" : say(value, measureOfQuantity(name, motion), { digits: 4 });
    },
  }));
  return [
    {
      key: "cell",
      head: "cell",
      cell: (cell) => (
        <button type="button" className="link" onClick={() => onSelect(cell)}>
          {cell + 1}
          {cell === selected && " is selected"}
        </button>
      ),
    },
    ...axes,
    { key: "outcome", head: "outcome", cell: (cell) => outcomeOf(cells, cell) },
    ...quantities,
  ];
}

function outcomeOf(cells: SweepCells, cell: number): string {
  const figures = cells.read(cell);
  if (!figures) return "still to come";
  return figures.outcome ? outcomeWords[figures.outcome] : "no answer";
}
