import type { Account } from "../accounts/accounts-schema.ts";
import type { Database } from "../database/database.ts";
import type { Role } from "../members/members-schema.ts";
import { membersIn } from "../members/members-service.ts";
import type { RevisionPlace, RevisionsService } from "../revisions/revisions-service.ts";
import type { Standpoint } from "./review-rules.ts";
import { listDecisions } from "./reviews-store.ts";

/** Somebody who does something to a revision. */
export interface Actor {
  readonly account: Account;
  readonly role: Role;
}

/** Reads everything that decides what somebody may do with a revision, as it is in the transaction. */
export type ReadStandpoint = (transaction: Database, place: RevisionPlace, actor: Actor) => Promise<Standpoint>;

export function createReadStandpoint(revisions: RevisionsService): ReadStandpoint {
  return async (transaction, place, { account, role }) => ({
    accountId: account.id,
    role,
    revision: await revisions.readIn(transaction, place),
    members: await membersIn(transaction, place.projectId),
    decisions: await listDecisions(transaction, place.revisionId),
  });
}
