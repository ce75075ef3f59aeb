import type { ComponentProps } from "react";
import { classNames } from "./class-names.ts";
import { controlClass, Field, type FieldProps } from "./field.tsx";
import { Icon } from "./icon.tsx";

export interface Choice<Value extends string = string> {
  value: Value;
  label: string;
}

interface PlainSelectProps extends Omit<ComponentProps<"select">, "children"> {
  choices: readonly Choice[];
}

/** A native select in our look, without a label of its own: give it an `aria-label` where no field surrounds it. */
export function PlainSelect({ choices, className, ...select }: PlainSelectProps) {
  return (
    <span className={classNames("relative inline-flex min-w-0", className)}>
      <select {...select} className={classNames(controlClass, "appearance-none pr-8!")}>
        {choices.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </select>
      <span className="pointer-events-none absolute inset-y-0 right-2.5 flex items-center">
        <Icon name="chevron" size={12} />
      </span>
    </span>
  );
}

interface SelectFieldProps extends Omit<PlainSelectProps, "id" | "className">, FieldProps {}

/** A labelled select. */
export function SelectField({ label, help, error, hint, aside, className, ...select }: SelectFieldProps) {
  return (
    <Field {...{ label, help, error, hint, aside, className }}>
      {(control) => <PlainSelect {...select} {...control} className="grow" />}
    </Field>
  );
}
