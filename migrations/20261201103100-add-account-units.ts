import type { Knex } from "knex";

/** The units a person thinks in. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    ALTER TABLE accounts
      ADD COLUMN units ENUM('millimetre', 'metre', 'inch') NOT NULL DEFAULT 'millimetre' AFTER is_administrator`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("ALTER TABLE accounts DROP COLUMN units");
}
