import type { Comment, Member, Revision } from "@restband/api/contract";
import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import { commentsQuery } from "../../api/comments.ts";
import { revisionQuery, revisionsQuery } from "../../api/revisions.ts";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { useWidth } from "../../components/use-width.ts";
import { typedAnchor, wholeAnchor, type TypedAnchor } from "./anchor-field.tsx";
import { CommentFigure } from "./comment-figure.tsx";
import { CommentForm } from "./comment-form.tsx";
import { CommentThread } from "./comment-thread.tsx";
import { inOrder } from "./leaders.ts";

interface CommentsPanelProps {
  revision: Revision;
  /** Members who can be told: all but the reader. */
  others: readonly Member[];
  canComment: boolean;
  /** The values a comment can be about. */
  fields: readonly { path: string; label: string }[];
  labelOf: (path: string) => string;
}

const GAP = 20;
/** Room inside the sheet, at each side. */
const PAD = 16;

/** What was said to a revision, on leaders to its time axis, and the way to say more. */
export function CommentsPanel({ revision, others, canComment, fields, labelOf }: CommentsPanelProps) {
  const { projectId, id } = revision;
  const comments = useQuery(commentsQuery(projectId, id));
  const before = usePrevious(revision);
  const [typed, setTyped] = useState<TypedAnchor | null>(null);
  const [ref, sheetWidth] = useWidth<HTMLDivElement>(1000);
  const width = sheetWidth - 2 * PAD;
  const columns = columnsIn(width);
  const sorted = inOrder<Comment>(comments.data ?? []);
  return (
    <div ref={ref} className="rounded border border-line bg-raised" style={{ padding: PAD }}>
      <CommentFigure
        revision={revision}
        before={before}
        comments={sorted}
        width={width}
        columns={columns.length > 1 ? columns : []}
        onPick={canComment ? (anchor) => setTyped(typedAnchor(anchor, 4)) : undefined}
      />
      {comments.error && <ErrorNote>{comments.error.message}</ErrorNote>}
      {sorted.length > 0 && (
        <ol
          aria-label="Comments"
          className="grid gap-y-6"
          style={{ columnGap: GAP, gridTemplateColumns: `repeat(${columns.length}, minmax(0, 1fr))` }}
        >
          {sorted.map((comment) => (
            <CommentThread key={comment.id} {...{ projectId, comment, others, canComment, labelOf }} revisionId={id} />
          ))}
        </ol>
      )}
      {comments.data?.length === 0 && <p className="text-quiet">Nobody has commented on this revision yet.</p>}
      {canComment && typed === null && (
        <div className="mt-4 flex flex-wrap items-center gap-x-5 gap-y-2">
          <Button onClick={() => setTyped(wholeAnchor)}>Comment</Button>
          <p className="text-13 text-quiet">Press the time axis for an instant, or drag along it for a span.</p>
        </div>
      )}
      {typed && (
        <CommentForm {...{ revision, typed, fields, others }} onChange={setTyped} onClose={() => setTyped(null)} />
      )}
    </div>
  );
}

/** Left edges of the columns that threads stand in. */
function columnsIn(width: number): number[] {
  const count = width >= 840 ? 3 : width >= 560 ? 2 : 1;
  const column = (width - GAP * (count - 1)) / count;
  return Array.from({ length: count }, (_, i) => i * (column + GAP));
}

/** The revision before this one of the same scenario; undefined until it is read, and where there is none. */
function usePrevious({ projectId, scenarioId, number }: Revision): Revision | undefined {
  const { data: all } = useQuery(revisionsQuery(projectId, scenarioId));
  const id = all?.find((each) => each.number === number - 1)?.id;
  return useQuery({ ...revisionQuery(projectId, id ?? ""), enabled: id !== undefined }).data;
}
