import type { Project } from "@restband/api/contract";
import { useSuspenseQueries } from "@tanstack/react-query";
import { lazy, useState } from "react";
import { useNavigate, useParams } from "react-router-dom";
import { membersQuery } from "../api/members.ts";
import { projectQuery, useChangeProject } from "../api/projects.ts";
import { scenariosQuery, useCreateScenario } from "../api/scenarios.ts";
import { useAccount } from "../api/session.ts";
import { Button } from "../components/button.tsx";
import { Dialog } from "../components/dialog.tsx";
import { EmptyState } from "../components/empty-state.tsx";
import { ErrorNote } from "../components/error-note.tsx";
import { useShortcut } from "../components/shortcuts.tsx";
import { WorkHeader } from "../features/account/work-header.tsx";
import { headline, type Standing } from "../features/project-home/headline.ts";
import { newScenario } from "../features/project-home/new-scenario.ts";
import { PeopleColumn } from "../features/project-home/people-column.tsx";
import { mayEdit } from "../features/project-home/roles.ts";
import { ScenarioRows } from "../features/project-home/scenario-rows.tsx";
import { paths } from "../paths.ts";
import { AnsweredRow } from "./answered-row.tsx";

// Forms are loaded when one is opened: they are no part of the first paint.
const ProjectForm = lazy(async () => ({
  default: (await import("../features/project-home/project-form.tsx")).ProjectForm,
}));

/** One project: its scenarios with their answers, and its people. */
export function ProjectPage() {
  const { projectId = "" } = useParams();
  const [{ data: project }, { data: scenarios }, { data: members }] = useSuspenseQueries({
    queries: [projectQuery(projectId), scenariosQuery(projectId), membersQuery(projectId)],
  });
  const { id: ownId } = useAccount();
  const navigate = useNavigate();
  const [standings, setStandings] = useState<ReadonlyMap<string, Standing>>(new Map());
  const begin = useNewScenario(
    projectId,
    scenarios.map(({ content }) => content.title),
  );
  const canEdit = mayEdit(project.role);
  const newButton = canEdit && (
    <Button kind="primary" isBusy={begin.isBusy} onClick={begin.run}>
      New scenario
    </Button>
  );
  const known = scenarios.flatMap(({ id }) => standings.get(id) ?? []);
  return (
    <>
      <title>{`${project.name} · Restband`}</title>
      <WorkHeader trail={[{ label: "All projects", to: paths.projects }]} title={project.name} actions={newButton} />
      {canEdit && <NewScenarioKey run={begin.run} />}
      <main
        id="content"
        tabIndex={-1}
        className="page-width grid grow content-start gap-x-16 gap-y-12 py-8 desk:py-9 wide:grid-cols-[minmax(0,1fr)_292px]"
      >
        <div className="min-w-0">
          <h1 className="text-24 font-semibold desk:text-34">{headline(scenarios.length, known)}</h1>
          <Description project={project} />
          {begin.failure && <ErrorNote className="mb-6">{begin.failure}</ErrorNote>}
          {scenarios.length > 0 ? (
            <ScenarioRows
              scenarios={scenarios}
              row={(stored, isSeen) => (
                <AnsweredRow
                  stored={stored}
                  ownId={ownId}
                  isSeen={isSeen}
                  onStanding={(standing) => setStandings((before) => new Map(before).set(stored.id, standing))}
                />
              )}
            />
          ) : (
            <EmptyState action={newButton}>
              {canEdit
                ? "A body, its spring, its friction and what drives it are enough for an answer."
                : "Nobody has begun a scenario in this project so far."}
            </EmptyState>
          )}
        </div>
        <PeopleColumn
          projectId={projectId}
          members={members}
          ownId={ownId}
          canManage={project.role === "owner"}
          onLeft={() => void navigate(paths.projects)}
        />
      </main>
    </>
  );
}

/** Begins a scenario and opens it. */
function useNewScenario(projectId: string, taken: readonly string[]) {
  const create = useCreateScenario(projectId);
  const navigate = useNavigate();
  const run = () =>
    create.mutate(newScenario(taken), { onSuccess: ({ id }) => void navigate(paths.scenario(projectId, id)) });
  return { run, isBusy: create.isPending, failure: create.error?.message ?? null };
}

function NewScenarioKey({ run }: { run: () => void }) {
  useShortcut("n", "New scenario", run);
  return null;
}

/** What the project is about; an owner can change that and its name. */
function Description({ project }: { project: Project }) {
  const [isOpen, setOpen] = useState(false);
  const change = useChangeProject(project.id);
  const save = async (draft: Pick<Project, "name" | "description">) => {
    await change.mutateAsync(draft);
    setOpen(false);
  };
  return (
    <div className="mt-3 mb-8 max-w-(--measure)">
      {project.description && <p className="text-18 whitespace-pre-line text-quiet">{project.description}</p>}
      {project.role === "owner" && (
        <>
          <button type="button" className="link mt-2 text-13" onClick={() => setOpen(true)}>
            Change name and description
          </button>
          <Dialog isOpen={isOpen} title="Change the project" onClose={() => setOpen(false)}>
            <ProjectForm project={project} action="Save" save={save} onCancel={() => setOpen(false)} />
          </Dialog>
        </>
      )}
    </div>
  );
}
