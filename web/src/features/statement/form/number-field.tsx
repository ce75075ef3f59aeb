import { Field } from "../../../components/field.tsx";
import { useDraftContext } from "../draft/draft-context.ts";
import { EntryFault, NumberControl } from "../entry/number-control.tsx";
import { useNumberEntry } from "../entry/use-number-entry.ts";
import { OriginEntry } from "../origin/origin-entry.tsx";
import { useKept } from "../keeps.tsx";
import { fieldAt } from "../scenario-fields.ts";

interface NumberFieldProps {
  path: string;
  /** In place of the field's own label, where the group already says the rest. */
  label?: string;
  /** What an empty text stands for; absent: the number must be given. */
  empty?: unknown;
}

/** The labelled form of the number at a path; nothing where the scenario has no such number. */
export function NumberField({ path, label, empty }: NumberFieldProps) {
  const { draft } = useDraftContext();
  const field = fieldAt(draft.sheet.wanted, path);
  return field ? <FullField path={path} field={{ ...field, label: label ?? field.label }} empty={empty} /> : null;
}

type FullFieldProps = Pick<NumberFieldProps, "path" | "empty"> & { field: NonNullable<ReturnType<typeof fieldAt>> };

function FullField({ path, field, empty }: FullFieldProps) {
  const { aside } = useDraftContext();
  const entry = useNumberEntry(path, field, empty);
  const keeps = useKept(path);
  const name = field.symbol ? `${field.label}, ${field.symbol}` : field.label;
  return (
    <div data-path={path}>
      <Field label={name} help={field.help} error={entry.fault && <EntryFault entry={entry} keeps={keeps} />}>
        {(control) => <NumberControl entry={entry} label={field.label} {...control} />}
      </Field>
      {aside?.(path)}
      <OriginEntry path={path} field={field} entry={entry} />
    </div>
  );
}
