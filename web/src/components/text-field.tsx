import type { ComponentProps, ReactNode } from "react";
import { classNames } from "./class-names.ts";
import { controlClass, Field, type FieldProps } from "./field.tsx";

interface TextFieldProps extends Omit<ComponentProps<"input">, "id" | "className">, FieldProps {
  /** Has the focus when the dialog around it opens. */
  "data-first-focus"?: boolean;
  /** Numbers stand in the mono face. */
  isFigure?: boolean;
  /** Inside the control, at its right end. */
  inset?: ReactNode;
}

/** One line of text, or a number; every attribute of an input goes through. */
export function TextField({ label, help, error, hint, aside, className, isFigure, inset, ...input }: TextFieldProps) {
  return (
    <Field {...{ label, help, error, hint, aside, className }}>
      {(control) => (
        <span className="relative flex min-w-0 grow">
          <input
            autoComplete="off"
            {...input}
            {...control}
            className={classNames(controlClass, isFigure && "figures", Boolean(inset) && "pr-16")}
          />
          {inset && <span className="absolute inset-y-0 right-2.5 flex items-center text-13">{inset}</span>}
        </span>
      )}
    </Field>
  );
}

interface TextAreaProps extends Omit<ComponentProps<"textarea">, "id" | "className">, FieldProps {}

/** Several lines of text. */
export function TextArea({ label, help, error, hint, aside, className, rows = 4, ...input }: TextAreaProps) {
  return (
    <Field {...{ label, help, error, hint, aside, className }}>
      {(control) => (
        <textarea
          {...input}
          {...control}
          rows={rows}
          className={classNames(controlClass, "h-auto! py-2 leading-[1.45]")}
        />
      )}
    </Field>
  );
}
