import type { ScenarioSummary } from "@restband/api/contract";
import type { ReactNode } from "react";
import { Link } from "react-router-dom";
import { sayWhen } from "../../format/when.ts";
import { paths } from "../../paths.ts";

interface ScenarioRowProps {
  projectId: string;
  summary: ScenarioSummary;
  /** The reader's own account, who is called "you". */
  ownId: string;
  /** The motion strip with its span. */
  strip: ReactNode;
  /** The answer in one sentence. */
  sentence: ReactNode;
  /** How many limits are kept. */
  limits: ReactNode;
  /** How its revisions stand; null without one. */
  state: ReactNode;
  /** What can be done to it. */
  menu: ReactNode;
}

/** One scenario of a project: how it moves | title and answer | limits, state, who and when. */
export function ScenarioRow({ projectId, summary, ownId, strip, sentence, limits, state, menu }: ScenarioRowProps) {
  const { id, title, updatedAt, updatedBy, archivedAt } = summary;
  const who = updatedBy.accountId === ownId ? "you" : updatedBy.name;
  return (
    <div className="grid items-start gap-x-7 gap-y-3 py-4 desk:grid-cols-[188px_minmax(0,1fr)_244px]">
      <div className="min-h-11 max-desk:order-2">{strip}</div>
      <div className="min-w-0">
        <h3 className="font-bold wrap-anywhere">
          <Link to={paths.scenario(projectId, id)} className="link">
            {title || "Untitled"}
          </Link>
        </h3>
        <div className="mt-0.5 min-h-[31px] text-18">{sentence}</div>
      </div>
      <div className="flex items-start gap-2 text-13 max-desk:order-3">
        <div className="min-w-0 grow">
          <div className="min-h-5">{limits}</div>
          {state && <p className="mt-1">{state}</p>}
          <p className="mt-1 text-quiet">
            {archivedAt ? "archived" : "draft"} · {who},{" "}
            <time dateTime={updatedAt}>{sayWhen(new Date(updatedAt))}</time>
          </p>
        </div>
        <div className="-mt-2">{menu}</div>
      </div>
    </div>
  );
}
