import type { Knex } from "knex";

/**
 * The points a project wants looked at before a revision is accepted, as a JSON list; its trail keeps what they were.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE checklists (
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      points TEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      updated_by CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      CONSTRAINT checklists_project_id_foreign FOREIGN KEY (project_id) REFERENCES projects (id)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("checklists");
}
