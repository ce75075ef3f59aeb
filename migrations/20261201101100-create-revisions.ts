import type { Knex } from "knex";

/**
 * Frozen scenarios, only ever added. `content` is the canonical text, byte for byte, `digest` its SHA-256; `result`,
 * `trace` and `without_origin` are JSON as written. No foreign keys, so that nothing can cascade into it.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE revisions (
      id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      scenario_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      number INT UNSIGNED NOT NULL,
      scenario_version INT UNSIGNED NOT NULL,
      title TEXT NOT NULL,
      content LONGTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      digest BINARY(32) NOT NULL,
      units VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      solver_version VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      is_recomputed BOOLEAN NOT NULL,
      is_sensitive BOOLEAN NOT NULL,
      outcome VARCHAR(20) CHARACTER SET ascii COLLATE ascii_bin NULL,
      limits_kept SMALLINT UNSIGNED NOT NULL,
      limits_set SMALLINT UNSIGNED NOT NULL,
      result LONGTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      trace MEDIUMTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      without_origin TEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      frozen_by CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      frozen_at DATETIME(3) NOT NULL,
      sequence INT UNSIGNED NOT NULL,
      previous_hash BINARY(32) NOT NULL,
      hash BINARY(32) NOT NULL,
      signature BINARY(64) NULL,
      signed_by BINARY(32) NULL,
      UNIQUE INDEX revisions_scenario_id_number_unique (scenario_id, number),
      UNIQUE INDEX revisions_project_id_sequence_unique (project_id, sequence)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("revisions");
}
