import { createHash } from "node:crypto";
import type { Knex } from "knex";

/** Records longer than this are named by their digest in what is kept. */
const INLINE_POINTS = 1000;

/**
 * The points of long records, once for each project, named by the SHA-256 of their bytes (times, then values, as
 * little-endian Float64); only ever added. Scenarios and explorations that hold such points so far name them from now on.
 */
export async function up(knex: Knex): Promise<void> {
  await knex.raw(`
    CREATE TABLE records (
      project_id CHAR(36) CHARACTER SET ascii COLLATE ascii_bin NOT NULL,
      digest BINARY(32) NOT NULL,
      points INT UNSIGNED NOT NULL,
      content MEDIUMBLOB NOT NULL,
      created_at DATETIME(3) NOT NULL,
      PRIMARY KEY (project_id, digest)
    ) ENGINE = InnoDB DEFAULT CHARACTER SET utf8mb4 COLLATE utf8mb4_unicode_ci`);
  await rewrite(knex, (value, projectId) => keep(knex, value, projectId));
}

export async function down(knex: Knex): Promise<void> {
  await rewrite(knex, (value, projectId) => restore(knex, value, projectId));
  await knex.schema.dropTable("records");
}

type Change = (value: unknown, projectId: string) => Promise<unknown>;

/** Writes every text anew that may hold a record, one at a time. */
async function rewrite(knex: Knex, change: Change): Promise<void> {
  const scenarios = await knex("scenarios").select<{ id: string; project_id: string }[]>("id", "project_id");
  for (const { id, project_id: projectId } of scenarios) {
    await rewriteRow(knex, "scenarios", id, projectId, ["content", "switched_off"], change);
    const explorations = await knex("explorations").where({ scenario_id: id }).select<{ id: string }[]>("id");
    for (const each of explorations) await rewriteRow(knex, "explorations", each.id, projectId, ["content"], change);
  }
}

async function rewriteRow(
  knex: Knex,
  table: string,
  id: string,
  projectId: string,
  columns: readonly string[],
  change: Change,
): Promise<void> {
  const row = await knex(table)
    .where({ id })
    .first<Record<string, string>>([...columns]);
  for (const column of columns) {
    const text = JSON.stringify(await change(JSON.parse(row[column]), projectId));
    if (text !== row[column])
      await knex(table)
        .where({ id })
        .update({ [column]: text });
  }
}

/** The value with each long record in it kept and named. */
async function keep(knex: Knex, value: unknown, projectId: string): Promise<unknown> {
  if (!isLongRecord(value)) return changed(value, (inner) => keep(knex, inner, projectId));
  const { kind, times, values } = value;
  const content = bytesOf([...times, ...values]);
  const digest = createHash("sha256").update(content).digest();
  await knex("records")
    .insert({ project_id: projectId, digest, points: times.length, content, created_at: new Date() })
    .onConflict(["project_id", "digest"])
    .ignore();
  return { digest: digest.toString("hex"), kind, points: times.length };
}

/** The value with the points of each record that is named in it. */
async function restore(knex: Knex, value: unknown, projectId: string): Promise<unknown> {
  if (!isNamedRecord(value)) return changed(value, (inner) => restore(knex, inner, projectId));
  const row = await knex("records")
    .where({ project_id: projectId, digest: Buffer.from(value.digest, "hex") })
    .first<{ content: Buffer } | undefined>("content");
  if (!row) return value;
  const all = Array.from({ length: row.content.length / 8 }, (_, i) => row.content.readDoubleLE(8 * i));
  return { kind: value.kind, times: all.slice(0, value.points), values: all.slice(value.points) };
}

/** Lists and objects with their members changed; numbers in lists are left alone, there may be many. */
async function changed(value: unknown, change: (inner: unknown) => Promise<unknown>): Promise<unknown> {
  if (typeof value !== "object" || value === null) return value;
  if (Array.isArray(value)) return typeof value[0] === "object" ? Promise.all(value.map(change)) : value;
  const members = Object.entries(value).map(async ([key, inner]) => [key, await change(inner)] as const);
  return Object.fromEntries(await Promise.all(members));
}

function bytesOf(numbers: readonly number[]): Buffer {
  const bytes = Buffer.alloc(8 * numbers.length);
  numbers.forEach((number, i) => bytes.writeDoubleLE(number + 0, 8 * i));
  return bytes;
}

function isLongRecord(value: unknown): value is { kind: string; times: number[]; values: number[] } {
  const { times } = Object(value) as { times?: unknown };
  return Array.isArray(times) && times.length > INLINE_POINTS;
}

function isNamedRecord(value: unknown): value is { kind: string; digest: string; points: number } {
  return "digest" in Object(value) && "points" in Object(value);
}
