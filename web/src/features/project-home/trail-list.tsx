import { Link } from "react-router-dom";
import { sayWhen } from "../../format/when.ts";
import { paths } from "../../paths.ts";
import type { Told } from "./lately-words.ts";

/** Acts in sentences, each with its time. */
export function TrailList({ projectId, told }: { projectId: string; told: readonly Told[] }) {
  return (
    <ol className="flex flex-col gap-2.5 py-4">
      {told.map(({ id, at, before, revision, scenario, after }) => (
        <li key={id} className="grid grid-cols-[74px_minmax(0,1fr)] gap-x-2">
          <time
            dateTime={at}
            title={new Date(at).toLocaleString("en-GB")}
            className="figures text-13/[22px] text-quiet"
          >
            {sayWhen(new Date(at))}
          </time>
          <span className="wrap-anywhere">
            {before}
            {revision && (
              <>
                <Link to={paths.revision(projectId, revision.id)} className="link">
                  revision {revision.number}
                </Link>
                {" of "}
              </>
            )}
            {scenario &&
              (scenario.isThere ? (
                <Link to={paths.scenario(projectId, scenario.id)} className="link">
                  {scenario.title}
                </Link>
              ) : (
                scenario.title
              ))}
            {after}
          </span>
        </li>
      ))}
    </ol>
  );
}
