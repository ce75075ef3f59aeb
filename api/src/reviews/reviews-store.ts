import { randomUUID } from "node:crypto";
import type { Account } from "../accounts/accounts-schema.ts";
import { append } from "../chain/chain.ts";
import { type Link, rowFaults } from "../chain/walk.ts";
import { type Database, signingKeyOf } from "../database/database.ts";
import type { RevisionPlace } from "../revisions/revisions-service.ts";
import type { Decision, Review } from "./reviews-schema.ts";

const REQUESTS = "review_requests";
const DECISIONS = "decisions";

interface RequestRow {
  reviewer_id: string;
  reviewer_name: string;
  asked_by: string;
  asked_by_name: string;
  asked_at: Date;
  message: string;
}

interface DecisionRow extends Link {
  id: string;
  kind: Decision["kind"];
  decided_by: string;
  decided_by_name: string;
  decided_at: Date;
  reasons: string;
  digest: Buffer;
  replay_id: string | null;
  checklist: string;
}

/** A decision as it is added. */
export type NewDecision = Pick<Decision, "kind" | "reasons" | "digest" | "replayId" | "checklist">;

/** Who was asked to review a revision, oldest first. */
export async function listRequests(database: Database, revisionId: string): Promise<Review["requests"]> {
  const rows = await database(REQUESTS)
    .join("accounts as reviewers", "reviewers.id", "review_requests.reviewer_id")
    .join("accounts as askers", "askers.id", "review_requests.asked_by")
    .where({ revision_id: revisionId })
    .orderBy("review_requests.sequence")
    .select<RequestRow[]>("review_requests.*", "reviewers.name as reviewer_name", "askers.name as asked_by_name");
  return rows.map((row) => ({
    reviewer: { accountId: row.reviewer_id, name: row.reviewer_name },
    by: { accountId: row.asked_by, name: row.asked_by_name },
    at: row.asked_at.toISOString(),
    message: row.message,
  }));
}

export async function insertRequest(
  transaction: Database,
  { projectId, revisionId }: RevisionPlace,
  { reviewerId, message, askedBy }: { reviewerId: string; message: string; askedBy: string },
): Promise<void> {
  await append(transaction, REQUESTS, {
    ...{ id: randomUUID(), project_id: projectId, revision_id: revisionId, reviewer_id: reviewerId },
    ...{ message, asked_by: askedBy, asked_at: new Date() },
  });
}

/** What was decided on a revision, oldest first. */
export async function listDecisions(database: Database, revisionId: string): Promise<Decision[]> {
  const rows = await database(DECISIONS)
    .where({ revision_id: revisionId })
    .orderBy("sequence")
    .select<DecisionRow[]>("*");
  const key = signingKeyOf(database);
  return rows.map((row) => decisionFrom(row, rowFaults(DECISIONS, row, key)));
}

export async function insertDecision(
  transaction: Database,
  { projectId, revisionId }: RevisionPlace,
  { kind, reasons, digest, replayId, checklist }: NewDecision,
  { id: decidedBy, name }: Account,
): Promise<string> {
  const id = randomUUID();
  await append(transaction, DECISIONS, {
    ...{ id, project_id: projectId, revision_id: revisionId, step: kind === "withdraw" ? 2 : 1, kind, reasons },
    ...{ digest: Buffer.from(digest, "hex"), replay_id: replayId, checklist: JSON.stringify(checklist) },
    ...{ decided_by: decidedBy, decided_by_name: name, decided_at: new Date() },
  });
  return id;
}

function decisionFrom(row: DecisionRow, faults: string[]): Decision {
  return {
    id: row.id,
    kind: row.kind,
    by: { accountId: row.decided_by, name: row.decided_by_name },
    at: row.decided_at.toISOString(),
    reasons: row.reasons,
    digest: row.digest.toString("hex"),
    replayId: row.replay_id,
    checklist: JSON.parse(row.checklist) as Decision["checklist"],
    faults,
  };
}
