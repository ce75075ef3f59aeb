import { useId, type ComponentProps, type ReactNode } from "react";
import { classNames } from "./class-names.ts";
import type { Choice } from "./select.tsx";

const dotClass = "mt-[3px] size-4 shrink-0 accent-slip";

interface RadioChoicesProps<Value extends string> {
  /** Names the group. */
  label: string;
  choices: readonly (Choice<Value> & { remark?: string })[];
  value: Value;
  onChange: (value: Value) => void;
  isDisabled?: boolean;
  className?: string;
}

/** One of several, each with a quiet remark. */
export function RadioChoices<Value extends string>({
  label,
  choices,
  value,
  onChange,
  isDisabled,
  className,
}: RadioChoicesProps<Value>) {
  const name = useId();
  return (
    <fieldset className={classNames("flex flex-col gap-2", className)} disabled={isDisabled}>
      <legend className="mb-2 text-15 font-semibold">{label}</legend>
      {choices.map((choice) => (
        <label key={choice.value} className="flex gap-2.5 pointer-coarse:min-h-[44px] pointer-coarse:items-center">
          <input
            type="radio"
            name={name}
            value={choice.value}
            checked={choice.value === value}
            onChange={() => onChange(choice.value)}
            className={dotClass}
          />
          <span>
            {choice.label} {choice.remark && <span className="ml-1 text-13 text-quiet">{choice.remark}</span>}
          </span>
        </label>
      ))}
    </fieldset>
  );
}

interface CheckboxProps extends Omit<ComponentProps<"input">, "type" | "className"> {
  label: ReactNode;
  /** A quiet line under the label. */
  help?: ReactNode;
}

/** Yes or no. */
export function Checkbox({ label, help, ...input }: CheckboxProps) {
  return (
    <label className="flex gap-2.5 pointer-coarse:min-h-[44px]">
      <input {...input} type="checkbox" className={dotClass} />
      <span>
        {label}
        {help && <span className="block text-13 text-quiet">{help}</span>}
      </span>
    </label>
  );
}
