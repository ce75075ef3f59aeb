import { afterAll, beforeAll, describe, expect, it } from "vitest";
import {
  type Route,
  type RouteName,
  routes,
  type ScenarioSummary,
  type StoredScenario,
} from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import { longRecord, recordScenario } from "../support/long-record.ts";
import { addMember, createProject, createScenario, signUp, smallScenario } from "../support/people.ts";
import { createRevision, freezeBody, placeOf, smallComment } from "../support/revisions.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let server: TestServer;
let ada: Browser & { accountId: string };
let projectId: string;
beforeAll(async () => {
  server = await startTestServer();
  ada = await signUp(server, "Ada");
});
afterAll(() => server.stop());

const keyed = (key: string) => ({ headers: { "Idempotency-Key": key } });
const listed = () => ada.get<ScenarioSummary[]>("listScenarios", { params: { projectId } });
const creation = (key: string, content: object = smallScenario) => ({
  ...{ params: { projectId }, body: { content }, ...keyed(key) },
});

beforeAll(async () => (projectId = await createProject(ada)));

describe("a request with a key", () => {
  it("acts once, and gets the first answer each time", async () => {
    const before = (await listed()).length;
    const request = creation("one-and-the-same-key");
    const [first, second] = [await ada.call("createScenario", request), await ada.call("createScenario", request)];
    expect([second.status, second.body]).toEqual([201, first.body]);
    expect(second.headers.get("Content-Type")).toBe(first.headers.get("Content-Type"));
    expect(await listed()).toHaveLength(before + 1);
    await ada.get("createScenario", creation("another-key-by-far"));
    expect(await listed()).toHaveLength(before + 2);
  });

  it("acts once too where several come at the same time", async () => {
    const before = (await listed()).length;
    const request = creation("many-at-the-same-time");
    const answers = await Promise.all(Array.from({ length: 8 }, () => ada.call("createScenario", request)));
    expect(await listed()).toHaveLength(before + 1);
    expect(answers.filter(({ status }) => status === 201).length).toBeGreaterThan(0);
    for (const { status } of answers) expect([201, 409]).toContain(status);
  });

  it("may ask for the same only", async () => {
    const key = "a-key-for-one-request";
    await ada.get("createScenario", creation(key));
    const other = creation(key, { ...smallScenario, title: "Another" });
    expect(await ada.fail("createScenario", other)).toMatchObject({ status: 422, code: "key-reused" });
    const body = { contents: [smallScenario] };
    expect((await ada.fail("createCases", { params: { projectId }, body, ...keyed(key) })).code).toBe("key-reused");
  });

  it("that was refused may be tried again", async () => {
    const key = "refused-at-first-sight";
    const wrong = creation(key, { ...smallScenario, body: { inertia: -1, stiffness: 1 } });
    for (const _ of [1, 2]) expect(await ada.fail("createScenario", wrong)).toMatchObject({ status: 422 });
    await ada.get("createScenario", creation(key));
  });

  it("is nobody else's: another person's request under it is their own", async () => {
    const bo = await signUp(server, "Bo");
    await addMember(ada, projectId, bo.email, "editor");
    const request = creation("the-same-key-of-two");
    const [hers, his] = [
      await ada.get<StoredScenario>("createScenario", request),
      await bo.get<StoredScenario>("createScenario", request),
    ];
    expect(his.id).not.toBe(hers.id);
  });

  it("is not answered to who may no longer ask", async () => {
    const cy = await signUp(server, "Cy");
    await addMember(ada, projectId, cy.email, "editor");
    const request = creation("asked-as-an-editor");
    await cy.get("createScenario", request);
    const params = { projectId, accountId: cy.accountId };
    await ada.get("changeMember", { params, body: { role: "reader" } });
    expect((await cy.fail("createScenario", request)).status).toBe(403);
    await ada.call("removeMember", { params });
    expect((await cy.fail("createScenario", request)).status).toBe(404);
  });

  it("that was cut off is refused rather than done twice", async () => {
    const request = creation("cut-off-in-the-midst");
    await ada.get("createScenario", request);
    const row = server.database("idempotency_keys").where({ idempotency_key: "cut-off-in-the-midst" });
    await row.clone().update({ status: null, answer: null });
    expect(await ada.fail("createScenario", request)).toMatchObject({ status: 409, code: "under-way" });
  });

  it("learns that it was done where its answer is too long to be kept", async () => {
    const before = (await listed()).length;
    const request = creation("a-very-long-answer", recordScenario(longRecord(3, 40_000)));
    await ada.get("createScenario", request);
    expect(await ada.fail("createScenario", request)).toMatchObject({ status: 409, code: "done-already" });
    expect(await listed()).toHaveLength(before + 1);
  });

  it("is known for 24 hours", async () => {
    const request = creation("yesterday-and-today");
    const first = await ada.get<StoredScenario>("createScenario", request);
    const at = new Date(Date.now() - 24 * 3600 * 1000 - 1000);
    await server.database("idempotency_keys").update({ created_at: at });
    expect((await ada.get<StoredScenario>("createScenario", request)).id).not.toBe(first.id);
    expect(await server.database("idempotency_keys").where({ account_id: ada.accountId })).toHaveLength(1);
  });

  it.each(["short", "x".repeat(101), "a key with blanks in it", "naïve-naïve-naïve"])(
    "is refused as %s",
    async (key) => {
      const failure = await ada.fail("createScenario", creation(encodeURI(key)));
      expect(failure).toMatchObject({ status: 400, fields: [{ path: "Idempotency-Key" }] });
    },
  );
});

describe("routes that add something each time they are called", () => {
  it("all take a key", async () => {
    const scenario = await createScenario(ada, projectId);
    const revision = await createRevision(ada, projectId);
    const at = { projectId, scenarioId: scenario.id };
    const requests: Partial<Record<RouteName, object>> = {
      createProject: { body: { name: "Hall 9", description: "" } },
      createCases: { params: at, body: { contents: [smallScenario] } },
      duplicateScenario: { params: at, body: { title: "Copy" } },
      freezeScenario: { params: at, version: 1, body: freezeBody(scenario) },
      addComment: { params: placeOf(revision), body: smallComment },
    };
    for (const [name, request] of Object.entries(requests) as [RouteName, object][]) {
      const same = { ...request, ...keyed(`the-key-of-${name}`) };
      const first = await ada.get(name, same);
      expect(await ada.get(name, same)).toEqual(first);
    }
  });

  it("are those of the contract that add, and carry no password", () => {
    const once = (Object.keys(routes) as RouteName[]).filter((name) => (routes[name] as Route).isOnce);
    const adding = ["createProject", "createScenario", "createCases", "duplicateScenario", "createExploration"];
    expect(once.sort()).toEqual([...adding, "freezeScenario", "keepReplay", "addComment", "replyToComment"].sort());
  });
});
