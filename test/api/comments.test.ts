import { afterAll, beforeAll, describe, expect, it } from "vitest";
import type { ActivityEntry, Comment, Notice, Revision } from "../../api/src/contract.ts";
import type { Browser } from "../support/browser.ts";
import { addMember, createProject, signUp } from "../support/people.ts";
import { createComment, createRevision, placeOf, smallComment } from "../support/revisions.ts";
import { startTestServer, type TestServer } from "../support/test-server.ts";

type Person = Browser & { accountId: string; email: string };

let server: TestServer;
let [ada, bo, cy]: Person[] = [];
let projectId: string;
let revision: Revision;

beforeAll(async () => {
  server = await startTestServer();
  [ada, bo, cy] = await Promise.all(["Ada", "Bo", "Cy"].map((name) => signUp(server, name)));
  projectId = await createProject(ada);
  await addMember(ada, projectId, bo.email, "reviewer");
  await addMember(ada, projectId, cy.email, "reader");
  revision = await createRevision(ada, projectId);
});
afterAll(() => server.stop());

const add = (body: object) => bo.get<Comment>("addComment", { params: placeOf(revision), body });
const list = () => bo.get<Comment[]>("listComments", { params: placeOf(revision) });
const noticesOf = async (person: Person, { id }: Comment) =>
  (await person.get<Notice[]>("listNotices")).filter(({ commentId }) => commentId === id).map(({ kind }) => kind);

describe("a comment", () => {
  it.each([
    { kind: "whole" },
    { kind: "field", path: "contact.normal.preload" },
    { kind: "instant", t: 0.036 },
    { kind: "span", from: 0.25, to: 0.5 },
  ])("is about %j", async (anchor) => {
    const comment = await add({ ...smallComment, anchor });
    expect(comment).toMatchObject({ anchor, by: { name: "Bo" }, replies: [], settled: null, faults: [] });
    expect((await list()).at(-1)).toEqual(comment);
    expect(comment.number).toBe((await list()).length);
  });

  it.each([
    [{ kind: "field", path: "contact.normal.luck" }, "anchor.path", "There is no such field in this revision."],
    [{ kind: "instant", t: 5.1 }, "anchor.t", "The run ends at 5 s."],
    [{ kind: "span", from: 1, to: 1 }, "anchor.to", "A span ends after it begins."],
    [{ kind: "span", from: 1, to: 6 }, "anchor.to", "The run ends at 5 s."],
  ])("is refused about %j", async (anchor, path, message) => {
    const failure = await bo.fail("addComment", { params: placeOf(revision), body: { ...smallComment, anchor } });
    expect([failure.status, failure.fields]).toEqual([422, [{ path, message }]]);
  });

  it("is answered, settled and opened again, each an entry of the trail and none twice", async () => {
    const { id: commentId } = await createComment(bo, revision);
    const params = { ...placeOf(revision), commentId };
    const words = "The friction holds it.";
    const answered = await ada.get<Comment>("replyToComment", { params, body: { words, mentions: [] } });
    expect(answered.replies).toMatchObject([{ words, by: { name: "Ada" }, faults: [] }]);
    const settled = await bo.get<Comment>("settleComment", { params });
    expect(settled.settled).toMatchObject({ by: { name: "Bo" } });
    expect(await ada.get<Comment>("settleComment", { params })).toEqual(settled);
    const read = async () => (await bo.get<Revision>("readRevision", { params })).openComments;
    const before = await read();
    expect((await ada.get<Comment>("reopenComment", { params })).settled).toBeNull();
    expect(await read()).toBe(before + 1);
    const acts = await ada.get<ActivityEntry[]>("listActivity", { params: { projectId } });
    expect(acts.slice(0, 4).map(({ act, detail }) => [act, detail.commentId])).toEqual([
      ["comment.reopened", commentId],
      ["comment.settled", commentId],
      ["comment.answered", commentId],
      ["comment.added", commentId],
    ]);
  });

  it("is not found under another revision", async () => {
    const { id: commentId } = await createComment(bo, revision);
    const other = await createRevision(ada, projectId);
    const params = { ...placeOf(other), commentId };
    expect((await bo.fail("settleComment", { params })).status).toBe(404);
    expect((await bo.fail("replyToComment", { params, body: { words: "x", mentions: [] } })).status).toBe(404);
  });
});

describe("people", () => {
  it("who are mentioned are told, readers too; who froze it is told of each comment, and nobody of their own", async () => {
    const comment = await add({ ...smallComment, mentions: [cy.accountId] });
    expect(comment.mentions).toEqual([{ accountId: cy.accountId, name: "Cy" }]);
    expect(await noticesOf(cy, comment)).toEqual(["mentioned"]);
    expect(await noticesOf(ada, comment)).toEqual(["commented"]);
    expect(await noticesOf(bo, comment)).toEqual([]);
    const params = { ...placeOf(revision), commentId: comment.id };
    await ada.get("replyToComment", { params, body: { words: "As asked.", mentions: [] } });
    expect(await noticesOf(bo, comment)).toEqual(["answered"]);
    expect(await noticesOf(ada, comment)).toEqual(["commented"]);
  });

  it("who are not of the project cannot be mentioned", async () => {
    const stranger = await signUp(server, "Stranger");
    const body = { ...smallComment, mentions: [cy.accountId, stranger.accountId] };
    const failure = await bo.fail("addComment", { params: placeOf(revision), body });
    expect(failure).toMatchObject({ status: 422, fields: [{ path: "mentions[1]" }] });
  });
});
