import { controlClass, Field } from "../../../components/field.tsx";
import { SelectField } from "../../../components/select.tsx";
import { classNames } from "../../../components/class-names.ts";
import type { ExploreField } from "../explore-field.ts";
import { FieldChoice } from "../field-choice.tsx";
import { FigureField } from "../figure-field.tsx";
import { TypedNumber } from "../typed-number.tsx";
import type { AxisDraft, Spacing } from "./sweep-draft.ts";

interface AxisFormProps {
  name: string;
  axis: AxisDraft;
  fields: readonly ExploreField[];
  /** The sentence at a member of the axis: "to", "values[2]". */
  faultAt: (member: string) => string | undefined;
  onField: (path: string) => void;
  onChange: (axis: AxisDraft) => void;
}

const spacings: { value: Spacing; label: string }[] = [
  { value: "linear", label: "evenly" },
  { value: "log", label: "in equal ratios" },
  { value: "listed", label: "a list of values" },
];

/** One field of a sweep: which, from where to where, in how many steps. */
export function AxisForm({ name, axis, fields, faultAt, onField, onChange }: AxisFormProps) {
  const field = fields.find(({ path }) => path === axis.path) ?? fields[0];
  const set = (change: Partial<AxisDraft>): void => onChange({ ...axis, ...change });
  return (
    <fieldset className="min-w-0">
      <legend className="sr-only">{name}</legend>
      <div className="flex flex-wrap items-start gap-x-4 gap-y-4">
        <FieldChoice label={name} fields={fields} value={axis.path} error={faultAt("path")} onChange={onField} />
        <SelectField
          label="spread"
          choices={spacings}
          value={axis.spacing}
          onChange={(event) => set({ spacing: event.target.value as Spacing })}
        />
        {axis.spacing === "listed" ? (
          <ListField axis={axis} error={faultAt("values")} onChange={set} />
        ) : (
          <>
            <TypedNumber
              label="from"
              typed={axis.from}
              measure={field.measure}
              error={faultAt("from")}
              onChange={(from) => set({ from })}
            />
            <TypedNumber
              label="to"
              typed={axis.to}
              measure={field.measure}
              error={faultAt("to")}
              onChange={(to) => set({ to })}
            />
            <FigureField
              label="values"
              isWhole
              value={axis.count}
              error={faultAt("count")}
              onChange={(count) => set({ count })}
            />
          </>
        )}
      </div>
    </fieldset>
  );
}

function ListField({
  axis,
  error,
  onChange,
}: {
  axis: AxisDraft;
  error?: string;
  onChange: (change: Partial<AxisDraft>) => void;
}) {
  return (
    <Field label="values" hint={axis.from.unit} error={error} help="Blanks between them." className="grow">
      {(control) => (
        <input
          {...control}
          autoComplete="off"
          className={classNames(controlClass, "figures")}
          value={axis.list}
          onChange={(event) => onChange({ list: event.target.value })}
        />
      )}
    </Field>
  );
}
