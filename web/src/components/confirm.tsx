import { useState, type ReactNode } from "react";
import { Button } from "./button.tsx";
import { Dialog, DialogActions } from "./dialog.tsx";
import { ErrorNote } from "./error-note.tsx";

interface ConfirmProps {
  isOpen: boolean;
  title: string;
  /** What follows from it, and what stays. */
  children: ReactNode;
  /** The verb on the button. */
  action: string;
  /** Resolves when it is done; a rejection's message is shown and the dialog stays. */
  onConfirm: () => Promise<unknown>;
  onClose: () => void;
}

/** Asks once more before something is taken away. */
export function Confirm({ isOpen, title, children, action, onConfirm, onClose }: ConfirmProps) {
  const [isBusy, setBusy] = useState(false);
  const [failure, setFailure] = useState<string | null>(null);
  const confirm = async () => {
    setBusy(true);
    setFailure(null);
    try {
      await onConfirm();
      onClose();
    } catch (error) {
      setFailure(error instanceof Error ? error.message : String(error));
    } finally {
      setBusy(false);
    }
  };
  const close = () => {
    setFailure(null);
    onClose();
  };
  return (
    <Dialog isOpen={isOpen} title={title} onClose={close}>
      <div className="max-w-(--measure)">{children}</div>
      {failure && <ErrorNote className="mt-4">{failure}</ErrorNote>}
      <DialogActions>
        <Button kind="danger" isBusy={isBusy} onClick={confirm}>
          {action}
        </Button>
        <Button data-first-focus onClick={close}>
          Cancel
        </Button>
      </DialogActions>
    </Dialog>
  );
}
