import { canonicalText, pathsWithoutOrigin, type Scenario } from "@restband/solver";
import { saversOf, recordAct } from "../activity/activity-service.ts";
import { holdChain } from "../chain/chain.ts";
import type { Database } from "../database/database.ts";
import { notFound, Refusal, refusedContent } from "../errors.ts";
import { pathsWithoutPoints, withPoints } from "../records/records-service.ts";
import { holdVersion, readVersion } from "../scenarios/scenarios-service.ts";
import { disagreements, unknownQuantities } from "./disagreement.ts";
import type { Recompute } from "./recompute-pool.ts";
import { insertReplay, listReplays } from "./replays-store.ts";
import type { Freeze, Replay, ReplayDraft, Revision, RevisionSummary } from "./revisions-schema.ts";
import { findFrozen, type Frozen, insertRevision, listFrozen, type NewRevision } from "./revisions-store.ts";
import { lastAcceptedBefore, standingsOf } from "./standing-store.ts";

export type RevisionsService = ReturnType<typeof createRevisionsService>;

/** A revision by the ids in a path. */
export interface RevisionPlace {
  readonly projectId: string;
  readonly revisionId: string;
}

interface ScenarioPlace {
  readonly projectId: string;
  readonly scenarioId: string;
}

/** Frozen scenarios. Nothing of one is ever changed; how it stands follows from what is added to it. */
export function createRevisionsService(database: Database, recompute: Recompute) {
  /** What freezing would write: what the page says came out, held against the server's own run. */
  async function prepare({ projectId, scenarioId }: ScenarioPlace, seen: number, freeze: Freeze, frozenBy: string) {
    const stored = await readVersion(database, { projectId, scenarioId }, seen);
    if (stored.digest !== freeze.digest) throw otherDigest();
    const unknown = unknownQuantities(freeze.result);
    if (unknown.length > 0) throw refusedContent("refused-result", unknown);
    const lost = pathsWithoutPoints(stored.content);
    if (lost.length > 0) throw refusedContent("lost-points", lost.map(lossAt));
    const text = canonicalText(stored.content);
    return {
      ...{ projectId, scenarioId, scenarioVersion: seen, title: stored.content.title, text, digest: stored.digest },
      ...{ units: freeze.units, withoutOrigin: pathsWithoutOrigin(stored.content), frozenBy },
      ...(await outcomeOf(stored.content, freeze, frozenBy)),
    };
  }

  async function outcomeOf(scenario: Scenario, { result: claimed, trace }: Freeze, accountId: string) {
    const own = await recompute({ scenario, claimed }, accountId);
    if (own === null) return { isRecomputed: false, isSensitive: false, result: claimed, trace };
    if ("message" in own) throw refusedContent("not-computed", [{ path: `content.${own.path}`, message: own.message }]);
    if (own.agreement.verdict === "differs")
      throw disagrees(own.result.solverVersion, claimed.solverVersion, own.agreement);
    const isSensitive = own.agreement.verdict === "sensitive";
    return { isRecomputed: true, isSensitive, result: own.result, trace: own.trace };
  }

  return {
    list: (projectId: string, scenarioId?: string) => list(database, projectId, scenarioId),
    read: (place: RevisionPlace) => read(database, place),
    /** As it stands within a transaction. */
    readIn: (transaction: Database, place: RevisionPlace) => read(transaction, place),

    /**
     * Freezes the version of a scenario that the page has seen.
     * @throws Refusal 409 where it is not the stored one or is frozen already, 422 where the server's run says otherwise
     */
    async freeze(place: ScenarioPlace, seen: number, freeze: Freeze, accountId: string): Promise<Revision> {
      const prepared = await prepare(place, seen, freeze, accountId);
      return database.transaction(async (transaction) => {
        await holdVersion(transaction, place, seen);
        await holdChain(transaction, place.projectId);
        const [last] = await list(transaction, place.projectId, place.scenarioId);
        if (last) demandNews(last, prepared);
        const number = (last?.number ?? 0) + 1;
        const revisionId = await insertRevision(transaction, { ...prepared, number });
        const { title, digest } = prepared;
        const detail = { revisionId, number, title, digest };
        await recordAct(transaction, act(place, accountId, "revision.frozen", detail));
        return read(transaction, { projectId: place.projectId, revisionId });
      });
    },

    async listReplays(place: RevisionPlace): Promise<Replay[]> {
      await demand(database, place);
      return listReplays(database, place.revisionId);
    },

    keepReplay: (place: RevisionPlace, draft: ReplayDraft, accountId: string) =>
      keepReplay(database, place, draft, accountId),
  };
}

