import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { ActivityEntry, Replay, Revision, RevisionSummary, StoredScenario } from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import { addMember, createProject, createScenario, signUp, smallScenario } from "../support/people.ts";
import { createRevision, freeze, freezeBody, placeOf, smallReplay } from "../support/revisions.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let server: TestServer;
let ada: Browser & { accountId: string };
let projectId: string;

beforeAll(async () => {
  server = await startTestServer();
  ada = await signUp(server, "Ada");
  projectId = await createProject(ada);
});
afterAll(() => server.stop());

/** Let go 11 mm off its middle; at 10 mm its second turn would be a tie of spring and friction, and nothing could be told. */
const moving = { ...smallScenario, initial: { displacement: 0.011, velocity: 0 } };

const revisionsOf = (scenarioId: string) =>
  ada.get<RevisionSummary[]>("listRevisions", { params: { projectId }, query: `?scenarioId=${scenarioId}` });

async function save(author: Browser, scenario: StoredScenario, preload: number): Promise<StoredScenario> {
  const content = { ...smallScenario, contact: { ...smallScenario.contact, normal: { preload } } };
  const { id: scenarioId, version } = scenario;
  return author.get("saveScenario", { params: { projectId, scenarioId }, body: { content }, version });
}

describe("freezing", () => {
  it("keeps the text, its digest, the server's own result, a trace and what has no origin", async () => {
    const scenario = await createScenario(ada, projectId);
    const revision = await freeze(ada, scenario);
    const { result, trace } = freezeBody(scenario);
    expect(revision).toMatchObject({
      number: 1,
      digest: scenario.digest,
      content: scenario.content,
      scenarioVersion: 1,
      units: "millimetre",
      state: "open",
      isRecomputed: true,
      isSensitive: false,
      frozenBy: { accountId: ada.accountId, name: "Ada" },
      authors: [{ accountId: ada.accountId, name: "Ada" }],
      faults: [],
    });
    expect(revision.result).toEqual(result);
    expect(revision.trace.t.at(-1)).toBe(trace.t.at(-1));
    expect(JSON.stringify(revision.trace).length).toBeLessThan(65_536);
    expect(revision.withoutOrigin).toEqual([
      "body.inertia",
      "body.stiffness",
      "contact.law.kinetic",
      "contact.law.static",
      "contact.normal.preload",
    ]);
    expect(await ada.get<Revision>("readRevision", { params: placeOf(revision) })).toEqual(revision);
  });

  it("counts on, leaves the working copy alone, and refuses the very same again", async () => {
    const scenario = await createScenario(ada, projectId);
    const params = { projectId, scenarioId: scenario.id };
    await freeze(ada, scenario);
    expect(await ada.fail("freezeScenario", { params, version: 1, body: freezeBody(scenario) })).toMatchObject({
      status: 409,
      code: "frozen-already",
      message: "Revision 1 is this very scenario. Nothing has changed since.",
    });
    const second = await freeze(ada, await save(ada, scenario, 12));
    expect(second.number).toBe(2);
    const listed = await revisionsOf(scenario.id);
    expect(listed.map(({ number, state }) => [number, state])).toEqual([
      [2, "open"],
      [1, "open"],
    ]);
    expect(await ada.get<StoredScenario>("readScenario", { params })).toMatchObject({ version: 2 });
  });

  it("refuses a version that is no longer the stored one, or another digest", async () => {
    const scenario = await createScenario(ada, projectId);
    await save(ada, scenario, 12);
    const params = { projectId, scenarioId: scenario.id };
    const stale = await ada.fail("freezeScenario", { params, version: 1, body: freezeBody(scenario) });
    expect(stale).toMatchObject({ status: 409, code: "stale-version", current: { version: 2 } });
    const other = await ada.fail("freezeScenario", { params, version: 2, body: freezeBody(scenario) });
    expect(other).toMatchObject({ status: 422, code: "other-digest", fields: [{ path: "digest" }] });
    expect(await revisionsOf(scenario.id)).toEqual([]);
  });

  it("refuses a result that the server's own run does not agree with, and names what", async () => {
    const scenario = await createScenario(ada, projectId, moving);
    const body = freezeBody(scenario);
    const quantities = { ...body.result.quantities, peakDisplacement: 0.0111 };
    const params = { projectId, scenarioId: scenario.id };
    const wrong = { ...body, result: { ...body.result, outcome: "stick-slip", quantities } };
    const failure = await ada.fail("freezeScenario", { params, version: 1, body: wrong });
    expect(failure).toMatchObject({ status: 422, code: "result-disagrees" });
    expect(failure.fields).toContainEqual({
      path: "result",
      message: "The outcomes are came-to-rest and stick-slip.",
    });
    expect(failure.fields).toContainEqual({
      path: "result.quantities.peakDisplacement",
      message: "Peak displacement is 0.011 here and 0.0111 on the page.",
    });
    const unknown = { ...body, result: { ...body.result, quantities: { luck: 1 } } };
    expect(await ada.fail("freezeScenario", { params, version: 1, body: unknown })).toMatchObject({
      status: 422,
      fields: [{ path: "result.quantities.luck", message: "There is no such quantity." }],
    });
    expect(await revisionsOf(scenario.id)).toEqual([]);
  });

  it("says what the server could not compute in its time", async () => {
    const hasty = await startTestServer({ recomputing: { workers: 1, seconds: 0.001 } });
    const bo = await signUp(hasty, "Bo");
    const scenario = await createScenario(bo, await createProject(bo));
    const revision = await freeze(bo, scenario);
    const { result, trace } = freezeBody(scenario);
    expect(revision).toMatchObject({ isRecomputed: false, result, trace });
    await hasty.stop();
  });

  it("stays where its trail is: the scenario is not moved away, and its copy is", async () => {
    const revision = await createRevision(ada, projectId);
    const params = { projectId, scenarioId: revision.scenarioId };
    const body = { toProjectId: await createProject(ada, "Elsewhere") };
    expect(await ada.fail("moveScenario", { params, body })).toMatchObject({ status: 409, code: "has-revisions" });
    const copy = await ada.get<StoredScenario>("duplicateScenario", { params, body: { title: "Copy" } });
    await ada.get("moveScenario", { params: { projectId, scenarioId: copy.id }, body });
  });
});

