import { quantityNames } from "@restband/solver";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { ExplorationSummary, Project, StoredExploration, StoredTile } from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import {
  cellsOf,
  createExploration,
  otherRunner,
  runner,
  smallSweep,
  sweepOf,
  tileContent,
} from "../support/explorations.ts";
import { addMember, createProject, createScenario, signUp, smallScenario } from "../support/people.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let server: TestServer;
let ada: Browser & { accountId: string };
let bo: Browser & { accountId: string };
let projectId: string;
let scenarioId: string;
beforeAll(async () => {
  server = await startTestServer();
  ada = await signUp(server, "Ada");
  const other = await signUp(server, "Bo");
  bo = other;
  projectId = await createProject(ada);
  await addMember(ada, projectId, other.email, "editor");
});
afterAll(() => server.stop());

async function begin(more: object = {}): Promise<StoredExploration> {
  scenarioId = (await createScenario(ada, projectId)).id;
  return createExploration(ada, projectId, scenarioId, more);
}

const at = (explorationId: string, number?: number) => ({
  projectId,
  explorationId,
  ...(number !== undefined && { number: String(number) }),
});
const save = (browser: Browser, id: string, tile: number, by = runner, content = tileContent(cellsOf(tile))) =>
  browser.call("saveTile", { params: at(id, tile), body: { runner: by, content } });
const claim = (id: string, by = runner, solverVersion = smallSweep.solverVersion) => ({
  params: at(id),
  body: { runner: by, solverVersion },
});
const read = (browser: Browser, id: string) => browser.get<StoredExploration>("readExploration", { params: at(id) });
const list = () => ada.get<ExplorationSummary[]>("listExplorations", { params: { projectId, scenarioId } });

describe("a sweep", () => {
  it("keeps the scenario as it was asked of, and tells when that has other numbers by now", async () => {
    const made = await begin();
    expect(made).toMatchObject({ state: "stopped", isStale: false, tiles: 3, tilesSaved: 0, saved: [], answer: null });
    const params = { projectId, scenarioId };
    const renamed = { ...smallScenario, title: "Another name" };
    await ada.get("saveScenario", { params, body: { content: renamed }, version: 1 });
    expect((await list())[0].isStale).toBe(false);
    const changed = { ...renamed, body: { ...smallScenario.body, inertia: 3 } };
    await ada.get("saveScenario", { params, body: { content: changed }, version: 2 });
    expect((await list())[0]).toMatchObject({ isStale: true, scenarioVersion: 1 });
    expect((await read(ada, made.id)).content.body.inertia).toBe(smallScenario.body.inertia);
  });

  it("is not begun on a version of the scenario that nobody has any more", async () => {
    await begin();
    const params = { projectId, scenarioId };
    await ada.get("saveScenario", { params, body: { content: smallScenario }, version: 1 });
    const failure = await ada.fail("createExploration", { params, body: smallSweep });
    expect(failure).toMatchObject({
      status: 409,
      code: "other-version",
      message: "The scenario has version 2 by now. Open it anew and ask again.",
    });
  });

  it("gives its tiles back to the last bit, to whoever may read it", async () => {
    const { id } = await begin();
    const numbers = Float64Array.from([0.1, -0, 1e-308, Number.MAX_VALUE, 0, 0, 0, 0, 0]);
    expect((await save(ada, id, 2, runner, tileContent(numbers))).status).toBe(204);
    expect((await read(bo, id)).saved).toEqual([2]);
    const tiles = await bo.get<StoredTile[]>("readTiles", { params: at(id), query: "?numbers=0,2" });
    expect(tiles.map(({ number }) => number)).toEqual([2]);
    const bytes = Buffer.from(tiles[0].content, "base64");
    const back = new Float64Array(bytes.buffer.slice(bytes.byteOffset, bytes.byteOffset + bytes.length));
    expect([...back].every((value, i) => Object.is(value, numbers[i]))).toBe(true);
    expect(back).toHaveLength(9);
  });

  it("takes a tile once, whoever sends it how often", async () => {
    const { id } = await begin();
    await Promise.all(
      Array.from({ length: 12 }, (_, i) => save(i % 2 ? ada : bo, id, 0, i % 2 ? runner : otherRunner)),
    );
    const rows = await server.database("exploration_tiles").where({ exploration_id: id });
    expect(rows).toHaveLength(1);
  });

  it("refuses tiles of another size or number with what it expects", async () => {
    const { id } = await begin();
    const short = await ada.fail("saveTile", {
      params: at(id, 2),
      body: { runner, content: tileContent(cellsOf(1)) },
    });
    expect(short.status).toBe(400);
    expect(short.fields).toEqual([
      { path: "content", message: "Tile 2 has 72 bytes: 3 cells of 3 numbers. These are 144." },
    ]);
    const beyond = await ada.fail("saveTile", {
      params: at(id, 3),
      body: { runner, content: tileContent(cellsOf(2)) },
    });
    expect(beyond.fields).toEqual([{ path: "number", message: "There are 3 tiles." }]);
    expect((await save(ada, id, 0, runner, "not base64!")).status).toBe(400);
    expect((await read(ada, id)).saved).toEqual([]);
  });

  it("is done when all its tiles are there, and says before how many are missing", async () => {
    const { id } = await begin();
    for (const tile of [0, 2]) await save(ada, id, tile);
    const body = { headline: "Slides smoothly from 0.2 on.", answer: { cells: 5 } };
    const early = await ada.fail("concludeExploration", { params: at(id), body });
    expect(early).toMatchObject({ status: 409, code: "not-done", message: "1 of 3 tiles are not there yet." });
    await save(ada, id, 1);
    await ada.get("concludeExploration", { params: at(id), body });
    expect(await read(bo, id)).toMatchObject({ state: "done", headline: body.headline, answer: { cells: 5 } });
    const other = { headline: "Never slides smoothly.", answer: {} };
    await bo.get("concludeExploration", { params: at(id), body: other });
    expect(await read(ada, id)).toMatchObject({ headline: body.headline, answer: { cells: 5 } });
  });
});

