import type { Knex } from "knex";

/**
 * What was decided on a revision, signed and only ever added. A revision is decided once (`step` 1) and may be withdrawn once
 * (`step` 2). The name is kept as it was, for a signed decision outlives the account. `checklist` is JSON as written.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE decisions (
      id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      revision_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      step TINYINT UNSIGNED NOT NULL,
      kind ENUM('accept', 'return', 'self-check', 'withdraw') NOT NULL,
      reasons TEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      digest BINARY(32) NOT NULL,
      replay_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
      checklist LONGTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      decided_by CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      decided_by_name VARCHAR(80) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      decided_at DATETIME(3) NOT NULL,
      sequence INT UNSIGNED NOT NULL,
      previous_hash BINARY(32) NOT NULL,
      hash BINARY(32) NOT NULL,
      signature BINARY(64) NULL,
      signed_by BINARY(32) NULL,
      UNIQUE INDEX decisions_revision_id_step_unique (revision_id, step),
      UNIQUE INDEX decisions_project_id_sequence_unique (project_id, sequence)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("decisions");
}
