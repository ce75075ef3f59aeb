import { controlClass, Field } from "../../components/field.tsx";
import { PlainSelect } from "../../components/select.tsx";
import { classNames } from "../../components/class-names.ts";
import { readInput } from "../../format/format-quantity.ts";
import { parseTyped } from "../../format/parse-typed.ts";
import type { Measure } from "../../format/unit.ts";
import { unitByLabel, unitFor, unitsOf } from "../../format/units.ts";

/** A number as it is typed: its text, and the label of the unit it counts in. */
export interface Typed {
  readonly text: string;
  readonly unit: string;
}

export function typedOf(value: number, measure: Measure): Typed {
  const { text, unit } = readInput(value, measure);
  return { text, unit };
}

/** The value typed, SI, or what is to be put right. */
export function readTyped({ text, unit }: Typed, measure: Measure): { value: number } | { message: string } {
  const read = parseTyped(text, measure, unitByLabel(measure, unit) ?? unitFor(0, measure));
  return read.kind === "value" ? { value: read.value } : { message: read.message };
}

interface TypedNumberProps {
  label: string;
  typed: Typed;
  measure: Measure;
  onChange: (typed: Typed) => void;
  /** What the plan says against it; what cannot be read says so itself. */
  error?: string;
  help?: string;
  className?: string;
}

/** A labelled number with its unit, read as it is typed. */
export function TypedNumber({ label, typed, measure, onChange, error, help, className }: TypedNumberProps) {
  const read = readTyped(typed, measure);
  // A plain number says so by having no unit beside it; a percentage has to be typed.
  const units = unitsOf(measure).some(({ label: each }) => each === "") ? [] : unitsOf(measure);
  return (
    <Field label={label} error={"message" in read ? read.message : error} help={help} className={className}>
      {(control) => (
        <>
          <input
            {...control}
            autoComplete="off"
            spellCheck={false}
            className={classNames(controlClass, "figures w-28!")}
            value={typed.text}
            onChange={(event) => onChange({ ...typed, text: event.target.value })}
          />
          {units.length === 1 && <span className="text-13 text-quiet">{units[0].label}</span>}
          {units.length > 1 && (
            <PlainSelect
              aria-label={`Unit of ${label}`}
              choices={units.map((unit) => ({ value: unit.label, label: unit.label }))}
              value={typed.unit}
              onChange={(event) => onChange({ ...typed, unit: event.target.value })}
            />
          )}
        </>
      )}
    </Field>
  );
}
