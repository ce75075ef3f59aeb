import { checkTerm, type Scenario } from "@restband/solver";
import { without, writePath } from "../path.ts";
import { checkSheet } from "./check-sheet.ts";
import type { Draft, DraftAction, Sheet } from "./draft.ts";
import { restructured } from "./sheet.ts";

const STEPS_KEPT = 200;

/** A draft with some values as they were left, refused or unread. */
export function resumeDraft(inForce: Scenario, sheet: Sheet): Draft {
  return { sheet, ...checkSheet(sheet, inForce), past: [], future: [], merging: null, anchor: inForce };
}

/** All that can happen to a draft. Pure: the same action on the same draft gives the same draft. */
export function draftReducer(draft: Draft, action: DraftAction): Draft {
  switch (action.type) {
    case "undo":
      return goBack(draft);
    case "redo":
      return goForward(draft);
    case "settle":
      return draft.merging === null ? draft : settled(draft);
    case "show-in":
      return { ...draft, sheet: withUnit(draft.sheet, action.path, action.unit) };
    case "set":
    case "leave-unread":
      return step(draft, edited(draft.sheet, action), action.path);
    case "change":
      return step(draft, restructured(draft.sheet, action.apply, action.rename), null);
    case "rewrite":
      return step(draft, action.apply(draft.sheet, draft.inForce, checkTerm), null);
    case "replace":
      return step(
        draft,
        { wanted: action.scenario, unread: {}, units: draft.sheet.units, off: action.off ?? [] },
        null,
      );
  }
}

function step(draft: Draft, sheet: Sheet, merging: string | null): Draft {
  const isSameStep = merging !== null && merging === draft.merging;
  const past = isSameStep ? draft.past : [...draft.past, draft.sheet].slice(-STEPS_KEPT);
  const anchor = isSameStep ? draft.anchor : draft.inForce;
  return { sheet, ...checkSheet(sheet, anchor), past, future: [], merging, anchor };
}

/** Ends a step; one that left all as it was is none. */
function settled(draft: Draft): Draft {
  const before = draft.past[draft.past.length - 1];
  const isNone = before && isSameSheet(before, draft.sheet);
  return { ...draft, past: isNone ? draft.past.slice(0, -1) : draft.past, merging: null };
}

const isSameSheet = (a: Sheet, b: Sheet): boolean =>
  JSON.stringify([a.wanted, a.unread, a.off]) === JSON.stringify([b.wanted, b.unread, b.off]);

function goBack(draft: Draft): Draft {
  const sheet = draft.past[draft.past.length - 1];
  return sheet ? restored(draft, sheet, draft.past.slice(0, -1), [draft.sheet, ...draft.future]) : draft;
}

function goForward(draft: Draft): Draft {
  const [sheet, ...future] = draft.future;
  return sheet ? restored(draft, sheet, [...draft.past, draft.sheet], future) : draft;
}

function restored({ inForce }: Draft, sheet: Sheet, past: readonly Sheet[], future: readonly Sheet[]): Draft {
  return { sheet, ...checkSheet(sheet, inForce), past, future, merging: null, anchor: inForce };
}

type Edit = Extract<DraftAction, { type: "set" | "leave-unread" }>;

function edited(sheet: Sheet, action: Edit): Sheet {
  if (action.type === "leave-unread") {
    const { path, text, message, value } = action;
    const wanted = value === undefined ? sheet.wanted : writePath(sheet.wanted, path, value);
    return { ...sheet, wanted, unread: { ...sheet.unread, [path]: { text, message } } };
  }
  const unread = without(sheet.unread, action.clears ?? action.path);
  const wanted = withEntered(writePath(sheet.wanted, action.path, action.value), action.path, action.entered);
  const next = { ...sheet, wanted, unread };
  if (action.unit === undefined) return next;
  return action.unit === null
    ? { ...next, units: without(next.units, action.path) }
    : withUnit(next, action.path, action.unit);
}

/** A value's origin tells how it was typed; a new value drops the old words. */
function withEntered(scenario: Scenario, path: string, entered: string | undefined): Scenario {
  const origin = scenario.origins[path];
  if (!origin) return scenario;
  const renewed = entered === undefined ? without(origin, "entered") : { ...origin, entered };
  return { ...scenario, origins: { ...scenario.origins, [path]: renewed } };
}

function withUnit(sheet: Sheet, path: string, unit: string): Sheet {
  return sheet.units[path] === unit ? sheet : { ...sheet, units: { ...sheet.units, [path]: unit } };
}
