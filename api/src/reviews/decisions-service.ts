import type { z } from "@restband/solver";
import { recordAct } from "../activity/activity-service.ts";
import type { Act } from "../activity/activity.ts";
import { holdChain } from "../chain/chain.ts";
import type { Database } from "../database/database.ts";
import { notAllowed, Refusal, refusedContent } from "../errors.ts";
import { endWaiting, tell } from "../notices/notices-service.ts";
import type { RevisionPlace, RevisionsService } from "../revisions/revisions-service.ts";
import type { Revision } from "../revisions/revisions-schema.ts";
import { demandAnswers } from "./checklist-rules.ts";
import { findChecklist } from "./checklists-store.ts";
import { demandAlone, demandDecider, demandMaker, demandUndecided, type Standpoint } from "./review-rules.ts";
import type { Checklist, Decision, decideSchema, withdrawSchema } from "./reviews-schema.ts";
import { insertDecision, listDecisions, listRequests, type NewDecision } from "./reviews-store.ts";
import type { Actor, ReadStandpoint } from "./standpoint.ts";

export type DecisionsService = ReturnType<typeof createDecisionsService>;

/** Somebody who signs a decision with their name. */
export interface Signer extends Actor {
  /** Demands their password once more: 422 for a wrong one, 429 for too many. */
  readonly confirm: (password: string) => Promise<void>;
}

type Decide = z.infer<typeof decideSchema>;
type Signed = NewDecision & { readonly password: string };

const acts: Record<Decision["kind"], Act> = {
  accept: "revision.accepted",
  return: "revision.returned",
  "self-check": "revision.self-checked",
  withdraw: "revision.withdrawn",
};

/** What is decided on a revision: once, and perhaps withdrawn after that. */
export function createDecisionsService(
  database: Database,
  revisions: RevisionsService,
  readStandpoint: ReadStandpoint,
) {
  /** Keeps a decision once `demand` is content, twice: before the password is asked for, and once nobody else can decide. */
  async function decide(
    place: RevisionPlace,
    signer: Signer,
    { password, ...decision }: Signed,
    demand: (standpoint: Standpoint, checklist: Checklist) => void,
  ): Promise<void> {
    const check = async (transaction: Database) => {
      const standpoint = await readStandpoint(transaction, place, signer);
      demand(standpoint, await findChecklist(transaction, place.projectId));
      demandDigest(standpoint.revision, decision.digest);
      return standpoint.revision;
    };
    await check(database);
    await demandReplay(revisions, place, decision.replayId, signer.account.id);
    await signer.confirm(password);
    await database.transaction(async (transaction) => {
      await holdChain(transaction, place.projectId);
      await keep(transaction, await check(transaction), signer, decision);
    });
  }

  return {
    /**
     * Accepts a revision or returns it.
     * @throws Refusal 403 for one's own work, 409 where somebody was faster
     */
    decide(place: RevisionPlace, { decision, ...given }: Decide, signer: Signer): Promise<void> {
      return decide(place, signer, { kind: decision, ...given }, (standpoint, checklist) => {
        demandDecider(standpoint);
        demandUndecided(standpoint.revision, standpoint.decisions);
        demandAnswers(given.checklist, checklist, { isAccepting: decision === "accept" });
      });
    },

    /** Marks one's own revision as looked through by oneself, where nobody else in the project could. */
    selfCheck(place: RevisionPlace, given: Omit<Decide, "decision">, signer: Signer): Promise<void> {
      return decide(place, signer, { kind: "self-check", ...given }, (standpoint, checklist) => {
        demandMaker(standpoint);
        demandAlone(standpoint);
        demandUndecided(standpoint.revision, standpoint.decisions);
        demandAnswers(given.checklist, checklist, { isAccepting: true });
      });
    },

    /** Takes a revision back for good. Everything said to it stays. */
    withdraw(place: RevisionPlace, given: z.infer<typeof withdrawSchema>, signer: Signer): Promise<void> {
      const decision: Signed = { kind: "withdraw", replayId: null, checklist: [], ...given };
      return decide(place, signer, decision, ({ role, revision: { state } }) => {
        if (role !== "owner") throw notAllowed(`Your role in this project is ${role}; this takes owner.`);
        if (state !== "returned" && state !== "withdrawn") return;
        throw new Refusal(409, "decided", `This revision is ${state} already.`);
      });
    },
  };
}

/** Writes a decision, ends the waiting for it, and tells those it concerns. */
async function keep(
  transaction: Database,
  revision: Revision,
  { account }: Signer,
  decision: NewDecision,
): Promise<void> {
  const { projectId, id: revisionId, number, scenarioId: subjectId } = revision;
  const place = { projectId, revisionId };
  await insertDecision(transaction, place, decision, account);
  await endWaiting(transaction, revisionId);
  await tellDecision(transaction, place, revision, decision.kind, account.id);
  const detail = { revisionId, number, reasons: decision.reasons.slice(0, 200) };
  await recordAct(transaction, { projectId, accountId: account.id, act: acts[decision.kind], subjectId, detail });
}

const tellings = { accept: "accepted", return: "returned", withdraw: "withdrawn" } as const;

/** Who froze it, who asked and who decided before learn of a decision. */
async function tellDecision(
  transaction: Database,
  place: RevisionPlace,
  { frozenBy }: Revision,
  kind: Decision["kind"],
  by: string,
): Promise<void> {
  if (kind === "self-check") return;
  const requests = await listRequests(transaction, place.revisionId);
  const decisions = await listDecisions(transaction, place.revisionId);
  const people = [frozenBy, ...requests.map((request) => request.by), ...decisions.map((each) => each.by)];
  const notices = people.map(({ accountId: to }) => ({ to, kind: tellings[kind], by, ...place }));
  await tell(transaction, notices);
}

/** What is decided on has to be what was looked at. */
function demandDigest(revision: Revision, digest: string): void {
  if (revision.digest === digest) return;
  const message = "This is the digest of something else than this revision.";
  throw refusedContent("other-digest", [{ path: "digest", message }]);
}

/** The replay a decision rests on is one of the deciding person's own, of this revision. */
async function demandReplay(
  revisions: RevisionsService,
  place: RevisionPlace,
  replayId: string | null,
  accountId: string,
): Promise<void> {
  if (replayId === null) return;
  const replays = await revisions.listReplays(place);
  if (replays.some(({ id, by }) => id === replayId && by.accountId === accountId)) return;
  const message = "This is no replay of yours of this revision.";
  throw refusedContent("refused-replay", [{ path: "replayId", message }]);
}
