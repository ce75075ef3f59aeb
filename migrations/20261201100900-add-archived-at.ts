import type { Knex } from "knex";

/** When a project or scenario was put away; null for those in use. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw("ALTER TABLE projects ADD COLUMN archived_at DATETIME(3) NULL");
  await knex.raw("ALTER TABLE scenarios ADD COLUMN archived_at DATETIME(3) NULL");
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("ALTER TABLE scenarios DROP COLUMN archived_at");
  await knex.raw("ALTER TABLE projects DROP COLUMN archived_at");
}
