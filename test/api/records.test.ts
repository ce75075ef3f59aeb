import { checkScenario, digestOf, recordDigest, type Scenario } from "@restband/solver";
import { afterAll, beforeAll, describe, expect, it } from "vitest";
import { createChainService } from "../../api/src/chain/chain-service.ts";
import type { Revision, StoredExploration, StoredScenario } from "../../api/src/contract.ts";
import { openDatabase } from "../../api/src/database/database.ts";
import { removeUnusedRecords } from "../../api/src/records/records-service.ts";
import * as createRecords from "../../migrations/20261201104000-create-records.ts";
import type { Browser } from "../support/browser.ts";
import { createExploration } from "../support/explorations.ts";
import { longRecord, recordScenario } from "../support/long-record.ts";
import { createProject, createScenario, signUp } from "../support/people.ts";
import { createRevision, freeze, freezeBody, placeOf } from "../support/revisions.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

let server: TestServer;
let ada: Browser & { accountId: string };
beforeAll(async () => {
  server = await startTestServer();
  ada = await signUp(server, "Ada");
});
afterAll(() => server.stop());

const record = longRecord();
const digest = recordDigest(record.times, record.values);
const named = { kind: "record", digest, points: 1500 };

const rowsOf = (projectId: string) =>
  server.database("records").where({ project_id: projectId }).select<{ digest: Buffer; content: Buffer }[]>("*");
const read = (projectId: string, scenarioId: string) =>
  ada.get<StoredScenario>("readScenario", { params: { projectId, scenarioId } });
const saving = (projectId: string, scenarioId: string, version: number, content: object) => ({
  ...{ params: { projectId, scenarioId }, version, body: { content } },
});

