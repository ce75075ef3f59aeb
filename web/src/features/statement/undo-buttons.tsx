import { Button } from "../../components/button.tsx";
import { Icon, type IconName } from "../../components/icon.tsx";
import { useShortcut } from "../../components/shortcuts.tsx";
import type { Dispatch, Draft, DraftAction } from "./draft/draft.ts";

const undo: DraftAction = { type: "undo" };
const redo: DraftAction = { type: "redo" };

/** One step back and forth by keys, wherever the focus is. For the page: the buttons may stand in a closed menu. */
export function useUndoKeys(dispatch: Dispatch): void {
  useShortcut("Ctrl+z", "Undo", () => dispatch(undo));
  useShortcut("Ctrl+Z", "Redo", () => dispatch(redo));
  useShortcut("Ctrl+y", "Redo", () => dispatch(redo));
}

/** One step back and forth. */
export function UndoButtons({ draft, dispatch }: { draft: Draft; dispatch: Dispatch }) {
  return (
    <span className="flex">
      <Step name="Undo" icon="undo" isPossible={draft.past.length > 0} run={() => dispatch(undo)} />
      <Step name="Redo" icon="redo" isPossible={draft.future.length > 0} run={() => dispatch(redo)} />
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
