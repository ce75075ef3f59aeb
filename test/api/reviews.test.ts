import { afterAll, beforeAll, describe, expect, it, vi } from "vitest";
import type { ActivityEntry, Notice, Replay, Review, Revision, StoredScenario } from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import { addMember, createProject, createScenario, signUp, smallScenario } from "../support/people.ts";
import { createComment, createRevision, decisionOn, freeze, placeOf, smallReplay } from "../support/revisions.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

type Person = Browser & { accountId: string; email: string };

let server: TestServer;
let [ada, bo, cy, di]: Person[] = [];
let projectId: string;

/** Ada owns the project, Bo edits, Cy and Di review. */
beforeAll(async () => {
  const generous = { account: { attempts: 1000, seconds: 60 }, origin: { attempts: 1000, seconds: 60 } };
  server = await startTestServer({ throttle: generous });
  [ada, bo, cy, di] = await Promise.all(["Ada", "Bo", "Cy", "Di"].map((name) => signUp(server, name)));
  projectId = await createProject(ada);
  await addMember(ada, projectId, bo.email, "editor");
  for (const { email } of [cy, di]) await addMember(ada, projectId, email, "reviewer");
});
afterAll(() => server.stop());

const read = (person: Person, revision: Revision) => person.get<Review>("readReview", { params: placeOf(revision) });
const stateOf = async (revision: Revision) =>
  (await ada.get<Revision>("readRevision", { params: placeOf(revision) })).state;

const ask = (revision: Revision, ...reviewers: Person[]) => {
  const body = { reviewers: reviewers.map(({ accountId }) => accountId), message: "Mind the clamp." };
  return bo.get<Review>("askForReview", { params: placeOf(revision), body });
};

const decide = (person: Person, revision: Revision, decision: "accept" | "return", more: object = {}) =>
  person.call<Review & { error: { code: string; message: string } }>("decideRevision", {
    params: placeOf(revision),
    body: { decision, ...decisionOn(revision), ...more },
  });

/** The next revision of the same scenario, with another preload. */
async function freezeNext(author: Person, { scenarioId }: Revision, preload: number): Promise<Revision> {
  const params = { projectId, scenarioId };
  const { version } = await author.get<StoredScenario>("readScenario", { params });
  const content = { ...smallScenario, contact: { ...smallScenario.contact, normal: { preload } } };
  return freeze(author, await author.get<StoredScenario>("saveScenario", { params, version, body: { content } }));
}

const waitingFor = async (person: Person, revision: Revision) =>
  (await person.get<Notice[]>("listNotices")).filter((notice) => notice.revision.id === revision.id);

describe("asking for a review", () => {
  it("puts it among what waits for each reviewer, until it is decided", async () => {
    const revision = await createRevision(bo, projectId);
    const review = await ask(revision, cy, di);
    expect(review.requests).toMatchObject([
      { reviewer: { name: "Cy" }, by: { name: "Bo" }, message: "Mind the clamp." },
      { reviewer: { name: "Di" } },
    ]);
    expect(await stateOf(revision)).toBe("in-review");
    expect(await waitingFor(cy, revision)).toMatchObject([
      { kind: "review-asked", by: { name: "Bo" }, revision: { number: 1 } },
    ]);
    expect((await decide(cy, revision, "return")).status).toBe(201);
    expect([await waitingFor(cy, revision), await waitingFor(di, revision)]).toEqual([[], []]);
    const [told] = await waitingFor(bo, revision);
    expect(told).toMatchObject({ kind: "returned", by: { name: "Cy" } });
    await bo.get("closeNotice", { params: { noticeId: told.id } });
    expect(await waitingFor(bo, revision)).toEqual([]);
  });

  it("names each who cannot be asked, with the reason", async () => {
    const revision = await createRevision(bo, projectId);
    await ask(revision, di);
    const reviewers = [bo, di, cy, cy].map(({ accountId }) => accountId).concat(crypto.randomUUID());
    const failure = await bo.fail("askForReview", { params: placeOf(revision), body: { reviewers, message: "" } });
    expect([failure.status, failure.fields]).toEqual([
      422,
      [
        { path: "reviewers[0]", message: "This is Bo's own work. Somebody else decides." },
        { path: "reviewers[1]", message: "Di was asked already." },
        { path: "reviewers[3]", message: "Cy was asked already." },
        { path: "reviewers[4]", message: "This is nobody of the project." },
      ],
    ]);
    expect((await read(ada, revision)).candidates.map(({ name }) => name)).toEqual(["Ada", "Cy"]);
  });
});

