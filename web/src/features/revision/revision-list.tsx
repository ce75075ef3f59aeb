import type { RevisionSummary } from "@restband/api/contract";
import { useQuery } from "@tanstack/react-query";
import { Link } from "react-router-dom";
import { revisionsQuery } from "../../api/revisions.ts";
import { Button } from "../../components/button.tsx";
import { ErrorNote } from "../../components/error-note.tsx";
import { outcomeWords } from "../../format/outcomes.ts";
import { sayWhen } from "../../format/when.ts";
import { compareReference, paths } from "../../paths.ts";
import { RevisionMark } from "./revision-mark.tsx";

interface RevisionListProps {
  projectId: string;
  scenarioId: string;
  /** The reader's own account, who is called "you". */
  ownId: string;
  /** Digest of the working copy as it is stored: tells whether a revision is what stands there. */
  digest: string;
  /** What freezes a revision, for those who may. */
  action: React.ReactNode;
}

/** The revisions of a scenario, newest first; each a way to its page and to what has changed since. */
export function RevisionList({ projectId, scenarioId, ownId, digest, action }: RevisionListProps) {
  const { data: revisions, error, refetch } = useQuery(revisionsQuery(projectId, scenarioId));
  const compare = (
    <Link className="link text-13" to={paths.compare(projectId, compareReference.scenario(scenarioId))}>
      Compare with another
    </Link>
  );
  if (error)
    return <ErrorNote action={<Button onClick={() => void refetch()}>Try again</Button>}>{error.message}</ErrorNote>;
  if (!revisions) return <p className="late text-quiet">Reading the revisions</p>;
  if (revisions.length === 0)
    return (
      <div className="flex flex-wrap items-center gap-x-5 gap-y-3">
        <p className="max-w-(--measure) text-quiet">
          No revision yet. A revision keeps the scenario and its answer as they are, for a review or for the record.
        </p>
        {action}
        {compare}
      </div>
    );
  return (
    <>
      <ul className="border-t border-edge" aria-label="Revisions">
        {revisions.map((revision, i) => (
          <RevisionRow
            key={revision.id}
            revision={revision}
            before={revisions[i + 1]}
            ownId={ownId}
            isCurrent={i === 0 && revision.digest === digest}
          />
        ))}
      </ul>
      <div className="mt-4 flex flex-wrap items-center gap-x-5 gap-y-3">
        {action}
        {revisions[0].digest !== digest && (
          <Link
            className="link text-13"
            to={paths.compare(
              projectId,
              compareReference.revision(revisions[0].id),
              compareReference.scenario(scenarioId),
            )}
          >
            What has changed since revision {revisions[0].number}
          </Link>
        )}
        {compare}
      </div>
    </>
  );
}

interface RevisionRowProps {
  revision: RevisionSummary;
  /** The one before it; undefined for the first. */
  before: RevisionSummary | undefined;
  ownId: string;
  isCurrent: boolean;
}

function RevisionRow({ revision, before, ownId, isCurrent }: RevisionRowProps) {
  const { id, projectId, number, state, outcome, limits, frozenBy, frozenAt, openComments, isRecomputed } = revision;
  const who = frozenBy.accountId === ownId ? "you" : frozenBy.name;
  const remarks = [
    isCurrent && "as the scenario stands",
    openComments > 0 && `${openComments} ${openComments === 1 ? "comment" : "comments"} open`,
    !isRecomputed && "not recomputed by the server",
  ].filter(Boolean);
  return (
    <li className="grid items-baseline gap-x-6 gap-y-1 border-b border-line py-2.5 desk:grid-cols-[120px_130px_minmax(0,1fr)_auto]">
      <Link to={paths.revision(projectId, id)} className="link font-bold">
        Revision {number}
      </Link>
      <RevisionMark state={state} />
      <p className="min-w-0">
        {outcome ? outcomeWords[outcome] : "no outcome"}
        {limits.of > 0 && `, ${limits.kept} of ${limits.of} limits kept`}
        {remarks.length > 0 && <span className="text-13 text-quiet"> · {remarks.join(" · ")}</span>}
      </p>
      <p className="text-13 text-quiet">
        {who}, <time dateTime={frozenAt}>{sayWhen(new Date(frozenAt))}</time>
        {before && (
          <>
            {" · "}
            <Link
              className="link"
              to={paths.compare(projectId, compareReference.revision(before.id), compareReference.revision(id))}
            >
              compare with {before.number}
            </Link>
          </>
        )}
      </p>
    </li>
  );
}
