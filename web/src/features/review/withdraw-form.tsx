import type { Revision } from "@restband/api/contract";
import { useState } from "react";
import { useWithdraw } from "../../api/reviews.ts";
import { Button } from "../../components/button.tsx";
import { DialogActions } from "../../components/dialog.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { PasswordField } from "../../components/password-field.tsx";
import { announce } from "../../components/status.tsx";
import { TextArea } from "../../components/text-field.tsx";
import { faultAt, otherFault } from "./fault-of.ts";

/** Takes a revision back for good: by an owner, with reasons. */
export function WithdrawForm({ revision, onClose }: { revision: Revision; onClose: () => void }) {
  const withdraw = useWithdraw(revision.projectId, revision.id);
  const [reasons, setReasons] = useState("");
  const [password, setPassword] = useState("");
  const [isTried, setTried] = useState(false);
  const act = (): void => {
    setTried(true);
    if (reasons.trim() === "" || password === "") return;
    const onSuccess = () => {
      announce(`Revision ${revision.number} is withdrawn.`);
      onClose();
    };
    withdraw.mutate({ reasons, password, digest: revision.digest }, { onSuccess });
  };
  const failure = otherFault(withdraw.error, ["reasons", "password"]);
  return (
    <>
      <p className="max-w-(--measure)">
        Nobody relies on it from then on, and it cannot be taken up again. What was said and decided stays.
      </p>
      <TextArea
        label="Reasons"
        className="mt-4"
        rows={3}
        maxLength={4000}
        data-first-focus
        value={reasons}
        error={isTried && reasons.trim() === "" ? "Say why." : faultAt(withdraw.error, "reasons")}
        onChange={(event) => setReasons(event.target.value)}
      />
      <PasswordField
        label="Your password, once more"
        autoComplete="current-password"
        className="mt-4"
        value={password}
        error={isTried && password === "" ? "Enter your password." : faultAt(withdraw.error, "password")}
        onChange={(event) => setPassword(event.target.value)}
      />
      {failure && <ErrorNote className="mt-4">{failure}</ErrorNote>}
      <DialogActions>
        <Button kind="danger" isBusy={withdraw.isPending} onClick={act}>
          Withdraw revision {revision.number}
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </DialogActions>
    </>
  );
}
