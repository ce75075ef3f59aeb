import type { Review, Revision } from "@restband/api/contract";
import { useState } from "react";
import { useAskForReview } from "../../api/reviews.ts";
import { Button } from "../../components/button.tsx";
import { Checkbox } from "../../components/choices.tsx";
import { DialogActions } from "../../components/dialog.tsx";
import { FieldError } from "../../components/field.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { announce } from "../../components/status.tsx";
import { TextArea } from "../../components/text-field.tsx";
import { listed } from "../../format/words.ts";
import { otherFault } from "./fault-of.ts";

interface AskFormProps {
  revision: Revision;
  candidates: Review["candidates"];
  onClose: () => void;
}

/** Chooses who is asked to review, with some words to them. */
export function AskForm({ revision, candidates, onClose }: AskFormProps) {
  const ask = useAskForReview(revision.projectId, revision.id);
  const [chosen, setChosen] = useState<readonly string[]>(candidates.length === 1 ? [candidates[0].accountId] : []);
  const [message, setMessage] = useState("");
  const [isTried, setTried] = useState(false);
  const toggle = (id: string): void =>
    setChosen(chosen.includes(id) ? chosen.filter((each) => each !== id) : [...chosen, id]);
  const send = (): void => {
    setTried(true);
    if (chosen.length === 0) return;
    const names = candidates.filter(({ accountId }) => chosen.includes(accountId)).map(({ name }) => name);
    ask.mutate(
      { reviewers: [...chosen], message },
      {
        onSuccess: () => {
          announce(`${listed(names)} will find it under what waits.`);
          onClose();
        },
      },
    );
  };
  const failure = otherFault(ask.error, []);
  return (
    <>
      <fieldset className="flex flex-col gap-2">
        <legend className="mb-2 text-15 font-semibold">Who reviews revision {revision.number}</legend>
        {candidates.map(({ accountId, name }) => (
          <Checkbox
            key={accountId}
            label={name}
            checked={chosen.includes(accountId)}
            onChange={() => toggle(accountId)}
          />
        ))}
        {isTried && chosen.length === 0 && <FieldError>Choose at least one.</FieldError>}
      </fieldset>
      <TextArea
        label="What to look at"
        className="mt-4"
        rows={3}
        maxLength={2000}
        value={message}
        onChange={(event) => setMessage(event.target.value)}
      />
      {failure && <ErrorNote className="mt-4">{failure}</ErrorNote>}
      <DialogActions>
        <Button kind="primary" isBusy={ask.isPending} onClick={send}>
          Ask for a review
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </DialogActions>
    </>
  );
}
