import { afterAll, beforeAll, expect, it } from "vitest";
import { insertOneTimeLink } from "../../api/src/accounts/one-time-links-store.ts";
import { addMember, createProject, createScenario, emailOf, password, signUp } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let server: TestServer;
beforeAll(async () => (server = await startTestServer()));
afterAll(() => server.stop());

it("holds one line a request with its id, and no password, token, cookie or address of a whole run", async () => {
  const ada = await signUp(server, "Ada");
  const bo = await signUp(server, "Bo");
  const projectId = await createProject(ada, "Secret refit");
  await addMember(ada, projectId, bo.email, "reader");
  await createScenario(ada, projectId);
  const token = await insertOneTimeLink(server.database, { email: emailOf("Cy"), makesAdministrator: true });
  await server.browser().send("GET", `/welcome/${token}?from=${emailOf("Cy")}`);
  const cy = await server.browser().open();
  await cy.get("claimAccount", { body: { token, name: "Cy", password } });
  await cy.fail("signIn", { body: { email: ada.email, password: "a wrong password" } });
  // A failing statement: its message would hold what was typed.
  await server.database.schema.renameTable("activity", "activity_away");
  const failed = await ada.fail("createProject", { body: { name: "Unlucky", description: "Confidential" } });
  await server.database.schema.renameTable("activity_away", "activity");
  expect(failed.status).toBe(500);
  expect(failed.message).toContain(failed.headers.get("X-Request-Id"));

  const log = server.log.join("");
  const secrets = [password, "a wrong password", token, ada.csrfToken, bo.csrfToken, cy.csrfToken, "workshop.example"];
  const cookies = [ada, bo, cy].map(({ cookie }) => decodeURIComponent(cookie!).split(/[:.]/)[1]);
  for (const secret of [...secrets, ...cookies, "Confidential", "argon2id", "INSERT", "insert into"]) {
    expect(log).not.toContain(secret);
  }
  const lines = server.log.map((line) => JSON.parse(line) as { id?: string; request?: object; err?: object });
  expect(lines.some(({ id, err }) => id === failed.headers.get("X-Request-Id") && err)).toBe(true);
  expect(lines.filter(({ request }) => request).length).toBeGreaterThan(10);
  expect(log).toContain('"path":"/welcome/…"');
});
