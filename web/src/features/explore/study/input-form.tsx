import { Button } from "../../../components/button.tsx";
import { SelectField } from "../../../components/select.tsx";
import type { ExploreField } from "../explore-field.ts";
import { FieldChoice } from "../field-choice.tsx";
import { TypedNumber } from "../typed-number.tsx";
import { distributionMembers, type DistributionKind, type InputDraft } from "./study-draft.ts";

interface InputFormProps {
  input: InputDraft;
  fields: readonly ExploreField[];
  /** The sentence at a member: "path", "distribution.high". */
  faultAt: (member: string) => string | undefined;
  onField: (path: string) => void;
  onKind: (kind: DistributionKind) => void;
  onChange: (input: InputDraft) => void;
  onRemove?: () => void;
}

const kinds: { value: DistributionKind; label: string }[] = [
  { value: "uniform", label: "evenly between" },
  { value: "normal", label: "normal" },
  { value: "truncated", label: "normal, cut" },
  { value: "triangular", label: "triangular" },
];

/** One value that scatters: which, and how. */
export function InputForm({ input, fields, faultAt, onField, onKind, onChange, onRemove }: InputFormProps) {
  const field = fields.find(({ path }) => path === input.path) ?? fields[0];
  return (
    <fieldset className="flex min-w-0 flex-wrap items-start gap-x-4 gap-y-4">
      <legend className="sr-only">{field.name} scatters</legend>
      <FieldChoice label="Scatters" fields={fields} value={input.path} error={faultAt("path")} onChange={onField} />
      <SelectField
        label="how"
        choices={kinds}
        value={input.kind}
        onChange={(event) => onKind(event.target.value as DistributionKind)}
      />
      {distributionMembers[input.kind].map(({ key, label }) => (
        <TypedNumber
          key={key}
          label={label}
          typed={input.numbers[key]}
          measure={field.measure}
          error={faultAt(`distribution.${key}`)}
          onChange={(typed) => onChange({ ...input, numbers: { ...input.numbers, [key]: typed } })}
        />
      ))}
      {onRemove && (
        <Button className="mt-[29px]" onClick={onRemove}>
          Leave it out
        </Button>
      )}
    </fieldset>
  );
}
