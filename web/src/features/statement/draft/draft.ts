import type { SwitchedOff } from "@restband/api/contract";
import type { checkTerm, Fault, Scenario } from "@restband/solver";

/** What a person has typed and chosen, before it is known to be right. */
export interface Sheet {
  /** The scenario as it is wanted; may hold numbers that the check refuses. */
  readonly wanted: Scenario;
  /** Texts that are no number yet, by path; `wanted` keeps the number from before. */
  readonly unread: Readonly<Record<string, Unread>>;
  /** Unit each value was last typed in, by path. */
  readonly units: Readonly<Record<string, string>>;
  /** Terms kept beside the scenario, out of force. */
  readonly off: readonly SwitchedOff[];
}

export interface Unread {
  readonly text: string;
  readonly message: string;
}

/** An open scenario: the sheet, what is in force of it, and the way back. */
export interface Draft {
  readonly sheet: Sheet;
  /** The last valid state: what runs and what is saved. */
  readonly inForce: Scenario;
  /** Everything to put right, unread texts included. */
  readonly faults: readonly Fault[];
  readonly past: readonly Sheet[];
  readonly future: readonly Sheet[];
  /** While a value is typed or dragged, its path: all of that is one step of undo. */
  readonly merging: string | null;
  /** What was in force when that step began: a value refused at its end falls back to it, not to one on the way. */
  readonly anchor: Scenario;
}

/** One thing a person does to a draft. */
export type DraftAction =
  /** `unit` null: shown in no unit of its own again. `clears`: where the text that stood for the value is kept, if not at its own path. */
  | { type: "set"; path: string; value: unknown; unit?: string | null; entered?: string; clears?: string }
  /** `value`: what stood there before anything was typed, and stands again. */
  | { type: "leave-unread"; path: string; text: string; message: string; value?: unknown }
  | { type: "show-in"; path: string; unit: string }
  | { type: "change"; apply: (scenario: Scenario) => Scenario; rename?: (path: string) => string | null }
  /** The check is handed in: whoever makes an action stands before it is loaded. */
  | { type: "rewrite"; apply: (sheet: Sheet, inForce: Scenario, check: typeof checkTerm) => Sheet }
  | { type: "settle" }
  | { type: "undo" }
  | { type: "redo" }
  /** Another scenario in its place; `off`: with terms that are switched off. */
  | { type: "replace"; scenario: Scenario; off?: readonly SwitchedOff[] };

export type Dispatch = (action: DraftAction) => void;
