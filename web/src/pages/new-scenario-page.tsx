import type { Scenario } from "@restband/solver";
import { useSuspenseQueries } from "@tanstack/react-query";
import { useState } from "react";
import { Navigate, useNavigate, useParams } from "react-router-dom";
import { projectQuery } from "../api/projects.ts";
import { scenariosQuery, useCreateScenario } from "../api/scenarios.ts";
import { ErrorNote } from "../components/error-note.tsx";
import { useRun } from "../compute/use-run.ts";
import { WorkHeader } from "../features/account/work-header.tsx";
import { StripGlance } from "../features/answer/answer-glance.tsx";
import { freeTitle, newScenario } from "../features/project-home/new-scenario.ts";
import { mayEdit } from "../features/project-home/roles.ts";
import { startingPoints } from "../features/starting-points/index.ts";
import { StartingPointRow } from "../features/starting-points/starting-point-row.tsx";
import { paths } from "../paths.ts";

/** What a new scenario begins from: plain numbers, or a case of the trade. */
export function NewScenarioPage() {
  const { projectId = "" } = useParams();
  const [{ data: project }, { data: scenarios }] = useSuspenseQueries({
    queries: [projectQuery(projectId), scenariosQuery(projectId)],
  });
  const begin = useBegin(projectId);
  if (!mayEdit(project.role) || project.archivedAt !== null) return <Navigate to={paths.project(projectId)} replace />;
  const taken = scenarios.map(({ title }) => title);
  const plain = newScenario(taken);
  return (
    <>
      <title>{`New scenario · ${project.name} · Restband`}</title>
      <WorkHeader trail={[{ label: project.name, to: paths.project(projectId) }]} title="New scenario" />
      <main id="content" tabIndex={-1} className="page-width grow py-8 desk:py-9">
        <h1 className="text-24 font-semibold desk:text-34">Begin with a case like yours.</h1>
        <p className="mt-3 mb-6 max-w-(--measure) text-18 text-quiet">
          Each number carries where it comes from. None is advice: put yours in its place.
        </p>
        {begin.failure && <ErrorNote className="mb-6">{begin.failure}</ErrorNote>}
        <ul aria-label="Starting points" className="border-t border-edge">
          <StartingPointRow
            name="Plain numbers"
            why="Nothing fits: a slide on a feed drive, all of it to be replaced."
            strip={<Strip scenario={plain} />}
            isBusy={begin.isBusy}
            onBegin={() => begin.run(plain)}
          />
          {startingPoints.map(({ key, scenario, ...words }) => (
            <StartingPointRow
              key={key}
              {...words}
              strip={<Strip scenario={scenario} />}
              isBusy={begin.isBusy}
              onBegin={() => begin.run({ ...scenario, title: freeTitle(scenario.title, taken) })}
            />
          ))}
        </ul>
      </main>
    </>
  );
}

/** Makes a scenario of the project and opens it. */
function useBegin(projectId: string) {
  const create = useCreateScenario(projectId);
  const navigate = useNavigate();
  const run = (scenario: Scenario) =>
    create.mutate(scenario, {
      onSuccess: ({ id }) => void navigate(paths.scenario(projectId, id), { replace: true }),
    });
  return { run, isBusy: create.isPending, failure: create.error?.message ?? null };
}

/** The motion of a starting point, computed here. */
function Strip({ scenario: given }: { scenario: Scenario }) {
  // The first it was given: equal ones are made anew with each render.
  const [scenario] = useState(given);
  const { computed, failure } = useRun(scenario);
  if (computed) return <StripGlance computed={computed} />;
  return <p className={failure ? "text-13 text-quiet" : "late text-13 text-quiet"}>{failure ?? "Computing"}</p>;
}
