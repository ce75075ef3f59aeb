import type { Knex } from "knex";

/** Counted attempts, in the columns of the limiter: `expire` in milliseconds since 1970. Keys are digests, never addresses. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE throttles (
      \`key\` VARCHAR(255) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      points INT NOT NULL DEFAULT 0,
      expire BIGINT UNSIGNED NULL,
      INDEX throttles_expire_index (expire)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("throttles");
}