describe("the points of a long record", () => {
  it("are kept once for all scenarios of a project, whatever is saved how often", async () => {
    const projectId = await createProject(ada);
    const made = await createScenario(ada, projectId, recordScenario());
    await createScenario(ada, projectId, recordScenario(record, "Another"));
    const request = saving(projectId, made.id, 1, recordScenario(record, "Saved"));
    const saved = await ada.get<StoredScenario>("saveScenario", request);
    const rows = await rowsOf(projectId);
    expect(rows.map((row) => row.digest.toString("hex"))).toEqual([digest]);
    expect(rows[0].content).toHaveLength(2 * 8 * 1500);
    for (const { content } of [made, saved, await read(projectId, made.id)]) expect(content.force).toEqual([record]);
  });

  it("are no part of the canonical text, which names them", async () => {
    const projectId = await createProject(ada);
    const made = await createScenario(ada, projectId, recordScenario());
    const [row] = await server.database("scenarios").where({ id: made.id }).select<{ content: string }[]>("content");
    expect((JSON.parse(row.content) as Scenario).force).toEqual([named]);
    expect(made.digest).toBe(digestOf(checkScenario(recordScenario()).scenario!));
  });

  it("need not be sent again: their digest stands for them, and comes back where it was sent", async () => {
    const projectId = await createProject(ada);
    const made = await createScenario(ada, projectId, recordScenario());
    const request = saving(projectId, made.id, 1, recordScenario(named, "Renamed"));
    const saved = await ada.get<StoredScenario>("saveScenario", request);
    expect(saved.content.force).toEqual([named]);
    const found = await read(projectId, made.id);
    expect(found.content).toMatchObject({ title: "Renamed", force: [record] });
    expect(found.digest).toBe(digestOf(found.content));
    const body = { contents: [recordScenario(named, "Case 1"), recordScenario(named, "Case 2")] };
    expect(await ada.get("createCases", { params: { projectId }, body })).toHaveLength(2);
    expect(await rowsOf(projectId)).toHaveLength(1);
  });

  it("are refused by digest where the project has them not, or counts them otherwise", async () => {
    const [projectId, other] = [await createProject(ada), await createProject(ada)];
    await createScenario(ada, other, recordScenario());
    const refusal = { status: 422, code: "unknown-record" };
    const message = "The 1500 points of this record are not in this project. Send them along.";
    const body = { content: recordScenario(named) };
    expect(await ada.fail("createScenario", { params: { projectId }, body })).toMatchObject({
      ...{ ...refusal, fields: [{ path: "force[0].digest", message }] },
    });
    const cases = { contents: [recordScenario(), recordScenario(named)] };
    await ada.get("createCases", { params: { projectId: other }, body: cases });
    const wrong = { contents: [recordScenario({ ...named, digest: "0".repeat(64) })] };
    const miscounted = { contents: [recordScenario(), recordScenario({ ...named, points: 1501 })] };
    expect(await ada.fail("createCases", { params: { projectId }, body: wrong })).toMatchObject(refusal);
    expect(await ada.fail("createCases", { params: { projectId: other }, body: miscounted })).toMatchObject({
      ...{ ...refusal, fields: [{ path: "contents[1].force[0].digest" }] },
    });
    expect(await rowsOf(projectId)).toEqual([]);
  });

  it("of another project are nobody's, even with their digest in hand", async () => {
    const theirs = await createProject(ada);
    const made = await createScenario(ada, theirs, recordScenario());
    const eve = await signUp(server, "Eve");
    const own = await createProject(eve);
    expect((await eve.fail("readScenario", { params: { projectId: theirs, scenarioId: made.id } })).status).toBe(404);
    const body = { content: recordScenario(named) };
    expect((await eve.fail("createScenario", { params: { projectId: own }, body })).status).toBe(422);
    const hers = await createScenario(eve, own);
    const request = saving(own, hers.id, 1, recordScenario(named));
    expect((await eve.fail("saveScenario", request)).status).toBe(422);
    const off = { place: "force", index: 0, term: named, origins: {}, units: {} };
    const switchedOff = { content: hers.content, switchedOff: [off] };
    expect(await eve.fail("saveScenario", { ...request, body: switchedOff })).toMatchObject({
      fields: [{ path: "switchedOff[0].term.digest" }],
    });
  });

  it("go along with terms switched off, copies and explorations, and to another project", async () => {
    const [projectId, toProjectId] = [await createProject(ada), await createProject(ada)];
    const off = { place: "force", index: 1, term: longRecord(9), origins: {}, units: {} };
    const body = { content: recordScenario(), switchedOff: [off] };
    const made = await ada.get<StoredScenario>("createScenario", { params: { projectId }, body });
    const params = { projectId, scenarioId: made.id };
    const copy = await ada.get<StoredScenario>("duplicateScenario", { params, body: { title: "Copy" } });
    const asked = await createExploration(ada, projectId, made.id);
    await ada.get("saveScenario", saving(projectId, made.id, 1, recordScenario(longRecord(4))));
    await ada.get("moveScenario", { params, body: { toProjectId } });
    const moved = await read(toProjectId, made.id);
    expect([moved.content.force, moved.switchedOff]).toEqual([[longRecord(4)], [off]]);
    expect([copy.content.force, copy.switchedOff]).toEqual([[record], [off]]);
    const place = { projectId: toProjectId, explorationId: asked.id };
    const kept = await ada.get<StoredExploration>("readExploration", { params: place });
    expect(kept.content.force).toEqual([record]);
    expect(await rowsOf(toProjectId)).toHaveLength(3);
  });

  it("come in an answer with several contents for as many as it holds, the first always", async () => {
    const projectId = await createProject(ada);
    const wide = longRecord(3, 120_000);
    const first = await createScenario(ada, projectId, recordScenario(wide));
    const others = [recordScenario({ kind: "record", digest: recordDigest(wide.times, wide.values), points: 120_000 })];
    const [second] = await ada.get<StoredScenario[]>("createCases", {
      params: { projectId },
      body: { contents: others },
    });
    const query = `?ids=${second.id},${first.id}`;
    const contents = await ada.get<StoredScenario[]>("readContents", { params: { projectId }, query });
    expect(contents.map(({ id, content }) => [id, "times" in content.force[0]])).toEqual([[second.id, true]]);
  });

  it("may be as many as the format allows, and no more than the project has room for", async () => {
    const projectId = await createProject(ada);
    await createScenario(ada, projectId, recordScenario(longRecord(3, 200_000)));
    const filler = { project_id: projectId, digest: Buffer.alloc(32), points: 12_400_000, content: Buffer.alloc(0) };
    await server.database("records").insert({ ...filler, created_at: new Date() });
    const request = { params: { projectId }, body: { content: recordScenario() } };
    expect(await ada.fail("createScenario", request)).toMatchObject({ status: 507, code: "full-store" });
    await server.database("records").where({ digest: filler.digest }).delete();
  });
});

