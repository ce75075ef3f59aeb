import { SelectField } from "../../../components/select.tsx";
import { entryOf, readEntries, type Entries } from "./entries.ts";
import type { Formula, Preset } from "./formula.ts";
import { FormulaLine } from "./formula-line.tsx";
import { GivenField } from "./given-field.tsx";

interface FormulaFormProps {
  formula: Formula;
  entries: Entries;
  onChange: (entries: Entries) => void;
  /** The first number has the focus when the dialog opens. */
  isFirst?: boolean;
}

/** Everything a formula asks for, and the formula itself with the numbers put in. */
export function FormulaForm({ formula, entries, onChange, isFirst }: FormulaFormProps) {
  const { values, faults } = readEntries(formula, entries);
  return (
    <>
      <div className="grid gap-x-6 gap-y-4 desk:grid-cols-2">
        {formula.presets?.map((preset) => (
          <PresetField
            key={preset.label}
            {...{ formula, preset, entries }}
            onChoose={(chosen) => onChange({ ...entries, ...chosen })}
          />
        ))}
        {formula.givens.map((given, i) => (
          <GivenField
            key={given.key}
            given={given}
            entry={entries[given.key]}
            fault={faults[given.key]}
            onChange={(entry) => onChange({ ...entries, [given.key]: entry })}
            isFirst={isFirst && i === 0}
          />
        ))}
      </div>
      <div className="mt-3">
        <FormulaLine formula={formula} entries={entries} values={values} />
        {formula.caveat && <p className="mt-1.5 max-w-(--measure) text-13 text-quiet">{formula.caveat}</p>}
      </div>
    </>
  );
}

interface PresetFieldProps {
  formula: Formula;
  preset: Preset;
  entries: Entries;
  onChoose: (entries: Entries) => void;
}

const OWN = "own";

/** Shows the named set the fields hold now; their own numbers where they hold none. */
function PresetField({ formula, preset, entries, onChoose }: PresetFieldProps) {
  const sets = preset.options.map(({ label, values }) => ({ label, entries: presetEntries(formula, values) }));
  const current = sets.find((set) =>
    Object.entries(set.entries).every(
      ([key, { text, unit }]) => entries[key].text === text && entries[key].unit === unit,
    ),
  );
  return (
    <SelectField
      label={preset.label}
      choices={[{ value: OWN, label: "other" }, ...sets.map(({ label }) => ({ value: label, label }))]}
      value={current?.label ?? OWN}
      onChange={(event) => onChoose(sets.find(({ label }) => label === event.currentTarget.value)?.entries ?? {})}
    />
  );
}

function presetEntries({ givens }: Formula, values: Readonly<Partial<Record<string, number>>>): Entries {
  return Object.fromEntries(
    givens.flatMap((given) => {
      const value = values[given.key];
      return value === undefined ? [] : [[given.key, entryOf(value, given)]];
    }),
  );
}
