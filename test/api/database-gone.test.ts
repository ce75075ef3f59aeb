import { mkdtemp, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { afterAll, beforeAll, expect, it } from "vitest";
import { type DatabaseServer, openDatabaseServer } from "../../api/scripts/database-server.mjs";
import type { Project } from "../../api/src/contract.ts";
import { openDatabase } from "../../api/src/database/database.ts";
import { grantToServer } from "../../api/src/database/grants.ts";
import { migrateUp } from "../../api/src/database/migrate.ts";
import { createProject, signUp } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let folder: string;
let mariadb: DatabaseServer;
let server: TestServer;

beforeAll(async () => {
  folder = await mkdtemp(join(tmpdir(), "gone-"));
  mariadb = await openDatabaseServer(folder);
  const database = openDatabase(mariadb.urls.migrations);
  await migrateUp(database);
  await grantToServer(database, mariadb.grantTo);
  await database.destroy();
  server = await startTestServer({ databaseUrl: mariadb.urls.server });
});
afterAll(async () => {
  await server.stop();
  await mariadb.stop();
  await rm(folder, { recursive: true });
});

it("answers 503 with a sentence while the database is gone, keeps running, and works within 5 s of its return", async () => {
  const ada = await signUp(server, "Ada");
  const projectId = await createProject(ada, "Kept");

  process.kill(mariadb.pid, "SIGKILL");
  await mariadb.lost;
  const requests = [
    () => ada.fail("listProjects"),
    () => ada.fail("readProject", { params: { projectId } }),
    () => ada.fail("createProject", { body: { name: "Lost", description: "" } }),
    () => ada.fail("readSession"),
    () => server.browser().fail("readSession"),
    () => server.browser().fail("signIn", { body: { email: ada.email, password: "x" } }),
  ];
  // Several at once and twice over: connections of the pool, broken ones and new ones.
  for (const round of [requests, requests]) {
    const start = performance.now();
    for (const failure of await Promise.all(round.map((request) => request()))) {
      // Who has no session is refused before the database is asked for anything.
      if (failure.code === "csrf-token") continue;
      expect(failure).toMatchObject({ status: 503, code: "database-gone", fields: [] });
      expect(failure.message).toMatch(/database does not answer/);
      expect(Number(failure.headers.get("Retry-After"))).toBeGreaterThan(0);
    }
    expect(performance.now() - start).toBeLessThan(5000);
  }
  expect((await server.browser().send("GET", "/health")).status).toBe(200);
  expect((await server.browser().send("GET", "/ready")).status).toBe(503);

  mariadb = await openDatabaseServer(folder);
  const back = performance.now();
  while ((await ada.call("readSession")).status !== 200) await sleep(50);
  expect(performance.now() - back).toBeLessThan(5000);
  // Signed in as before, and what was acknowledged is there.
  expect(await ada.get<Project[]>("listProjects")).toMatchObject([{ id: projectId, name: "Kept" }]);
  await createProject(ada, "After");
});
