import type { Account } from "../accounts/accounts-schema.ts";
import type { Database } from "../database/database.ts";
import { notFound } from "../errors.ts";
import { membersIn } from "../members/members-service.ts";
import type { RevisionPlace, RevisionsService } from "../revisions/revisions-service.ts";
import type { Standpoint } from "./review-rules.ts";
import { listDecisions } from "./reviews-store.ts";

/** Somebody who does something to a revision. */
export interface Actor {
  readonly account: Account;
}

/** Reads everything that decides what somebody may do with a revision, as it is in the transaction. */
export type ReadStandpoint = (transaction: Database, place: RevisionPlace, actor: Actor) => Promise<Standpoint>;

export function createReadStandpoint(revisions: RevisionsService): ReadStandpoint {
  return async (transaction, place, { account }) => {
    const members = await membersIn(transaction, place.projectId);
    // As it is now: between the request and this there may have been a long wait.
    const role = members.find(({ accountId }) => accountId === account.id)?.role;
    if (!role) throw notFound();
    return {
      ...{ accountId: account.id, role, members },
      revision: await revisions.readIn(transaction, place),
      decisions: await listDecisions(transaction, place.revisionId),
    };
  };
}
