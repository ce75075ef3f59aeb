import type { Field, Rows, Scenario } from "@restband/solver";
import { useState } from "react";
import { TextArea } from "../../../components/text-field.tsx";
import { unitsOf } from "../../../format/units.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { isUnder, readPath } from "../path.ts";
import { measureOf } from "../scenario-fields.ts";
import { readRows, writeRows, type TypedColumn } from "./rows-text.ts";

interface RowsFieldProps {
  /** Of the kind that holds the rows: `contact.law`, `force[0]`. */
  path: string;
  rows: Rows;
}

/** Two columns of numbers as lines of text, to type or to paste. */
export function RowsField({ path, rows }: RowsFieldProps) {
  const { draft, dispatch } = useDraftContext();
  const { wanted, unread } = draft.sheet;
  const [typing, setTyping] = useState<string | null>(null);
  const stored = storedRows(wanted, path, rows);
  const columns = [columnOf(wanted, rows.columns[0]), columnOf(wanted, rows.columns[1])] as const;
  if (stored === null) return <p className="text-15 text-quiet">The points are stored with the scenario.</p>;

  const rowsPath = `${path}.points`;
  const type = (text: string): void => {
    setTyping(text);
    const read = readRows(text, columns);
    if ("message" in read) dispatch({ type: "leave-unread", path: rowsPath, text, message: read.message });
    else
      dispatch({
        type: "set",
        path,
        value: withRows(readPath(wanted, path) as object, rows, read.rows),
        clears: rowsPath,
      });
  };
  const fault = draft.faults.find((each) => isUnder(each.path, rowsPath) || each.path.startsWith(`${path}.times`));
  return (
    <TextArea
      label={`${columns[0].label} and ${columns[1].label.toLowerCase()}`}
      help={`One pair a line, in ${columns.map(({ unit }) => unit.label || "no unit").join(" and ")}; a table can be pasted.`}
      error={fault?.message}
      rows={Math.min(12, stored.length + 2)}
      spellCheck={false}
      value={typing ?? unread[rowsPath]?.text ?? writeRows(stored, columns)}
      onChange={(event) => type(event.currentTarget.value)}
      onBlur={() => {
        setTyping(null);
        dispatch({ type: "settle" });
      }}
    />
  );
}

/** The rows a kind holds inline, as pairs; null where they are stored elsewhere. */
function storedRows(scenario: Scenario, path: string, { columns }: Rows): [number, number][] | null {
  const kind = readPath(scenario, path) as Record<string, unknown>;
  if (Array.isArray(kind.points)) return kind.points as [number, number][];
  const [first, second] = columns.map(({ key }) => kind[key]);
  if (!Array.isArray(first) || !Array.isArray(second)) return null;
  return first.map((value: number, i) => [value, second[i] as number]);
}

function withRows(kind: object, { columns }: Rows, rows: [number, number][]): object {
  if ("points" in kind) return { ...kind, points: rows };
  return { ...kind, [columns[0].key]: rows.map(([a]) => a), [columns[1].key]: rows.map(([, b]) => b) };
}

function columnOf(scenario: Scenario, field: Field): TypedColumn {
  const measure = measureOf(scenario, field);
  const unit = unitsOf(measure).find(({ factor }) => factor === 1) ?? unitsOf(measure)[0];
  return { label: field.label, measure, unit };
}
