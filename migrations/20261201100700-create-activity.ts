import type { Knex } from "knex";

/**
 * The trail: one row per act, only ever added. No foreign keys, so that nothing can cascade into it and it outlives what
 * it tells of. `previous_hash` and `hash` are for the chain that will bind each row to the one before it in its project.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE activity (
      id BIGINT UNSIGNED NOT NULL AUTO_INCREMENT PRIMARY KEY,
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
      account_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      act VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      subject_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
      detail JSON NOT NULL,
      created_at DATETIME(3) NOT NULL,
      previous_hash BINARY(32) NULL,
      hash BINARY(32) NULL,
      INDEX activity_project_id_id_index (project_id, id)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("activity");
}
