import { createHash } from "node:crypto";
import { canonicalText, checkScenario, digestOf } from "@restband/solver";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { Project, ScenarioSummary, StoredScenario } from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import { addMember, createProject, createScenario, signUp, smallScenario } from "../support/people.ts";
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

const titled = (title: string) => ({ ...smallScenario, title });
const save = (browser: Browser, scenarioId: string, version: number | undefined, content: object) => ({
  call: () =>
    browser.call<StoredScenario>("saveScenario", { params: { projectId, scenarioId }, body: { content }, version }),
  fail: () => browser.fail("saveScenario", { params: { projectId, scenarioId }, body: { content }, version }),
});

describe("a scenario", () => {
  it("is stored as its canonical text, byte for byte, with the digest of that text", async () => {
    const content = titled('Träger „C-2“ 🛠 \u2028 \\ " µ');
    const made = await createScenario(ada, projectId, content);
    const canonical = canonicalText(checkScenario(content).scenario!);
    const [row] = await server
      .database("scenarios")
      .where({ id: made.id })
      .select<{ content: string; digest: Buffer }[]>("*");
    expect(row.content).toBe(canonical);
    expect(row.digest).toEqual(createHash("sha256").update(canonical, "utf8").digest());
    expect(made.digest).toBe(row.digest.toString("hex"));
    expect(made.content).toEqual(JSON.parse(canonical));
  });

  it("comes back from the server as it went in, so that reading and saving change nothing", async () => {
    const made = await createScenario(ada, projectId, titled("Round trip"));
    const read = await ada.get<StoredScenario>("readScenario", { params: { projectId, scenarioId: made.id } });
    expect(read).toEqual(made);
    expect(digestOf(read.content)).toBe(read.digest);
    const { body: saved } = await save(ada, made.id, 1, read.content).call();
    expect(saved).toMatchObject({ version: 2, digest: made.digest, content: made.content });
  });

  it("keeps every point of a long record, though its digest names the record alone", async () => {
    const times = Array.from({ length: 1500 }, (_, i) => i / 100);
    const record = { kind: "record", times, values: times.map((t) => Math.sin(t)) };
    const content = { ...titled("Long record"), force: [record] };
    const made = await createScenario(ada, projectId, content);
    const read = await ada.get<StoredScenario>("readScenario", { params: { projectId, scenarioId: made.id } });
    expect(read.content.force).toEqual([record]);
    expect(read.digest).toBe(digestOf(checkScenario(content).scenario!));
    expect((await save(ada, made.id, 1, read.content).call()).body).toMatchObject({ version: 2, digest: made.digest });
  });

  it("keeps terms that are switched off beside its content, through saves that say nothing of them", async () => {
    const off = {
      place: "force",
      index: 0,
      term: { kind: "harmonic", amplitude: 4, hz: 12 },
      origins: { hz: { kind: "measured", entered: "720 rpm" } },
      units: { hz: "rpm" },
    };
    const written = [{ ...off, term: { ...off.term, phase: 0 } }];
    const params = { projectId };
    const body = { content: titled("Shaken"), switchedOff: [off] };
    const made = await ada.get<StoredScenario>("createScenario", { params, body });
    expect(made.switchedOff).toEqual(written);
    expect(made.digest).toBe(digestOf(made.content));
    const { body: saved } = await save(ada, made.id, 1, made.content).call();
    expect(saved).toMatchObject({ version: 2, switchedOff: written });
    const at = { projectId, scenarioId: made.id };
    const copy = await ada.get<StoredScenario>("duplicateScenario", { params: at, body: { title: "Copy" } });
    expect(copy.switchedOff).toEqual(written);
    const without = { content: made.content, switchedOff: [] };
    const { body: cleared } = await ada.call<StoredScenario>("saveScenario", { params: at, body: without, version: 2 });
    expect(cleared).toMatchObject({ version: 3, switchedOff: [], digest: made.digest });
  });

  it("is refused with a term switched off that is none, and with members the solver does not know", async () => {
    const off = { place: "force", index: 0, origins: {}, units: {} };
    const refusal = (term: unknown) =>
      ada.fail("createScenario", {
        params: { projectId },
        body: { content: smallScenario, switchedOff: [{ ...off, term }] },
      });
    expect(await refusal({ kind: "harmonic", amplitude: 4, hz: -12 })).toMatchObject({
      status: 422,
      fields: [{ path: "switchedOff[0].term.hz" }],
    });
    expect(await refusal({ kind: "nonsense" })).toMatchObject({
      status: 422,
      fields: [{ path: "switchedOff[0].term.kind" }],
    });
    expect(await refusal("harmonic")).toMatchObject({ status: 400 });
  });

  it("says who saved it last, and touches its project", async () => {
    const bo = await signUp(server, "Bo");
    await addMember(ada, projectId, bo.email, "editor");
    const made = await createScenario(ada, projectId);
    const { body: saved } = await save(bo, made.id, 1, titled("By Bo")).call();
    expect(saved).toMatchObject({ version: 2, updatedBy: { accountId: bo.accountId, name: "Bo" } });
    const project = await ada.get<Project>("readProject", { params: { projectId } });
    expect(project.updatedAt).toBe(saved.updatedAt);
    const [newest] = await ada.get<ScenarioSummary[]>("listScenarios", { params: { projectId } });
    expect(newest.id).toBe(made.id);
  });

  it("is refused with every fault at its path, and nothing is stored", async () => {
    const content = { ...smallScenario, body: { inertia: 0, stiffness: -1 }, unknown: 1 };
    const count = async () => Number((await server.database("scenarios").count({ n: "*" }))[0].n);
    const before = await count();
    const failure = await ada.fail("createScenario", { params: { projectId }, body: { content } });
    expect(failure).toMatchObject({ status: 422, code: "refused-scenario", message: "3 fields to put right." });
    expect(failure.fields.map(({ path }) => path).sort()).toEqual(["body.inertia", "body.stiffness", "unknown"]);
    expect(failure.fields).toEqual(checkScenario(content).faults);
    expect(await count()).toBe(before);
  });

  it("keeps its old version when a save is refused", async () => {
    const made = await createScenario(ada, projectId, titled("Kept"));
    expect(await save(ada, made.id, 1, { ...smallScenario, span: {} }).fail()).toMatchObject({ status: 422 });
    expect(await ada.get("readScenario", { params: { projectId, scenarioId: made.id } })).toEqual(made);
  });
});

