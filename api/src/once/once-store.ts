import type { Database } from "../database/database.ts";
import { isDuplicate } from "../database/database-errors.ts";

const TABLE = "idempotency_keys";
const LIFETIME_MS = 24 * 3600 * 1000;

/** A request by the key its sender has given it. */
export interface Keyed {
  readonly accountId: string;
  readonly key: string;
}

/** What there is of a request: `status` null while it is under way, `answer` null where it was too long to be kept. */
export interface Known {
  readonly requestDigest: Buffer;
  readonly status: number | null;
  readonly answer: string | null;
}

const rowOf = ({ accountId, key }: Keyed) => ({ account_id: accountId, idempotency_key: key });

/** Keeps that a request is under way; false where its key is known. What is older than 24 hours is forgotten first. */
export async function insertKey(database: Database, keyed: Keyed, requestDigest: Buffer): Promise<boolean> {
  const now = Date.now();
  await database(TABLE)
    .where({ account_id: keyed.accountId })
    .where("created_at", "<", new Date(now - LIFETIME_MS))
    .delete();
  try {
    await database(TABLE).insert({ ...rowOf(keyed), request_digest: requestDigest, created_at: new Date(now) });
    return true;
  } catch (error) {
    if (isDuplicate(error, "PRIMARY")) return false;
    throw error;
  }
}

export async function findKey(database: Database, keyed: Keyed): Promise<Known | null> {
  const row = await database(TABLE)
    .where(rowOf(keyed))
    .first<{ request_digest: Buffer; status: number | null; answer: string | null } | undefined>(
      "request_digest",
      "status",
      "answer",
    );
  return row ? { requestDigest: row.request_digest, status: row.status, answer: row.answer } : null;
}

export async function updateKey(
  database: Database,
  keyed: Keyed,
  { status, answer }: Omit<Known, "requestDigest">,
): Promise<void> {
  await database(TABLE).where(rowOf(keyed)).update({ status, answer });
}

export async function deleteKey(database: Database, keyed: Keyed): Promise<void> {
  await database(TABLE).where(rowOf(keyed)).delete();
}
