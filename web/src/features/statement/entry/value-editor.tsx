import { useState, type KeyboardEvent } from "react";
import { Button } from "../../../components/button.tsx";
import { FieldError } from "../../../components/field.tsx";
import { readInput } from "../../../format/format-quantity.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { measureOf, type PathField } from "../scenario-fields.ts";
import { OriginEntry } from "../origin/origin-entry.tsx";
import { DragRuler } from "./drag-ruler.tsx";
import { EquivalentEntry } from "./equivalent-entry.tsx";
import { equivalentsOf } from "./equivalents.ts";
import { EntryFault, NumberControl } from "./number-control.tsx";
import { useKept } from "../keeps.tsx";
import { useNumberEntry } from "./use-number-entry.ts";

interface ValueEditorProps {
  path: string;
  field: PathField;
  /** Where the nib points, px from the left edge of the sentence. */
  nib: number;
  onClose: () => void;
}

/** Opens under a sentence: the number, its unit, equivalents, a ruler to drag, and the way back to what it was. */
export function ValueEditor({ path, field, nib, onClose }: ValueEditorProps) {
  const { draft, dispatch, aside } = useDraftContext();
  const entry = useNumberEntry(path, field);
  const keeps = useKept(path);
  const [before] = useState(() => ({
    value: entry.value,
    unit: entry.typedIn,
    entered: draft.sheet.wanted.origins[path]?.entered,
  }));
  const measure = measureOf(draft.sheet.wanted, field);
  const isRulable = before.value !== undefined && before.value !== 0 && !field.integer && field.dimension !== "angle";

  const putBack = (): void => {
    if (before.value !== undefined) entry.restore(before);
  };
  const done = (): void => {
    dispatch({ type: "settle" });
    if (entry.fault === undefined) onClose();
  };
  const press = (event: KeyboardEvent): void => {
    if (event.key !== "Escape") return;
    event.stopPropagation();
    putBack();
    dispatch({ type: "settle" });
    onClose();
  };
  return (
    <div
      role="group"
      aria-label={`Change ${field.label}`}
      className="relative mt-3 mb-4 w-fit max-w-full rounded border-[1.5px] border-ink bg-raised p-4 desk:px-6"
      style={{ minWidth: `min(100%, ${Math.max(480, nib + 32)}px)` }}
      onKeyDown={press}
    >
      <Nib at={nib} />
      <p className="mb-1.5 text-15 font-semibold">{field.symbol ? `${field.label}, ${field.symbol}` : field.label}</p>
      <div className="flex flex-wrap items-center gap-x-4 gap-y-3">
        <div className="flex items-center gap-2">
          <NumberControl entry={entry} label={field.label} autoFocus onEnter={done} />
        </div>
        <div className="flex flex-wrap gap-x-2 text-15 text-quiet">
          {equivalentsOf(draft.sheet.wanted, path).map((equivalent) => (
            <EquivalentEntry key={equivalent.before + equivalent.after} equivalent={equivalent} entry={entry} />
          ))}
        </div>
      </div>
      {entry.fault && (
        <FieldError>
          <EntryFault entry={entry} keeps={keeps} />
        </FieldError>
      )}
      {field.help && !entry.fault && <p className="mt-1.5 text-13 text-quiet">{field.help}</p>}
      {aside?.(path)}
      <OriginEntry path={path} field={field} entry={entry} />
      {isRulable && before.value !== undefined && (
        <DragRuler path={path} before={before.value} entry={entry} label={field.label} onPutBack={putBack} />
      )}
      <div
        className="mt-4 flex flex-wrap items-center gap-3 border-t border-line pt-3"
        // A press here leaves the focus in the field: leaving it first would settle the edit, move the page, and the
        // button would be gone from under the pointer.
        onMouseDown={(event) => event.preventDefault()}
      >
        <Button kind="primary" onClick={done}>
          Done
        </Button>
        {before.value !== undefined && (
          <Button onClick={putBack}>Put back {readInput(before.value, measure, before.unit ?? undefined).text}</Button>
        )}
        <p className="max-w-[300px] text-13 text-quiet">
          {isRulable
            ? "Drag, or ↑ ↓ for 1 %, with Shift for 10 %. The dashed line marks where it was."
            : "↑ ↓ move it by 1 %, with Shift by 10 %."}
        </p>
      </div>
    </div>
  );
}

function Nib({ at }: { at: number }) {
  return (
    <svg
      width="22"
      height="11"
      className="absolute -top-[11px]"
      style={{ left: Math.max(8, at - 11) }}
      aria-hidden="true"
    >
      <path d="M1 11L11 1L21 11" className="fill-raised stroke-ink" strokeWidth={1.5} />
    </svg>
  );
}