describe("whose own a revision is", () => {
  it("is who made the scenario, who saved a change in it and who froze it", async () => {
    const [bo, cy] = [await signUp(server, "Bo"), await signUp(server, "Cy")];
    for (const { email } of [bo, cy]) await addMember(ada, projectId, email, "editor");
    const scenario = await createScenario(bo, projectId);
    const saved = await save(ada, scenario, 12);
    const revision = await freeze(cy, saved);
    expect(revision.authors.map(({ name }) => name)).toEqual(["Cy", "Bo", "Ada"]);
    // Who makes a table of cases makes each of them.
    const [made] = await bo.get<StoredScenario[]>("createCases", {
      params: { projectId },
      body: { contents: [moving] },
    });
    const read = await ada.get<StoredScenario>("readScenario", { params: { projectId, scenarioId: made.id } });
    const next = await freeze(ada, await save(ada, read, 12));
    expect(next.authors.map(({ name }) => name)).toEqual(["Ada", "Bo"]);
  });
});

describe("replays", () => {
  it("are kept with who, when, which way and what came of it, and told in the trail", async () => {
    const revision = await createRevision(ada, projectId);
    const params = placeOf(revision);
    const first = await ada.get<Replay>("keepReplay", { params, body: smallReplay });
    const other = {
      ...smallReplay,
      way: "tolerances",
      verdict: "differs",
      differences: ["The events differ: 3 and 4."],
    };
    const second = await ada.get<Replay>("keepReplay", { params, body: other });
    expect(first).toMatchObject({ ...smallReplay, by: { name: "Ada" }, revisionId: revision.id });
    expect(await ada.get<Replay[]>("listReplays", { params })).toEqual([second, first]);
    const [act] = await ada.get<ActivityEntry[]>("listActivity", { params: { projectId } });
    expect(act).toMatchObject({
      act: "revision.replayed",
      subject: { id: revision.scenarioId },
      detail: { revisionId: revision.id, number: 1, way: "tolerances", verdict: "differs" },
    });
  });

  it("that say they agree may name nothing that does not", async () => {
    const params = placeOf(await createRevision(ada, projectId));
    const deviations = [{ what: "restTime", values: [1, 1.1], absolute: 0.1, relative: 0.1 }];
    const failure = await ada.fail("keepReplay", { params, body: { ...smallReplay, deviations } });
    expect(failure).toMatchObject({ status: 422, fields: [{ path: "verdict" }] });
  });
});
