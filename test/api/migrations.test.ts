import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { migrations } from "../../migrations/index.ts";
import { chainedTables } from "../../api/src/chain/chained-tables.ts";
import { openDatabase } from "../../api/src/database/database.ts";
import { migrateDown, migrateUp } from "../../api/src/database/migrate.ts";
import { createTestDatabase, type TestDatabase } from "../support/test-database.ts";

describe("the migrations", () => {
  let own: TestDatabase;
  beforeAll(async () => (own = await createTestDatabase({ isMigrated: false })));
  afterAll(() => own.drop());

  const schema = async () => {
    const [columns] = await own.database.raw<[object[]]>(
      "SELECT table_name, column_name, column_type, collation_name, is_nullable, column_key FROM information_schema.columns WHERE table_schema = DATABASE() ORDER BY table_name, ordinal_position",
    );
    return columns;
  };
  const tables = async () => {
    const [rows] = await own.database.raw<[Record<string, string>[]]>("SHOW TABLES");
    return rows.map((row) => Object.values(row)[0]).filter((name) => !name.startsWith("knex_"));
  };

  it("go up, down and up again to the same schema", async () => {
    expect(await migrateUp(own.database)).toEqual(migrations.map(({ name }) => name));
    const first = await schema();
    expect(await migrateDown(own.database)).toHaveLength(migrations.length);
    expect(await tables()).toEqual([]);
    await migrateUp(own.database);
    expect(await schema()).toEqual(first);
    expect(await migrateUp(own.database)).toEqual([]);
  });

  it("are named by time and what they do, in order", () => {
    const names = migrations.map(({ name }) => name);
    expect(names).toEqual([...names].sort());
    for (const name of names) expect(name).toMatch(/^\d{14}-[a-z-]+$/);
  });

  it("keep to our names: unique indexes by table and column, times in milliseconds", async () => {
    const [indexes] = await own.database.raw<[{ name: string; table: string; columns: string }[]]>(
      "SELECT index_name AS name, table_name AS `table`, GROUP_CONCAT(column_name ORDER BY seq_in_index SEPARATOR '_') AS columns FROM information_schema.statistics WHERE table_schema = DATABASE() AND non_unique = 0 AND index_name <> 'PRIMARY' GROUP BY table_name, index_name",
    );
    for (const { name, table, columns } of indexes) expect(name).toBe(`${table}_${columns}_unique`);
    expect(indexes.length).toBeGreaterThan(0);
    const [times] = await own.database.raw<[{ type: string; name: string }[]]>(
      "SELECT column_type AS type, column_name AS name FROM information_schema.columns WHERE table_schema = DATABASE() AND data_type IN ('datetime', 'timestamp') AND table_name NOT LIKE 'knex%'",
    );
    for (const { type } of times) expect(type).toBe("datetime(3)");
  });
});

describe("the server's database account", () => {
  let own: TestDatabase;
  beforeAll(async () => (own = await createTestDatabase()));
  afterAll(() => own.drop());

  it("can add to the trail and what was frozen, said and decided, and neither change nor remove it", async () => {
    const server = openDatabase(own.url);
    const row = { account_id: crypto.randomUUID(), act: "account.signed-up", detail: "{}", created_at: new Date() };
    const link = { sequence: 1, previous_hash: Buffer.alloc(32), hash: Buffer.alloc(32) };
    await server("activity").insert({ ...row, ...link });
    expect(await server("activity").select("act")).toHaveLength(1);
    const denied = { errno: 1142 };
    for (const table of chainedTables) {
      await expect(server(table).update({ sequence: 2 })).rejects.toMatchObject(denied);
      await expect(server(table).delete()).rejects.toMatchObject(denied);
      await expect(server.raw("TRUNCATE ??", [table])).rejects.toMatchObject(denied);
      await expect(server.raw("REPLACE INTO ?? SELECT * FROM ??", [table, table])).rejects.toMatchObject(denied);
    }
    await server.destroy();
  });

  it("can change no table and see no other database", async () => {
    const server = openDatabase(own.url);
    for (const statement of ["CREATE TABLE x (y INT)", "ALTER TABLE accounts ADD x INT", "DROP TABLE activity"]) {
      await expect(server.raw(statement)).rejects.toMatchObject({ errno: 1142 });
    }
    await expect(server.raw("DELETE FROM knex_migrations")).rejects.toMatchObject({ errno: 1142 });
    await expect(server.raw("SELECT * FROM mysql.user")).rejects.toMatchObject({ errno: 1142 });
    await server.destroy();
  });
});

describe("what the database compares", () => {
  let own: TestDatabase;
  beforeAll(async () => (own = await createTestDatabase()));
  afterAll(() => own.drop());

  it("tells look-alike addresses apart, byte by byte", async () => {
    const insert = (email: string) =>
      own.database("accounts").insert({
        ...{ id: crypto.randomUUID(), name: "x", email, email_normalised: email, password_hash: "x" },
        ...{ created_at: new Date(), updated_at: new Date() },
      });
    // Composed, decomposed, a Greek omicron, another case.
    for (const name of ["jose", "jos\u00e9", "jose\u0301", "j\u03bfse", "Jose"]) await insert(`${name}@x.example`);
    await expect(insert("jose@x.example")).rejects.toMatchObject({ errno: 1062 });
  });
});
