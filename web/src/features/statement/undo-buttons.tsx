import { Button } from "../../components/button.tsx";
import { Icon } from "../../components/icon.tsx";
import { useShortcut } from "../../components/shortcuts.tsx";
import type { Dispatch, Draft } from "./draft/draft.ts";

/** One step back and forth; the keys work wherever the focus is. */
export function UndoButtons({ draft, dispatch }: { draft: Draft; dispatch: Dispatch }) {
  const undo = (): void => dispatch({ type: "undo" });
  const redo = (): void => dispatch({ type: "redo" });
  useShortcut("Ctrl+z", "Undo", undo);
  useShortcut("Ctrl+Z", "Redo", redo);
  useShortcut("Ctrl+y", "Redo", redo);
  return (
    <span className="flex">
      <Button kind="quiet" aria-label="Undo" title="Undo" disabled={draft.past.length === 0} onClick={undo}>
        <Icon name="undo" />
      </Button>
      <Button kind="quiet" aria-label="Redo" title="Redo" disabled={draft.future.length === 0} onClick={redo}>
        <Icon name="redo" />
      </Button>
    </span>
  );
}
