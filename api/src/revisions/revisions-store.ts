import { randomUUID } from "node:crypto";
import type { Scenario } from "@restband/solver";
import { append } from "../chain/chain.ts";
import { type Link, rowFaults } from "../chain/walk.ts";
import { type Database, signingKeyOf } from "../database/database.ts";
import { sha256Of } from "../sha256.ts";
import type { KeptResult, Revision, RevisionSummary, Trace } from "./revisions-schema.ts";

const TABLE = "revisions";

/** Columns of what a list tells. */
const SUMMARY = [
  ...["id", "project_id", "scenario_id", "number", "title", "digest", "frozen_by", "frozen_at", "outcome"],
  ...["limits_kept", "limits_set", "solver_version", "is_recomputed", "scenario_version"],
].map((column) => `${TABLE}.${column}`);

interface SummaryRow {
  id: string;
  project_id: string;
  scenario_id: string;
  number: number;
  title: string;
  digest: Buffer;
  frozen_by: string;
  frozen_by_name: string;
  frozen_at: Date;
  outcome: RevisionSummary["outcome"];
  limits_kept: number;
  limits_set: number;
  solver_version: string;
  is_recomputed: number;
  scenario_version: number;
}

interface RevisionRow extends SummaryRow, Link {
  content: string;
  units: Revision["units"];
  is_sensitive: number;
  result: string;
  trace: string;
  without_origin: string;
}

/** What freezing writes. */
export interface NewRevision {
  readonly projectId: string;
  readonly scenarioId: string;
  readonly number: number;
  readonly scenarioVersion: number;
  readonly title: string;
  readonly text: string;
  readonly digest: string;
  readonly units: Revision["units"];
  readonly isRecomputed: boolean;
  readonly isSensitive: boolean;
  readonly result: KeptResult;
  readonly trace: Trace;
  readonly withoutOrigin: readonly string[];
  readonly frozenBy: string;
}

/** What the revision's own row tells of it; how it stands hangs on what others said to it. */
export type Frozen = Omit<RevisionSummary, "state" | "decided" | "asked" | "openComments"> & {
  readonly scenarioVersion: number;
};
export type WholeFrozen = Frozen & Omit<Revision, keyof RevisionSummary | "authors">;

/** The revisions of a project, newest first; of one scenario where it is named. */
export async function listFrozen(database: Database, projectId: string, scenarioId?: string): Promise<Frozen[]> {
  const rows = await frozenOf(database, projectId)
    .modify((query) => scenarioId !== undefined && void query.where({ scenario_id: scenarioId }))
    .orderBy("revisions.sequence", "desc")
    .select<SummaryRow[]>(...SUMMARY, "accounts.name as frozen_by_name");
  return rows.map(frozenFrom);
}

/** A revision of this very project, with whatever does not fit in it. */
export async function findFrozen(database: Database, projectId: string, id: string): Promise<WholeFrozen | null> {
  const [row] = await frozenOf(database, projectId)
    .where({ "revisions.id": id })
    .select<RevisionRow[]>("revisions.*", "accounts.name as frozen_by_name");
  return row ? wholeFrom(row, faultsOf(database, row)) : null;
}

export async function insertRevision(transaction: Database, revision: NewRevision): Promise<string> {
  const { result } = revision;
  const id = randomUUID();
  await append(transaction, TABLE, {
    id,
    project_id: revision.projectId,
    scenario_id: revision.scenarioId,
    number: revision.number,
    scenario_version: revision.scenarioVersion,
    title: revision.title,
    content: revision.text,
    digest: Buffer.from(revision.digest, "hex"),
    units: revision.units,
    solver_version: result.solverVersion,
    is_recomputed: revision.isRecomputed,
    is_sensitive: revision.isSensitive,
    outcome: result.outcome,
    limits_kept: result.limits.filter(({ kept }) => kept).length,
    limits_set: result.limits.length,
    result: JSON.stringify(result),
    trace: JSON.stringify(revision.trace),
    without_origin: JSON.stringify(revision.withoutOrigin),
    frozen_by: revision.frozenBy,
    frozen_at: new Date(),
  });
  return id;
}

function faultsOf(database: Database, { frozen_by_name: _joined, ...row }: RevisionRow): string[] {
  const isOwn = sha256Of(row.content).equals(row.digest);
  return [
    ...rowFaults(TABLE, row, signingKeyOf(database)),
    ...(isOwn ? [] : ["Its text has another digest than the one it was frozen with."]),
  ];
}

function frozenOf(database: Database, projectId: string) {
  return database(TABLE)
    .join("accounts", "accounts.id", "revisions.frozen_by")
    .where({ "revisions.project_id": projectId });
}

function frozenFrom(row: SummaryRow): Frozen {
  return {
    id: row.id,
    projectId: row.project_id,
    scenarioId: row.scenario_id,
    number: row.number,
    title: row.title,
    digest: row.digest.toString("hex"),
    frozenAt: row.frozen_at.toISOString(),
    frozenBy: { accountId: row.frozen_by, name: row.frozen_by_name },
    outcome: row.outcome,
    limits: { kept: row.limits_kept, of: row.limits_set },
    solverVersion: row.solver_version,
    isRecomputed: row.is_recomputed === 1,
    scenarioVersion: row.scenario_version,
  };
}

function wholeFrom(row: RevisionRow, faults: string[]): WholeFrozen {
  return {
    ...frozenFrom(row),
    content: JSON.parse(row.content) as Scenario,
    text: row.content,
    units: row.units,
    result: JSON.parse(row.result) as KeptResult,
    trace: JSON.parse(row.trace) as Trace,
    isSensitive: row.is_sensitive === 1,
    withoutOrigin: JSON.parse(row.without_origin) as string[],
    faults,
  };
}
