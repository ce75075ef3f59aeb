import type { ReactNode } from "react";
import { classNames } from "./class-names.ts";

export interface Column<Row> {
  key: string;
  head: ReactNode;
  /** Numbers stand right, in the mono face. */
  isFigure?: boolean;
  cell: (row: Row) => ReactNode;
  className?: string;
}

interface DataTableProps<Row> {
  /** Names the table; shown only to those who hear it, unless `isCaptionShown`. */
  caption: string;
  isCaptionShown?: boolean;
  columns: readonly Column<Row>[];
  rows: readonly Row[];
  keyOf: (row: Row) => string;
  /** The row to tint; say in words too why it is tinted. */
  isCurrent?: (row: Row) => boolean;
  /** Under an edge rule, in bold. */
  sumRow?: Row;
  className?: string;
}

/** A table with hairlines only; it scrolls within itself where it is wider than its place. */
export function DataTable<Row>({
  caption,
  isCaptionShown,
  columns,
  rows,
  keyOf,
  isCurrent,
  sumRow,
  className,
}: DataTableProps<Row>) {
  return (
    <div
      className={classNames("scroll-edges relative overflow-x-auto", className)}
      tabIndex={0}
      role="region"
      aria-label={caption}
    >
      <table className="w-full border-collapse text-15">
        <caption className={isCaptionShown ? "pb-2 text-left font-bold" : "sr-only"}>{caption}</caption>
        <thead>
          <tr className="border-b border-edge">
            {columns.map(({ key, head, isFigure, className: columnClass }) => (
              <th
                key={key}
                scope="col"
                className={classNames(
                  cellClass,
                  "text-13 font-semibold text-quiet",
                  isFigure && "text-right",
                  columnClass,
                )}
              >
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody>
          {rows.map((row) => (
            <TableRow
              key={keyOf(row)}
              row={row}
              columns={columns}
              className={isCurrent?.(row) ? "bg-tint" : undefined}
            />
          ))}
        </tbody>
        {sumRow && (
          <tfoot>
            <TableRow row={sumRow} columns={columns} className="border-t border-edge font-bold" />
          </tfoot>
        )}
      </table>
    </div>
  );
}

const cellClass = "px-2 py-1.5 text-left align-baseline whitespace-nowrap first:pl-0 last:pr-0";

function TableRow<Row>({ row, columns, className }: { row: Row; columns: readonly Column<Row>[]; className?: string }) {
  return (
    <tr className={classNames("border-b border-line", className)}>
      {columns.map(({ key, cell, isFigure, className: columnClass }, index) => {
        const Cell = index === 0 ? "th" : "td";
        return (
          <Cell
            key={key}
            scope={index === 0 ? "row" : undefined}
            className={classNames(
              cellClass,
              index === 0 && "font-normal",
              isFigure && "figures text-right",
              columnClass,
            )}
          >
            {cell(row)}
          </Cell>
        );
      })}
    </tr>
  );
}
