import type { Knex } from "knex";

/** People who can sign in. `email_normalised` decides what counts as the same address; `email` is as it was typed. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE accounts (
      id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      name VARCHAR(80) NOT NULL,
      email VARCHAR(254) NOT NULL,
      email_normalised VARCHAR(254) COLLATE utf8mb4_bin NOT NULL,
      password_hash VARCHAR(255) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      is_administrator BOOLEAN NOT NULL DEFAULT FALSE,
      created_at DATETIME(3) NOT NULL,
      updated_at DATETIME(3) NOT NULL,
      UNIQUE INDEX accounts_email_normalised_unique (email_normalised)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("accounts");
}
