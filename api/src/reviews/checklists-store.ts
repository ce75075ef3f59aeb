import type { Database } from "../database/database.ts";
import type { Checklist } from "./reviews-schema.ts";

const TABLE = "checklists";

/** A project's checklist; an empty one where none was set. */
export async function findChecklist(database: Database, projectId: string): Promise<Checklist> {
  const row = await database(TABLE).where({ project_id: projectId }).first<{ points: string } | undefined>("points");
  return { points: row ? (JSON.parse(row.points) as string[]) : [] };
}

export async function saveChecklist(
  database: Database,
  projectId: string,
  { points }: Checklist,
  accountId: string,
): Promise<void> {
  await database(TABLE)
    .insert({
      ...{ project_id: projectId, points: JSON.stringify(points) },
      ...{ updated_at: new Date(), updated_by: accountId },
    })
    .onConflict()
    .merge();
}
