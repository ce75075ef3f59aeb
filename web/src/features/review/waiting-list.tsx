import type { Notice } from "@restband/api/contract";
import { useQuery } from "@tanstack/react-query";
import { Link } from "react-router-dom";
import { noticesQuery, useCloseNotice } from "../../api/notices.ts";
import { sayWhen } from "../../format/when.ts";
import { paths } from "../../paths.ts";

const acts: Record<Notice["kind"], string> = {
  "review-asked": "asks you to review",
  mentioned: "named you in a comment on",
  answered: "answered in a comment on",
  commented: "commented on",
  accepted: "accepted",
  returned: "returned",
  withdrawn: "withdrew",
};

/** What waits for the reader in all their projects; nothing is drawn where nothing waits. */
export function WaitingList() {
  const { data: notices } = useQuery(noticesQuery);
  const close = useCloseNotice();
  if (!notices || notices.length === 0) return null;
  return (
    <section aria-labelledby="waiting" className="mb-10">
      <h2 id="waiting" className="border-b border-edge pb-2.5 text-15 font-bold">
        Waits for you
      </h2>
      <ul>
        {notices.map((notice) => (
          <Waiting key={notice.id} notice={notice} onClose={() => close.mutate(notice.id)} />
        ))}
      </ul>
    </section>
  );
}

function Waiting({ notice, onClose }: { notice: Notice; onClose: () => void }) {
  const { kind, by, at, project, revision, commentId } = notice;
  const isTask = kind === "review-asked";
  const target = `${paths.revision(project.id, revision.id)}${commentId ? `#comment-${commentId}` : ""}`;
  return (
    <li className="flex flex-wrap items-baseline gap-x-4 gap-y-1 border-b border-line py-2.5">
      <p className="min-w-0 grow basis-72">
        {by.name} {acts[kind]}{" "}
        <Link to={target} className="link font-semibold" onClick={() => !isTask && onClose()}>
          revision {revision.number} of {revision.title || "Untitled"}
        </Link>
        <span className="block text-13 text-quiet">{project.name}</span>
      </p>
      <time dateTime={at} className="text-13 text-quiet">
        {sayWhen(new Date(at))}
      </time>
      {!isTask && (
        <button type="button" className="link hit text-13" onClick={onClose}>
          Put away
        </button>
      )}
    </li>
  );
}
