import { randomUUID } from "node:crypto";
import type { Scenario } from "@restband/solver";
import type { Database } from "../database/database.ts";
import type { StoredScenario } from "./scenarios-schema.ts";

const TABLE = "scenarios";

/** What is kept of a checked scenario: its canonical text and the SHA-256 of it, lower-case hex. */
export interface CanonicalScenario {
  readonly text: string;
  readonly digest: string;
}

interface ScenarioRow {
  id: string;
  project_id: string;
  version: number;
  content: string;
  digest: Buffer;
  created_at: Date;
  updated_at: Date;
  updated_by: string;
  updated_by_name: string;
}

/** The scenarios of a project, last touched first. */
export async function listScenarios(database: Database, projectId: string): Promise<StoredScenario[]> {
  const rows = await scenariosOf(database, projectId).orderBy("scenarios.updated_at", "desc");
  return rows.map(scenarioOf);
}

/** A scenario of this very project: the id of another project's is not found. */
export async function findScenario(database: Database, projectId: string, id: string): Promise<StoredScenario | null> {
  const [row] = await scenariosOf(database, projectId).where({ "scenarios.id": id });
  return row ? scenarioOf(row) : null;
}

/** The version now stored, locked until the transaction ends; null where there is no such scenario. */
export async function lockVersion(transaction: Database, projectId: string, id: string): Promise<number | null> {
  const row = await transaction(TABLE)
    .where({ id, project_id: projectId })
    .first<{ version: number }>("version")
    .forUpdate();
  return row?.version ?? null;
}

export async function insertScenario(
  database: Database,
  projectId: string,
  content: CanonicalScenario,
  accountId: string,
  id: string = randomUUID(),
): Promise<string> {
  const now = new Date();
  await database(TABLE).insert({
    id,
    project_id: projectId,
    version: 1,
    created_at: now,
    ...changesOf(content, accountId, now),
  });
  return id;
}

export async function updateScenario(
  database: Database,
  id: string,
  version: number,
  content: CanonicalScenario,
  accountId: string,
): Promise<void> {
  await database(TABLE)
    .where({ id })
    .update({ version, ...changesOf(content, accountId, new Date()) });
}

function changesOf({ text, digest }: CanonicalScenario, accountId: string, at: Date) {
  return { content: text, digest: Buffer.from(digest, "hex"), updated_at: at, updated_by: accountId };
}

function scenariosOf(database: Database, projectId: string) {
  return database(TABLE)
    .join("accounts", "accounts.id", "scenarios.updated_by")
    .where({ "scenarios.project_id": projectId })
    .select<ScenarioRow[]>("scenarios.*", "accounts.name as updated_by_name");
}

function scenarioOf(row: ScenarioRow): StoredScenario {
  return {
    id: row.id,
    projectId: row.project_id,
    version: row.version,
    content: JSON.parse(row.content) as Scenario,
    digest: row.digest.toString("hex"),
    createdAt: row.created_at.toISOString(),
    updatedAt: row.updated_at.toISOString(),
    updatedBy: { accountId: row.updated_by, name: row.updated_by_name },
  };
}
