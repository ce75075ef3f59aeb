import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { ApiFailure } from "../../../web/src/api/api-failure.ts";
import { call, forgetToken } from "../../../web/src/api/client.ts";
import { fakeServer, ines, ok, project, refuse, session } from "../support/fake-server.ts";

const draft = { name: "Hall 3 refit", description: "" };
const params = { projectId: project.id, scenarioId: "00000000-0000-4000-8000-000000000100" };

beforeEach(forgetToken);
afterEach(() => vi.unstubAllGlobals());

const failureOf = (promise: Promise<unknown>) =>
  promise.then(
    () => expect.fail("no failure"),
    (error: unknown) => error as ApiFailure,
  );

describe("the client", () => {
  it("fetches the session's token before the first change and sends it along", async () => {
    const requests = fakeServer({
      "GET /session": ok(session(ines, "first")),
      "POST /projects": { status: 201, body: project },
    });
    await expect(call("createProject", { body: draft })).resolves.toEqual(project);
    expect(requests.map(({ method, path }) => `${method} ${path}`)).toEqual(["GET /session", "POST /projects"]);
    expect(requests[1].headers).toMatchObject({ "X-CSRF-Token": "first", "Content-Type": "application/json" });
    expect(requests[1].body).toEqual(draft);
  });

  it("takes the new token of a sign-in", async () => {
    const requests = fakeServer({
      "GET /session": ok(session(null, "old")),
      "POST /session": ok(session(ines, "new")),
      "DELETE /session": { status: 204 },
    });
    await call("signIn", { body: { email: ines.email, password: "p" } });
    await call("signOut", {});
    expect(requests.map(({ headers }) => headers["X-CSRF-Token"])).toEqual([undefined, "old", "new"]);
  });

  it("asks for a new token and repeats once where the token is stale, and only once", async () => {
    let count = 0;
    const requests = fakeServer({
      "GET /session": () => ok(session(ines, `token ${++count}`)),
      "POST /projects": ({ headers }) =>
        headers["X-CSRF-Token"] === "token 2" ? { status: 201, body: project } : refuse(403, "csrf-token", "Repeat."),
    });
    await expect(call("createProject", { body: draft })).resolves.toEqual(project);
    expect(requests).toHaveLength(4);
    forgetToken();
    fakeServer({ "GET /session": ok(session(ines)), "POST /projects": refuse(403, "csrf-token", "Repeat.") });
    expect(await failureOf(call("createProject", { body: draft }))).toMatchObject({ code: "csrf-token", status: 403 });
  });

  it("puts ids into the path and the version into If-Match", async () => {
    const path = `/projects/${params.projectId}/scenarios/${params.scenarioId}`;
    const requests = fakeServer({ "GET /session": ok(session(ines)), [`PUT ${path}`]: ok({}) });
    await call("saveScenario", { params, body: { content: {} }, version: 7 });
    expect(requests[1]).toMatchObject({ path, headers: { "If-Match": '"7"' } });
  });

  it("sends what got no answer again under the same key, and anything else under another", async () => {
    const keys: string[] = [];
    let isLost = true;
    fakeServer({
      "GET /session": ok(session(ines)),
      "POST /projects": ({ headers }) => {
        keys.push(headers["Idempotency-Key"]);
        return isLost ? Promise.reject(new TypeError("Failed to fetch")) : { status: 201, body: project };
      },
    });
    await failureOf(call("createProject", { body: draft }));
    await failureOf(call("createProject", { body: { ...draft, name: "Hall 4" } }));
    isLost = false;
    await call("createProject", { body: draft });
    await call("createProject", { body: draft });
    const [lost, other, repeated, next] = keys;
    expect(repeated).toBe(lost);
    expect(lost).toMatch(/^[0-9a-f]{32}$/u);
    expect(new Set([lost, other, next]).size).toBe(3);
  });

  it("gives no key to what carries a password", async () => {
    const requests = fakeServer({ "GET /session": ok(session(null)), "POST /session": ok(session(ines)) });
    await call("signIn", { body: { email: ines.email, password: "p" } });
    expect(requests[1].headers["Idempotency-Key"]).toBeUndefined();
  });

  it("tells a refusal with its code, sentence and fields", async () => {
    const fields = [{ path: "name", message: "Give it a name." }];
    fakeServer({
      "GET /session": ok(session(ines)),
      "POST /projects": refuse(400, "bad-request", "1 field to put right.", fields),
    });
    const failure = await failureOf(call("createProject", { body: draft }));
    expect(failure).toBeInstanceOf(ApiFailure);
    expect(failure).toMatchObject({
      status: 400,
      code: "bad-request",
      message: "1 field to put right.",
      fields,
      isUnreachable: false,
    });
  });

  it("tells a lost connection from a refusal", async () => {
    vi.stubGlobal("fetch", () => Promise.reject(new TypeError("Failed to fetch")));
    expect(await failureOf(call("listProjects", {}))).toMatchObject({
      code: "unreachable",
      status: 0,
      isUnreachable: true,
    });
  });

  it("counts a server without its database as out of reach, in the server's own words", async () => {
    fakeServer({ "GET /projects": refuse(503, "database-gone", "The database does not answer just now.") });
    expect(await failureOf(call("listProjects", {}))).toMatchObject({
      message: "The database does not answer just now.",
      isUnreachable: true,
    });
  });

  it("makes a sentence where the answer is no JSON of ours", async () => {
    vi.stubGlobal("fetch", () => Promise.resolve(new Response("<h1>Bad gateway</h1>", { status: 500 })));
    const failure = await failureOf(call("listProjects", {}));
    expect(failure).toMatchObject({ code: "unexplained", status: 500 });
    expect(failure.message).toMatch(/^The server has failed/u);
  });

  it("takes nothing that is no answer of ours for one", async () => {
    vi.stubGlobal("fetch", () => Promise.resolve(new Response("<h1>Sign in to the network</h1>", { status: 200 })));
    expect(await failureOf(call("listProjects", {}))).toMatchObject({ code: "unexplained", status: 200 });
  });

  it("takes a refusal without its fields for an unexplained one", async () => {
    fakeServer({ "GET /projects": { status: 400, body: { error: { code: "bad-request", message: "No." } } } });
    expect(await failureOf(call("listProjects", {}))).toMatchObject({ code: "unexplained", status: 400 });
  });

  it("knows a session that has ended from a wrong password", async () => {
    fakeServer({ "GET /projects": refuse(401, "not-signed-in", "Sign in to go on.") });
    expect((await failureOf(call("listProjects", {}))).isSignedOut).toBe(true);
    fakeServer({
      "GET /session": ok(session(null)),
      "POST /session": refuse(401, "wrong-password", "They do not belong together."),
    });
    expect((await failureOf(call("signIn", { body: { email: ines.email, password: "p" } }))).isSignedOut).toBe(false);
  });

  it("lets a cancelled call be cancelled, not lost", async () => {
    const abort = new AbortController();
    vi.stubGlobal("fetch", () => Promise.reject(new DOMException("aborted", "AbortError")));
    abort.abort();
    expect(await failureOf(call("listProjects", { signal: abort.signal }))).toMatchObject({ name: "AbortError" });
  });
});
