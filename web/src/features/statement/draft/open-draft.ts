import type { SwitchedOff } from "@restband/api/contract";
import type { Scenario } from "@restband/solver";
import type { Draft, Sheet } from "./draft.ts";

/** A draft of a scenario that is valid; `off`: terms that are kept beside it. */
export function openDraft(scenario: Scenario, off: readonly SwitchedOff[] = []): Draft {
  const sheet: Sheet = { wanted: scenario, unread: {}, units: unitsEntered(scenario), off };
  return { sheet, inForce: scenario, faults: [], past: [], future: [], merging: null, anchor: scenario };
}

/** The units values were entered in, where their origins tell: "0.25 in" is shown in inches again. */
export function unitsEntered(scenario: Scenario): Record<string, string> {
  return Object.fromEntries(
    Object.entries(scenario.origins).flatMap(([path, { entered }]) => {
      const unit = entered?.replace(/^[\d\s.,'’+\-−eE·^⁻⁰-⁹¹²³]*/, "");
      return unit ? [[path, unit]] : [];
    }),
  );
}
