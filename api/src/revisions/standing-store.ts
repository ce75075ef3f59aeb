import type { Database } from "../database/database.ts";
import type { RevisionState, RevisionSummary } from "./revisions-schema.ts";
import type { Frozen } from "./revisions-store.ts";

/** How a revision stands: what was asked, said and decided since it was frozen. */
export type Standing = Pick<RevisionSummary, "state" | "decided" | "asked" | "openComments">;

type Kind = "accept" | "return" | "self-check" | "withdraw";

interface DecisionRow {
  revision_id: string;
  scenario_id: string;
  number: number;
  kind: Kind;
  decided_by: string;
  decided_by_name: string;
  decided_at: Date;
}

/** How each of the revisions stands, in their order; all are of one project. */
export async function standingsOf(database: Database, frozen: readonly Frozen[]): Promise<Standing[]> {
  if (frozen.length === 0) return [];
  const ids = frozen.map(({ id }) => id);
  const decisions = await decisionsOf(database, frozen[0].projectId);
  const [asked, open] = [await askedOf(database, ids), await openCommentsOf(database, ids)];
  return frozen.map((revision) => {
    const last = decisions.filter((decision) => decision.revision_id === revision.id).at(-1);
    return {
      state: stateOf(revision, asked.has(revision.id), decisions),
      decided: last ? decidedFrom(last) : null,
      asked: asked.get(revision.id) ?? [],
      openComments: open.get(revision.id) ?? 0,
    };
  });
}

function stateOf(
  { id, scenarioId, number }: Frozen,
  isAsked: boolean,
  decisions: readonly DecisionRow[],
): RevisionState {
  const kinds = decisions.filter((decision) => decision.revision_id === id).map(({ kind }) => kind);
  if (kinds.includes("withdraw")) return "withdrawn";
  if (kinds.includes("return")) return "returned";
  if (kinds.includes("self-check")) return "self-checked";
  if (!kinds.includes("accept")) return isAsked ? "in-review" : "open";
  const isLater = (other: DecisionRow) => other.scenario_id === scenarioId && other.number > number;
  return standing(decisions).some((other) => other.kind === "accept" && isLater(other)) ? "superseded" : "accepted";
}

/** The decisions that were not withdrawn. */
function standing(decisions: readonly DecisionRow[]): DecisionRow[] {
  const withdrawn = new Set(decisions.filter(({ kind }) => kind === "withdraw").map((each) => each.revision_id));
  return decisions.filter((decision) => !withdrawn.has(decision.revision_id));
}

/** The last revision of a scenario before the given one that is or was accepted and not withdrawn; null for none. */
export async function lastAcceptedBefore(database: Database, { projectId, scenarioId, number }: Frozen) {
  const decisions = standing(await decisionsOf(database, projectId));
  const earlier = decisions.filter(
    (other) => other.kind === "accept" && other.scenario_id === scenarioId && other.number < number,
  );
  const last = earlier.sort((a, b) => b.number - a.number).at(0);
  if (!last) return null;
  const row = await database("revisions").where({ id: last.revision_id }).first<{ scenario_version: number }>();
  return { number: last.number, scenarioVersion: row.scenario_version };
}

/** All decisions of a project, oldest first. */
function decisionsOf(database: Database, projectId: string): Promise<DecisionRow[]> {
  return database("decisions")
    .join("revisions", "revisions.id", "decisions.revision_id")
    .where({ "decisions.project_id": projectId })
    .orderBy("decisions.sequence")
    .select<DecisionRow[]>(
      ...["revision_id", "kind", "decided_by", "decided_by_name", "decided_at"].map((column) => `decisions.${column}`),
      "revisions.scenario_id",
      "revisions.number",
    );
}

async function askedOf(database: Database, ids: readonly string[]) {
  const rows = await database("review_requests")
    .join("accounts", "accounts.id", "review_requests.reviewer_id")
    .whereIn("revision_id", ids)
    .orderBy("review_requests.sequence")
    .select<{ revision_id: string; reviewer_id: string; name: string }[]>(
      "revision_id",
      "reviewer_id",
      "accounts.name",
    );
  return groups(rows.map(({ revision_id: id, reviewer_id: accountId, name }) => [id, { accountId, name }] as const));
}

/** How many comments of each revision are not settled, or opened again. */
async function openCommentsOf(database: Database, ids: readonly string[]): Promise<Map<string, number>> {
  const rows = await database("comments")
    .whereIn("revision_id", ids)
    .whereIn("entry", ["comment", "settle", "reopen"])
    .orderBy("sequence")
    .select<{ id: string; revision_id: string; parent_id: string | null; entry: string }[]>(
      ...["id", "revision_id", "parent_id", "entry"],
    );
  const open = new Map<string, string>();
  for (const { id, revision_id: revisionId, parent_id: parentId, entry } of rows) {
    if (entry === "settle") open.delete(parentId!);
    else open.set(parentId ?? id, revisionId);
  }
  const counts = new Map<string, number>();
  for (const revisionId of open.values()) counts.set(revisionId, (counts.get(revisionId) ?? 0) + 1);
  return counts;
}

function groups<T>(entries: readonly (readonly [string, T])[]): Map<string, T[]> {
  const grouped = new Map<string, T[]>();
  for (const [key, value] of entries) grouped.set(key, [...(grouped.get(key) ?? []), value]);
  return grouped;
}

function decidedFrom({ decided_by: accountId, decided_by_name: name, decided_at: at }: DecisionRow) {
  return { by: { accountId, name }, at: at.toISOString() };
}