describe("two people at one sweep", () => {
  it("are told who computes it; it is the other's when the page is closed or not heard of any more", async () => {
    const { id } = await begin();
    await ada.get("claimExploration", claim(id));
    expect(await read(bo, id)).toMatchObject({ state: "running", runner: { name: "Ada" } });
    const refused = await bo.fail("claimExploration", claim(id, otherRunner));
    expect(refused).toMatchObject({
      status: 409,
      code: "running",
      message: "Ada computes this just now. The cells appear here as they come.",
    });
    await ada.get("claimExploration", claim(id));
    await ada.get("releaseExploration", { params: at(id), body: { runner } });
    expect((await read(bo, id)).state).toBe("stopped");
    await bo.get("claimExploration", claim(id, otherRunner));
    await server
      .database("explorations")
      .where({ id })
      .update({ runner_until: new Date(Date.now() - 1) });
    expect(await ada.get("claimExploration", claim(id))).toMatchObject({ state: "running", runner: { name: "Ada" } });
  });

  it("of twenty claims at once exactly one is granted", async () => {
    const { id } = await begin();
    const claims = Array.from({ length: 20 }, () => ada.call("claimExploration", claim(id, crypto.randomUUID())));
    const granted = (await Promise.all(claims)).filter(({ status }) => status === 200);
    expect(granted).toHaveLength(1);
  });

  it("do no harm when both compute: the tiles of either are kept, the claim stays with who has it", async () => {
    const { id } = await begin();
    await ada.get("claimExploration", claim(id));
    expect((await save(bo, id, 0, otherRunner)).status).toBe(204);
    expect(await read(ada, id)).toMatchObject({ saved: [0], runner: { name: "Ada" } });
    await bo.get("releaseExploration", { params: at(id), body: { runner: otherRunner } });
    expect((await read(ada, id)).state).toBe("running");
  });

  it("with another solver it is not gone on with", async () => {
    const { id } = await begin();
    const failure = await ada.fail("claimExploration", claim(id, runner, "9.9.9"));
    expect(failure).toMatchObject({
      status: 409,
      code: "other-solver",
      message: "It was begun by solver 0.2.0; this page has 9.9.9. Begin it anew.",
    });
  });
});

it("a full store is told with what to do, and has room again when something is deleted", async () => {
  const wide = sweepOf(500, quantityNames.slice(0, 29), 500);
  const { id } = await begin(wide);
  const params = { projectId, scenarioId };
  for (const _ of [2, 3]) await createExploration(ada, projectId, scenarioId, wide);
  const body = sweepOf(500, quantityNames.slice(0, 29), 80);
  const failure = await ada.fail("createExploration", { params, body });
  expect(failure).toMatchObject({ status: 507, code: "full-store" });
  expect(failure.message).toMatch(/hold 192 of 200 MB\. Delete one to make room, or ask for fewer cells\.$/);
  await ada.get("deleteExploration", { params: at(id) });
  expect((await createExploration(ada, projectId, scenarioId, body)).tiles).toBe(body.tileCells.length);
});

it("a tile larger than a request is not planned", async () => {
  const body = { ...smallSweep, tileCells: [4096], cellValues: 100 };
  const failure = await ada.fail("createExploration", { params: { projectId, scenarioId }, body });
  expect(failure.fields).toEqual([{ path: "tileCells", message: "A tile has no more than 720000 bytes." }]);
});

