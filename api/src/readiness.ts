import { migrations } from "../../migrations/index.ts";
import type { Database } from "./database/database.ts";

/** True once the database answers and has every migration this server was built with. */
export async function isReady(database: Database): Promise<boolean> {
  const rows = await database<{ name: string }>("knex_migrations").select("name");
  const done = new Set(rows.map((row) => row.name));
  return migrations.every(({ name }) => done.has(name));
}
