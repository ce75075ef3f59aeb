import type { z } from "@restband/solver";
import { recordAct } from "../activity/activity-service.ts";
import type { Act } from "../activity/activity.ts";
import { holdChain } from "../chain/chain.ts";
import type { Database } from "../database/database.ts";
import { notFound, refusedContent } from "../errors.ts";
import type { MembersService } from "../members/members-service.ts";
import { tell } from "../notices/notices-service.ts";
import type { RevisionPlace, RevisionsService } from "../revisions/revisions-service.ts";
import type { Revision } from "../revisions/revisions-schema.ts";
import type { Anchor, Comment, commentDraftSchema, replyDraftSchema } from "./comments-schema.ts";
import { valueAt } from "./value-at.ts";
import { type Entry, insertEntry, listComments } from "./comments-store.ts";

export type CommentsService = ReturnType<typeof createCommentsService>;

type CommentPlace = RevisionPlace & { readonly commentId: string };
type Draft = z.infer<typeof commentDraftSchema>;
type Reply = z.infer<typeof replyDraftSchema>;

/** What is said to a revision. Nothing said is ever changed: settling a comment adds that it is settled. */
export function createCommentsService(database: Database, members: MembersService, revisions: RevisionsService) {
  const toggle = async (place: CommentPlace, accountId: string, entry: "settle" | "reopen") => {
    const revision = await revisions.read(place);
    return database.transaction(async (transaction) => {
      await holdChain(transaction, place.projectId);
      const comment = await demand(transaction, place);
      if ((comment.settled !== null) === (entry === "settle")) return comment;
      const act = entry === "settle" ? "comment.settled" : "comment.reopened";
      return say(transaction, revision, act, { entry, parentId: place.commentId, saidBy: accountId });
    });
  };

  return {
    async list(place: RevisionPlace): Promise<Comment[]> {
      await revisions.read(place);
      return listComments(database, place.revisionId);
    },

    async add(place: RevisionPlace, { anchor, words, mentions }: Draft, accountId: string): Promise<Comment> {
      const revision = await revisions.read(place);
      demandAnchor(anchor, revision);
      await demandMembers(members, place.projectId, mentions);
      return database.transaction(async (transaction) => {
        const entry = { entry: "comment", anchor, words, mentions, saidBy: accountId } as const;
        const comment = await say(transaction, revision, "comment.added", entry);
        const notice = { by: accountId, ...place, commentId: comment.id };
        const toMaker = { ...notice, to: revision.frozenBy.accountId, kind: "commented" as const };
        await tell(transaction, [...mentionsOf(notice, mentions), toMaker]);
        return comment;
      });
    },

    async reply(place: CommentPlace, { words, mentions }: Reply, accountId: string): Promise<Comment> {
      const revision = await revisions.read(place);
      await demandMembers(members, place.projectId, mentions);
      return database.transaction(async (transaction) => {
        await demand(transaction, place);
        const entry = { entry: "answer", parentId: place.commentId, words, mentions, saidBy: accountId } as const;
        const comment = await say(transaction, revision, "comment.answered", entry);
        const notice = { by: accountId, ...place };
        const told = [comment, ...comment.replies].map(({ by }) => by.accountId);
        const others = told.map((to) => ({ ...notice, to, kind: "answered" as const }));
        await tell(transaction, [...mentionsOf(notice, mentions), ...others]);
        return comment;
      });
    },

    settle: (place: CommentPlace, accountId: string) => toggle(place, accountId, "settle"),
    reopen: (place: CommentPlace, accountId: string) => toggle(place, accountId, "reopen"),
  };
}

/** Who is named in what was said. */
const mentionsOf = <T>(notice: T, mentions: readonly string[]) =>
  mentions.map((to) => ({ ...notice, to, kind: "mentioned" as const }));

/** Adds an entry, tells the trail, and returns its comment as it stands then. */
async function say(
  transaction: Database,
  revision: Revision,
  act: Act,
  entry: Omit<Entry, "projectId" | "revisionId">,
) {
  const { projectId, id: revisionId, number, scenarioId: subjectId } = revision;
  const id = await insertEntry(transaction, { projectId, revisionId, ...entry });
  const commentId = entry.parentId ?? id;
  const detail = { revisionId, number, commentId };
  await recordAct(transaction, { projectId, accountId: entry.saidBy, act, subjectId, detail });
  return demand(transaction, { projectId, revisionId, commentId });
}

async function demand(database: Database, { revisionId, commentId }: CommentPlace): Promise<Comment> {
  const comments = await listComments(database, revisionId);
  return comments.find(({ id }) => id === commentId) ?? noSuchComment();
}

function noSuchComment(): never {
  throw notFound();
}

/** Only what is there can be commented on. */
function demandAnchor(anchor: Anchor, { content }: Revision): void {
  const fault = anchorFault(anchor, content);
  if (fault) throw refusedContent("refused-anchor", [fault]);
}

function anchorFault(anchor: Anchor, content: Revision["content"]) {
  const { seconds } = content.span;
  switch (anchor.kind) {
    case "whole":
      return null;
    case "field":
      if (valueAt(content, anchor.path) !== undefined) return null;
      return { path: "anchor.path", message: "There is no such field in this revision." };
    case "instant":
      return anchor.t <= seconds ? null : { path: "anchor.t", message: `The run ends at ${seconds} s.` };
    case "span":
      if (anchor.from >= anchor.to) return { path: "anchor.to", message: "A span ends after it begins." };
      return anchor.to <= seconds ? null : { path: "anchor.to", message: `The run ends at ${seconds} s.` };
  }
}

async function demandMembers(members: MembersService, projectId: string, mentions: readonly string[]): Promise<void> {
  if (mentions.length === 0) return;
  const known = new Set((await members.list(projectId)).map(({ accountId }) => accountId));
  const faults = mentions.flatMap((id, i) =>
    known.has(id) ? [] : [{ path: `mentions[${i}]`, message: "This is nobody of the project." }],
  );
  if (faults.length > 0) throw refusedContent("refused-mentions", faults);
}
