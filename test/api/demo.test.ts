import { checkScenario, simulate } from "@restband/solver";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { Integrity, Member, Notice, Project, RevisionSummary, ScenarioSummary } from "../../api/src/contract.ts";
import { demoPeople } from "../../api/src/demo/demo-people.ts";
import { removeDemo } from "../../api/src/demo/remove-demo.ts";
import { demoProjects, seedDemo } from "../../api/src/demo/seed-demo.ts";
import { addMember, createProject, createScenario, signUp } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

const password = "lever-willow-slate-gauge";

let server: TestServer;
beforeAll(async () => {
  server = await startTestServer();
  await seedDemo(server.database, password);
});
afterAll(() => server.stop());

const signIn = async (person: keyof typeof demoPeople) =>
  (await server.browser().open()).signIn(demoPeople[person].email, password);

/** Title, outcome and the number of limits not kept. */
function answerOf(content: object) {
  const scenario = checkScenario(content).scenario!;
  const result = simulate(scenario, {});
  if ("error" in result) throw new Error(result.error.message);
  return [scenario.title, result.outcome, result.limits.filter(({ kept }) => !kept).length];
}

describe("the demo", () => {
  it("has three projects with ten scenarios, all of which the solver accepts", () => {
    const contents = demoProjects.flatMap(({ scenarios }) => scenarios.map(({ content }) => content));
    expect([demoProjects.length, contents.length]).toEqual([3, 10]);
    for (const content of contents) expect(checkScenario(content).faults).toEqual([]);
  });

  it("shows every outcome it is there to show", () => {
    const answers = demoProjects.flatMap(({ scenarios }) => scenarios.map(({ content }) => answerOf(content)));
    expect(answers).toEqual([
      ["Inclined stage, power off", "never-moved", 0],
      ["Fan on rubbed springs, near resonance", "smooth-sliding", 2],
      ["Coupon, ring-down in its grips", "came-to-rest", 0],
      ["Hanger C-2, released", "came-to-rest", 0],
      ["Tail clamp, shaken by the mill", "never-moved", 0],
      ["Sorting belt, carton against the stop", "stick-slip", 0],
      ["Turret, two-pad brake", "came-to-rest", 0],
      ["Z carriage, rapid return", "smooth-sliding", 0],
      ["Z carriage, oil damper", "smooth-sliding", 0],
      ["Z carriage, creep feed", "stick-slip", 2],
    ]);
  });

  it("shows each of its people what their role allows", async () => {
    const aoife = await signIn("aoife");
    const projects = await aoife.get<Project[]>("listProjects");
    expect(projects.map(({ name, role, scenarioCount }) => [name, role, scenarioCount])).toEqual([
      ["Hall 3 refit", "reader", 6],
      ["Test floor isolators", "reader", 2],
    ]);
    const [{ id: projectId }] = projects;
    const members = await aoife.get<Member[]>("listMembers", { params: { projectId } });
    expect(members.map(({ name, role }) => `${name} ${role}`)).toEqual([
      "Ines Duarte owner",
      "Tomas Wik editor",
      "Priya Raman reviewer",
      "Aoife Kerr reader",
    ]);
    const scenarios = await aoife.get<ScenarioSummary[]>("listScenarios", { params: { projectId } });
    expect(scenarios[0].title).toBe("Z carriage, creep feed");
    expect(scenarios[0].updatedBy.name).toBe("Ines Duarte");
  });

  it("has a scenario that was frozen, returned, changed, frozen again and accepted, on a whole chain", async () => {
    const priya = await signIn("priya");
    const [{ id: projectId }] = await priya.get<Project[]>("listProjects");
    const revisions = await priya.get<RevisionSummary[]>("listRevisions", { params: { projectId } });
    expect(revisions.map(({ number, state, outcome, limits }) => [number, state, outcome, limits])).toEqual([
      [2, "accepted", "smooth-sliding", { kept: 4, of: 4 }],
      [1, "returned", "stick-slip", { kept: 2, of: 4 }],
    ]);
    const integrity = await priya.get<Integrity>("readIntegrity", { params: { projectId } });
    expect([integrity.isWhole, integrity.faults]).toEqual([true, []]);
    const [told] = await (await signIn("ines")).get<Notice[]>("listNotices");
    expect(told).toMatchObject({ kind: "accepted", by: { name: "Priya Raman" } });
  });

  it("uses addresses that belong to nobody, and says that it is invented", () => {
    for (const { email } of Object.values(demoPeople)) expect(email).toMatch(/\.example$/);
    for (const { description } of demoProjects) expect(description).toMatch(/invented for the example\.$/);
  });

  it("is made anew on demand, and leaves alone what other people own", async () => {
    const ada = await signUp(server, "Ada");
    const own = await createProject(ada, "Ada's own");
    await addMember(ada, own, demoPeople.tomas.email, "editor");
    const tomas = await signIn("tomas");
    await createScenario(tomas, own);
    const ines = await signIn("ines");
    await createProject(ines, "Made by hand");

    await removeDemo(server.database);
    expect(await ada.get<Project[]>("listProjects")).toMatchObject([{ id: own, scenarioCount: 1 }]);
    await seedDemo(server.database, password);
    const names = (await (await signIn("ines")).get<Project[]>("listProjects")).map(({ name }) => name);
    expect(names).toEqual(["Hall 3 refit", "Hanger line C", "Test floor isolators"]);
    expect((await (await signIn("tomas")).get<Project[]>("listProjects")).length).toBe(3);
  });
});
