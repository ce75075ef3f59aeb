import type { Knex } from "knex";

/**
 * Who made a scenario: its first version is their work, however often others saved it since. For scenarios made before
 * this, the trail says who; where it does not, for tables of cases, whoever saved last stands in.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    ALTER TABLE scenarios
      ADD COLUMN created_by CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL AFTER created_at`);
  await knex.raw(`
    UPDATE scenarios
    SET created_by = COALESCE(
      (SELECT account_id FROM activity
       WHERE subject_id = scenarios.id AND act IN ('scenario.created', 'scenario.duplicated')
       ORDER BY activity.id LIMIT 1),
      updated_by)`);
  await knex.raw(`
    ALTER TABLE scenarios
      MODIFY COLUMN created_by CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw("ALTER TABLE scenarios DROP COLUMN created_by");
}
