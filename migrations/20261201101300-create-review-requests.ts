import type { Knex } from "knex";

/**
 * Who was asked to review which revision, by whom, and with what words; only ever added.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE review_requests (
      id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      revision_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      reviewer_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      message TEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      asked_by CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      asked_at DATETIME(3) NOT NULL,
      sequence INT UNSIGNED NOT NULL,
      previous_hash BINARY(32) NOT NULL,
      hash BINARY(32) NOT NULL,
      UNIQUE INDEX review_requests_revision_id_reviewer_id_unique (revision_id, reviewer_id),
      UNIQUE INDEX review_requests_project_id_sequence_unique (project_id, sequence)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("review_requests");
}
