import type { Knex } from "knex";

/**
 * What waits for a person. Closed once it was looked at, or once it is done by anybody.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE notices (
      id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      account_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      revision_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      comment_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
      kind VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      by_account_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      created_at DATETIME(3) NOT NULL,
      closed_at DATETIME(3) NULL,
      INDEX notices_account_id_closed_at_index (account_id, closed_at),
      INDEX notices_revision_id_index (revision_id)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("notices");
}
