import type { Database } from "../database/database.ts";
import type { Activity } from "./activity.ts";
import type { ActivityEntry } from "./activity-schema.ts";

const TABLE = "activity";
const PAGE = 50;

interface ActivityRow {
  id: number;
  account_id: string;
  account_name: string;
  act: string;
  subject_id: string | null;
  scenario_title: string | null;
  member_name: string | null;
  /** Text or parsed, as the database's JSON type comes through the driver. */
  detail: string | ActivityEntry["detail"];
  created_at: Date;
}

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

/**
 * A page of a project's trail, newest first. A scenario is named as it is called now; one that is in another project by
 * now, as it was called then: nothing of that project is told.
 */
export async function listActivity(
  database: Database,
  projectId: string,
  before: number | null,
): Promise<ActivityEntry[]> {
  const rows = await database(TABLE)
    .join("accounts", "accounts.id", "activity.account_id")
    .leftJoin("scenarios", (join) =>
      join.on("scenarios.id", "activity.subject_id").andOnVal("scenarios.project_id", projectId),
    )
    .leftJoin("accounts as subjects", (join) =>
      join.on("subjects.id", "activity.subject_id").andOnVal("activity.act", "like", "member.%"),
    )
    .where({ "activity.project_id": projectId })
    .modify((query) => before !== null && void query.where("activity.id", "<", before))
    .orderBy("activity.id", "desc")
    .limit(PAGE)
    .select<ActivityRow[]>(
      "activity.*",
      "accounts.name as account_name",
      "scenarios.title as scenario_title",
      "subjects.name as member_name",
    );
  return rows.map(entryOf);
}

function entryOf(row: ActivityRow): ActivityEntry {
  const detail = typeof row.detail === "string" ? (JSON.parse(row.detail) as ActivityEntry["detail"]) : row.detail;
  const now = row.scenario_title ?? row.member_name;
  const name = now ?? String(detail.title ?? "");
  return {
    id: Number(row.id),
    at: row.created_at.toISOString(),
    by: { accountId: row.account_id, name: row.account_name },
    act: row.act,
    subject: row.subject_id === null ? null : { id: row.subject_id, name, isThere: now !== null },
    detail,
  };
}
