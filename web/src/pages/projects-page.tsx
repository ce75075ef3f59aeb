import { useSuspenseQuery } from "@tanstack/react-query";
import { Suspense, useState } from "react";
import { useNavigate } from "react-router-dom";
import { projectsQuery, useCreateProject } from "../api/projects.ts";
import { Button } from "../components/button.tsx";
import { Dialog } from "../components/dialog.tsx";
import { EmptyState } from "../components/empty-state.tsx";
import { lazyPart } from "../components/lazy-part.ts";
import { useShortcut } from "../components/shortcuts.tsx";
import { WorkHeader } from "../features/account/work-header.tsx";
import { ProjectList, projectsHeadline } from "../features/project-home/project-list.tsx";
import { paths } from "../paths.ts";

const WaitingList = lazyPart(async () => (await import("../features/review/waiting-list.tsx")).WaitingList);
// Forms are loaded when one is opened: they are no part of the first paint.
const ProjectForm = lazyPart(async () => (await import("../features/project-home/project-form.tsx")).ProjectForm);

/** All projects of the person signed in. */
export function ProjectsPage() {
  const { data: all } = useSuspenseQuery(projectsQuery);
  const [areArchivedShown, showArchived] = useState(false);
  const archived = all.filter(({ archivedAt }) => archivedAt !== null);
  const projects = areArchivedShown ? archived : all.filter(({ archivedAt }) => archivedAt === null);
  const [isNew, setNew] = useState(false);
  const create = useCreateProject();
  const navigate = useNavigate();
  const open = () => setNew(true);
  useShortcut("n", "New project", open);
  const newProject = (
    <Button kind="primary" onClick={open}>
      New project
    </Button>
  );
  return (
    <>
      <title>All projects · Restband</title>
      <WorkHeader title="All projects" actions={newProject} />
      <main
        id="content"
        tabIndex={-1}
        className="page-width grid grow content-start gap-x-16 gap-y-10 py-8 desk:py-9 wide:grid-cols-[minmax(0,972px)_292px]"
      >
        <div className="min-w-0">
          <h1 className="mb-6 text-24 font-semibold desk:text-34">
            {projectsHeadline(projects.length, areArchivedShown)}
          </h1>
          {projects.length > 0 || areArchivedShown ? (
            <ProjectList projects={projects} />
          ) : (
            <EmptyState action={<Button onClick={open}>Begin a project</Button>}>
              A project holds scenarios and the people who work on them. Begin one, or ask its owner to add you to
              theirs.
            </EmptyState>
          )}
          {archived.length > 0 && (
            <button type="button" className="link mt-4 text-13" onClick={() => showArchived(!areArchivedShown)}>
              {areArchivedShown ? "back to those in use" : `${archived.length} archived`}
            </button>
          )}
        </div>
        <Suspense>
          <WaitingList />
        </Suspense>
      </main>
      <Dialog isOpen={isNew} title="New project" onClose={() => setNew(false)}>
        <ProjectForm
          action="Begin the project"
          save={async (draft) => navigate(paths.project((await create.mutateAsync(draft)).id))}
          onCancel={() => setNew(false)}
        />
      </Dialog>
    </>
  );
}
