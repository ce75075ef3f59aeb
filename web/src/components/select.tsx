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
  /** Underlined words in running text instead of a box. */
  isQuiet?: boolean;
}

/** A native select in our look, without a label of its own: give it an `aria-label` where no field surrounds it. */
export function PlainSelect({ choices, isQuiet, className, ...select }: PlainSelectProps) {
  return (
    <span className={classNames("relative inline-flex min-w-0", className)}>
      <select {...select} className={isQuiet ? quietClass : classNames(controlClass, "appearance-none pr-8!")}>
        {choices.map(({ value, label }) => (
          <option key={value} value={value}>
            {label}
          </option>
        ))}
      </select>
      <span
        className={classNames(
          "pointer-events-none absolute inset-y-0 flex items-center",
          isQuiet ? "right-0" : "right-2.5",
        )}
      >
        <Icon name="chevron" size={isQuiet ? 9 : 12} />
      </span>
    </span>
  );
}

const quietClass =
  "field-sizing-content min-h-6 appearance-none rounded bg-transparent pr-3.5 text-13 text-slip underline underline-offset-3 pointer-coarse:min-h-[44px] [&>option]:bg-raised [&>option]:text-ink";

interface SelectFieldProps extends Omit<PlainSelectProps, "id" | "className">, FieldProps {}

/** A labelled select. */
export function SelectField({ label, help, error, hint, aside, className, ...select }: SelectFieldProps) {
  return (
    <Field {...{ label, help, error, hint, aside, className }}>
      {(control) => <PlainSelect {...select} {...control} className="grow" />}
    </Field>
  );
}
