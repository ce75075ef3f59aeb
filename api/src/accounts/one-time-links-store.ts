import { createHash, randomBytes } from "node:crypto";
import type { Database } from "../database/database.ts";

const TABLE = "one_time_links";
const LIFETIME_DAYS = 7;

export interface OneTimeLink {
  readonly email: string;
  readonly makesAdministrator: boolean;
}

interface LinkRow {
  email: string;
  makes_administrator: number;
}

/** Keeps a link for seven days and returns its token: 256 random bits, of which only the SHA-256 is stored. */
export async function insertOneTimeLink(database: Database, link: OneTimeLink): Promise<string> {
  const token = randomBytes(32).toString("base64url");
  const now = Date.now();
  await database(TABLE).insert({
    token_hash: hashOf(token),
    email: link.email,
    makes_administrator: link.makesAdministrator,
    created_at: new Date(now),
    expires_at: new Date(now + LIFETIME_DAYS * 24 * 3600 * 1000),
  });
  return token;
}

/** Reads what a token stands for, or null where it is unknown, used or too old. */
export async function findOneTimeLink(database: Database, token: string): Promise<OneTimeLink | null> {
  const [row] = await stillGood(database, token).select<LinkRow[]>("email", "makes_administrator");
  return row ? { email: row.email, makesAdministrator: row.makes_administrator === 1 } : null;
}

/** Marks a token used; false where another request was first, so that exactly one of them goes on. */
export async function useOneTimeLink(database: Database, token: string): Promise<boolean> {
  return (await stillGood(database, token).update({ used_at: new Date() })) === 1;
}

function stillGood(database: Database, token: string) {
  return database(TABLE)
    .where({ token_hash: hashOf(token), used_at: null })
    .where("expires_at", ">", new Date());
}

function hashOf(token: string): Buffer {
  return createHash("sha256").update(token).digest();
}
