import { sharedValue, useSharedValue } from "../shared-value.ts";
import { Button } from "./button.tsx";
import { Icon } from "./icon.tsx";

interface Notice {
  id: number;
  text: string;
  undo?: () => void;
}

const shownFor = 8000;
/** Long enough to read it, think, and get there by the keyboard. */
const undoableFor = 20_000;
const notices = sharedValue<readonly Notice[]>([]);
let count = 0;

/**
 * Tells what was done, in one sentence that is also read out. It goes away by itself: nothing that must be acted on.
 * `undo` takes it back; it is offered as long as the notice stands.
 */
export function announce(text: string, undo?: () => void): void {
  const notice = { id: ++count, text, undo };
  notices.set([...notices.get().slice(-2), notice]);
  setTimeout(() => dismiss(notice.id), undo ? undoableFor : shownFor);
}

function dismiss(id: number): void {
  notices.set(notices.get().filter((notice) => notice.id !== id));
}

/** Where announcements appear; once, at the root of the page. */
export function StatusRegion() {
  const shown = useSharedValue(notices);
  return (
    <div
      role="status"
      className="pointer-events-none fixed inset-x-4 bottom-[max(16px,env(safe-area-inset-bottom))] z-40 flex flex-col items-start gap-2 print:hidden"
    >
      {shown.map(({ id, text, undo }) => (
        <div
          key={id}
          className="pointer-events-auto flex max-w-[480px] items-start gap-3 rounded border-[1.5px] border-ink bg-raised py-2 pr-2 pl-4"
        >
          <span className="py-1">{text}</span>
          {undo && (
            <Button
              onClick={() => {
                dismiss(id);
                undo();
              }}
            >
              Undo
            </Button>
          )}
          <Button kind="quiet" aria-label="Dismiss" onClick={() => dismiss(id)}>
            <Icon name="cross" size={13} />
          </Button>
        </div>
      ))}
    </div>
  );
}
