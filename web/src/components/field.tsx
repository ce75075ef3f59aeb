import { useId, type ReactNode } from "react";
import { classNames } from "./class-names.ts";
import { Icon } from "./icon.tsx";

/** What a control inside a `Field` must carry so that label, help and error belong to it. */
export interface ControlProps {
  id: string;
  "aria-describedby": string | undefined;
  "aria-invalid": true | undefined;
}

export interface FieldProps {
  label: string;
  /** One quiet line under the control. */
  help?: ReactNode;
  /** What is wrong and what is allowed; the control gets the broken border. */
  error?: ReactNode;
  /** Unit or remark beside the control. */
  hint?: ReactNode;
  /** At the right end of the label's line: a link, as a rule. */
  aside?: ReactNode;
  className?: string;
}

/** A label above, a control, a hint beside it, help and error below; the control is whatever `children` makes of the ids. */
export function Field({
  label,
  help,
  error,
  hint,
  aside,
  className,
  children,
}: FieldProps & { children: (control: ControlProps) => ReactNode }) {
  const id = useId();
  const described = [hint && `${id}-hint`, error && `${id}-error`, help && `${id}-help`].filter(Boolean).join(" ");
  const control: ControlProps = {
    id,
    "aria-describedby": described || undefined,
    "aria-invalid": error ? true : undefined,
  };
  return (
    <div className={classNames("flex flex-col", className)}>
      <div className="mb-1.5 flex items-baseline justify-between gap-3">
        <label htmlFor={id} className="text-15 font-semibold">
          {label}
        </label>
        {aside && <span className="text-13">{aside}</span>}
      </div>
      <div className="flex items-center gap-2">
        {children(control)}
        {hint && (
          <span id={`${id}-hint`} className="shrink-0 text-13 text-quiet">
            {hint}
          </span>
        )}
      </div>
      {error && <FieldError id={`${id}-error`}>{error}</FieldError>}
      {help && (
        <p id={`${id}-help`} className="mt-1.5 text-13 text-quiet">
          {help}
        </p>
      )}
    </div>
  );
}

/** The sentence under a field that is to be put right. */
export function FieldError({ id, children }: { id?: string; children: ReactNode }) {
  return (
    <p id={id} className="mt-1.5 flex gap-1.5 text-13 text-broken">
      <span className="mt-0.5">
        <Icon name="cross" size={13} weight={2.4} />
      </span>
      <span>{children}</span>
    </p>
  );
}

/** The look shared by inputs, selects and text areas. */
export const controlClass = classNames(
  "w-full min-w-0 rounded border border-edge bg-raised px-2.5 text-15 text-ink placeholder:text-quiet",
  "h-[38px] pointer-coarse:h-[44px] hover:border-ink focus-visible:border-slip",
  "aria-invalid:border-2 aria-invalid:border-broken disabled:opacity-60 read-only:bg-transparent",
);
