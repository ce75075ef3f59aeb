import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { ActivityEntry, Project, ScenarioSummary, StoredScenario } from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import { addMember, createProject, createScenario, signUp, smallScenario } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let server: TestServer;
let ada: Browser & { accountId: string; email: string };
let projectId: string;
beforeAll(async () => {
  server = await startTestServer();
  ada = await signUp(server, "Ada");
  projectId = await createProject(ada);
});
afterAll(() => server.stop());

const titled = (title: string) => ({ ...smallScenario, title });
const list = (id = projectId) => ada.get<ScenarioSummary[]>("listScenarios", { params: { projectId: id } });
const summaryOf = async (scenarioId: string, id = projectId) => (await list(id)).find((each) => each.id === scenarioId);
const trailOf = (id: string) => ada.get<ActivityEntry[]>("listActivity", { params: { projectId: id } });

describe("the list of scenarios", () => {
  it("tells of each all but its content", async () => {
    const made = await createScenario(ada, projectId, { ...titled('Träger „C-2“ 🛠 " \\'), purpose: "holding" });
    expect(await summaryOf(made.id)).toEqual({
      id: made.id,
      version: 1,
      title: 'Träger „C-2“ 🛠 " \\',
      purpose: "holding",
      digest: made.digest,
      updatedAt: made.updatedAt,
      updatedBy: made.updatedBy,
      archivedAt: null,
    });
  });

  it("stays small however large the contents, and a title of any length is kept", async () => {
    const times = Array.from({ length: 900 }, (_, i) => i / 100);
    const force = [{ kind: "record", times, values: times.map((t) => Math.sin(t)) }];
    const made = await createScenario(ada, projectId, { ...titled("x".repeat(100_000)), force });
    expect(made.content.title).toHaveLength(100_000);
    expect(JSON.stringify(await summaryOf(made.id)).length).toBeLessThan(700);
  });

  it("gives the contents asked for, and of another project's none", async () => {
    const [mine, other] = [await createScenario(ada, projectId), await createScenario(ada, await createProject(ada))];
    const query = `?ids=${mine.id},${other.id}`;
    const contents = await ada.get<object[]>("readContents", { params: { projectId }, query });
    expect(contents).toEqual([{ id: mine.id, digest: mine.digest, content: mine.content }]);
  });
});

describe("a table of cases", () => {
  const count = async () => (await list()).length;
  const post = (contents: object[]) => ({ params: { projectId }, body: { contents } });

  it("becomes scenarios in the order of its rows, told once in the trail", async () => {
    const titles = Array.from({ length: 500 }, (_, i) => `Case ${i + 1}`);
    const made = await ada.get<ScenarioSummary[]>("createCases", post(titles.map(titled)));
    expect(made.map(({ title }) => title)).toEqual(titles);
    expect(new Set(made.map(({ id }) => id)).size).toBe(500);
    const read = await ada.get<StoredScenario>("readScenario", { params: { projectId, scenarioId: made[123].id } });
    expect(read).toMatchObject({ version: 1, digest: made[123].digest, content: { title: "Case 124" } });
    expect((await trailOf(projectId))[0]).toMatchObject({ act: "cases.created", detail: { count: 500 } });
  });

  it("with a fault in any row makes none of them, and names every fault by its row", async () => {
    const before = await count();
    const bad = { ...smallScenario, body: { inertia: 0, stiffness: -1 } };
    const failure = await ada.fail("createCases", post([titled("Good"), bad, titled("Good too"), {}]));
    expect(failure).toMatchObject({ status: 422, code: "refused-scenario" });
    const paths = failure.fields.map(({ path }) => path);
    expect(paths).toContain("contents[1].body.inertia");
    expect(paths).toContain("contents[1].body.stiffness");
    expect(paths.every((path) => /^contents\[[13]\]/.test(path))).toBe(true);
    expect(await count()).toBe(before);
  });

  it("of more than 500 rows, or of none, is refused", async () => {
    const before = await count();
    for (const rows of [0, 501]) {
      const failure = await ada.fail("createCases", post(Array.from({ length: rows }, () => smallScenario)));
      expect(failure).toMatchObject({ status: 400, fields: [{ path: "contents" }] });
    }
    expect(await count()).toBe(before);
  });
});

