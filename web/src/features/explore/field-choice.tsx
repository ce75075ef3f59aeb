import { SelectField } from "../../components/select.tsx";
import type { ExploreField } from "./explore-field.ts";

interface FieldChoiceProps {
  label: string;
  fields: readonly ExploreField[];
  /** The path chosen. */
  value: string;
  error?: string;
  onChange: (path: string) => void;
}

/** Which number of the scenario. */
export function FieldChoice({ label, fields, value, error, onChange }: FieldChoiceProps) {
  return (
    <SelectField
      label={label}
      className="w-64 max-w-full"
      error={error}
      choices={fields.map(({ path, name }) => ({ value: path, label: name }))}
      value={value}
      onChange={(event) => onChange(event.target.value)}
    />
  );
}
