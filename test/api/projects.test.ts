import { afterAll, beforeAll, expect, it } from "vitest";
import type { ActivityEntry, Project } from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import { addMember, createProject, createScenario, signUp, smallScenario } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let server: TestServer;
let ada: Browser & { accountId: string };
let bo: Browser & { accountId: string; email: string };
beforeAll(async () => {
  server = await startTestServer();
  ada = await signUp(server, "Ada");
  bo = await signUp(server, "Bo");
});
afterAll(() => server.stop());

const trailOf = (browser: Browser, projectId: string, query = "") =>
  browser.get<ActivityEntry[]>("listActivity", { params: { projectId }, query });

it("an archived project is still listed and read, and comes back as it was", async () => {
  const projectId = await createProject(ada);
  const before = await ada.get<Project>("readProject", { params: { projectId } });
  expect(before.archivedAt).toBeNull();
  const put = await ada.get<Project>("archiveProject", { params: { projectId } });
  expect(Math.abs(Date.parse(put.archivedAt!) - Date.now())).toBeLessThan(60_000);
  const again = await ada.get<Project>("archiveProject", { params: { projectId } });
  expect(again.archivedAt).toBe(put.archivedAt);
  expect((await ada.get<Project[]>("listProjects")).find(({ id }) => id === projectId)).toEqual(put);
  expect(await ada.get("restoreProject", { params: { projectId } })).toEqual(before);
  const acts = (await trailOf(ada, projectId)).map(({ act }) => act);
  expect(acts).toEqual(["project.restored", "project.archived", "project.created"]);
});

it("the trail says who did what to which, by today's names", async () => {
  const projectId = await createProject(ada);
  await addMember(ada, projectId, bo.email, "editor");
  const { id } = await createScenario(ada, projectId, { ...smallScenario, title: "Slide" });
  const content = { ...smallScenario, title: "Slide, stiffer", body: { inertia: 2, stiffness: 900 } };
  await bo.get("saveScenario", { params: { projectId, scenarioId: id }, body: { content }, version: 1 });
  const entries = await trailOf(bo, projectId);
  expect(entries).toMatchObject([
    {
      act: "scenario.saved",
      by: { accountId: bo.accountId, name: "Bo" },
      subject: { id, name: "Slide, stiffer", isThere: true },
      detail: { version: 2, changed: "body title" },
    },
    { act: "scenario.created", by: { name: "Ada" }, subject: { id, name: "Slide, stiffer" } },
    { act: "member.added", subject: { id: bo.accountId, name: "Bo" }, detail: { role: "editor" } },
    { act: "project.created", by: { name: "Ada" }, subject: null },
  ]);
});

it("the trail comes in pages, each older than the last, without a gap", async () => {
  const projectId = await createProject(ada);
  for (let i = 0; i < 60; i++) await ada.get("changeProject", { params: { projectId }, body: draft(i) });
  const first = await trailOf(ada, projectId);
  const second = await trailOf(ada, projectId, `?before=${first.at(-1)!.id}`);
  expect([first.length, second.length]).toEqual([50, 11]);
  const all = [...first, ...second];
  expect(all.slice(0, 60).map(({ detail }) => detail.name)).toEqual(
    Array.from({ length: 60 }, (_, i) => draft(59 - i).name),
  );
  expect(await trailOf(ada, projectId, `?before=${second.at(-1)!.id}`)).toEqual([]);
});

const draft = (i: number) => ({ name: `Hall ${i}`, description: "" });
