import { recordAct } from "../activity/activity-service.ts";
import { openChain } from "../chain/chain.ts";
import type { Database } from "../database/database.ts";
import { notFound } from "../errors.ts";
import type { MembersService } from "../members/members-service.ts";
import type { Project } from "./projects-schema.ts";
import {
  findProject,
  insertProject,
  listProjects,
  markProjectArchived,
  type ProjectDraft,
  updateProject,
} from "./projects-store.ts";

export type ProjectsService = ReturnType<typeof createProjectsService>;

export function createProjectsService(database: Database, members: MembersService) {
  const read = async (id: string, accountId: string): Promise<Project> =>
    (await findProject(database, id, accountId)) ?? noSuchProject();

  const mark = async (projectId: string, accountId: string, act: "project.archived" | "project.restored") => {
    await database.transaction(async (transaction) => {
      const at = act === "project.archived" ? new Date() : null;
      if (await markProjectArchived(transaction, projectId, at)) {
        await recordAct(transaction, { projectId, accountId, act });
      }
    });
    return read(projectId, accountId);
  };

  return {
    list: (accountId: string) => listProjects(database, accountId),
    read,

    /** Makes a project whose only member is its maker, as owner. */
    async create(draft: ProjectDraft, accountId: string): Promise<Project> {
      const projectId = await database.transaction(async (transaction) => {
        const id = await insertProject(transaction, draft);
        await openChain(transaction, id);
        await members.makeOwner(transaction, id, accountId);
        await recordAct(transaction, { projectId: id, accountId, act: "project.created", detail: draft });
        return id;
      });
      return read(projectId, accountId);
    },

    /** Puts a project away: from now on it is only read, until it is restored. Doing it twice is no fault. */
    archive: (projectId: string, accountId: string) => mark(projectId, accountId, "project.archived"),
    restore: (projectId: string, accountId: string) => mark(projectId, accountId, "project.restored"),

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
