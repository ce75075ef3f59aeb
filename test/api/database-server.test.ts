import { mkdir, mkdtemp, readFile, rm, stat, writeFile } from "node:fs/promises";
import { createServer, type Server } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { type DatabaseServer, openDatabaseServer } from "../../api/scripts/database-server.mjs";
import { openDatabase } from "../../api/src/database/database.ts";

let folder: string;
const opened: DatabaseServer[] = [];
beforeEach(async () => (folder = await mkdtemp(join(tmpdir(), "server-"))));
afterEach(async () => {
  for (const server of opened.splice(0)) await server.stop();
  await rm(folder, { recursive: true });
});

async function open(at = folder): Promise<DatabaseServer> {
  const server = await openDatabaseServer(at);
  opened.push(server);
  return server;
}

async function query(url: string, statement: string): Promise<object[]> {
  const database = openDatabase(url);
  try {
    const [rows] = await database.raw<[object[]]>(statement);
    return rows;
  } finally {
    await database.destroy();
  }
}

describe("the database of a folder", () => {
  it("keeps what was written when its server was killed, and starts again on the same port", async () => {
    const first = await open();
    await query(first.urls.migrations, "CREATE TABLE kept (x INT)");
    await query(first.urls.migrations, "INSERT INTO kept VALUES (7)");
    process.kill(first.pid, "SIGKILL");
    await first.lost;
    const second = await open();
    expect(second.port).toBe(first.port);
    expect(await query(second.urls.migrations, "SELECT x FROM kept")).toEqual([{ x: 7 }]);
  });

  it("is used as it is where its server runs already, left by a start that was killed", async () => {
    const first = await open();
    const second = await open();
    expect([second.pid, second.urls]).toEqual([first.pid, first.urls]);
    await second.stop();
    await first.lost;
  });

  it("does not mind that its files name another living process, or that somebody else has its port", async () => {
    const first = await open();
    await first.stop();
    await writeFile(join(folder, "pid"), String(process.pid));
    const other = await listen(first.port);
    const second = await open();
    expect(second.port).not.toBe(first.port);
    expect(await query(second.urls.migrations, "SELECT 1 AS one")).toEqual([{ one: 1 }]);
    await new Promise((resolve) => other.close(resolve));
  });

  it("is laid out anew where the first time was cut off", async () => {
    await mkdir(join(folder, "data.unfinished/mysql"), { recursive: true });
    const server = await open();
    expect(await query(server.urls.migrations, "SELECT 1 AS one")).toEqual([{ one: 1 }]);
  });

  it("starts in a folder too deep for a socket", async () => {
    const deep = join(folder, "a".repeat(60), "b".repeat(60));
    const server = await open(deep);
    expect(await query(server.urls.migrations, "SELECT 1 AS one")).toEqual([{ one: 1 }]);
  });

  it("lets nobody in without the passwords, which only the owner of the folder can read", async () => {
    const server = await open();
    for (const account of ["root", "root:", "migrations", "server", "", "anybody"]) {
      const url = `mysql://${account}@127.0.0.1:${server.port}/mysql`;
      await expect(query(url, "SELECT 1")).rejects.toMatchObject({ errno: 1045 });
    }
    for (const file of ["passwords.json", "port"]) expect((await stat(join(folder, file))).mode & 0o077).toBe(0);
    expect((await stat(folder)).mode & 0o077).toBe(0);
    await expect(readFile(join(folder, "init.sql"))).rejects.toMatchObject({ code: "ENOENT" });
  });

  it("listens on loopback only", async () => {
    const server = await open();
    const rows = await query(`${server.urls.root}/mysql`, "SHOW VARIABLES LIKE 'bind_address'");
    expect(rows).toEqual([{ Variable_name: "bind_address", Value: "127.0.0.1" }]);
  });
});

function listen(port: number): Promise<Server> {
  return new Promise((resolve) => {
    const server = createServer((socket) => socket.destroy());
    server.listen(port, "127.0.0.1", () => resolve(server));
  });
}
