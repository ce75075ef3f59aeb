import type { StoredScenario } from "@restband/api/contract";
import type { ReactNode } from "react";
import { Link } from "react-router-dom";
import { sayWhen } from "../../format/when.ts";
import { paths } from "../../paths.ts";

interface ScenarioRowProps {
  stored: StoredScenario;
  /** The reader's own account, who is called "you". */
  ownId: string;
  /** The motion strip with its span. */
  strip: ReactNode;
  /** The answer in one sentence. */
  sentence: ReactNode;
  /** How many limits are kept. */
  limits: ReactNode;
}

/** One scenario of a project: how it moves | title and answer | limits, state, who and when. */
export function ScenarioRow({ stored, ownId, strip, sentence, limits }: ScenarioRowProps) {
  const { id, projectId, content, updatedAt, updatedBy } = stored;
  const who = updatedBy.accountId === ownId ? "you" : updatedBy.name;
  return (
    <div className="grid items-start gap-x-7 gap-y-3 py-4 desk:grid-cols-[188px_minmax(0,1fr)_214px]">
      <div className="min-h-11 max-desk:order-2">{strip}</div>
      <div className="min-w-0">
        <h3 className="font-bold">
          <Link to={paths.scenario(projectId, id)} className="link">
            {content.title || "Untitled"}
          </Link>
        </h3>
        <div className="mt-0.5 min-h-[31px] text-18">{sentence}</div>
      </div>
      <div className="text-13 max-desk:order-3">
        <div className="min-h-5">{limits}</div>
        <p className="mt-1 text-quiet">
          draft · {who}, <time dateTime={updatedAt}>{sayWhen(new Date(updatedAt))}</time>
        </p>
      </div>
    </div>
  );
}
