import { createHash } from "node:crypto";
import type { Knex } from "knex";

/** Stands for "no project" where a project's id is the key. */
const NOWHERE = "00000000-0000-0000-0000-000000000000";
const BATCH = 1000;

/**
 * The head of each project's chain: how many rows there are, the hash of the last, and the server's signature on both, so
 * that neither a row nor the end of the trail goes unnoticed. Acts that concern no project have a chain of their own.
 * The trail as it stands is chained in its order; its heads are signed by whoever holds the key.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE chains (
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL PRIMARY KEY,
      sequence INT UNSIGNED NOT NULL,
      hash BINARY(32) NOT NULL,
      signature BINARY(64) NULL,
      signed_by BINARY(32) NULL
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  await knex.raw("ALTER TABLE activity ADD COLUMN sequence INT UNSIGNED NULL AFTER created_at");
  const heads = new Map<string, Head>([[NOWHERE, start]]);
  for (const { id } of await knex<{ id: string }>("projects").select("id")) heads.set(id, start);
  await chainRows(knex, heads);
  await knex("chains").insert([...heads].map(([project_id, head]) => ({ project_id, ...head })));
  await knex.raw(`
    ALTER TABLE activity
      MODIFY COLUMN sequence INT UNSIGNED NOT NULL,
      MODIFY COLUMN previous_hash BINARY(32) NOT NULL,
      MODIFY COLUMN hash BINARY(32) NOT NULL,
      ADD INDEX activity_project_id_sequence_index (project_id, sequence),
      ADD INDEX activity_subject_id_index (subject_id)`);
}

export async function down(knex: Knex): Promise<void> {
  await knex.raw(`
    ALTER TABLE activity
      DROP INDEX activity_subject_id_index,
      DROP INDEX activity_project_id_sequence_index,
      DROP COLUMN sequence,
      MODIFY COLUMN previous_hash BINARY(32) NULL,
      MODIFY COLUMN hash BINARY(32) NULL`);
  await knex("activity").update({ previous_hash: null, hash: null });
  await knex.schema.dropTable("chains");
}

interface Head {
  sequence: number;
  hash: Buffer;
}

const start: Head = { sequence: 0, hash: Buffer.alloc(32) };

interface Row {
  id: number;
  project_id: string | null;
  account_id: string;
  act: string;
  subject_id: string | null;
  detail: unknown;
  created_at: Date;
}

/** Gives each row of the trail its place and its hash, oldest first, and moves the heads along. */
async function chainRows(knex: Knex, heads: Map<string, Head>): Promise<void> {
  let after = 0;
  for (;;) {
    const rows = await knex("activity").where("id", ">", after).orderBy("id").limit(BATCH).select<Row[]>("*");
    for (const row of rows) {
      const key = row.project_id ?? NOWHERE;
      const previous = heads.get(key) ?? start;
      const head = { sequence: previous.sequence + 1, hash: hashOf(row, previous) };
      await knex("activity")
        .where({ id: row.id })
        .update({ ...head, previous_hash: previous.hash });
      heads.set(key, head);
      after = Number(row.id);
    }
    if (rows.length < BATCH) return;
  }
}

/** SHA-256 of the row as sorted JSON, what is null left out: as the server hashes what it adds. */
function hashOf(row: Row, previous: Head): Buffer {
  const { id: _id, detail, created_at: at, ...rest } = row;
  const content = {
    ...{ account_id: rest.account_id, act: rest.act, project_id: rest.project_id, subject_id: rest.subject_id },
    ...{ created_at: at.toISOString(), detail: typeof detail === "string" ? (JSON.parse(detail) as unknown) : detail },
  };
  const text = { previous: previous.hash.toString("hex"), row: content, sequence: previous.sequence + 1 };
  return createHash("sha256")
    .update(sortedJson({ ...text, table: "activity" }))
    .digest();
}

function sortedJson(value: unknown): string {
  if (typeof value !== "object" || value === null) return JSON.stringify(value);
  if (Array.isArray(value)) return `[${value.map(sortedJson).join(",")}]`;
  const members = Object.entries(value).filter(([, member]) => member !== null && member !== undefined);
  members.sort(([a], [b]) => (a < b ? -1 : 1));
  return `{${members.map(([key, member]) => `${JSON.stringify(key)}:${sortedJson(member)}`).join(",")}}`;
}
