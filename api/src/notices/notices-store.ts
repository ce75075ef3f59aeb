import { randomUUID } from "node:crypto";
import type { Database } from "../database/database.ts";
import type { Notice } from "./notices-schema.ts";

const TABLE = "notices";
const MOST = 200;

/** A notice that is to be kept for somebody. */
export interface NewNotice {
  readonly to: string;
  readonly kind: Notice["kind"];
  readonly by: string;
  readonly projectId: string;
  readonly revisionId: string;
  readonly commentId?: string;
}

interface NoticeRow {
  id: string;
  kind: Notice["kind"];
  created_at: Date;
  by_account_id: string;
  by_name: string;
  project_id: string;
  project_name: string;
  revision_id: string;
  number: number;
  scenario_id: string;
  title: string;
  comment_id: string | null;
}

/** What is not closed yet, newest first, of projects the person is still a member of and that are in use. */
export async function listNotices(database: Database, accountId: string): Promise<Notice[]> {
  const rows = await database(TABLE)
    .join("accounts", "accounts.id", "notices.by_account_id")
    .join("projects", "projects.id", "notices.project_id")
    .join("revisions", "revisions.id", "notices.revision_id")
    .join("members", (join) =>
      join.on("members.project_id", "notices.project_id").andOn("members.account_id", "notices.account_id"),
    )
    .where({ "notices.account_id": accountId })
    .whereNull("notices.closed_at")
    .whereNull("projects.archived_at")
    .orderBy("notices.created_at", "desc")
    .limit(MOST)
    .select<NoticeRow[]>(
      "notices.*",
      "accounts.name as by_name",
      "projects.name as project_name",
      ...["number", "scenario_id", "title"].map((column) => `revisions.${column}`),
    );
  return rows.map(noticeFrom);
}

export async function insertNotices(database: Database, notices: readonly NewNotice[]): Promise<void> {
  if (notices.length === 0) return;
  const now = new Date();
  const rows = notices.map(({ to, kind, by, projectId, revisionId, commentId }) => ({
    ...{ id: randomUUID(), account_id: to, kind, by_account_id: by, project_id: projectId, revision_id: revisionId },
    ...{ comment_id: commentId ?? null, created_at: now },
  }));
  await database(TABLE).insert(rows);
}

export async function closeNotice(database: Database, accountId: string, id: string): Promise<void> {
  await database(TABLE).where({ id, account_id: accountId }).whereNull("closed_at").update({ closed_at: new Date() });
}

/** Closes what waits of one kind for anybody on a revision. */
export async function closeNoticesOf(database: Database, revisionId: string, kind: Notice["kind"]): Promise<void> {
  await database(TABLE)
    .where({ revision_id: revisionId, kind })
    .whereNull("closed_at")
    .update({ closed_at: new Date() });
}

function noticeFrom(row: NoticeRow): Notice {
  return {
    id: row.id,
    kind: row.kind,
    at: row.created_at.toISOString(),
    by: { accountId: row.by_account_id, name: row.by_name },
    project: { id: row.project_id, name: row.project_name },
    revision: { id: row.revision_id, number: row.number, scenarioId: row.scenario_id, title: row.title },
    commentId: row.comment_id,
  };
}
