import { originKinds, type Origin } from "@restband/solver";
import { useState } from "react";
import { SelectField } from "../../../components/select.tsx";
import { TextField } from "../../../components/text-field.tsx";
import { isEndless, joined, readInput } from "../../../format/format-quantity.ts";
import { setOrigin } from "../changes.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import type { NumberEntry } from "../entry/use-number-entry.ts";
import { measureOf, type PathField } from "../scenario-fields.ts";
import { originText } from "./origin-words.ts";
import { readRange, writeRange } from "./range-text.ts";

interface OriginEntryProps {
  path: string;
  field: PathField;
  entry: NumberEntry;
}

/** Where the number at a path comes from: what is known in a line, and on demand what can be said of it. */
export function OriginEntry({ path, field, entry }: OriginEntryProps) {
  const { draft } = useDraftContext();
  const [isOpen, setOpen] = useState(false);
  const origin = draft.sheet.wanted.origins[path];
  if (entry.value === undefined) return null;
  return (
    <div className="mt-2 text-13">
      <button type="button" className="link hit" aria-expanded={isOpen} onClick={() => setOpen(!isOpen)}>
        {origin ? "comes from" : "say where it comes from"}
        <span className="sr-only">, {field.label}</span>
      </button>
      {origin && <span className="text-quiet"> {originText(draft.sheet.wanted, path, origin)}</span>}
      {isOpen && <OriginForm path={path} field={field} entry={entry} origin={origin} />}
    </div>
  );
}

const kindChoices = [{ value: "", label: "not said" }, ...originKinds.map((kind) => ({ value: kind, label: kind }))];

function OriginForm({ path, field, entry, origin }: OriginEntryProps & { origin: Origin | undefined }) {
  const { draft, dispatch } = useDraftContext();
  const measure = measureOf(draft.sheet.wanted, field);
  const { value = 0, unit, typedIn } = entry;
  const isAsEntered = typedIn !== null || !isEndless(value, unit);
  const entered = isAsEntered ? { entered: joined(readInput(value, measure, unit)) } : {};
  const settle = (): void => dispatch({ type: "settle" });
  const choose = (kind: string): void => {
    const known = originKinds.find((each) => each === kind);
    dispatch(setOrigin(draft.sheet.wanted, path, known ? { ...entered, ...origin, kind: known } : null));
    settle();
  };
  return (
    <div role="group" aria-label={`Where ${field.label} comes from`} className="mt-2 flex flex-col gap-3">
      <SelectField
        label="Kind"
        choices={kindChoices}
        value={origin?.kind ?? ""}
        onChange={(event) => choose(event.currentTarget.value)}
      />
      {origin && (
        <>
          <TextField
            label="Source"
            help="Sheet, standard, measurement or reason."
            value={origin.source ?? ""}
            onChange={({ currentTarget: { value } }) =>
              dispatch(setOrigin(draft.sheet.wanted, path, withSource(origin, value)))
            }
            onBlur={settle}
          />
          <RangeField path={path} field={field} entry={entry} origin={origin} />
        </>
      )}
    </div>
  );
}

function withSource({ source: _, ...others }: Origin, source: string): Origin {
  return source === "" ? others : { ...others, source };
}

function RangeField({ path, field, entry, origin }: OriginEntryProps & { origin: Origin }) {
  const { draft, dispatch } = useDraftContext();
  const [typing, setTyping] = useState<string | null>(null);
  const measure = measureOf(draft.sheet.wanted, field);
  const reading = { measure, unit: entry.unit, value: entry.value ?? 0 };
  const read = typing === null ? null : readRange(typing, reading);
  const type = (text: string): void => {
    setTyping(text);
    const range = readRange(text, reading);
    if ("message" in range) return;
    const { low: _low, high: _high, ...others } = origin;
    dispatch(setOrigin(draft.sheet.wanted, path, { ...others, ...range }));
  };
  const leave = (): void => {
    // What cannot be read stays to be put right; the range from before is in force.
    if (read === null || !("message" in read)) setTyping(null);
    dispatch({ type: "settle" });
  };
  return (
    <TextField
      label="Range"
      isFigure
      help="“0.12 to 0.18”, “±10 %” or “0.12 or more”. Limits are then judged over the whole of it."
      error={read && "message" in read ? read.message : undefined}
      value={typing ?? writeRange(origin, reading)}
      onChange={(event) => type(event.currentTarget.value)}
      onBlur={leave}
    />
  );
}
