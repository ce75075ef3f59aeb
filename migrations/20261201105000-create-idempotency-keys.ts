import type { Knex } from "knex";

/**
 * Requests that act once, however often they are sent: the key their sender has given them, what was asked (its SHA-256) and
 * what was answered. `status` is null while it is under way; `answer` is null then, and where it is too long to be kept.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE idempotency_keys (
      account_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      idempotency_key VARCHAR(100) CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      request_digest BINARY(32) NOT NULL,
      status SMALLINT UNSIGNED NULL,
      answer MEDIUMTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NULL,
      created_at DATETIME(3) NOT NULL,
      PRIMARY KEY (account_id, idempotency_key)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("idempotency_keys");
}
