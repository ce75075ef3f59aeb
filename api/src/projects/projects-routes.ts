import type { HandlersOf } from "../route-handler.ts";
import type { ProjectsService } from "./projects-service.ts";

export function projectsRoutes(
  projects: ProjectsService,
): HandlersOf<
  "listProjects" | "createProject" | "readProject" | "changeProject" | "archiveProject" | "restoreProject"
> {
  return {
    listProjects: ({ account }) => projects.list(account.id),
    createProject: ({ body, account }) => projects.create(body, account.id),
    readProject: ({ params, account }) => projects.read(params.projectId, account.id),
    changeProject: ({ params, body, account }) => projects.change(params.projectId, body, account.id),
    archiveProject: ({ params, account }) => projects.archive(params.projectId, account.id),
    restoreProject: ({ params, account }) => projects.restore(params.projectId, account.id),
  };
}
