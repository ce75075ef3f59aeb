import type { Knex } from "knex";

/** Working copies. `content` is the canonical text, byte for byte; `digest` its SHA-256; `version` counts saves from 1. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE scenarios (
      id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      version INT UNSIGNED NOT NULL,
      content LONGTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      digest BINARY(32) NOT NULL,
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      updated_by CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      INDEX scenarios_project_id_updated_at_index (project_id, updated_at),
      CONSTRAINT scenarios_project_id_foreign FOREIGN KEY (project_id) REFERENCES projects (id),
      CONSTRAINT scenarios_updated_by_foreign FOREIGN KEY (updated_by) REFERENCES accounts (id)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("scenarios");
}
