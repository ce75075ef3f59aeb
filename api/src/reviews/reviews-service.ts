import type { z } from "@restband/solver";
import { recordAct } from "../activity/activity-service.ts";
import { holdChain } from "../chain/chain.ts";
import type { Database } from "../database/database.ts";
import { refusedContent } from "../errors.ts";
import type { Member } from "../members/members-schema.ts";
import { tell } from "../notices/notices-service.ts";
import type { RevisionPlace } from "../revisions/revisions-service.ts";
import type { Revision } from "../revisions/revisions-schema.ts";
import { findChecklist, saveChecklist } from "./checklists-store.ts";
import {
  decidersOf,
  demandMaker,
  demandUndecided,
  hindranceOf,
  isOwn,
  mayOf,
  type Standpoint,
} from "./review-rules.ts";
import type { askSchema, Checklist, Review } from "./reviews-schema.ts";
import { insertRequest, listRequests } from "./reviews-store.ts";
import type { Actor, ReadStandpoint } from "./standpoint.ts";

export type ReviewsService = ReturnType<typeof createReviewsService>;

/** Who was asked to review a revision, and what it is looked at for. */
export function createReviewsService(database: Database, readStandpoint: ReadStandpoint) {
  async function read(place: RevisionPlace, actor: Actor): Promise<Review> {
    const standpoint = await readStandpoint(database, place, actor);
    const requests = await listRequests(database, place.revisionId);
    const candidates = candidatesOf(standpoint, requests);
    return {
      requests,
      decisions: [...standpoint.decisions],
      checklist: await findChecklist(database, place.projectId),
      may: mayOf(standpoint, candidates.length),
      hindrance: hindranceOf(standpoint),
      candidates,
    };
  }

  return {
    read,

    /** Asks members to review; they find it among what waits for them. */
    ask(place: RevisionPlace, { reviewers, message }: z.infer<typeof askSchema>, actor: Actor): Promise<void> {
      return database.transaction(async (transaction) => {
        await holdChain(transaction, place.projectId);
        const standpoint = await readStandpoint(transaction, place, actor);
        demandMaker(standpoint);
        demandUndecided(standpoint.revision, standpoint.decisions);
        demandAskable(reviewers, standpoint, await listRequests(transaction, place.revisionId));
        const by = actor.account.id;
        for (const reviewerId of reviewers) {
          await insertRequest(transaction, place, { reviewerId, message, askedBy: by });
          await recordAct(transaction, askAct(place, standpoint, reviewerId, by));
        }
        await tell(
          transaction,
          reviewers.map((to) => ({ to, kind: "review-asked", by, ...place })),
        );
      });
    },

    readChecklist: (projectId: string) => findChecklist(database, projectId),

    setChecklist(projectId: string, checklist: Checklist, accountId: string): Promise<Checklist> {
      return database.transaction(async (transaction) => {
        await saveChecklist(transaction, projectId, checklist, accountId);
        const detail = { count: checklist.points.length, points: checklist.points.join("\n") };
        await recordAct(transaction, { projectId, accountId, act: "checklist.set", detail });
        return findChecklist(transaction, projectId);
      });
    },
  };
}

function candidatesOf({ revision, members }: Standpoint, requests: Review["requests"]) {
  const asked = new Set(requests.map(({ reviewer }) => reviewer.accountId));
  return decidersOf(revision, members)
    .filter(({ accountId }) => !asked.has(accountId))
    .map(({ accountId, name }) => ({ accountId, name }));
}

/** Each of those asked has to be able to decide, and not asked before; all others are named. */
function demandAskable(reviewers: readonly string[], standpoint: Standpoint, requests: Review["requests"]): void {
  const candidates = new Set(candidatesOf(standpoint, requests).map(({ accountId }) => accountId));
  const faults = reviewers.flatMap((id, i) => {
    const isTwice = reviewers.indexOf(id) < i;
    if (candidates.has(id) && !isTwice) return [];
    const member = standpoint.members.find(({ accountId }) => accountId === id);
    return [{ path: `reviewers[${i}]`, message: whyNot(member, standpoint.revision) }];
  });
  if (faults.length > 0) throw refusedContent("refused-reviewers", faults);
}

function whyNot(member: Member | undefined, revision: Revision): string {
  if (!member) return "This is nobody of the project.";
  if (isOwn(revision, member.accountId)) return `This is ${member.name}'s own work. Somebody else decides.`;
  if (member.role === "owner" || member.role === "reviewer") return `${member.name} was asked already.`;
  return `${member.name} is ${member.role} here; owners and reviewers decide.`;
}

function askAct(place: RevisionPlace, { revision, members }: Standpoint, reviewerId: string, accountId: string) {
  const reviewer = members.find((member) => member.accountId === reviewerId)!.name;
  const detail = { revisionId: place.revisionId, number: revision.number, reviewer, reviewerId };
  const { projectId } = place;
  return { projectId, accountId, act: "review.asked", subjectId: revision.scenarioId, detail } as const;
}