describe("a plan", () => {
  const refused = async (more: object) => {
    const { id } = await createScenario(ada, projectId);
    const request = { params: { projectId, scenarioId: id }, body: { ...smallSweep, ...more } };
    const failure = await ada.fail("createExploration", request);
    expect(failure).toMatchObject({ status: 422, code: "refused-plan" });
    return failure.fields;
  };
  const { sweep } = smallSweep.plan;
  const [axis] = sweep.axes;
  const study = { format: "restband-tolerance/1", inputs: [], runs: 200, seed: 1 };

  it.each<[string, object, string]>([
    [
      "of a field the scenario has not",
      { sweep: { ...sweep, axes: [{ ...axis, path: "body.weight" }] } },
      "sweep.axes[0].path",
    ],
    ["of an empty range", { sweep: { ...sweep, axes: [{ ...axis, to: 0.1 }] } }, "sweep.axes[0].to"],
    ["of no shape", { sweep: { axes: [] } }, "sweep.format"],
    ["with more beside it", { sweep, note: "<script>" }, "note"],
    ["that lasts no time", { sweep, seconds: 0 }, "seconds"],
  ])("of a sweep is refused %s, at its place", async (_, plan, path) => {
    const fields = await refused({ plan: { seconds: 5, ...plan } });
    expect(fields.map((field) => field.path)).toContain(`plan.${path}`);
  });

  it("of a sweep has rows of its own size, cut into its own tiles", async () => {
    expect(await refused({ cellValues: 4 })).toEqual([
      { path: "cellValues", message: "A row of this plan has 3 numbers, not 4." },
    ]);
    expect(await refused({ tileCells: [3, 3, 6] })).toEqual([
      { path: "tileCells", message: "These are not the tiles of a plan of 12 cells." },
    ]);
  });

  it("is kept whole, with what may be left out written out", async () => {
    const { links: _links, continuation: _continuation, ...short } = sweep;
    const { plan } = await begin({ plan: { sweep: short, seconds: 5 } });
    expect(plan).toMatchObject({ sweep: { ...short, continuation: "none", links: {} }, seconds: 5 });
  });

  it("of a study is refused with nothing that scatters", async () => {
    const fields = await refused({ kind: "study", plan: { study } });
    expect(fields[0].path).toMatch(/^plan\.study\./);
  });

  it("of a study is kept with a row for each of its runs", async () => {
    const path = "contact.law.kinetic";
    const inputs = [{ path, distribution: { kind: "uniform", low: 0.1, high: 0.18 } }];
    const plan = { study: { ...study, inputs } };
    const rows = { kind: "study", plan, tileCells: [100, 100], cellValues: 3 };
    expect((await begin(rows)).plan).toMatchObject(plan);
    expect((await refused({ ...rows, tileCells: [100] })).map((field) => field.path)).toEqual(["tileCells"]);
  });

  it("of a search names a number of the scenario, and goes up", async () => {
    const plan = { path: "contact.law.static", low: 0.1, high: 0.4, target: "stick-slip" };
    const search = { kind: "search", tileCells: [], cellValues: 1, plan };
    expect((await begin(search)).plan).toEqual(plan);
    const wrong = await refused({ ...search, plan: { ...plan, path: "title", high: 0.1 } });
    expect(wrong.map((field) => field.path)).toEqual(["plan.path", "plan.high"]);
  });
});

it("is not concluded before its tiles are there, not even when it is begun", async () => {
  const { id } = await createScenario(ada, projectId);
  const conclusion = { headline: "Slides smoothly everywhere.", answer: {} };
  const request = { params: { projectId, scenarioId: id }, body: { ...smallSweep, conclusion } };
  expect(await ada.fail("createExploration", request)).toMatchObject({ status: 400, fields: [{ path: "conclusion" }] });
});

it("goes with its scenario into another project, and away with it", async () => {
  const { id } = await begin();
  const toProjectId = (await ada.get<Project>("createProject", { body: { name: "Hall 4", description: "" } })).id;
  await ada.get("moveScenario", { params: { projectId, scenarioId }, body: { toProjectId } });
  expect((await ada.fail("readExploration", { params: at(id) })).status).toBe(404);
  expect(await ada.get("readExploration", { params: { projectId: toProjectId, explorationId: id } })).toMatchObject({
    id,
    title: smallSweep.title,
  });
});

it("is told in the trail, when begun and when deleted", async () => {
  const { id } = await begin();
  await save(ada, id, 0);
  await ada.get("deleteExploration", { params: at(id) });
  const rows = await server
    .database("activity")
    .where({ subject_id: scenarioId })
    .orderBy("id")
    .select("act", "detail");
  expect(rows).toMatchObject([
    { act: "scenario.created" },
    { act: "exploration.created", detail: { kind: "sweep", asked: smallSweep.title } },
    { act: "exploration.deleted", detail: { kind: "sweep", asked: smallSweep.title } },
  ]);
  expect(await server.database("exploration_tiles").where({ exploration_id: id })).toEqual([]);
});
