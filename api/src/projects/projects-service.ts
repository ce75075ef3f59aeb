import { recordAct } from "../activity/activity-service.ts";
import type { Database } from "../database/database.ts";
import { notFound } from "../errors.ts";
import type { MembersService } from "../members/members-service.ts";
import type { Project } from "./projects-schema.ts";
import { findProject, insertProject, listProjects, type ProjectDraft, updateProject } from "./projects-store.ts";

export type ProjectsService = ReturnType<typeof createProjectsService>;

export function createProjectsService(database: Database, members: MembersService) {
  const read = async (id: string, accountId: string): Promise<Project> =>
    (await findProject(database, id, accountId)) ?? noSuchProject();

  return {
    list: (accountId: string) => listProjects(database, accountId),
    read,

    /** Makes a project whose only member is its maker, as owner. */
    async create(draft: ProjectDraft, accountId: string): Promise<Project> {
      const projectId = await database.transaction(async (transaction) => {
        const id = await insertProject(transaction, draft);
        await members.makeOwner(transaction, id, accountId);
        await recordAct(transaction, { projectId: id, accountId, act: "project.created", detail: draft });
        return id;
      });
      return read(projectId, accountId);
    },

    async change(projectId: string, draft: ProjectDraft, accountId: string): Promise<Project> {
      await database.transaction(async (transaction) => {
        await updateProject(transaction, projectId, draft);
        await recordAct(transaction, { projectId, accountId, act: "project.changed", detail: draft });
      });
      return read(projectId, accountId);
    },
  };
}

/** Only where the membership ended between the check and the reading. */
function noSuchProject(): never {
  throw notFound();
}
