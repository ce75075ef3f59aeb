import type { Database } from "../database/database.ts";
import { digestOfBytes } from "./points.ts";

const TABLE = "records";

/** A record as it is added. */
export interface NewRecord {
  readonly digest: string;
  readonly bytes: Buffer;
}

const binary = (digest: string): Buffer => Buffer.from(digest, "hex");

/**
 * How many points each of the digests stands for in a project; those it has none of are missing.
 * @param isHeld none of them is removed until the transaction ends
 */
export async function countPoints(
  database: Database,
  projectId: string,
  digests: readonly string[],
  { isHeld }: { isHeld: boolean },
): Promise<Map<string, number>> {
  if (digests.length === 0) return new Map();
  const rows = await database(TABLE)
    .where({ project_id: projectId })
    .whereIn("digest", digests.map(binary))
    .modify((query) => isHeld && void query.forShare())
    .select<{ digest: Buffer; points: number }[]>("digest", "points");
  return new Map(rows.map(({ digest, points }) => [digest.toString("hex"), points]));
}

/** The bytes of the records by their digests; what is not there, or not what its digest says, is missing. */
export async function findRecords(
  database: Database,
  projectId: string,
  digests: readonly string[],
): Promise<Map<string, Buffer>> {
  if (digests.length === 0) return new Map();
  const rows = await database(TABLE)
    .where({ project_id: projectId })
    .whereIn("digest", digests.map(binary))
    .select<{ digest: Buffer; content: Buffer }[]>("digest", "content");
  const found = rows.map(({ digest, content }) => [digest.toString("hex"), content] as const);
  return new Map(found.filter(([digest, content]) => digestOfBytes(content) === digest));
}

/** Adds records in the order of their digests, so that no two who add the same ones wait for each other in a ring. */
export async function insertRecords(
  transaction: Database,
  projectId: string,
  records: readonly NewRecord[],
): Promise<void> {
  const sorted = [...records].sort((a, b) => (a.digest < b.digest ? -1 : 1));
  for (const { digest, bytes } of sorted) {
    const row = { project_id: projectId, digest: binary(digest), points: bytes.length / 16, content: bytes };
    await transaction(TABLE)
      .insert({ ...row, created_at: new Date() })
      .onConflict(["project_id", "digest"])
      .ignore();
  }
}

/** Bytes that the records of a project hold; the project is locked until the transaction ends. */
export async function lockRecordBytes(transaction: Database, projectId: string): Promise<number> {
  await transaction("projects").where({ id: projectId }).forUpdate().first("id");
  const [{ bytes }] = await transaction(TABLE)
    .where({ project_id: projectId })
    .select<{ bytes: string | null }[]>(transaction.raw("SUM(points) * 16 AS bytes"));
  return Number(bytes ?? 0);
}

/** Gives those of a project's records to another that it lacks. */
export async function copyRecords(
  transaction: Database,
  digests: readonly string[],
  { from, to }: { from: string; to: string },
): Promise<void> {
  if (digests.length === 0) return;
  const places = digests.map(() => "?").join(", ");
  await transaction.raw(
    `INSERT IGNORE INTO records (project_id, digest, points, content, created_at)
     SELECT ?, digest, points, content, ? FROM records AS others WHERE project_id = ? AND digest IN (${places})`,
    [to, new Date(), from, ...digests.map(binary)],
  );
}

/** Digests of a project's records whose points are not those they were named by. */
export async function findAltered(database: Database, projectId: string): Promise<string[]> {
  const rows = await database(TABLE)
    .where({ project_id: projectId })
    .whereRaw("UNHEX(SHA2(content, 256)) <> digest")
    .select<{ digest: Buffer }[]>("digest");
  return rows.map(({ digest }) => digest.toString("hex"));
}

/**
 * Removes what was added more than a day ago and what no scenario, revision or exploration names. Needs the migrations
 * account: the server's own can only add.
 */
export async function deleteUnused(database: Database): Promise<void> {
  const named = (text: string) => `LOCATE(LOWER(HEX(records.digest)), ${text}) > 0`;
  await database.raw(
    `DELETE FROM records
     WHERE created_at < UTC_TIMESTAMP(3) - INTERVAL 1 DAY
       AND NOT EXISTS (SELECT 1 FROM revisions WHERE revisions.project_id = records.project_id
                       AND ${named("revisions.content")})
       AND NOT EXISTS (SELECT 1 FROM scenarios
                       LEFT JOIN explorations ON explorations.scenario_id = scenarios.id
                       WHERE scenarios.project_id = records.project_id
                       AND (${["scenarios.content", "scenarios.switched_off", "explorations.content"].map(named).join(" OR ")}))`,
  );
}