describe("deciding", () => {
  it("keeps reasons, digest, replay and the answers to the checklist, signed, and tells the trail", async () => {
    const revision = await createRevision(bo, projectId);
    const replay = await cy.get<Replay>("keepReplay", { params: placeOf(revision), body: smallReplay });
    const points = ["Every value has its origin.", "The margin is above 10 %."];
    await ada.get("setChecklist", { params: { projectId }, body: { points } });
    const checklist = points.map((point) => ({ point, answer: "yes" }));
    const { status, body } = await decide(cy, revision, "accept", { replayId: replay.id, checklist });
    expect(status).toBe(201);
    expect(body.decisions).toMatchObject([
      { kind: "accept", by: { name: "Cy" }, digest: revision.digest, replayId: replay.id, checklist, faults: [] },
    ]);
    expect(await stateOf(revision)).toBe("accepted");
    const [act] = await ada.get<ActivityEntry[]>("listActivity", { params: { projectId } });
    expect(act).toMatchObject({ act: "revision.accepted", subject: { id: revision.scenarioId }, by: { name: "Cy" } });
    await ada.get("setChecklist", { params: { projectId }, body: { points: [] } });
  });

  it("refuses a no in the checklist of what is accepted, and answers to another checklist", async () => {
    const revision = await createRevision(bo, projectId);
    await ada.get("setChecklist", { params: { projectId }, body: { points: ["Origins."] } });
    const no = await decide(cy, revision, "accept", { checklist: [{ point: "Origins.", answer: "no" }] });
    expect([no.status, no.body.error]).toMatchObject([422, { fields: [{ path: "checklist[0].answer" }] }]);
    const other = await decide(cy, revision, "accept", { checklist: [] });
    expect([other.status, other.body.error.code]).toEqual([409, "other-checklist"]);
    expect((await decide(cy, revision, "return", { checklist: [{ point: "Origins.", answer: "no" }] })).status).toBe(
      201,
    );
    await ada.get("setChecklist", { params: { projectId }, body: { points: [] } });
  });

  it("asks for the password again and throttles wrong ones", async () => {
    const strict = await startTestServer({
      throttle: { account: { attempts: 4, seconds: 60 }, origin: { attempts: 1000, seconds: 60 } },
    });
    const [owner, editor] = [await signUp(strict, "Ona"), await signUp(strict, "Ed")];
    const hall = await createProject(owner);
    await addMember(owner, hall, editor.email, "editor");
    const revision = await createRevision(editor, hall);
    const body = { decision: "accept", ...decisionOn(revision), password: "not the password" };
    const tries = [];
    for (let i = 0; i < 6; i++) tries.push(await owner.fail("decideRevision", { params: placeOf(revision), body }));
    expect(tries.map(({ status }) => status)).toEqual([422, 422, 422, 422, 429, 429]);
    expect(tries[0].fields).toEqual([{ path: "password", message: "This is not your password." }]);
    await strict.stop();
  });

  it("is refused with the reason on one's own work, until an accepted revision lies between", async () => {
    const revision = await createRevision(bo, projectId);
    const own = await freezeNext(ada, revision, 12);
    const refused = await decide(ada, own, "accept");
    expect(refused.status).toBe(403);
    expect(refused.body.error.message).toMatch(/^This is your own work: you froze it, or saved a change in it/);
    expect((await read(ada, own)).may).toMatchObject({ decide: false, selfCheck: false, ask: true });
    expect((await read(ada, own)).hindrance).toBe(refused.body.error.message);
    expect((await decide(cy, own, "accept")).status).toBe(201);
    // Ada's change is in what was accepted; what follows is Bo's alone.
    const next = await freezeNext(bo, revision, 13);
    expect(next.authors.map(({ name }) => name)).toEqual(["Bo"]);
    expect((await decide(ada, next, "accept")).status).toBe(201);
    expect([await stateOf(own), await stateOf(next)]).toEqual(["superseded", "accepted"]);
  });

  it("stands once: the other is told who was faster, and when", async () => {
    const revision = await createRevision(bo, projectId);
    const answers = await Promise.all([decide(cy, revision, "accept"), decide(di, revision, "return")]);
    const [won, lost] = answers.sort((a, b) => a.status - b.status);
    expect([won.status, lost.status, lost.body.error.code]).toEqual([201, 409, "decided"]);
    const { decisions } = await read(ada, revision);
    expect(decisions).toHaveLength(1);
    const verb = decisions[0].kind === "accept" ? "accepted" : "returned";
    expect(lost.body.error.message).toMatch(
      new RegExp(`^${decisions[0].by.name} ${verb} this revision on \\d+ \\w+ \\d{4}, \\d\\d:\\d\\d UTC\\.$`),
    );
  });

  it("is on what was looked at, by a replay of one's own", async () => {
    const revision = await createRevision(bo, projectId);
    const digest = await decide(cy, revision, "accept", { digest: "0".repeat(64) });
    expect([digest.status, digest.body.error.code]).toEqual([422, "other-digest"]);
    const replay = await di.get<Replay>("keepReplay", { params: placeOf(revision), body: smallReplay });
    const foreign = await decide(cy, revision, "accept", { replayId: replay.id });
    expect([foreign.status, foreign.body.error.code]).toEqual([422, "refused-replay"]);
  });
});

