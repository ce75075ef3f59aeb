import type { RevisionSummary, ScenarioSummary } from "@restband/api/contract";
import { useQuery, useSuspenseQueries } from "@tanstack/react-query";
import { useMemo, useState } from "react";
import { useNavigate, useParams } from "react-router-dom";
import { membersQuery } from "../api/members.ts";
import { projectQuery } from "../api/projects.ts";
import { revisionsQuery } from "../api/revisions.ts";
import { scenariosQuery } from "../api/scenarios.ts";
import { useAccount } from "../api/session.ts";
import { Button, ButtonLink } from "../components/button.tsx";
import { EmptyState } from "../components/empty-state.tsx";
import { useShortcut } from "../components/shortcuts.tsx";
import { WorkHeader } from "../features/account/work-header.tsx";
import { knownOf } from "../features/project-home/arrange.ts";
import { useGlances, type Glances } from "../features/project-home/glances/use-glances.ts";
import { headline, inReview } from "../features/project-home/headline.ts";
import { ImportDialog } from "../features/project-home/import-dialog.tsx";
import { Lately } from "../features/project-home/lately.tsx";
import { PeopleColumn } from "../features/project-home/people-column.tsx";
import { ProjectAbout } from "../features/project-home/project-about.tsx";
import { ProjectScenarios } from "../features/project-home/project-scenarios.tsx";
import { mayEdit } from "../features/project-home/roles.ts";
import { byScenario } from "../features/revision/by-scenario.ts";
import { paths } from "../paths.ts";
import { AnsweredRow } from "./answered-row.tsx";

const none: readonly RevisionSummary[] = [];

/** One project: its scenarios with their answers, its people, and what they did lately. */
export function ProjectPage() {
  const { projectId = "" } = useParams();
  const [{ data: project }, { data: scenarios }, { data: members }] = useSuspenseQueries({
    queries: [projectQuery(projectId), scenariosQuery(projectId), membersQuery(projectId)],
  });
  const { id: ownId } = useAccount();
  const navigate = useNavigate();
  const glances = useGlances(projectId);
  const { data: revisions } = useQuery(revisionsQuery(projectId));
  const frozen = useMemo(() => byScenario(revisions ?? []), [revisions]);
  const begin = () => void navigate(paths.newScenario(projectId));
  const [isImporting, setImporting] = useState(false);
  const canEdit = mayEdit(project.role) && project.archivedAt === null;
  const newButton = canEdit && (
    <Button kind="primary" onClick={begin}>
      New scenario
    </Button>
  );
  const actions = canEdit && (
    <>
      <Button onClick={() => setImporting(true)}>Bring in JSON</Button>
      {scenarios.length > 0 && <ButtonLink to={paths.cases(projectId)}>Table of cases</ButtonLink>}
      {newButton}
    </>
  );
  return (
    <>
      <title>{`${project.name} · Restband`}</title>
      <WorkHeader trail={[{ label: "All projects", to: paths.projects }]} title={project.name} actions={actions} />
      {canEdit && <NewScenarioKey run={begin} />}
      <main
        id="content"
        tabIndex={-1}
        className="page-width grid grow content-start gap-x-16 gap-y-12 py-8 desk:py-9 wide:grid-cols-[minmax(0,1fr)_292px]"
      >
        <div className="min-w-0">
          <h1 className="text-24 font-semibold desk:text-34">{headlineOf(scenarios, glances, frozen)}</h1>
          <ProjectAbout project={project} />
          <ProjectScenarios
            project={project}
            scenarios={scenarios}
            glances={glances}
            ownId={ownId}
            canEdit={canEdit}
            row={(summary, glance, menu) => (
              <AnsweredRow
                projectId={projectId}
                revisions={frozen.get(summary.id) ?? none}
                {...{ summary, ownId, glance, menu }}
              />
            )}
            empty={
              <EmptyState action={newButton}>
                {canEdit
                  ? "A body, its spring, its friction and what drives it are enough for an answer."
                  : "Nobody has begun a scenario in this project so far."}
              </EmptyState>
            }
          />
        </div>
        <div className="flex flex-col gap-10">
          <PeopleColumn
            projectId={projectId}
            members={members}
            ownId={ownId}
            canManage={project.role === "owner" && project.archivedAt === null}
            onLeft={() => void navigate(paths.projects)}
          />
          <Lately projectId={projectId} ownId={ownId} />
        </div>
      </main>
      <ImportDialog projectId={projectId} isOpen={isImporting} onClose={() => setImporting(false)} />
    </>
  );
}

/** What is archived does not count. */
function headlineOf(
  scenarios: readonly ScenarioSummary[],
  glances: Glances,
  frozen: ReadonlyMap<string, readonly RevisionSummary[]>,
): string {
  const used = scenarios.filter(({ archivedAt }) => archivedAt === null);
  return headline(
    used.length,
    used.flatMap(({ digest }) => knownOf(glances.of(digest))?.standing ?? []),
    inReview(used.flatMap(({ id }) => frozen.get(id)?.[0].state ?? [])),
  );
}

function NewScenarioKey({ run }: { run: () => void }) {
  useShortcut("n", "New scenario", run);
  return null;
}