describe("two editors", () => {
  it("never overwrite each other: the later save gets 409 with what is stored", async () => {
    const made = await createScenario(ada, projectId, titled("Both"));
    const { body: first } = await save(ada, made.id, 1, titled("First")).call();
    const failure = await save(ada, made.id, 1, titled("Second")).fail();
    expect(failure).toMatchObject({ status: 409, code: "stale-version" });
    expect(failure.current).toEqual(first);
    const { body: resolved } = await save(ada, made.id, 2, titled("Second")).call();
    expect(resolved).toMatchObject({ version: 3, content: { title: "Second" } });
  });

  it("of twenty saves at once exactly one is taken", async () => {
    const made = await createScenario(ada, projectId, titled("Race"));
    const saves = Array.from({ length: 20 }, (_, i) => save(ada, made.id, 1, titled(`Racer ${i}`)).call());
    const answers = await Promise.all(saves);
    const won = answers.filter(({ status }) => status === 200);
    expect(won).toHaveLength(1);
    expect(answers.filter(({ status }) => status === 409)).toHaveLength(19);
    const read = await ada.get("readScenario", { params: { projectId, scenarioId: made.id } });
    expect(read).toEqual(won[0].body);
  });

  it("have to say which version they have seen, and cannot be ahead", async () => {
    const made = await createScenario(ada, projectId);
    expect(await save(ada, made.id, undefined, smallScenario).fail()).toMatchObject({
      status: 428,
      code: "version-missing",
    });
    expect((await save(ada, made.id, 2, smallScenario).fail()).status).toBe(409);
  });
});

it("puts each version into the trail with its digest", async () => {
  const made = await createScenario(ada, projectId, titled("Trail"));
  const { body: saved } = await save(ada, made.id, 1, titled("Trail 2")).call();
  const rows = await server.database("activity").where({ subject_id: made.id }).orderBy("id").select<object[]>("*");
  expect(rows).toMatchObject([
    { act: "scenario.created", project_id: projectId, detail: { version: 1, digest: made.digest } },
    { act: "scenario.saved", account_id: ada.accountId, detail: { version: 2, digest: saved.digest } },
  ]);
});

it("that is large is stored whole", async () => {
  const times = Array.from({ length: 900 }, (_, i) => i / 100);
  const term = { kind: "record", times, values: times.map((t) => Math.sin(t)) };
  const content = { ...smallScenario, force: Array.from({ length: 30 }, () => term) };
  const made = await createScenario(ada, projectId, content);
  expect(made.content.force).toHaveLength(30);
  expect(JSON.stringify(content).length).toBeGreaterThan(600_000);
});
