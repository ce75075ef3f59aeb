import { PlainSelect } from "../../../components/select.tsx";
import { unitsOf } from "../../../format/units.ts";
import type { CaseField } from "./case-field.ts";
import type { Column, ColumnChoice } from "./columns.ts";

interface ColumnHeadProps {
  column: Column;
  fields: readonly CaseField[];
  onChoose: (choice: ColumnChoice) => void;
}

/** The head of a column: what it is called, what it is for, in which unit. */
export function ColumnHead({ column, fields, onChoose }: ColumnHeadProps) {
  const target = column.kind === "field" ? column.field.path : column.kind;
  return (
    <div className="flex flex-col items-start gap-0.5 whitespace-nowrap">
      <span className="font-bold text-ink">{column.head || "no name"}</span>
      <PlainSelect
        isQuiet
        aria-label={`What column ${column.head} is for`}
        value={target}
        choices={[
          { value: "unused", label: "left out" },
          { value: "title", label: "the title" },
          ...fields.map(({ path, label }) => ({ value: path, label: `${label} · ${path}` })),
        ]}
        onChange={(event) => onChoose({ target: event.target.value })}
      />
      {column.kind === "field" && <UnitChoice column={column} onChoose={(unit) => onChoose({ target, unit })} />}
    </div>
  );
}

function UnitChoice({ column, onChoose }: { column: Column & { kind: "field" }; onChoose: (unit: string) => void }) {
  const known = unitsOf(column.field.measure).map(({ label }) => label);
  const labels = known.includes(column.unit.label) ? known : [column.unit.label, ...known];
  if (labels.length === 1 && labels[0] === "") return <span className="text-13 font-normal text-quiet">a number</span>;
  return (
    <PlainSelect
      isQuiet
      aria-label={`Unit of column ${column.head}`}
      value={column.unit.label}
      choices={labels.map((label) => ({ value: label, label: label || "a number" }))}
      onChange={(event) => onChoose(event.target.value)}
    />
  );
}
