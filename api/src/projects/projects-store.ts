import { randomUUID } from "node:crypto";
import type { z } from "@restband/solver";
import type { Database } from "../database/database.ts";
import type { Role } from "../members/members-schema.ts";
import type { Project, projectDraftSchema } from "./projects-schema.ts";

const TABLE = "projects";

export type ProjectDraft = z.infer<typeof projectDraftSchema>;

interface ProjectRow {
  id: string;
  name: string;
  description: string;
  role: Role;
  scenario_count: number;
  created_at: Date;
  updated_at: Date;
  archived_at: Date | null;
  scenarios_updated_at: Date | null;
}

/** The projects an account is a member of, last touched first. */
export async function listProjects(database: Database, accountId: string): Promise<Project[]> {
  const rows = await projectsOf(database, accountId);
  return rows.map(projectOf).sort((a, b) => b.updatedAt.localeCompare(a.updatedAt));
}

export async function findProject(database: Database, id: string, accountId: string): Promise<Project | null> {
  const [row] = await projectsOf(database, accountId).where({ "projects.id": id });
  return row ? projectOf(row) : null;
}

export async function insertProject(
  database: Database,
  draft: ProjectDraft,
  id: string = randomUUID(),
): Promise<string> {
  const now = new Date();
  await database(TABLE).insert({ id, ...draft, created_at: now, updated_at: now });
  return id;
}

export async function updateProject(database: Database, id: string, draft: ProjectDraft): Promise<void> {
  await database(TABLE)
    .where({ id })
    .update({ ...draft, updated_at: new Date() });
}

/** Sets or clears when a project was archived; false where it stands so already. */
export async function markProjectArchived(database: Database, id: string, at: Date | null): Promise<boolean> {
  const rows = database(TABLE).where({ id });
  const changed = await (at ? rows.whereNull("archived_at") : rows.whereNotNull("archived_at")).update({
    archived_at: at,
  });
  return changed > 0;
}

function projectsOf(database: Database, accountId: string) {
  return database(TABLE)
    .join("members", "members.project_id", "projects.id")
    .leftJoin("scenarios", "scenarios.project_id", "projects.id")
    .where({ "members.account_id": accountId })
    .groupBy("projects.id", "members.role")
    .select<ProjectRow[]>(
      "projects.*",
      "members.role",
      database.raw("COUNT(IF(scenarios.archived_at IS NULL, scenarios.id, NULL)) AS scenario_count"),
      database.raw("MAX(scenarios.updated_at) AS scenarios_updated_at"),
    );
}

/** Saving a scenario touches its project, without a write of its own that all its editors would wait for. */
function projectOf(row: ProjectRow): Project {
  const touchedAt = Math.max(row.updated_at.getTime(), row.scenarios_updated_at?.getTime() ?? 0);
  return {
    id: row.id,
    name: row.name,
    description: row.description,
    role: row.role,
    scenarioCount: Number(row.scenario_count),
    createdAt: row.created_at.toISOString(),
    updatedAt: new Date(touchedAt).toISOString(),
    archivedAt: row.archived_at?.toISOString() ?? null,
  };
}
