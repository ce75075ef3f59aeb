import type { Project } from "@restband/api/contract";
import { Link } from "react-router-dom";
import { sayWhen } from "../../format/when.ts";
import { capitalised, sayMany } from "../../format/words.ts";
import { paths } from "../../paths.ts";

/** One row a project: name and description, how many scenarios, one's own role, when it was last touched. */
export function ProjectList({ projects }: { projects: readonly Project[] }) {
  return (
    <ul className="border-t border-edge">
      {projects.map((project) => (
        <ProjectRow key={project.id} project={project} />
      ))}
    </ul>
  );
}

function ProjectRow({ project }: { project: Project }) {
  const { id, name, description, role, scenarioCount, updatedAt } = project;
  const updated = new Date(updatedAt);
  return (
    <li className="grid gap-x-8 gap-y-2 border-b border-line py-4 desk:grid-cols-[minmax(0,1fr)_232px]">
      <div className="min-w-0">
        <h2 className="text-18 font-semibold">
          <Link to={paths.project(id)} className="link">
            {name}
          </Link>
        </h2>
        {description && <p className="mt-1 line-clamp-2 max-w-(--measure) text-quiet">{description}</p>}
      </div>
      <p className="text-13 text-quiet desk:pt-1">
        <span className="block text-ink">{sayMany(scenarioCount, "scenario")}</span>
        you are {role} · <time dateTime={updatedAt}>{sayWhen(updated)}</time>
      </p>
    </li>
  );
}

/** "Three projects.", "One archived project." */
export const projectsHeadline = (count: number, areArchived = false): string =>
  `${capitalised(sayMany(count, areArchived ? "archived project" : "project"))}${count || areArchived ? "" : " yet"}.`;
