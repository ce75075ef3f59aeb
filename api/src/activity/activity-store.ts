import type { Database } from "../database/database.ts";
import type { Activity } from "./activity.ts";

const TABLE = "activity";

/** Adds one row to the trail. Rows are never changed nor removed: the server's database account cannot. */
export async function insertActivity(database: Database, activity: Activity): Promise<void> {
  await database(TABLE).insert({
    project_id: activity.projectId,
    account_id: activity.accountId,
    act: activity.act,
    subject_id: activity.subjectId ?? null,
    detail: JSON.stringify(activity.detail ?? {}),
    created_at: new Date(),
  });
}
