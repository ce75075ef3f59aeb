import type { Member, Revision } from "@restband/api/contract";
import { useState } from "react";
import { useAddComment } from "../../api/comments.ts";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { announce } from "../../components/status.tsx";
import { AnchorField, anchorOf, type TypedAnchor } from "./anchor-field.tsx";
import { mentionsIn } from "./comment-words.ts";
import { faultAt, otherFault } from "./fault-of.ts";
import { WordsField } from "./words-field.tsx";

interface CommentFormProps {
  revision: Revision;
  typed: TypedAnchor;
  fields: readonly { path: string; label: string }[];
  others: readonly Member[];
  onChange: (typed: TypedAnchor) => void;
  onClose: () => void;
}

const paths = ["anchor.t", "anchor.to", "anchor.path", "words"];

/** A new comment: what it is about and what there is to say. */
export function CommentForm({ revision, typed, fields, others, onChange, onClose }: CommentFormProps) {
  const add = useAddComment(revision.projectId, revision.id);
  const [words, setWords] = useState("");
  const [isIncomplete, setIncomplete] = useState(false);
  const anchor = anchorOf(typed);
  const save = (event: React.FormEvent): void => {
    event.preventDefault();
    const isComplete = anchor !== null && words.trim() !== "";
    setIncomplete(!isComplete);
    if (!isComplete) return;
    add.mutate(
      { anchor, words, mentions: mentionsIn(words, others) },
      {
        onSuccess: ({ number }) => {
          announce(`Comment ${number} is kept.`);
          onClose();
        },
      },
    );
  };
  const anchorFault =
    isIncomplete && anchor === null
      ? typed.kind === "field"
        ? "Choose a value."
        : "Enter a time in seconds."
      : (faultAt(add.error, "anchor.t") ?? faultAt(add.error, "anchor.to") ?? faultAt(add.error, "anchor.path"));
  const failure = otherFault(add.error, paths);
  return (
    <form
      onSubmit={save}
      noValidate
      aria-label="New comment"
      className="mt-4 flex max-w-[640px] flex-col gap-4 rounded border border-edge bg-raised p-4"
    >
      <AnchorField typed={typed} fields={fields} error={anchorFault} onChange={onChange} />
      <WordsField
        label="Comment"
        words={words}
        others={others}
        error={isIncomplete && words.trim() === "" ? "Say something." : faultAt(add.error, "words")}
        onChange={setWords}
      />
      {failure && <ErrorNote>{failure}</ErrorNote>}
      <div className="flex flex-wrap gap-3">
        <Button type="submit" isBusy={add.isPending}>
          Keep the comment
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </div>
    </form>
  );
}
