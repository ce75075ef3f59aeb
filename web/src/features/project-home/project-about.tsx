import type { Project } from "@restband/api/contract";
import { useState } from "react";
import { useArchiveProject, useChangeProject } from "../../api/projects.ts";
import { Button } from "../../components/button.tsx";
import { Confirm } from "../../components/confirm.tsx";
import { Dialog } from "../../components/dialog.tsx";
import { lazyPart } from "../../components/lazy-part.ts";
import { announce } from "../../components/status.tsx";
import { sayWhen } from "../../format/when.ts";

// Loaded when it is opened: it is no part of the first paint.
const ProjectForm = lazyPart(async () => (await import("./project-form.tsx")).ProjectForm);

/** What the project is about, and whether it is archived; an owner can change both, and its name. */
export function ProjectAbout({ project }: { project: Project }) {
  const isOwner = project.role === "owner";
  return (
    <div className="mt-3 mb-8 max-w-(--measure)">
      {project.description && <p className="text-18 whitespace-pre-line text-quiet">{project.description}</p>}
      {project.archivedAt !== null && <ArchivedNote project={project} archivedAt={project.archivedAt} />}
      {isOwner && project.archivedAt === null && (
        <div className="mt-2 flex flex-wrap gap-x-5 text-13">
          <ChangeLink project={project} />
          <ArchiveLink project={project} />
        </div>
      )}
    </div>
  );
}

function ArchivedNote({ project, archivedAt }: { project: Project; archivedAt: string }) {
  const restore = useRestore(project);
  return (
    <div className="mt-4 flex flex-wrap items-center gap-x-4 gap-y-2 border-[1.5px] border-ink px-3.5 py-2.5">
      <p>
        Archived since {sayWhen(new Date(archivedAt))}. Everything can be read and run; nothing in it changes
        {project.role === "owner" ? "." : " until an owner restores it."}
      </p>
      {project.role === "owner" && <Button onClick={restore}>Restore</Button>}
    </div>
  );
}

/** Takes the project out again; a refusal is told where the act was begun. */
function useRestore({ id, name }: Project): () => Promise<void> {
  const archive = useArchiveProject(id);
  return async () => {
    try {
      await archive.mutateAsync(false);
      announce(`“${name}” is in use again.`);
    } catch (error) {
      announce(error instanceof Error ? error.message : String(error));
    }
  };
}

function ArchiveLink({ project }: { project: Project }) {
  const [isOpen, setOpen] = useState(false);
  const archive = useArchiveProject(project.id);
  const restore = useRestore(project);
  const confirm = async () => {
    await archive.mutateAsync(true);
    announce(`“${project.name}” is archived.`, () => void restore());
  };
  return (
    <>
      <button type="button" className="link" onClick={() => setOpen(true)}>
        Archive the project
      </button>
      <Confirm
        isOpen={isOpen}
        title={`Archive “${project.name}”`}
        action="Archive"
        onConfirm={confirm}
        onClose={() => setOpen(false)}
      >
        Everybody in it can still read and run everything, and nobody can change anything, until an owner restores it.
      </Confirm>
    </>
  );
}

function ChangeLink({ project }: { project: Project }) {
  const [isOpen, setOpen] = useState(false);
  const change = useChangeProject(project.id);
  const save = async (draft: Pick<Project, "name" | "description">) => {
    await change.mutateAsync(draft);
    setOpen(false);
  };
  return (
    <>
      <button type="button" className="link" onClick={() => setOpen(true)}>
        Change name and description
      </button>
      <Dialog isOpen={isOpen} title="Change the project" onClose={() => setOpen(false)}>
        <ProjectForm project={project} action="Save" save={save} onCancel={() => setOpen(false)} />
      </Dialog>
    </>
  );
}
