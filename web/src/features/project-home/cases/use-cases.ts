import type { Scenario } from "@restband/solver";
import { useDeferredValue, useMemo, useState } from "react";
import { buildCases, decimalOf, hasDoubt, type Case, type Decimal } from "./build-cases.ts";
import type { CaseField, WriteNumber } from "./case-field.ts";
import { readColumns, type Column, type ColumnChoice } from "./columns.ts";
import { readTable } from "./read-table.ts";

export interface CasesSource {
  readonly text: string;
  readonly base: Scenario;
  readonly fields: readonly CaseField[];
  readonly write: WriteNumber;
}

export interface Cases {
  readonly columns: readonly Column[];
  readonly cases: readonly Case[];
  /** Sentences about the table as a whole and about its columns. */
  readonly faults: readonly string[];
  readonly choose: (column: number, choice: ColumnChoice) => void;
  /** Asked only where a cell can be read in two ways and the others do not tell. */
  readonly isDecimalAsked: boolean;
  readonly decimal: Decimal | null;
  readonly setDecimal: (decimal: Decimal) => void;
}

/** A pasted table read as cases over a base, anew with every change of it. */
export function useCases(source: CasesSource): Cases {
  const { base, fields, write } = source;
  const text = useDeferredValue(source.text);
  const { table, fault } = useMemo(() => readTable(text), [text]);
  const [chosen, setChosen] = useState<{ head: string; choices: Readonly<Record<number, ColumnChoice>> }>(
    nothingChosen,
  );
  const [chosenDecimal, setDecimal] = useState<Decimal | null>(null);
  const head = table?.head.join("\t") ?? "";
  // What was chosen for columns holds as long as the head stays as it is.
  const choices = chosen.head === head ? chosen.choices : nothingChosen.choices;
  const read = useMemo(() => table && readColumns(table, fields, choices), [table, fields, choices]);
  const told = useMemo(() => read && decimalOf(read.rows, read.columns), [read]);
  const isDoubtful = useMemo(() => read !== null && hasDoubt(read.rows, read.columns), [read]);
  const decimal = told ?? chosenDecimal;
  const cases = useMemo(
    () => (read ? buildCases(read.rows, { base, columns: read.columns, write, decimal }) : []),
    [read, base, write, decimal],
  );
  return {
    columns: read?.columns ?? [],
    cases,
    faults: [
      ...(fault && text.trim() !== "" ? [fault] : []),
      ...(read?.faults ?? []),
      ...(read ? emptiness(read.columns) : []),
    ],
    choose: (column, choice) => setChosen({ head, choices: { ...choices, [column]: choice } }),
    isDecimalAsked: isDoubtful && told === null,
    decimal,
    setDecimal,
  };
}

const nothingChosen = { head: "", choices: {} };

const emptiness = (columns: readonly Column[]): string[] =>
  columns.some(({ kind }) => kind === "field")
    ? []
    : ["No column is for a number of the base yet: choose under each head what it is for."];
