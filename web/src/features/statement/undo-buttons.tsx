import { Button } from "../../components/button.tsx";
import { Icon, type IconName } from "../../components/icon.tsx";
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
      <Step name="Undo" icon="undo" isPossible={draft.past.length > 0} run={undo} />
      <Step name="Redo" icon="redo" isPossible={draft.future.length > 0} run={redo} />
    </span>
  );
}

/** On the phone, where it stands in a menu, with its name. */
function Step({ name, icon, isPossible, run }: { name: string; icon: IconName; isPossible: boolean; run: () => void }) {
  return (
    <Button kind="quiet" title={name} disabled={!isPossible} className="max-desk:px-2.5!" onClick={run}>
      <Icon name={icon} />
      <span className="desk:sr-only">{name}</span>
    </Button>
  );
}
