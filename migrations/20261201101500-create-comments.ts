import type { Knex } from "knex";

/**
 * The log of what was said to a revision, only ever added: comments, answers to one (`parent_id`), and that one was settled or
 * opened again. `anchor` and `mentions` are JSON as written.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE comments (
      id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      revision_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      entry ENUM('comment', 'answer', 'settle', 'reopen') NOT NULL,
      parent_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
      anchor TEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NULL,
      words TEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NULL,
      mentions TEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NULL,
      said_by CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      said_at DATETIME(3) NOT NULL,
      sequence INT UNSIGNED NOT NULL,
      previous_hash BINARY(32) NOT NULL,
      hash BINARY(32) NOT NULL,
      INDEX comments_revision_id_index (revision_id),
      UNIQUE INDEX comments_project_id_sequence_unique (project_id, sequence)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("comments");
}
