import { sayInput } from "../../format/format-quantity.ts";
import { useDraftContext } from "./draft/draft-context.ts";
import { unitTyped } from "./entry/use-number-entry.ts";
import { fieldAt, measureOf, numberAt } from "./scenario-fields.ts";

/** "Until then the answer keeps 0.12.", for a value that is not right yet. */
export function useKept(path: string): string | undefined {
  const { draft } = useDraftContext();
  const field = fieldAt(draft.inForce, path);
  const inForce = numberAt(draft.inForce, path);
  if (!field || inForce === undefined) return undefined;
  const measure = measureOf(draft.inForce, field);
  return sayInput(inForce, measure, unitTyped(draft.sheet.units[path], measure) ?? undefined);
}

export function Keeps({ path }: { path: string }) {
  const kept = useKept(path);
  return kept === undefined ? "Until then the answer keeps what was there." : `Until then the answer keeps ${kept}.`;
}
