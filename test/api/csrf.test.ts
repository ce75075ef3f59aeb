import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { type RouteName, routes } from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import { createProject, createScenario, emailOf, password, signUp, smallScenario } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

const unsafe = (Object.keys(routes) as RouteName[]).filter((name) => routes[name].method !== "GET");

let server: TestServer;
let owner: Browser & { accountId: string };
let params: { projectId: string; scenarioId: string; accountId: string };

beforeAll(async () => {
  server = await startTestServer();
  owner = await signUp(server, "Ada");
  const projectId = await createProject(owner);
  params = { projectId, scenarioId: (await createScenario(owner, projectId)).id, accountId: owner.accountId };
});
afterAll(() => server.stop());

/** A request that would succeed, or fail for another reason than where it comes from. */
const requests: Record<string, { body?: object; version?: number }> = {
  signUp: { body: { name: "Bo", email: emailOf("Bo"), password } },
  claimAccount: { body: { token: "a token that nobody ever gave out", name: "Bo", password } },
  changeAccount: { body: { units: "inch" } },
  signIn: { body: { email: emailOf("Ada"), password } },
  createProject: { body: { name: "Hall 4", description: "" } },
  changeProject: { body: { name: "Hall 5", description: "" } },
  addMember: { body: { email: emailOf("Ada"), role: "reader" } },
  changeMember: { body: { role: "owner" } },
  createScenario: { body: { content: smallScenario } },
  saveScenario: { body: { content: smallScenario }, version: 1 },
};

describe.each(unsafe)("%s", (name) => {
  const call = (headers: Record<string, string | undefined>) =>
    owner.call<{ error?: { code: string } }>(name, { params, ...requests[name], headers });

  it.each([
    ["without the token", { "X-CSRF-Token": undefined }, "csrf-token"],
    ["with another token", { "X-CSRF-Token": "0".repeat(64) }, "csrf-token"],
    ["from another origin", { Origin: "https://elsewhere.example" }, "cross-origin"],
    ["from an opaque origin", { Origin: "null" }, "cross-origin"],
    ["from another port", { Origin: "http://127.0.0.1:1" }, "cross-origin"],
    ["marked cross-site", { "Sec-Fetch-Site": "cross-site" }, "cross-origin"],
    ["marked same-site", { "Sec-Fetch-Site": "same-site", Origin: undefined }, "cross-origin"],
    ["from nowhere", { Origin: undefined }, "cross-origin"],
  ])("is refused %s", async (_, headers, code) => {
    const answer = await call(headers);
    expect(answer.status).toBe(403);
    expect(answer.body.error?.code).toBe(code);
  });
});

it("accepts a request that is marked as from the same origin", async () => {
  const answer = await owner.call("createProject", {
    body: { name: "Hall 6", description: "" },
    headers: { "Sec-Fetch-Site": "same-origin", Origin: undefined },
  });
  expect(answer.status).toBe(201);
});

it("needs the token of the very session", async () => {
  const other = await signUp(server, "Cy");
  const headers = { "X-CSRF-Token": other.csrfToken };
  expect((await owner.fail("createProject", { body: { name: "x", description: "" }, headers })).status).toBe(403);
});