describe("a copy", () => {
  it("is a scenario of its own with everything of the original but the title", async () => {
    const made = await createScenario(ada, projectId, titled("Original"));
    const params = { projectId, scenarioId: made.id };
    const copy = await ada.get<StoredScenario>("duplicateScenario", { params, body: { title: "Original, copy" } });
    expect(copy).toMatchObject({ version: 1, content: { ...made.content, title: "Original, copy" } });
    expect(copy.id).not.toBe(made.id);
    expect(await ada.get("readScenario", { params })).toEqual(made);
    expect((await trailOf(projectId))[0]).toMatchObject({ act: "scenario.duplicated", subject: { id: copy.id } });
  });
});

describe("archiving a scenario", () => {
  it("leaves it readable and unchanged, out of the project's count, and is undone by restoring", async () => {
    const project = await createProject(ada);
    const made = await createScenario(ada, project, titled("Put away"));
    const params = { projectId: project, scenarioId: made.id };
    const counted = async () => (await ada.get<Project>("readProject", { params })).scenarioCount;
    for (const times of [1, 2]) {
      await ada.get("archiveScenario", { params });
      expect([times, await counted()]).toEqual([times, 0]);
    }
    expect((await summaryOf(made.id, project))?.archivedAt).toMatch(/^\d{4}-/);
    expect(await ada.get("readScenario", { params })).toEqual({ ...made, archivedAt: expect.any(String) as string });
    await ada.get("restoreScenario", { params });
    expect([await counted(), (await summaryOf(made.id, project))?.archivedAt]).toEqual([1, null]);
    const acts = (await trailOf(project)).map(({ act }) => act);
    expect(acts).toEqual(["scenario.restored", "scenario.archived", "scenario.created", "project.created"]);
  });

  it("refuses saves until then, in words", async () => {
    const made = await createScenario(ada, projectId);
    const params = { projectId, scenarioId: made.id };
    await ada.get("archiveScenario", { params });
    const failure = await ada.fail("saveScenario", { params, body: { content: titled("Late") }, version: 1 });
    expect(failure).toMatchObject({ status: 409, code: "archived" });
    expect(failure.message).toBe("The scenario is archived: nothing in it changes until it is restored.");
    expect(await ada.get("readScenario", { params })).toEqual({ ...made, archivedAt: expect.any(String) as string });
  });
});

describe("moving a scenario", () => {
  it("takes it whole into another project, told in both trails", async () => {
    const target = await createProject(ada, "Target");
    const made = await createScenario(ada, projectId, titled("Traveller"));
    await ada.get("moveScenario", { params: { projectId, scenarioId: made.id }, body: { toProjectId: target } });
    expect(await summaryOf(made.id)).toBeUndefined();
    const there = await ada.get("readScenario", { params: { projectId: target, scenarioId: made.id } });
    expect(there).toEqual({ ...made, projectId: target });
    expect((await ada.fail("readScenario", { params: { projectId, scenarioId: made.id } })).status).toBe(404);
    expect((await trailOf(projectId))[0]).toMatchObject({
      act: "scenario.moved-out",
      subject: { name: "Traveller", isThere: false },
    });
    expect((await trailOf(target))[0]).toMatchObject({ act: "scenario.moved-in", subject: { isThere: true } });
  });

  it("tells the project it left nothing of what becomes of it", async () => {
    const [from, to] = [await createProject(ada, "From"), await createProject(ada, "To")];
    const { id } = await createScenario(ada, from, titled("Named then"));
    await ada.get("moveScenario", { params: { projectId: from, scenarioId: id }, body: { toProjectId: to } });
    const params = { projectId: to, scenarioId: id };
    await ada.get("saveScenario", { params, body: { content: titled("Secret since") }, version: 1 });
    expect(JSON.stringify(await trailOf(from))).not.toContain("Secret");
  });

  it("is refused into a project one may not change: as unknown, as not allowed, as archived", async () => {
    const bo = await signUp(server, "Bo");
    const made = await createScenario(ada, projectId);
    const into = (toProjectId: string) =>
      ada.fail("moveScenario", { params: { projectId, scenarioId: made.id }, body: { toProjectId } });
    const foreign = await createProject(bo, "Bo's");
    expect((await into(foreign)).status).toBe(404);
    await addMember(bo, foreign, ada.email, "reviewer");
    expect(await into(foreign)).toMatchObject({ status: 403, message: expect.stringContaining("reviewer") as string });
    const closed = await createProject(ada, "Closed");
    await ada.get("archiveProject", { params: { projectId: closed } });
    expect(await into(closed)).toMatchObject({ status: 409, code: "archived" });
    expect(await summaryOf(made.id)).toBeDefined();
  });
});
