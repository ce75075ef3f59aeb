import type { Knex } from "knex";

/** Terms that are switched off, as JSON, beside the content they are no part of. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    ALTER TABLE scenarios
      ADD COLUMN switched_off MEDIUMTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL DEFAULT '[]' AFTER digest`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("ALTER TABLE scenarios DROP COLUMN switched_off");
}
