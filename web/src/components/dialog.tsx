import { Suspense, useEffect, useId, useRef, type ReactNode, type RefObject } from "react";
import { Button } from "./button.tsx";
import { classNames } from "./class-names.ts";
import { Icon } from "./icon.tsx";

interface DialogProps {
  isOpen: boolean;
  title: string;
  /** Called by Escape, by the cross and by a click beside the dialog. */
  onClose: () => void;
  /** False where leaving without an answer makes no sense: no cross, and Escape does nothing. */
  canClose?: boolean;
  isWide?: boolean;
  children: ReactNode;
}

/**
 * The browser's own modal dialog in our look: it keeps the focus inside and gives it back at the end. What carries
 * `data-first-focus` has the focus at first. What is inside may be loaded lazily.
 */
export function Dialog({ isOpen, title, onClose, canClose = true, isWide, children }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (isOpen && element && !element.open) {
      element.showModal();
      focusFirst(dialog);
    }
    if (!isOpen && element?.open) element.close();
  }, [isOpen]);
  return (
    <dialog
      ref={dialog}
      aria-labelledby={titleId}
      className={classNames(
        "m-auto w-[calc(100vw-32px)] rounded border-[1.5px] border-ink bg-paper p-6 open:flex open:flex-col",
        isWide ? "max-w-[720px]" : "max-w-[480px]",
      )}
      onCancel={(event) => {
        event.preventDefault();
        if (canClose) onClose();
      }}
      onClose={() => isOpen && canClose && onClose()}
      onMouseDown={(event) => canClose && event.target === event.currentTarget && isOutside(event) && onClose()}
    >
      <div className="mb-4 flex items-start justify-between gap-4">
        <h2 id={titleId} className="text-24 font-semibold">
          {title}
        </h2>
        {canClose && (
          <Button kind="quiet" aria-label="Close" className="-mt-0.5 -mr-2" onClick={onClose}>
            <Icon name="cross" />
          </Button>
        )}
      </div>
      {isOpen && (
        <Suspense fallback={<p className="late text-quiet">Opening</p>}>
          <Contents dialog={dialog}>{children}</Contents>
        </Suspense>
      )}
    </dialog>
  );
}

/** Tells when what is inside has come, at once or later. */
function Contents({ dialog, children }: { dialog: RefObject<HTMLDialogElement | null>; children: ReactNode }) {
  useEffect(() => focusFirst(dialog), [dialog]);
  return children;
}

/** Without a mark the browser takes the first thing it finds, which is the cross. */
function focusFirst({ current }: RefObject<HTMLDialogElement | null>): void {
  current?.querySelector<HTMLElement>("[data-first-focus]")?.focus();
}

function isOutside({ currentTarget, clientX, clientY }: React.MouseEvent<HTMLDialogElement>): boolean {
  const box = currentTarget.getBoundingClientRect();
  return clientX < box.left || clientX > box.right || clientY < box.top || clientY > box.bottom;
}

/** The row of buttons at the end of a dialog or form; the first child is the act itself. */
export function DialogActions({ children }: { children: ReactNode }) {
  return <div className="mt-6 flex flex-wrap gap-3">{children}</div>;
}
