import { checkScenario } from "@restband/solver";
import fc from "fast-check";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { failureSchema, type Route, type RouteName, routes } from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import { createProject, createScenario, emailOf, password, signUp, smallScenario } from "../support/people.ts";
import { cellsOf, createExploration, runner, smallSweep, tileContent } from "../support/explorations.ts";
import { freezeBody, smallComment, smallReplay } from "../support/revisions.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

const names = Object.keys(routes) as RouteName[];
const withBody = names.filter((name) => "body" in routes[name]);

const signed = { reasons: "Looked through.", password, digest: "0".repeat(64) };

const goodBodies: Record<string, Record<string, unknown>> = {
  signUp: { name: "Bo", email: emailOf("Bo"), password },
  claimAccount: { token: "a token that nobody ever gave out", name: "Bo", password },
  changeAccount: { units: "inch" },
  signIn: { email: emailOf("Ada"), password },
  createProject: { name: "Hall 4", description: "" },
  changeProject: { name: "Hall 5", description: "" },
  addMember: { email: emailOf("Bo"), role: "reader" },
  changeMember: { role: "owner" },
  createScenario: { content: smallScenario },
  saveScenario: { content: smallScenario },
  createCases: { contents: [smallScenario] },
  duplicateScenario: { title: "Copy" },
  moveScenario: { toProjectId: crypto.randomUUID() },
  createExploration: smallSweep,
  claimExploration: { runner, solverVersion: smallSweep.solverVersion },
  releaseExploration: { runner },
  saveTile: { runner, content: tileContent(cellsOf(0)) },
  concludeExploration: { headline: "Slides smoothly from 8.35 mm/s.", answer: {} },
  freezeScenario: freezeBody({ content: checkScenario(smallScenario).scenario!, digest: "0".repeat(64) }),
  keepReplay: smallReplay,
  askForReview: { reviewers: [crypto.randomUUID()], message: "" },
  decideRevision: { decision: "accept", ...signed, replayId: null, checklist: [] },
  selfCheckRevision: { ...signed, replayId: null, checklist: [] },
  withdrawRevision: signed,
  setChecklist: { points: ["Every value has its origin."] },
  addComment: smallComment,
  replyToComment: { words: "Because the friction holds it.", mentions: [] },
};

/** What a query has to hold. */
const goodQueries: Partial<Record<RouteName, string>> = {
  readContents: `?ids=${crypto.randomUUID()}&`,
  readTiles: "?numbers=0&",
};

let server: TestServer;
let owner: Browser & { accountId: string };
let params: Record<string, string>;

beforeAll(async () => {
  const generous = { account: { attempts: 1e6, seconds: 60 }, origin: { attempts: 1e6, seconds: 60 } };
  server = await startTestServer({ throttle: generous });
  owner = await signUp(server, "Ada");
  const projectId = await createProject(owner);
  const [revisionId, commentId, noticeId] = Array.from({ length: 3 }, () => crypto.randomUUID());
  const scenarioId = (await createScenario(owner, projectId)).id;
  const explorationId = (await createExploration(owner, projectId, scenarioId)).id;
  const others = { revisionId, commentId, noticeId, explorationId, number: "0" };
  params = { projectId, scenarioId, accountId: owner.accountId, ...others };
});
afterAll(() => server.stop());

it("is tried for every route with a body", () => {
  expect(Object.keys(goodBodies).sort()).toEqual([...withBody].sort());
});

describe.each(withBody)("the body of %s", (name) => {
  const fail = (request: object) => owner.fail(name, { params, version: 1, ...request });

  it("may hold no unknown key", async () => {
    const failure = await fail({ body: { ...goodBodies[name], isAdministrator: true } });
    expect(failure).toMatchObject({
      status: 400,
      code: "bad-request",
      fields: [{ path: "isAdministrator", message: "There is no such field." }],
    });
  });

  it.each(Object.keys(goodBodies[name]))("needs %s, and of the right type", async (key) => {
    const rest = Object.fromEntries(Object.entries(goodBodies[name]).filter(([other]) => other !== key));
    expect(await fail({ body: rest })).toMatchObject({ status: 400, fields: [{ path: key }] });
    const wrong = typeof goodBodies[name][key] === "number" ? "seven" : 7;
    expect(await fail({ body: { ...rest, [key]: wrong } })).toMatchObject({ status: 400, fields: [{ path: key }] });
  });

  it.each([
    ["no JSON", { text: '{"name": ' }, 400, "not-json"],
    ["a bare number", { text: "7" }, 400, "not-json"],
    ["a list", { text: "[]" }, 400, "bad-request"],
    [
      "another type",
      { text: "name=Bo", headers: { "Content-Type": "application/x-www-form-urlencoded" } },
      415,
      "not-json",
    ],
    ["nothing", { headers: { "Content-Type": "application/json" } }, 400, undefined],
  ])("may not be %s", async (_, request, status, code) => {
    const failure = await fail(request);
    expect(failure.status).toBe(status);
    if (code) expect(failure.code).toBe(code);
  });

  it("may not be so deep, or in so many pieces, that it would take long to check", async () => {
    const deep = `{"content": ${"[".repeat(100_000)}${"]".repeat(100_000)}}`;
    const pieces = `{"content": {"force": [${"0,".repeat(100_000)}0]}}`;
    for (const [text, what] of [
      [deep, "is nested more than 64 levels deep"],
      [pieces, "has more than 100,000 members"],
    ]) {
      const headers = { "Idempotency-Key": `deep-${crypto.randomUUID()}` };
      expect(await fail({ text, headers })).toMatchObject({
        ...{ status: 413, code: "too-large", message: `The body ${what}.` },
      });
    }
  });

  it("may not be too large, and the answer says how large it may be", async () => {
    const most = (routes[name] as Route).carriesRecords ? 20 : 1;
    const text = JSON.stringify({ name: "x".repeat(most * 2 ** 20) });
    expect(await fail({ text })).toMatchObject({
      ...{ status: 413, code: "too-large", message: `The body is larger than ${most} MB.` },
    });
  });
});