/** Keeps that somebody ran a revision again, and what came of it. */
async function keepReplay(
  database: Database,
  place: RevisionPlace,
  draft: ReplayDraft,
  accountId: string,
): Promise<Replay> {
  demandConsistent(draft);
  return database.transaction(async (transaction) => {
    const { number, scenarioId } = await demand(transaction, place);
    await insertReplay(transaction, place, draft, accountId);
    const { way, verdict } = draft;
    const detail = { revisionId: place.revisionId, number, way, verdict };
    await recordAct(transaction, act({ ...place, scenarioId }, accountId, "revision.replayed", detail));
    const [kept] = await listReplays(transaction, place.revisionId);
    return kept;
  });
}

function act(
  { projectId, scenarioId: subjectId }: ScenarioPlace,
  accountId: string,
  name: "revision.frozen" | "revision.replayed",
  detail: Record<string, string | number>,
) {
  return { projectId, accountId, act: name, subjectId, detail };
}

async function list(database: Database, projectId: string, scenarioId?: string): Promise<RevisionSummary[]> {
  const frozen = await listFrozen(database, projectId, scenarioId);
  const standings = await standingsOf(database, frozen);
  return frozen.map(({ scenarioVersion: _version, ...revision }, i) => ({ ...revision, ...standings[i] }));
}

async function read(database: Database, place: RevisionPlace): Promise<Revision> {
  const frozen = await demand(database, place);
  const [standing] = await standingsOf(database, [frozen]);
  const content = await withPoints(database, place.projectId, frozen.content);
  const lost = pathsWithoutPoints(content).map((path) => `The points of ${path} are not those it was frozen with.`);
  const faults = [...frozen.faults, ...lost];
  return { ...frozen, content, faults, ...standing, authors: await authorsOf(database, frozen) };
}

async function demand(database: Database, { projectId, revisionId }: RevisionPlace) {
  const frozen = await findFrozen(database, projectId, revisionId);
  if (!frozen) throw notFound();
  return frozen;
}

/** Whose own it is: who froze it, and who saved any change in it since the last accepted revision. */
async function authorsOf(database: Database, frozen: Frozen): Promise<Revision["authors"]> {
  const since = (await lastAcceptedBefore(database, frozen))?.scenarioVersion ?? 0;
  const savers = await saversOf(database, frozen.scenarioId, { after: since, upTo: frozen.scenarioVersion });
  return [frozen.frozenBy, ...savers.filter(({ accountId }) => accountId !== frozen.frozenBy.accountId)];
}

/** The same again is no new revision, unless what was said to the last one asks for it. */
function demandNews(last: RevisionSummary, next: Omit<NewRevision, "number">): void {
  const isDone = last.state === "returned" || last.state === "withdrawn";
  if (isDone || last.digest !== next.digest || last.solverVersion !== next.result.solverVersion) return;
  throw new Refusal(409, "frozen-already", `Revision ${last.number} is this very scenario. Nothing has changed since.`);
}

const lossAt = (path: string) => ({
  path: `content.${path}`,
  message: "The points of this record are no longer there as they were kept. Bring them in again.",
});

function otherDigest(): Refusal {
  const message = "The page shows something else than what is stored. Reload it and freeze again.";
  return refusedContent("other-digest", [{ path: "digest", message }]);
}

function disagrees(own: string, claimed: string, agreement: Parameters<typeof disagreements>[0]): Refusal {
  const reload =
    own === claimed ? "" : ` The page computes with version ${claimed}, the server with ${own}: reload the page.`;
  const message = `The server's own run comes to something else, so nothing was frozen.${reload}`;
  return new Refusal(422, "result-disagrees", message, { fields: disagreements(agreement) });
}

/** A report that says it agrees may hold nothing that does not. */
function demandConsistent({ verdict, differences, deviations, allowed }: ReplayDraft): void {
  if (verdict !== "agrees") return;
  if (differences.length === 0 && deviations.every(({ relative }) => relative <= allowed)) return;
  const message = "This says that it agrees, and names what does not.";
  throw refusedContent("inconsistent-replay", [{ path: "verdict", message }]);
}
