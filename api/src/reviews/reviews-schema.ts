import { z } from "@restband/solver";
import { addresses } from "../addresses.ts";
import { passwordSchema } from "../accounts/accounts-schema.ts";
import { personSchema, revisionParams } from "../revisions/revisions-schema.ts";

const projectParams = z.strictObject({ projectId: z.uuid() });

const reasons = z.string().trim().min(1).max(4000);
const digest = z.string().regex(/^[0-9a-f]{64}$/);

/** One point of a project's checklist, and what a reviewer says to it. */
const checkedPoint = z.strictObject({
  point: z.string().max(300),
  answer: z.enum(["yes", "no", "not-applicable"]),
});

export const checklistSchema = z.strictObject({ points: z.array(z.string().trim().min(1).max(300)).max(40) });
export type Checklist = z.infer<typeof checklistSchema>;

export const askSchema = z.strictObject({
  reviewers: z.array(z.uuid()).min(1).max(20),
  message: z.string().trim().max(2000),
});

/**
 * The password and the digest that was looked at stand for the person and the thing. `replayId` is one of the person's own
 * replays of this revision, null for none. Accepting takes an answer other than `no` to each point of the checklist.
 */
export const decideSchema = z.strictObject({
  decision: z.enum(["accept", "return"]),
  reasons,
  password: passwordSchema,
  digest,
  replayId: z.uuid().nullable(),
  checklist: z.array(checkedPoint).max(40),
});
export const selfCheckSchema = decideSchema.omit({ decision: true });
export const withdrawSchema = z.strictObject({ reasons, password: passwordSchema, digest });

export const decisionSchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(["accept", "return", "self-check", "withdraw"]),
  by: personSchema,
  at: z.iso.datetime(),
  reasons: z.string(),
  digest: z.string(),
  replayId: z.uuid().nullable(),
  checklist: z.array(checkedPoint),
  /** As of a revision: empty for a decision as it was signed. */
  faults: z.array(z.string()),
});
export type Decision = z.infer<typeof decisionSchema>;

export const reviewSchema = z.strictObject({
  /** Who was asked to review, by whom, oldest first. */
  requests: z.array(
    z.strictObject({ reviewer: personSchema, by: personSchema, at: z.iso.datetime(), message: z.string() }),
  ),
  /** Oldest first: accepted, returned or self-checked, and perhaps withdrawn after that. */
  decisions: z.array(decisionSchema),
  /** The project's, as it is now. */
  checklist: checklistSchema,
  /** What the asking person may do with the revision as it stands. */
  may: z.strictObject({ ask: z.boolean(), decide: z.boolean(), selfCheck: z.boolean(), withdraw: z.boolean() }),
  /** Why they may not decide, as a sentence; null where they may. */
  hindrance: z.string().nullable(),
  /** Members who may be asked: their role decides, the work is not their own, and nobody has asked them yet. */
  candidates: z.array(personSchema),
});
export type Review = z.infer<typeof reviewSchema>;

export const reviewsContract = {
  readReview: {
    ...addresses.readReview,
    params: revisionParams,
    status: 200,
    response: reviewSchema,
  },
  askForReview: {
    ...addresses.askForReview,
    params: revisionParams,
    body: askSchema,
    status: 201,
    response: reviewSchema,
  },
  /** 403 for one's own work; 409 `decided` where somebody was faster: the message says who and when. */
  decideRevision: {
    ...addresses.decideRevision,
    params: revisionParams,
    body: decideSchema,
    status: 201,
    response: reviewSchema,
  },
  /** By one of its authors, where no other member could decide. */
  selfCheckRevision: {
    ...addresses.selfCheckRevision,
    params: revisionParams,
    body: selfCheckSchema,
    status: 201,
    response: reviewSchema,
  },
  withdrawRevision: {
    ...addresses.withdrawRevision,
    params: revisionParams,
    body: withdrawSchema,
    status: 201,
    response: reviewSchema,
  },
  readChecklist: {
    ...addresses.readChecklist,
    params: projectParams,
    status: 200,
    response: checklistSchema,
  },
  setChecklist: {
    ...addresses.setChecklist,
    params: projectParams,
    body: checklistSchema,
    status: 200,
    response: checklistSchema,
  },
} as const;
