import type { Knex } from "knex";

/** Title and purpose beside the content they are part of, so that a list of a thousand scenarios reads no contents. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    ALTER TABLE scenarios
      ADD COLUMN title TEXT NOT NULL DEFAULT '' AFTER version,
      ADD COLUMN purpose VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL DEFAULT 'other' AFTER title`);
  await knex.raw(`
    UPDATE scenarios
    SET title = COALESCE(JSON_VALUE(content, '$.title'), ''),
        purpose = COALESCE(JSON_VALUE(content, '$.purpose'), 'other')`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("ALTER TABLE scenarios DROP COLUMN title, DROP COLUMN purpose");
}
