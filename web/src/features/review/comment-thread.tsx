import type { Comment, Member } from "@restband/api/contract";
import { useState } from "react";
import { useReply, useSettle } from "../../api/comments.ts";
import { Button } from "../../components/button.tsx";
import { StateMark } from "../../components/state-mark.tsx";
import { announce } from "../../components/status.tsx";
import { sayWhen } from "../../format/when.ts";
import { mentionsIn, sayAnchor } from "./comment-words.ts";
import { faultAt, otherFault } from "./fault-of.ts";
import { WordsField } from "./words-field.tsx";

interface CommentThreadProps {
  projectId: string;
  revisionId: string;
  comment: Comment;
  others: readonly Member[];
  canComment: boolean;
  labelOf: (path: string) => string;
}

/** A comment with what was answered, and whether it is settled. */
export function CommentThread({ projectId, revisionId, comment, others, canComment, labelOf }: CommentThreadProps) {
  const [isAnswering, setAnswering] = useState(false);
  const settle = useSettle(projectId, revisionId, comment.id);
  const { number, by, at, anchor, words, replies, settled, faults } = comment;
  const toggle = () => settle.mutate(settled === null, { onError: (error) => announce(error.message) });
  return (
    <li id={`comment-${comment.id}`} className="min-w-0 scroll-mt-20 border-t-[1.5px] border-ink pt-2.5">
      <p className="text-13">
        <strong>
          {number} · {by.name}
        </strong>{" "}
        <span className="text-quiet">
          {sayAnchor(anchor, labelOf)}, <time dateTime={at}>{sayWhen(new Date(at))}</time>
        </span>
      </p>
      <p className="mt-1 whitespace-pre-wrap wrap-anywhere">{words}</p>
      <Tampered faults={faults} />
      {replies.map((reply) => (
        <div key={reply.id} className="mt-2.5 border-l-2 border-line pl-3">
          <p className="text-13">
            <strong>{reply.by.name}</strong>{" "}
            <time dateTime={reply.at} className="text-quiet">
              {sayWhen(new Date(reply.at))}
            </time>
          </p>
          <p className="mt-0.5 whitespace-pre-wrap wrap-anywhere">{reply.words}</p>
          <Tampered faults={reply.faults} />
        </div>
      ))}
      <p className="mt-2 flex flex-wrap items-baseline gap-x-3 text-13">
        {settled && (
          <span title={`${settled.by.name}, ${sayWhen(new Date(settled.at))}`}>
            <StateMark word="settled" tone="kept" />
          </span>
        )}
        {canComment && (
          <>
            <button
              type="button"
              className="link hit"
              aria-expanded={isAnswering}
              onClick={() => setAnswering(!isAnswering)}
            >
              Reply
            </button>
            <button type="button" className="link hit" onClick={toggle}>
              {settled ? "Open again" : "Settle"}
            </button>
          </>
        )}
      </p>
      {isAnswering && (
        <ReplyForm {...{ projectId, revisionId, others }} commentId={comment.id} onClose={() => setAnswering(false)} />
      )}
    </li>
  );
}

/** A word that somebody has changed in the database since is no longer theirs. */
function Tampered({ faults }: { faults: readonly string[] }) {
  if (faults.length === 0) return null;
  return (
    <p className="mt-1 text-13">
      <StateMark word="not as it was written" tone="broken" /> {faults.join(" ")}
    </p>
  );
}

interface ReplyFormProps {
  projectId: string;
  revisionId: string;
  commentId: string;
  others: readonly Member[];
  onClose: () => void;
}

function ReplyForm({ projectId, revisionId, commentId, others, onClose }: ReplyFormProps) {
  const reply = useReply(projectId, revisionId, commentId);
  const [words, setWords] = useState("");
  const save = (event: React.FormEvent): void => {
    event.preventDefault();
    if (words.trim() !== "") reply.mutate({ words, mentions: mentionsIn(words, others) }, { onSuccess: onClose });
  };
  return (
    <form onSubmit={save} noValidate aria-label="Reply" className="mt-2 flex flex-col gap-3">
      <WordsField
        label="Reply"
        rows={2}
        words={words}
        others={others}
        error={faultAt(reply.error, "words") ?? otherFault(reply.error, ["words"]) ?? undefined}
        onChange={setWords}
      />
      <div className="flex flex-wrap gap-3">
        <Button type="submit" isBusy={reply.isPending}>
          Keep the reply
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </div>
    </form>
  );
}
