import type { Computed } from "../compute/use-run.ts";
import { firstCursor, runViewOf, type RunView } from "../features/evidence/run-view.ts";
import { useSharedValue, type SharedValue } from "../shared-value.ts";

/** Where somebody has put the time cursor, s; null until then. Kept outside the page's state: only what draws it follows. */
export type Cursor = SharedValue<number | null>;

/** The time cursor of a run: where it was put, or where it stands by itself, and never beyond the end. */
export function useCursor(cursor: Cursor, view: RunView | null): number {
  const chosen = useSharedValue(cursor);
  return view === null ? 0 : Math.min(chosen ?? firstCursor(view), view.end);
}

/** A run made ready to be looked at; null without one that has samples. */
export const viewOf = (computed: Computed): RunView | null =>
  "result" in computed ? runViewOf(computed.scenario, computed.result) : null;