describe("a revision with a long record", () => {
  it("is frozen by its digest, computed by the server, and read with its points", async () => {
    const projectId = await createProject(ada);
    const scenario = await createScenario(ada, projectId, recordScenario());
    const revision = await freeze(ada, scenario);
    expect(revision).toMatchObject({ isRecomputed: true, isSensitive: false, digest: scenario.digest, faults: [] });
    expect(revision.content.force).toEqual([record]);
    expect((JSON.parse(revision.text) as Scenario).force).toEqual([named]);
    expect(revision.result).toEqual(freezeBody(scenario).result);
    // The working copy goes on; what is frozen stays.
    await ada.get("saveScenario", saving(projectId, scenario.id, 1, recordScenario(longRecord(4))));
    const again = await ada.get<Revision>("readRevision", { params: placeOf(revision) });
    expect(again).toMatchObject({ content: { force: [record] }, faults: [] });
  });

  it("is refused where the page's result is not that of the points", async () => {
    const projectId = await createProject(ada);
    const scenario = await createScenario(ada, projectId, recordScenario());
    const { result } = freezeBody({ content: checkScenario(recordScenario(longRecord(4))).scenario!, digest });
    const body = { ...freezeBody(scenario), result };
    const request = { params: { projectId, scenarioId: scenario.id }, version: 1, body };
    expect(await ada.fail("freezeScenario", request)).toMatchObject({ status: 422, code: "result-disagrees" });
  });

  it("shows points that were changed or taken away by SQL, where it is read and in the chain", async () => {
    const projectId = await createProject(ada);
    const revision = await createRevision(ada, projectId, recordScenario());
    const records = server.database("records").where({ project_id: projectId });
    const chain = async () => (await createChainService(server.database).readAll({ isFresh: true })).faults;
    const seen = async () => (await ada.get<Revision>("readRevision", { params: placeOf(revision) })).faults;
    expect(await chain()).toEqual([]);
    const fault = "The points of force[0] are not those it was frozen with.";
    const { content } = (await rowsOf(projectId))[0];
    content[7] ^= 1;
    await records.clone().update({ content });
    expect(await seen()).toEqual([fault]);
    expect(await chain()).toMatchObject([
      { projectId, table: "records", id: digest, message: "These points were changed after they were kept." },
    ]);
    const request = { params: { projectId, scenarioId: revision.scenarioId } };
    const { content: working } = await ada.get<StoredScenario>("readScenario", request);
    expect(working.force).toEqual([named]);
    await records.clone().delete();
    expect(await seen()).toEqual([fault]);
    expect(await chain()).toMatchObject([{ table: "records", message: "The points of a frozen record are gone." }]);
    await server.database("records").insert({ project_id: projectId, ...rowOf(), created_at: new Date() });
    expect(await chain()).toEqual([]);
  });

  it("keeps its points from the server's own database account", async () => {
    const account = openDatabase(server.databaseUrl);
    for (const change of [account("records").update({ points: 1 }), account("records").delete()]) {
      await expect(change).rejects.toMatchObject({ errno: 1142 });
    }
    await account.destroy();
  });
});

/** The record's row, its bytes laid by other means than the server's. */
function rowOf() {
  const numbers = Float64Array.from([...record.times, ...record.values]);
  return { digest: Buffer.from(digest, "hex"), points: 1500, content: Buffer.from(numbers.buffer) };
}

describe("records that nothing names any more", () => {
  it("are removed at the next start, a day after they came; all others stay", async () => {
    const projectId = await createProject(ada);
    const made = await createScenario(ada, projectId, recordScenario(longRecord(5)));
    await createRevision(ada, projectId, recordScenario(longRecord(6)));
    await ada.get("saveScenario", saving(projectId, made.id, 1, recordScenario(longRecord(7))));
    await removeUnusedRecords(server.database);
    expect(await rowsOf(projectId)).toHaveLength(3);
    await server.database("records").update({ created_at: new Date(Date.now() - 25 * 3600 * 1000) });
    await removeUnusedRecords(server.database);
    const left = (await rowsOf(projectId)).map((row) => row.digest.toString("hex"));
    const expected = [6, 7]
      .map((amplitude) => longRecord(amplitude))
      .map(({ times, values }) => recordDigest(times, values));
    expect(left.sort()).toEqual(expected.sort());
  });
});

describe("scenarios from before there were records", () => {
  it("name theirs from then on, with the same digest, and have them again when the change is taken back", async () => {
    const projectId = await createProject(ada);
    const made = await createScenario(ada, projectId, recordScenario());
    const row = () => server.database("scenarios").where({ id: made.id }).first<{ content: string }>("content");
    const { content: text } = await row();
    await createRecords.down(server.database);
    expect((JSON.parse((await row()).content) as Scenario).force).toEqual([record]);
    await createRecords.up(server.database);
    expect((await row()).content).toBe(text);
    expect(await read(projectId, made.id)).toEqual(made);
  });
});
