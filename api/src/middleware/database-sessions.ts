import { createHash } from "node:crypto";
import { ConnectSessionKnexStore } from "connect-session-knex";
import { type SessionData, Store } from "express-session";
import type { Database } from "../database/database.ts";

const TABLE = "sessions";
const CLEANUP_MILLISECONDS = 10 * 60 * 1000;

type Done = (error?: unknown) => void;

/**
 * Sessions in the database, with what the package alone does not give:
 * an id is stored as its SHA-256, so that who reads the table cannot take over a session; a failing database reaches the
 * callback once and never the process; a session that was ended stays ended, even where a request that began before
 * still wants to save it.
 */
export class DatabaseSessions extends Store {
  readonly #database: Database;
  readonly #kept: ConnectSessionKnexStore;

  constructor(database: Database, onCleanupError: (error: unknown) => void) {
    super();
    this.#database = database;
    this.#kept = new ConnectSessionKnexStore({
      knex: database,
      tableName: TABLE,
      createTable: false,
      cleanupInterval: CLEANUP_MILLISECONDS,
      onDbCleanupError: onCleanupError,
    });
  }

  override get(id: string, done: (error: unknown, session?: SessionData | null) => void): void {
    this.#kept.get(hashOf(id), ignore).then((session) => done(null, session), done);
  }

  override set(id: string, session: SessionData, done: Done = ignore): void {
    const work = session.isStored
      ? this.#renew(id, session)
      : this.#kept.set(hashOf(id), { ...session, isStored: true });
    work.then(() => done(), done);
  }

  override destroy(id: string, done: Done = ignore): void {
    this.#kept.destroy(hashOf(id)).then(() => done(), done);
  }

  /** Nothing: `ageSession` marks a session as seen, which saves it, once a minute instead of at every request. */
  override touch(_id: string, _session: SessionData, done: () => void = ignore): void {
    done();
  }

  async #renew(id: string, session: SessionData): Promise<void> {
    await this.#database(TABLE)
      .where({ sid: hashOf(id) })
      .update({ sess: JSON.stringify(session), expired: new Date(Date.now() + (session.cookie.maxAge ?? 0)) });
  }
}

/** Ends every session of an account, wherever it is signed in. */
export async function endSessionsOf(database: Database, accountId: string): Promise<void> {
  await database(TABLE).whereRaw("JSON_VALUE(sess, '$.accountId') = ?", [accountId]).delete();
}

function ignore(): void {}

function hashOf(id: string): string {
  return createHash("sha256").update(id).digest("hex");
}
