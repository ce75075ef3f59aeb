import { useEffect, useId, useRef, type ReactNode } from "react";
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
 * `data-first-focus` has the focus at first.
 */
export function Dialog({ isOpen, title, onClose, canClose = true, isWide, children }: DialogProps) {
  const dialog = useRef<HTMLDialogElement>(null);
  const titleId = useId();
  useEffect(() => {
    const element = dialog.current;
    if (isOpen && element && !element.open) {
      element.showModal();
      // Without a mark the browser takes the first thing it finds, which is the cross.
      element.querySelector<HTMLElement>("[data-first-focus]")?.focus();
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
      <header className="mb-4 flex items-start justify-between gap-4">
        <h2 id={titleId} className="text-24 font-semibold">
          {title}
        </h2>
        {canClose && (
          <Button kind="quiet" aria-label="Close" className="-mt-0.5 -mr-2" onClick={onClose}>
            <Icon name="cross" />
          </Button>
        )}
      </header>
      {isOpen && children}
    </dialog>
  );
}

function isOutside({ currentTarget, clientX, clientY }: React.MouseEvent<HTMLDialogElement>): boolean {
  const box = currentTarget.getBoundingClientRect();
  return clientX < box.left || clientX > box.right || clientY < box.top || clientY > box.bottom;
}

/** The row of buttons at the end of a dialog or form; the first child is the act itself. */
export function DialogActions({ children }: { children: ReactNode }) {
  return <div className="mt-6 flex flex-wrap gap-3">{children}</div>;
}
