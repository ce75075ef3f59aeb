import type { Knex } from "knex";

/**
 * Searches, sweeps and studies over a scenario. `content` is the scenario as it was asked of, `input_digest` that of what
 * a run reads of it. Results are rows of numbers in tiles, one row of the second table each. `runner` is the page that
 * computes it, until `runner_until`.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE explorations (
      id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      scenario_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      kind VARCHAR(10) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      title VARCHAR(200) NOT NULL,
      headline VARCHAR(400) NULL,
      content LONGTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      scenario_version INT UNSIGNED NOT NULL,
      input_digest BINARY(32) NOT NULL,
      solver_version VARCHAR(40) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      plan MEDIUMTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NOT NULL,
      answer MEDIUMTEXT CHARACTER SET utf8mb4 COLLATE utf8mb4_bin NULL,
      cells INT UNSIGNED NOT NULL,
      tile_cells TEXT CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      cell_values INT UNSIGNED NOT NULL,
      runner CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
      runner_account CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NULL,
      runner_until DATETIME(3) NULL,
      created_at DATETIME(3) NOT NULL,
      created_by CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      INDEX explorations_scenario_id_created_at_index (scenario_id, created_at),
      CONSTRAINT explorations_scenario_id_foreign FOREIGN KEY (scenario_id) REFERENCES scenarios (id) ON DELETE CASCADE,
      CONSTRAINT explorations_created_by_foreign FOREIGN KEY (created_by) REFERENCES accounts (id)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  await knex.raw(`
    CREATE TABLE exploration_tiles (
      exploration_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      number INT UNSIGNED NOT NULL,
      content MEDIUMBLOB NOT NULL,
      saved_at DATETIME(3) NOT NULL,
      PRIMARY KEY (exploration_id, number),
      CONSTRAINT exploration_tiles_exploration_id_foreign FOREIGN KEY (exploration_id) REFERENCES explorations (id) ON DELETE CASCADE
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.schema.dropTable("exploration_tiles");
  await knex.schema.dropTable("explorations");
}
