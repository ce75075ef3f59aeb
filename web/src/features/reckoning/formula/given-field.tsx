import { Button } from "../../../components/button.tsx";
import { classNames } from "../../../components/class-names.ts";
import { controlClass, Field } from "../../../components/field.tsx";
import { PlainSelect } from "../../../components/select.tsx";
import { parseTyped } from "../../../format/parse-typed.ts";
import { unitsOf } from "../../../format/units.ts";
import { entryOf, typedEntry, unitTyped, type Entry, type EntryFault } from "./entries.ts";
import type { Given } from "./formula.ts";

interface GivenFieldProps {
  given: Given;
  entry: Entry;
  fault: EntryFault | undefined;
  onChange: (entry: Entry) => void;
  isFirst?: boolean;
}

/** One number a formula needs, with its unit. */
export function GivenField({ given, entry, fault, onChange, isFirst }: GivenFieldProps) {
  return (
    <Field
      label={`${given.label}, ${given.symbol.replace("_", "")}`}
      help={given.help}
      error={fault && <FaultWords fault={fault} given={given} onChange={onChange} />}
    >
      {(control) => (
        <>
          <input
            {...control}
            type="text"
            autoComplete="off"
            spellCheck={false}
            data-first-focus={isFirst || undefined}
            className={classNames(controlClass, "figures w-24! grow")}
            value={entry.text}
            onChange={(event) => onChange(typedEntry(event.currentTarget.value, entry, given))}
          />
          <UnitChoice given={given} entry={entry} onChange={onChange} />
        </>
      )}
    </Field>
  );
}

/** Another unit says the same value in it; a text that cannot be read only counts in it from now on. */
function UnitChoice({ given, entry, onChange }: Pick<GivenFieldProps, "given" | "entry" | "onChange">) {
  const { measure } = given;
  const unit = unitTyped(entry, measure);
  const usual = unitsOf(measure).filter(({ label }) => label !== "");
  if (measure.isShare) return <span className="text-13 text-quiet">%</span>;
  if (measure.dimension === "none") return null;
  const units = usual.some(({ label }) => label === unit.label) ? usual : [unit, ...usual];
  const choose = (label: string): void => {
    const reading = parseTyped(entry.text, measure, unit);
    const chosen = unitTyped({ text: "", unit: label }, measure);
    onChange(reading.kind === "value" ? entryOf(reading.value, given, chosen) : { ...entry, unit: label });
  };
  return (
    <PlainSelect
      aria-label={`Unit of ${given.label}`}
      className="w-24 shrink-0"
      choices={units.map(({ label }) => ({ value: label, label }))}
      value={unit.label}
      onChange={(event) => choose(event.currentTarget.value)}
    />
  );
}

function FaultWords({ fault, given, onChange }: { fault: EntryFault } & Pick<GivenFieldProps, "given" | "onChange">) {
  return (
    <>
      {fault.message}
      {fault.choices.length > 0 && (
        <span className="mt-2 flex flex-wrap gap-2">
          {fault.choices.map(({ label, value, unit }) => (
            <Button key={label} onClick={() => onChange(entryOf(value, given, unit))}>
              {label}
            </Button>
          ))}
        </span>
      )}
    </>
  );
}
