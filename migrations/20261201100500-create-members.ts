import type { Knex } from "knex";

/** Who is in which project, and as what. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE members (
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      account_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      role ENUM('owner', 'editor', 'reviewer', 'reader') NOT NULL,
      created_at DATETIME(3) NOT NULL,
      PRIMARY KEY (project_id, account_id),
      INDEX members_account_id_index (account_id),
      CONSTRAINT members_project_id_foreign FOREIGN KEY (project_id) REFERENCES projects (id),
      CONSTRAINT members_account_id_foreign FOREIGN KEY (account_id) REFERENCES accounts (id)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("members");
}
