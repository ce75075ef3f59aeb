import type { Knex } from "knex";

/**
 * Who ran a revision again, when, which way, and what came of it; only ever added. `report` is JSON as written.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE replays (
      id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      revision_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      way ENUM('same-method', 'other-method', 'tolerances', 'script') NOT NULL,
      verdict ENUM('agrees', 'differs', 'sensitive') NOT NULL,
      report LONGTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      replayed_by CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      replayed_at DATETIME(3) NOT NULL,
      sequence INT UNSIGNED NOT NULL,
      previous_hash BINARY(32) NOT NULL,
      hash BINARY(32) NOT NULL,
      INDEX replays_revision_id_index (revision_id),
      UNIQUE INDEX replays_project_id_sequence_unique (project_id, sequence)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("replays");
}
