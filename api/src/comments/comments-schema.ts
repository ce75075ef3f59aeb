import { z } from "@restband/solver";
import { addresses } from "../addresses.ts";
import { personSchema, revisionParams } from "../revisions/revisions-schema.ts";

/** What a comment is about: the whole revision, one of its fields, an instant or a span of its time axis (s). */
export const anchorSchema = z.discriminatedUnion("kind", [
  z.strictObject({ kind: z.literal("whole") }),
  z.strictObject({ kind: z.literal("field"), path: z.string().min(1).max(200) }),
  z.strictObject({ kind: z.literal("instant"), t: z.number().min(0) }),
  z.strictObject({ kind: z.literal("span"), from: z.number().min(0), to: z.number().min(0) }),
]);
export type Anchor = z.infer<typeof anchorSchema>;

const words = z.string().trim().min(1).max(4000);
/** Members who are told, though nobody asked them. */
const mentions = z.array(z.uuid()).max(20);

export const commentDraftSchema = z.strictObject({ anchor: anchorSchema, words, mentions });
export const replyDraftSchema = z.strictObject({ words, mentions });

const said = {
  id: z.uuid(),
  by: personSchema,
  at: z.iso.datetime(),
  words: z.string(),
  mentions: z.array(personSchema),
  /** As of a revision: empty for what stands as it was written. */
  faults: z.array(z.string()),
};

/** A comment with what was said to it. Nothing of it is ever changed: settling and opening again are entries too. */
export const commentSchema = z.strictObject({
  ...said,
  /** Counts the comments of a revision from 1. */
  number: z.number().int(),
  anchor: anchorSchema,
  replies: z.array(z.strictObject(said)),
  settled: z.strictObject({ by: personSchema, at: z.iso.datetime() }).nullable(),
});
export type Comment = z.infer<typeof commentSchema>;

const commentParams = revisionParams.extend({ commentId: z.uuid() });

export const commentsContract = {
  /** Oldest first. */
  listComments: {
    ...addresses.listComments,
    params: revisionParams,
    status: 200,
    response: z.array(commentSchema),
  },
  addComment: {
    ...addresses.addComment,
    params: revisionParams,
    body: commentDraftSchema,
    isOnce: true,
    status: 201,
    response: commentSchema,
  },
  replyToComment: {
    ...addresses.replyToComment,
    params: commentParams,
    body: replyDraftSchema,
    isOnce: true,
    status: 201,
    response: commentSchema,
  },
  settleComment: {
    ...addresses.settleComment,
    params: commentParams,
    status: 200,
    response: commentSchema,
  },
  reopenComment: {
    ...addresses.reopenComment,
    params: commentParams,
    status: 200,
    response: commentSchema,
  },
} as const;
