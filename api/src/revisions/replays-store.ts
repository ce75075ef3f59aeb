import { randomUUID } from "node:crypto";
import { append } from "../chain/chain.ts";
import type { Database } from "../database/database.ts";
import type { Replay, ReplayDraft } from "./revisions-schema.ts";

const TABLE = "replays";

interface ReplayRow {
  id: string;
  revision_id: string;
  way: Replay["way"];
  verdict: Replay["verdict"];
  report: string;
  replayed_by: string;
  name: string;
  replayed_at: Date;
}

/** The replays of a revision, newest first. */
export async function listReplays(database: Database, revisionId: string): Promise<Replay[]> {
  const rows = await database(TABLE)
    .join("accounts", "accounts.id", "replays.replayed_by")
    .where({ revision_id: revisionId })
    .orderBy("replays.sequence", "desc")
    .select<ReplayRow[]>("replays.*", "accounts.name");
  return rows.map(replayFrom);
}

export async function insertReplay(
  transaction: Database,
  { projectId, revisionId }: { projectId: string; revisionId: string },
  { way, verdict, ...report }: ReplayDraft,
  accountId: string,
): Promise<string> {
  const id = randomUUID();
  await append(transaction, TABLE, {
    ...{ id, project_id: projectId, revision_id: revisionId, way, verdict, report: JSON.stringify(report) },
    ...{ replayed_by: accountId, replayed_at: new Date() },
  });
  return id;
}

function replayFrom(row: ReplayRow): Replay {
  return {
    id: row.id,
    revisionId: row.revision_id,
    way: row.way,
    verdict: row.verdict,
    ...(JSON.parse(row.report) as Omit<ReplayDraft, "way" | "verdict">),
    by: { accountId: row.replayed_by, name: row.name },
    at: row.replayed_at.toISOString(),
  };
}
