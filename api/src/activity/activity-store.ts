import type { Knex } from "knex";
import { append } from "../chain/chain.ts";
import type { Database } from "../database/database.ts";
import type { Activity } from "./activity.ts";
import type { ActivityEntry, ActivityQuery } from "./activity-schema.ts";

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

/** Adds one row to the trail. */
export async function insertActivity(database: Database, activity: Activity): Promise<void> {
  await append(database, TABLE, {
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
  query: ActivityQuery,
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
    .modify((rows) => narrow(rows, query))
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

function narrow(rows: Knex.QueryBuilder, { before, about, by, scenarioId, from, to }: ActivityQuery): void {
  if (before !== undefined) void rows.where("activity.id", "<", Number(before));
  if (about !== undefined) void rows.where("activity.act", "like", `${about}.%`);
  if (by !== undefined) void rows.where({ "activity.account_id": by });
  if (scenarioId !== undefined) void rows.where({ "activity.subject_id": scenarioId });
  if (from !== undefined) void rows.where("activity.created_at", ">=", new Date(from));
  if (to !== undefined) void rows.where("activity.created_at", "<", new Date(to));
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

/**
 * Who saved the versions of a scenario that lie in (after, upTo], first savers first. Its first version is the work of who
 * made it.
 */
export async function findSavers(
  database: Database,
  scenarioId: string,
  { after, upTo }: { readonly after: number; readonly upTo: number },
): Promise<{ accountId: string; name: string }[]> {
  const version = database.raw("CAST(JSON_VALUE(activity.detail, '$.version') AS UNSIGNED)");
  const savers = await database(TABLE)
    .join("accounts", "accounts.id", "activity.account_id")
    .where({ subject_id: scenarioId, act: "scenario.saved" })
    .where(version, ">", after)
    .where(version, "<=", upTo)
    .groupBy("accounts.id")
    .orderByRaw("MIN(activity.id)")
    .select<{ accountId: string; name: string }[]>("accounts.id as accountId", "accounts.name");
  if (after > 0) return savers;
  const [maker] = await database("scenarios")
    .join("accounts", "accounts.id", "scenarios.created_by")
    .where({ "scenarios.id": scenarioId })
    .select<{ accountId: string; name: string }[]>("accounts.id as accountId", "accounts.name");
  return [maker, ...savers.filter(({ accountId }) => accountId !== maker.accountId)];
}