describe("withdrawing", () => {
  it("takes an owner and a reason, ends an acceptance, and is told to those who made and took it", async () => {
    const revision = await createRevision(bo, projectId);
    await decide(cy, revision, "accept");
    const body = {
      reasons: "The load case was wrong.",
      password: decisionOn(revision).password,
      digest: revision.digest,
    };
    expect((await cy.fail("withdrawRevision", { params: placeOf(revision), body })).status).toBe(403);
    const unreasoned = { ...body, reasons: " " };
    expect((await ada.fail("withdrawRevision", { params: placeOf(revision), body: unreasoned })).status).toBe(400);
    const review = await ada.get<Review>("withdrawRevision", { params: placeOf(revision), body });
    expect(review.decisions.map(({ kind }) => kind)).toEqual(["accept", "withdraw"]);
    expect(await stateOf(revision)).toBe("withdrawn");
    for (const person of [bo, cy]) {
      expect((await waitingFor(person, revision)).map(({ kind }) => kind)).toContain("withdrawn");
    }
    expect((await ada.fail("withdrawRevision", { params: placeOf(revision), body })).status).toBe(409);
    // What was accepted before counts no more: all changes are open again.
    expect((await freezeNext(bo, revision, 12)).authors.map(({ name }) => name)).toEqual(["Bo"]);
  });
});

describe("self-checked", () => {
  it("is for work that nobody else in the project can look at", async () => {
    const alone = await createProject(ada, "Alone");
    const revision = await createRevision(ada, alone);
    const params = placeOf(revision);
    const review = await read(ada, revision);
    expect(review.may).toEqual({ ask: false, decide: false, selfCheck: true, withdraw: true });
    const body = decisionOn(revision);
    await addMember(ada, alone, cy.email, "reviewer");
    expect(await ada.fail("selfCheckRevision", { params, body })).toMatchObject({
      status: 403,
      message: "Cy can decide on it. Self-checked is for work that nobody else in the project can look at.",
    });
    await ada.get("removeMember", { params: { projectId: alone, accountId: cy.accountId } });
    await ada.get("selfCheckRevision", { params, body });
    expect((await ada.get<Revision>("readRevision", { params })).state).toBe("self-checked");
    expect((await ada.fail("selfCheckRevision", { params, body })).code).toBe("decided");
  });
});

describe("what waits for a person", () => {
  it("is theirs alone, and goes with their membership", async () => {
    const hall = await createProject(ada, "Hall 5");
    await addMember(ada, hall, bo.email, "editor");
    await addMember(ada, hall, cy.email, "reviewer");
    const revision = await createRevision(bo, hall);
    await ask(revision, cy);
    const [notice] = await waitingFor(cy, revision);
    await ada.get("closeNotice", { params: { noticeId: notice.id } });
    expect(await waitingFor(cy, revision)).toHaveLength(1);
    await ada.get("removeMember", { params: { projectId: hall, accountId: cy.accountId } });
    expect(await waitingFor(cy, revision)).toEqual([]);
  });
});

describe("the trail", () => {
  it("is filtered by what an act is about, by person, scenario and time", async () => {
    const revision = await createRevision(bo, projectId);
    await createComment(cy, revision);
    const list = async (query: string) =>
      (await ada.get<ActivityEntry[]>("listActivity", { params: { projectId }, query })).map(({ act }) => act);
    const { scenarioId } = revision;
    expect(await list(`?scenarioId=${scenarioId}`)).toEqual(["comment.added", "revision.frozen", "scenario.created"]);
    expect(await list(`?scenarioId=${scenarioId}&about=revision`)).toEqual(["revision.frozen"]);
    expect(await list(`?scenarioId=${scenarioId}&by=${cy.accountId}`)).toEqual(["comment.added"]);
    expect(await list(`?scenarioId=${scenarioId}&from=${revision.frozenAt}`)).not.toContain("scenario.created");
    expect(await list(`?scenarioId=${scenarioId}&to=${revision.frozenAt}`)).toEqual(["scenario.created"]);
  });
});

it("keeps the scenario's name with each act", async () => {
  const scenario = await createScenario(bo, projectId, { ...smallScenario, title: "Tail clamp" });
  await freeze(bo, scenario);
  const [act] = await ada.get<ActivityEntry[]>("listActivity", { params: { projectId } });
  expect(act).toMatchObject({ act: "revision.frozen", subject: { name: "Tail clamp", isThere: true } });
});

describe("a role that is lost while its holder waits for others", () => {
  const isWaiting = async () => {
    const [rows] = await server.database.raw<[object[]]>(
      "SELECT trx_id FROM information_schema.innodb_trx WHERE trx_state = 'LOCK WAIT'",
    );
    return rows.length > 0;
  };

  it.each([
    ["reader", 403],
    [null, 404],
  ])("decides nothing any more: now %s", async (role, status) => {
    const revision = await createRevision(bo, projectId);
    const others = await server.database.transaction();
    await others("chains").where({ project_id: projectId }).forUpdate().first();
    const decision = decide(di, revision, "accept");
    // The database tells nothing new to who asks more often than ten times a second.
    await vi.waitUntil(isWaiting, { interval: 200, timeout: 10_000 }).catch(() => others.rollback());
    const membership = server.database("members").where({ project_id: projectId, account_id: di.accountId });
    await (role ? membership.clone().update({ role }) : membership.clone().delete());
    await others.commit();
    expect((await decision).status).toBe(status);
    expect(await stateOf(revision)).toBe("open");
    if (role) await membership.clone().update({ role: "reviewer" });
  });
});
