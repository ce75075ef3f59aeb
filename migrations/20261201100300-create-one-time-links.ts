import type { Knex } from "knex";

/** Links that make an account once. Only the SHA-256 of the token is kept; the address is bound to the link. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE one_time_links (
      token_hash BINARY(32) NOT NULL PRIMARY KEY,
      email VARCHAR(254) NOT NULL,
      makes_administrator BOOLEAN NOT NULL,
      created_at DATETIME(3) NOT NULL,
      expires_at DATETIME(3) NOT NULL,
      used_at DATETIME(3) NULL
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("one_time_links");
}
