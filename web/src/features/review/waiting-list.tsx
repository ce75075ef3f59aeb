import type { Notice } from "@restband/api/contract";
import { useQuery } from "@tanstack/react-query";
import { Link } from "react-router-dom";
import { noticesQuery, useCloseNotice } from "../../api/notices.ts";
import { sayWhen } from "../../format/when.ts";
import { paths } from "../../paths.ts";
import { grouped, type Waiting } from "./waiting.ts";

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
    <section aria-labelledby="waiting" className="max-wide:-order-1">
      <h2 id="waiting" className="border-b border-edge pb-2.5 text-15 font-bold">
        Waits for you
      </h2>
      <ul>
        {grouped(notices).map((waiting) => (
          <WaitingRow
            key={waiting.notice.id}
            waiting={waiting}
            onClose={() => waiting.ids.forEach((id) => close.mutate(id))}
          />
        ))}
      </ul>
    </section>
  );
}

function WaitingRow({ waiting: { notice, ids }, onClose }: { waiting: Waiting; onClose: () => void }) {
  const { kind, by, at, project, revision, commentId } = notice;
  const isTask = kind === "review-asked";
  const target = `${paths.revision(project.id, revision.id)}${commentId ? "#comments" : ""}`;
  return (
    <li className="border-b border-line py-2.5">
      <p className="wrap-anywhere">
        {by.name} {acts[kind]}{" "}
        <Link to={target} className="link font-semibold" onClick={() => !isTask && onClose()}>
          revision {revision.number} of {revision.title || "Untitled"}
        </Link>
        {ids.length > 1 && `, ${ids.length} times`}
      </p>
      <p className="flex flex-wrap items-baseline gap-x-3 text-13 text-quiet">
        <span className="grow">
          {project.name} · <time dateTime={at}>{sayWhen(new Date(at))}</time>
        </span>
        {!isTask && (
          <button type="button" className="link hit" onClick={onClose}>
            Put away
          </button>
        )}
      </p>
    </li>
  );
}
