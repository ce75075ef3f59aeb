import { useState } from "react";
import { joined, readInput } from "../../../format/format-quantity.ts";
import { parseTyped, type TypedReading } from "../../../format/parse-typed.ts";
import { parseUnit } from "../../../format/parse-unit.ts";
import type { Measure, Unit } from "../../../format/unit.ts";
import { unitFor, unitsOf } from "../../../format/units.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { measureOf, numberAt, type PathField } from "../scenario-fields.ts";
import { nudged } from "./nudge.ts";

/** A number while it is typed: its text, unit and complaint, and what can be done to it. */
export interface NumberEntry {
  readonly text: string;
  readonly value: number | undefined;
  readonly unit: Unit;
  /** The unit it was typed in or chosen for it; null: shown in the customary one. */
  readonly typedIn: Unit | null;
  readonly units: readonly Unit[];
  /** What is to be put right, in words. */
  readonly fault: string | undefined;
  /** Where a text can be read in two ways: both, to choose from. */
  readonly choices: Extract<TypedReading, { kind: "ambiguous" }>["choices"];
  readonly type: (text: string) => void;
  readonly set: (value: number, unit?: Unit) => void;
  /** Puts a value in force as it was; `unit` null: shown in the customary one. */
  readonly restore: (was: { value?: number; unit: Unit | null; entered?: string }) => void;
  readonly showIn: (label: string) => void;
  /** One arrow key: up or down by 1 %, or 10 %. */
  readonly nudge: (direction: 1 | -1, isLarge: boolean) => void;
  /** The field is left: its text is the value again, and the step of undo is closed. */
  readonly leave: () => void;
}

/** The entry of the number at a path. `empty` is what an empty text stands for where the number may be left out. */
export function useNumberEntry(path: string, field: PathField, empty?: unknown): NumberEntry {
  const { draft, dispatch } = useDraftContext();
  const { wanted, unread, units } = draft.sheet;
  const [typing, setTyping] = useState<{ text: string; value: number | undefined; before: number | undefined } | null>(
    null,
  );
  const measure = measureOf(wanted, field);
  const value = numberAt(wanted, path);
  const typedIn = unitTyped(units[path], measure);
  const unit = typedIn ?? unitFor(value ?? field.initial, measure);
  // What is being typed stands as long as the draft holds what it meant: undo takes it back.
  const isTyping = typing !== null && (typing.value === value || typing.text === unread[path]?.text);
  const text =
    (isTyping ? typing.text : unread[path]?.text) ??
    (value === undefined ? "" : readInput(value, measure, typedIn ?? undefined).text);
  const reading = unread[path] && parseTyped(unread[path].text, measure, unit);

  const set = (next: number, nextUnit = unit): void => {
    const entered = joined(readInput(next, measure, nextUnit));
    dispatch({ type: "set", path, value: next, unit: nextUnit.label, entered });
  };
  const type = (typed: string): void => {
    const before = isTyping ? typing.before : value;
    const read = typed.trim() === "" && empty !== undefined ? null : parseTyped(typed, measure, unit);
    if (read === null) dispatch({ type: "set", path, value: leftOut(empty) });
    else if (read.kind === "value") set(read.value, read.unit);
    // "1,200" passes by 1,2: what cannot be read leaves the value from before, not one on the way.
    else dispatch({ type: "leave-unread", path, text: typed, message: read.message, value: before });
    setTyping({ text: typed, value: read?.kind === "value" ? read.value : read ? before : undefined, before });
  };
  return {
    text,
    value,
    unit,
    typedIn,
    units: unitsOf(measure).some(({ label }) => label === unit.label) ? unitsOf(measure) : [unit, ...unitsOf(measure)],
    fault: draft.faults.find((fault) => fault.path === path)?.message,
    choices: reading?.kind === "ambiguous" ? reading.choices : [],
    type,
    set: (next, nextUnit) => {
      setTyping(null);
      set(next, nextUnit);
    },
    restore: ({ value: was, unit: wasIn, entered }) => {
      setTyping(null);
      dispatch({ type: "set", path, value: was, unit: wasIn && wasIn.label, entered });
    },
    showIn: (label) => dispatch({ type: "show-in", path, unit: label }),
    nudge: (direction, isLarge) => {
      setTyping(null);
      set(nudged(value ?? 0, direction * (isLarge ? 0.1 : 0.01), field, unit));
    },
    leave: () => {
      setTyping(null);
      dispatch({ type: "settle" });
    },
  };
}

/** The unit a value was last typed in; none once it measures something else. */
export const unitTyped = (label: string | undefined, measure: Measure): Unit | null =>
  label === undefined ? null : parseUnit(label, measure);

/** Marks a member that is taken away rather than set to a word. */
export const ABSENT = Symbol("absent");
const leftOut = (empty: unknown): unknown => (empty === ABSENT ? undefined : empty);
