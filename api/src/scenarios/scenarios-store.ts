import { randomUUID } from "node:crypto";
import type { Scenario } from "@restband/solver";
import type { Database } from "../database/database.ts";
import type { CanonicalScenario } from "./canonical-scenario.ts";
import type { ScenarioSummary, StoredScenario, SwitchedOff } from "./scenarios-schema.ts";

const TABLE = "scenarios";

/** What is written of a scenario; `switchedOff` left out: what there is stays. */
export interface KeptScenario extends CanonicalScenario {
  readonly switchedOff?: readonly SwitchedOff[];
}

interface SummaryRow {
  id: string;
  version: number;
  title: string;
  purpose: string;
  digest: Buffer;
  updated_at: Date;
  updated_by: string;
  updated_by_name: string;
  archived_at: Date | null;
}

interface ScenarioRow extends SummaryRow {
  project_id: string;
  content: string;
  switched_off: string;
  created_at: Date;
}

/** The scenarios of a project without their contents, last touched first; `ids`: of these alone. */
export async function listScenarios(
  database: Database,
  projectId: string,
  ids?: readonly string[],
): Promise<ScenarioSummary[]> {
  const rows = await scenariosOf(database, projectId)
    .modify((query) => ids && void query.whereIn("scenarios.id", ids))
    .orderBy([
      { column: "scenarios.updated_at", order: "desc" },
      { column: "scenarios.id", order: "asc" },
    ])
    .select<SummaryRow[]>(
      "scenarios.id",
      "scenarios.version",
      "scenarios.title",
      "scenarios.purpose",
      "scenarios.digest",
      "scenarios.updated_at",
      "scenarios.updated_by",
      "scenarios.archived_at",
      "accounts.name as updated_by_name",
    );
  return rows.map(summaryOf);
}

/** A scenario of this very project: the id of another project's is not found. */
export async function findScenario(database: Database, projectId: string, id: string): Promise<StoredScenario | null> {
  const [row] = await scenariosOf(database, projectId)
    .where({ "scenarios.id": id })
    .select<ScenarioRow[]>("scenarios.*", "accounts.name as updated_by_name");
  return row ? scenarioOf(row) : null;
}

/** The contents of those of the scenarios that are in the project, in the order asked. */
export async function findContents(
  database: Database,
  projectId: string,
  ids: readonly string[],
): Promise<Pick<StoredScenario, "id" | "digest" | "content">[]> {
  const rows = await database(TABLE)
    .where({ project_id: projectId })
    .whereIn("id", ids)
    .select<Pick<ScenarioRow, "id" | "digest" | "content">[]>("id", "digest", "content");
  const found = rows.map(({ id, digest, content }) => ({
    ...{ id, digest: digest.toString("hex"), content: parsed(content) },
  }));
  return found.sort((a, b) => ids.indexOf(a.id) - ids.indexOf(b.id));
}

export interface LockedScenario {
  readonly version: number;
  readonly title: string;
  readonly content: string;
  readonly isArchived: boolean;
}

/** What is stored now, locked until the transaction ends; null where there is no such scenario. */
export async function lockScenario(
  transaction: Database,
  projectId: string,
  id: string,
): Promise<LockedScenario | null> {
  const row = await transaction(TABLE)
    .where({ id, project_id: projectId })
    .first<Pick<ScenarioRow, "version" | "title" | "content" | "archived_at">>()
    .forUpdate();
  if (!row) return null;
  const { version, title, content, archived_at: archivedAt } = row;
  return { version, title, content, isArchived: archivedAt !== null };
}

export async function insertScenario(
  database: Database,
  projectId: string,
  content: KeptScenario,
  accountId: string,
): Promise<string> {
  const [id] = await insertScenarios(database, projectId, [content], accountId);
  return id;
}

/** Adds scenarios in one statement; returns their ids in the same order. */
export async function insertScenarios(
  database: Database,
  projectId: string,
  contents: readonly KeptScenario[],
  accountId: string,
): Promise<string[]> {
  const now = new Date();
  const rows = contents.map((content) => ({
    id: randomUUID(),
    project_id: projectId,
    version: 1,
    created_at: now,
    created_by: accountId,
    ...changesOf(content, accountId, now),
  }));
  await database(TABLE).insert(rows);
  return rows.map(({ id }) => id);
}

export async function updateScenario(
  database: Database,
  id: string,
  version: number,
  content: KeptScenario,
  accountId: string,
): Promise<void> {
  await database(TABLE)
    .where({ id })
    .update({ version, ...changesOf(content, accountId, new Date()) });
}

export async function markScenarioArchived(database: Database, id: string, at: Date | null): Promise<void> {
  await database(TABLE).where({ id }).update({ archived_at: at });
}

/** True for a scenario of which something was frozen: that stays where its trail is. */
export async function hasRevisions(database: Database, id: string): Promise<boolean> {
  return (await database("revisions").where({ scenario_id: id }).first("id")) !== undefined;
}

/** Every text that belongs to a scenario and may name records. */
export async function textsOf(database: Database, id: string): Promise<string[]> {
  const own = await database(TABLE).where({ id }).select<Record<string, string>[]>("content", "switched_off");
  const asked = await database("explorations").where({ scenario_id: id }).select<Record<string, string>[]>("content");
  return [...own, ...asked].flatMap((row) => Object.values(row));
}

export async function moveScenario(database: Database, id: string, toProjectId: string): Promise<void> {
  await database(TABLE).where({ id }).update({ project_id: toProjectId });
}

function changesOf({ text, digest, title, purpose, switchedOff }: KeptScenario, accountId: string, at: Date) {
  return {
    content: text,
    ...(switchedOff && { switched_off: JSON.stringify(switchedOff) }),
    digest: Buffer.from(digest, "hex"),
    title,
    purpose,
    updated_at: at,
    updated_by: accountId,
  };
}

function scenariosOf(database: Database, projectId: string) {
  return database(TABLE)
    .join("accounts", "accounts.id", "scenarios.updated_by")
    .where({ "scenarios.project_id": projectId });
}

function summaryOf(row: SummaryRow): ScenarioSummary {
  const { id, version, title, purpose, updated_by: accountId, updated_by_name: name } = row;
  return {
    id,
    version,
    title,
    purpose,
    digest: row.digest.toString("hex"),
    updatedAt: row.updated_at.toISOString(),
    updatedBy: { accountId, name },
    archivedAt: row.archived_at?.toISOString() ?? null,
  };
}

function scenarioOf(row: ScenarioRow): StoredScenario {
  return {
    id: row.id,
    projectId: row.project_id,
    version: row.version,
    content: parsed(row.content),
    digest: row.digest.toString("hex"),
    switchedOff: JSON.parse(row.switched_off) as SwitchedOff[],
    createdAt: row.created_at.toISOString(),
    updatedAt: row.updated_at.toISOString(),
    updatedBy: { accountId: row.updated_by, name: row.updated_by_name },
    archivedAt: row.archived_at?.toISOString() ?? null,
  };
}

const parsed = (text: string): Scenario => JSON.parse(text) as Scenario;
