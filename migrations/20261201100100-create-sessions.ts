import type { Knex } from "knex";

/** Signed-in browsers. Column names are those of the session store; `sid` holds a SHA-256 of the cookie's id. */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE sessions (
      sid VARCHAR(64) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      sess JSON NOT NULL,
      expired DATETIME(3) NOT NULL,
      INDEX sessions_expired_index (expired)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("sessions");
}
