import { useState } from "react";
import { Dialog } from "../../components/dialog.tsx";
import { lazyPart } from "../../components/lazy-part.ts";

// Loaded when it is opened: it is no part of the first paint.
const AddMemberForm = lazyPart(async () => (await import("./add-member-form.tsx")).AddMemberForm);

/** Brings somebody with an account into the project. */
export function AddMember({ projectId }: { projectId: string }) {
  const [isOpen, setOpen] = useState(false);
  return (
    <>
      <button type="button" className="link" onClick={() => setOpen(true)}>
        Add someone
      </button>
      <Dialog isOpen={isOpen} title="Add someone" onClose={() => setOpen(false)}>
        <AddMemberForm projectId={projectId} onDone={() => setOpen(false)} />
      </Dialog>
    </>
  );
}
