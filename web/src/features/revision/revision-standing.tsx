import type { RevisionSummary } from "@restband/api/contract";
import { Link } from "react-router-dom";
import { paths } from "../../paths.ts";
import { RevisionMark } from "./revision-mark.tsx";

interface RevisionStandingProps {
  /** Of one scenario, newest first, at least one. */
  revisions: readonly RevisionSummary[];
  /** Digest of the working copy. */
  digest: string;
}

/** How the newest revision of a scenario stands, the accepted one beside it, and whether the working copy has gone on. */
export function RevisionStanding({ revisions, digest }: RevisionStandingProps) {
  const [newest] = revisions;
  const accepted = revisions.find(({ state }) => state === "accepted");
  const shown = accepted && accepted !== newest ? [newest, accepted] : [newest];
  return (
    <>
      {shown.map(({ id, projectId, number, state }, i) => (
        <span key={id}>
          {i > 0 && ", "}
          <Link to={paths.revision(projectId, id)} className="link">
            revision {number}
          </Link>{" "}
          <RevisionMark state={state} />
        </span>
      ))}
      {newest.digest !== digest && <span className="text-quiet">, changed since</span>}
    </>
  );
}
