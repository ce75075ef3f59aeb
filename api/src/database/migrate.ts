import type { Knex } from "knex";
import { migrations } from "../../../migrations/index.ts";
import type { Database } from "./database.ts";

type Migration = (typeof migrations)[number];

/** Static imports, so that migrations survive bundling and their recorded names carry no extension. */
const migrationSource: Knex.MigrationSource<Migration> = {
  getMigrations: () => Promise.resolve(migrations),
  getMigrationName: (migration) => migration.name,
  getMigration: (migration) => Promise.resolve(migration),
};

/** Brings the database to the newest schema; does nothing where it is there already. Returns the names carried out. */
export async function migrateUp(database: Database): Promise<string[]> {
  const [, names] = (await database.migrate.latest({ migrationSource })) as [number, string[]];
  return names;
}

/** Takes every change back, newest first. */
export async function migrateDown(database: Database): Promise<string[]> {
  const [, names] = (await database.migrate.rollback({ migrationSource }, true)) as [number, string[]];
  return names;
}