describe.each(names)("%s", (name) => {
  it("takes no query parameter it does not know", async () => {
    const request = {
      params,
      version: 1,
      body: goodBodies[name],
      query: `${goodQueries[name] ?? "?"}as=administrator`,
    };
    expect(await owner.fail(name, request)).toMatchObject({ status: 400, fields: [{ path: "as" }] });
  });
});

describe("paths", () => {
  it("with an id that is none are refused at the parameter, in one's own project", async () => {
    const failure = await owner.fail("readScenario", { params: { ...params, scenarioId: "1 OR 1=1" } });
    expect(failure).toMatchObject({ status: 400, fields: [{ path: "scenarioId" }] });
  });

  it.each(["1", "é", "%00", "' OR '1'='1"])("with a project id like %j lead nowhere", async (projectId) => {
    const answer = await owner.send("GET", `/api/projects/${encodeURIComponent(projectId)}`);
    expect(answer.status).toBe(404);
  });

  it("that are malformed or unknown get the same kind of answer as all failures", async () => {
    const malformed = await owner.send("GET", "/api/projects/%E0%A4%A");
    const unknown = await owner.send("GET", "/api/nothing/here");
    expect([malformed.status, unknown.status]).toEqual([400, 404]);
    for (const { body } of [malformed, unknown]) expect(failureSchema.safeParse(body).success).toBe(true);
  });
});

describe("the ids of contents", () => {
  const twentyOne = Array.from({ length: 21 }, () => crypto.randomUUID()).join(",");
  it.each(["", "1", twentyOne, `${crypto.randomUUID()},`])("are refused as %j", async (ids) => {
    const failure = await owner.fail("readContents", { params, query: `?ids=${ids}` });
    expect(failure.status).toBe(400);
    expect(failure.fields[0].path).toMatch(/^ids/);
  });
});

describe("If-Match", () => {
  it.each(["1", '"x"', 'W/"1"', '"-1"', '"1", "2"', '"99999999999"', "*"])("is refused as %s", async (value) => {
    const request = { params, body: goodBodies.saveScenario, headers: { "If-Match": value } };
    expect(await owner.fail("saveScenario", request)).toMatchObject({ status: 400, fields: [{ path: "If-Match" }] });
  });
});

it("answers 10,000 random bodies with a failure of the contract, never with a 5xx", async () => {
  const value = fc.oneof({ maxDepth: 3 }, fc.jsonValue({ maxDepth: 3 }), fc.constantFrom("", "__proto__", 1e308, -0));
  const attempt = fc.record({
    name: fc.constantFrom(...withBody.filter((name) => name !== "signUp")),
    body: fc.oneof(
      value,
      fc.dictionary(
        fc.constantFrom(
          "name",
          "email",
          "password",
          "role",
          "content",
          "contents",
          "title",
          "token",
          "description",
          "__proto__",
        ),
        value,
      ),
    ),
  });
  const answer = async ({ name, body }: { name: RouteName; body: unknown }) => {
    const route: Route = routes[name];
    const { status, body: told } = await owner.call(name, { params, version: 1, body });
    expect(status).toBeLessThan(500);
    if (status >= 400) expect(failureSchema.safeParse(told).error).toBeUndefined();
    else expect(route.status).toBe(status);
  };
  const twenty = fc.array(attempt, { minLength: 20, maxLength: 20, size: "max" });
  const each = fc.asyncProperty(twenty, async (attempts) => void (await Promise.all(attempts.map(answer))));
  await fc.assert(each, { numRuns: 500, seed: 20261201 });
}, 300_000);
