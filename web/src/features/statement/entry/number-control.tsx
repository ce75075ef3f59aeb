import { Button } from "../../../components/button.tsx";
import { controlClass, type ControlProps } from "../../../components/field.tsx";
import { PlainSelect } from "../../../components/select.tsx";
import { classNames } from "../../../components/class-names.ts";
import type { KeyboardEvent } from "react";
import type { NumberEntry } from "./use-number-entry.ts";

interface NumberControlProps extends Partial<ControlProps> {
  entry: NumberEntry;
  label: string;
  autoFocus?: boolean;
  onEnter?: () => void;
}

/** The text of a number and its unit, side by side; arrow keys move the number. */
export function NumberControl({ entry, label, autoFocus, onEnter, ...control }: NumberControlProps) {
  const press = (event: KeyboardEvent<HTMLInputElement>): void => {
    if (event.key === "ArrowUp" || event.key === "ArrowDown") {
      event.preventDefault();
      entry.nudge(event.key === "ArrowUp" ? 1 : -1, event.shiftKey);
    } else if (event.key === "Enter" && onEnter) {
      event.preventDefault();
      onEnter();
    }
  };
  return (
    <>
      <input
        {...control}
        type="text"
        inputMode="text"
        autoComplete="off"
        spellCheck={false}
        aria-label={control.id ? undefined : label}
        aria-invalid={entry.fault !== undefined || undefined}
        autoFocus={autoFocus}
        className={classNames(controlClass, "figures w-32! shrink-0")}
        value={entry.text}
        onFocus={(event) => event.currentTarget.select()}
        onChange={(event) => entry.type(event.currentTarget.value)}
        onKeyDown={press}
        onBlur={entry.leave}
      />
      <UnitChoice entry={entry} label={label} />
    </>
  );
}

function UnitChoice({ entry, label }: { entry: NumberEntry; label: string }) {
  const { units, unit } = entry;
  const isPlain = unit.label === "" && units.every(({ label: each }) => each === "" || each === "%");
  if (isPlain) return null;
  if (units.length === 1) return <span className="text-13 text-quiet">{unit.label}</span>;
  return (
    <PlainSelect
      aria-label={`Unit of ${label}`}
      className="shrink-0"
      choices={units.map((each) => ({ value: each.label, label: each.label || "–" }))}
      value={unit.label}
      onChange={(event) => entry.showIn(event.currentTarget.value)}
    />
  );
}

/** What is wrong with a number, and the readings to choose from where there are two; for the error line of a field. */
export function EntryFault({ entry, keeps }: { entry: NumberEntry; keeps?: string }) {
  return (
    <span className="late" key={entry.fault}>
      {entry.fault} {keeps && `Until then the answer keeps ${keeps}.`}
      {entry.choices.length > 0 && (
        <span className="mt-2 flex flex-wrap gap-2">
          {entry.choices.map((choice) => (
            <Button
              key={choice.label}
              // Keeps the focus in the field, so that leaving it does not undo what is chosen.
              onMouseDown={(event) => event.preventDefault()}
              onClick={() => entry.set(choice.value, choice.unit)}
            >
              {choice.label}
            </Button>
          ))}
        </span>
      )}
    </span>
  );
}
