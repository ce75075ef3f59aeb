import type { Project, Replay, Revision } from "@restband/api/contract";
import { fieldPaths } from "@restband/solver";
import { useQuery } from "@tanstack/react-query";
import { Suspense, useEffect, useMemo } from "react";
import { useLocation } from "react-router-dom";
import { membersQuery } from "../api/members.ts";
import { lazyPart } from "../components/lazy-part.ts";
import { Section } from "../components/section.tsx";
import { fieldAt } from "../features/statement/scenario-fields.ts";

const CommentsPanel = lazyPart(async () => (await import("../features/review/comments-panel.tsx")).CommentsPanel);
const ReviewPanel = lazyPart(async () => (await import("../features/review/review-panel.tsx")).ReviewPanel);

interface RevisionPartProps {
  project: Project;
  revision: Revision;
  ownId: string;
}

/** What was said to a revision. */
export function RevisionComments({ project, revision, ownId }: RevisionPartProps) {
  const { content } = revision;
  const { data: members } = useQuery(membersQuery(project.id));
  const others = (members ?? []).filter(({ accountId }) => accountId !== ownId);
  const labelOf = (path: string): string => fieldAt(content, path)?.label ?? path;
  const fields = useMemo(
    () =>
      fieldPaths(content).flatMap((path) => {
        const field = fieldAt(content, path);
        return field ? [{ path, label: field.label }] : [];
      }),
    [content],
  );
  useScrollTo("#comments");
  const canComment = project.role !== "reader" && project.archivedAt === null;
  return (
    <Section id="comments" name="Comments" help="Pinned to instants and spans of time, to a value or to the whole.">
      <Suspense fallback={<div className="min-h-[320px]" />}>
        <CommentsPanel {...{ revision, others, canComment, fields, labelOf }} />
      </Suspense>
    </Section>
  );
}

/** Goes to a part of the page that a link has named: it was not there yet when the address was followed. */
function useScrollTo(hash: string): void {
  const { hash: asked, key } = useLocation();
  useEffect(() => {
    if (asked === hash) document.querySelector(hash)?.scrollIntoView();
  }, [asked, hash, key]);
}

/** Who was asked to review it, and what was decided. */
export function RevisionReview({
  project,
  revision,
  ownId,
  replays,
}: RevisionPartProps & { replays: readonly Replay[] }) {
  return (
    <Section id="review" name="Review" help="A decision is signed, and kept with the revision.">
      <Suspense fallback={<div className="min-h-[240px]" />}>
        <ReviewPanel {...{ project, revision, ownId, replays }} />
      </Suspense>
    </Section>
  );
}
