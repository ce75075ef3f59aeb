import { mkdtemp, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import { join } from "node:path";
import { afterAll, beforeAll, beforeEach, describe, expect, it, vi } from "vitest";
import { createChainService } from "../../api/src/chain/chain-service.ts";
import { signHeads } from "../../api/src/chain/chain.ts";
import { openSeenEnds } from "../../api/src/chain/seen-ends.ts";
import { openSigningKey } from "../../api/src/chain/signing-key.ts";
import type { Comment, Integrity, Review, Revision } from "../../api/src/contract.ts";
import { openDatabase } from "../../api/src/database/database.ts";
import { migrations } from "../../migrations/index.ts";
import type { Browser } from "../support/browser.ts";
import { addMember, createProject, createScenario, signUp } from "../support/people.ts";
import { createComment, createRevision, decisionOn, placeOf, smallReplay } from "../support/revisions.ts";
import { createTestDatabase } from "../support/test-database.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

interface Ready {
  readonly ready: boolean;
  readonly chain: Omit<Integrity, "faults"> & { faultCount: number; faults: Integrity["faults"] };
}

type Person = Browser & { accountId: string; email: string };

let server: TestServer;
let [ada, bo]: Person[] = [];
let projectId: string;
let revision: Revision;

beforeAll(async () => {
  server = await startTestServer();
  [ada, bo] = await Promise.all(["Ada", "Bo"].map((name) => signUp(server, name)));
});
afterAll(() => server.stop());

/** A project with a revision that was replayed, commented on and accepted. */
beforeEach(async () => {
  projectId = await createProject(ada);
  await addMember(ada, projectId, bo.email, "reviewer");
  revision = await createRevision(ada, projectId);
  const params = placeOf(revision);
  await bo.get("keepReplay", { params, body: smallReplay });
  await createComment(bo, revision);
  await bo.get("decideRevision", { params, body: { decision: "accept", ...decisionOn(revision) } });
});

const ready = async () => (await server.browser().send<Ready>("GET", "/ready?deep")).body;
const integrity = () => ada.get<Integrity>("readIntegrity", { params: { projectId } });
/** What the whole server and the project's own page say is wrong in this project. */
async function faults() {
  const { chain } = await ready();
  const own = chain.faults.filter((fault) => fault.projectId === projectId);
  expect((await integrity()).faults).toEqual(own);
  return own.map(({ table, message }) => `${table}: ${message}`);
}

describe("the chain", () => {
  it("is whole as it was written, names the key, and its tables are guarded", async () => {
    expect(await faults()).toEqual([]);
    const { chain } = await ready();
    const { fingerprint, isGuarded, rows } = await integrity();
    expect(fingerprint).toMatch(/^[0-9a-f]{64}$/);
    expect([isGuarded, chain.isGuarded, chain.fingerprint]).toEqual([true, true, fingerprint]);
    // Project, member, scenario, frozen, replayed, commented, accepted: seven acts; and the four rows they tell of.
    expect(rows).toBe(11);
  });

  it("holds while many people save at once", async () => {
    const { id: scenarioId, content } = await createScenario(ada, projectId);
    const save = (version: number) =>
      ada.call("saveScenario", { params: { projectId, scenarioId }, version, body: { content } });
    await Promise.all([1, 1, 1, 1].map(save).concat(Array.from({ length: 6 }, () => createProject(ada) as never)));
    expect(await faults()).toEqual([]);
  });

  it.each([
    ["activity", { act: "revision.returned" }],
    ["activity", { account_id: crypto.randomUUID() }],
    ["revisions", { content: "{}" }],
    ["revisions", { number: 7 }],
    ["replays", { verdict: "differs" }],
    ["comments", { words: "All is well." }],
    ["decisions", { reasons: "None." }],
  ])("shows a row of %s that was changed by SQL, %j", async (table, change) => {
    const last = await server
      .database(table)
      .where({ project_id: projectId })
      .max("sequence as n")
      .first<{ n: number }>();
    await server.database(table).where({ project_id: projectId, sequence: last.n }).update(change);
    expect(await faults()).toEqual([`${table}: It was changed after it was written.`]);
    expect((await server.browser().send<Ready>("GET", "/ready?deep")).status).toBe(503);
  });

  it("shows where a row was taken out", async () => {
    await server.database("comments").where({ project_id: projectId }).delete();
    expect(await faults()).toEqual([expect.stringMatching(/^chains: 1 missing before \d+\.$/)]);
  });

  it("shows that the end was cut off, by whoever cut it", async () => {
    const rows = () => server.database("activity").where({ project_id: projectId });
    const last = await rows().orderBy("sequence", "desc").first<{ sequence: number; previous_hash: Buffer }>();
    await rows().where({ sequence: last.sequence }).delete();
    expect(await faults()).toEqual([`chains: ${last.sequence} rows were added, ${last.sequence - 1} are there.`]);
    const head = { sequence: last.sequence - 1, hash: last.previous_hash };
    await server.database("chains").where({ project_id: projectId }).update(head);
    expect(await faults()).toEqual([
      "chains: Its signature does not fit.",
      `chains: ${last.sequence} rows were there when it was last looked at, ${last.sequence - 1} are left.`,
    ]);
  });

  it("shows rows that were changed and hashed anew, signed with another key or not at all", async () => {
    const row = () => server.database("decisions").where({ project_id: projectId });
    await row().update({ signature: null });
    expect(await faults()).toEqual(["decisions: Its signature does not fit."]);
    const { hash } = await row().first<{ hash: Buffer }>("hash");
    const other = openSigningKey("MC4CAQAwBQYDK2VwBCIEIHJlc3RiYW5kIHRlc3RzIHNpZ24gd2l0aCBvdGhlciEh");
    const signature = other.sign(`restband-row/1 decisions ${hash.toString("hex")}`);
    await row().update({ signature, signed_by: other.publicKey });
    expect(await faults()).toEqual([
      `decisions: It is signed with a key this server does not know, ${other.fingerprint}.`,
    ]);
  });
});

describe("a trail that was put back", () => {
  const tables = ["activity", "revisions", "replays", "review_requests", "decisions", "comments"];
  const headOf = () => server.database("chains").where({ project_id: projectId });

  it("to an end that was signed, with all that came after it gone, is shown", async () => {
    const before = await headOf().first<object & { sequence: number }>();
    await createScenario(ada, projectId);
    await createScenario(ada, projectId);
    await server.database("activity").where({ project_id: projectId }).where("sequence", ">", before.sequence).delete();
    await headOf().update(before);
    const { sequence } = before;
    const lost = `chains: ${sequence + 2} rows were there when it was last looked at, ${sequence} are left.`;
    expect(await faults()).toEqual([lost]);
    // Written on from there it is as long again, and other than it was.
    await createScenario(ada, projectId);
    await createScenario(ada, projectId);
    expect(await faults()).toEqual(["activity: Another row stood at this place when it was last looked at."]);
  });

  it("or is gone with its project and its end, is shown", async () => {
    for (const table of [...tables, "chains", "checklists", "scenarios", "members", "notices"])
      await server.database(table).where({ project_id: projectId }).delete();
    await server.database("projects").where({ id: projectId }).delete();
    const { ready: isReady, chain } = await ready();
    const own = chain.faults.filter((fault) => fault.projectId === projectId);
    expect(isReady).toBe(false);
    expect(own.map(({ message }) => message)).toEqual([
      "There is no end of the chain.",
      expect.stringMatching(/^\d+ rows were there when it was last looked at, 0 are left\.$/),
    ]);
  });

  it("is shown by the next process too, which has seen nothing itself", async () => {
    const folder = await mkdtemp(join(tmpdir(), "restband-"));
    const seenEndsFile = join(folder, "seen-ends.json");
    const own = await createTestDatabase();
    const first = await startTestServer({ databaseUrl: own.url, seenEndsFile });
    const owner = await signUp(first, "Ona");
    const id = await createProject(owner);
    const before = await own.database("chains").where({ project_id: id }).first<{ sequence: number }>();
    await createScenario(owner, id);
    await vi.waitUntil(() => openSeenEnds(seenEndsFile).of(id)?.sequence === before.sequence + 1, { interval: 50 });
    await first.stop();
    await own.database("activity").where({ project_id: id }).where("sequence", ">", before.sequence).delete();
    await own.database("chains").where({ project_id: id }).update(before);
    const next = await startTestServer({ databaseUrl: own.url, seenEndsFile });
    const { body } = await next.browser().send<Ready>("GET", "/ready?deep");
    expect(body.chain.faults.map((fault) => fault.projectId)).toEqual([id]);
    expect(body.chain.faults[0].message).toMatch(/^\d+ rows were there/);
    await next.stop();
    await own.drop();
    await rm(folder, { recursive: true });
  });
});

describe("what was changed by SQL", () => {
  it("is shown as such where it is read: revision, comment, decision", async () => {
    const params = placeOf(revision);
    await server
      .database("revisions")
      .where({ id: revision.id })
      .update({ content: revision.text.replace("800", "900") });
    expect((await ada.get<Revision>("readRevision", { params })).faults).toEqual([
      "It was changed after it was written.",
      "Its text has another digest than the one it was frozen with.",
    ]);
    await server.database("comments").where({ project_id: projectId }).update({ words: "All is well." });
    const [comment] = await ada.get<Comment[]>("listComments", { params });
    expect(comment.faults).toEqual(["It was changed after it was written."]);
    await server.database("decisions").where({ project_id: projectId }).update({ kind: "return" });
    const { decisions } = await ada.get<Review>("readReview", { params });
    expect(decisions[0].faults).toEqual(["It was changed after it was written."]);
  });

  it("is refused to the server's own database account", async () => {
    const account = openDatabase(server.databaseUrl);
    for (const table of ["revisions", "replays", "review_requests", "decisions", "comments", "activity"]) {
      await expect(account(table).update({ sequence: 1 })).rejects.toMatchObject({ errno: 1142 });
      await expect(account(table).delete()).rejects.toMatchObject({ errno: 1142 });
    }
    await account.destroy();
  });
});

describe("with one database account for everything", () => {
  it("the product says that nothing guards the trail", async () => {
    const own = await createTestDatabase();
    const open = await startTestServer({ databaseUrl: own.migrationsUrl });
    const { body } = await open.browser().send<Ready>("GET", "/ready?deep");
    expect(body).toMatchObject({ ready: true, chain: { isGuarded: false, isWhole: true } });
    const owner = await signUp(open, "Ona");
    const params = { projectId: await createProject(owner) };
    expect((await owner.get<Integrity>("readIntegrity", { params })).isGuarded).toBe(false);
    await open.stop();
    await own.drop();
  });
});

describe("a trail from before there were chains", () => {
  it("is chained as it stands", async () => {
    const own = await createTestDatabase({ isMigrated: false });
    const { database } = own;
    const isEarlier = ({ name }: { name: string }) => name < "20261201101000";
    for (const { up } of migrations.filter(isEarlier)) await up(database);
    const projectId = crypto.randomUUID();
    const now = new Date();
    await database("projects").insert({
      id: projectId,
      name: "Old",
      description: "",
      created_at: now,
      updated_at: now,
    });
    const row = { account_id: crypto.randomUUID(), subject_id: null, created_at: now };
    for (const act of ["project.created", "project.changed", "member.added"]) {
      const detail = JSON.stringify({ name: "Hall é", b: 1, a: "x" });
      await database("activity").insert({ ...row, project_id: projectId, act, detail });
    }
    await database("activity").insert({ ...row, project_id: null, act: "account.signed-up", detail: "{}" });
    for (const { up } of migrations.filter((each) => !isEarlier(each))) await up(database);
    await signHeads(database);
    const { rows, faults: found } = await createChainService(database).readAll({ isFresh: true });
    expect({ rows, found }).toEqual({ rows: 4, found: [] });
    await own.drop();
  });
});
