import { addedTables } from "../chain/chained-tables.ts";
import type { Database } from "./database.ts";

/** Tables to which the server only ever adds: its account can neither change nor remove what stands there. */
const appendOnly = new Set<string>(addedTables);

/** Tables the server's account has no business with. */
const closed = new Set(["knex_migrations_lock"]);

/**
 * Gives the server's account what it needs on each table and nothing more. Run by the migrations account after each
 * migration; it needs the right to grant.
 *
 * @param account `'name'@'host'`, quoted as SQL has it
 */
export async function grantToServer(database: Database, account: string): Promise<void> {
  const [rows] = await database.raw<[Record<string, string>[]]>("SHOW TABLES");
  for (const table of rows.map((row) => Object.values(row)[0])) {
    if (!closed.has(table)) await database.raw(`GRANT ${privilegesOn(table)} ON ?? TO ${account}`, [table]);
  }
}

function privilegesOn(table: string): string {
  if (table === "knex_migrations") return "SELECT";
  return appendOnly.has(table) ? "SELECT, INSERT" : "SELECT, INSERT, UPDATE, DELETE";
}
