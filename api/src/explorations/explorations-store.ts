import { randomUUID } from "node:crypto";
import { canonicalForm, type Scenario, type z } from "@restband/solver";
import type { Database } from "../database/database.ts";
import type { explorationDraftSchema, ExplorationKind, StoredTile } from "./explorations-schema.ts";

const TABLE = "explorations";
const TILES = "exploration_tiles";

/** A row as it is stored; `saved` counts its tiles. */
export interface ExplorationRow {
  readonly id: string;
  readonly scenario_id: string;
  readonly kind: ExplorationKind;
  readonly title: string;
  readonly headline: string | null;
  readonly content: string;
  readonly scenario_version: number;
  readonly input_digest: Buffer;
  readonly solver_version: string;
  readonly plan: string;
  readonly answer: string | null;
  readonly cells: number;
  /** JSON: the cells of each tile. */
  readonly tile_cells: string;
  readonly cell_values: number;
  readonly runner: string | null;
  readonly runner_account: string | null;
  readonly runner_until: Date | null;
  readonly runner_name: string | null;
  readonly created_at: Date;
  readonly created_by: string;
  readonly created_by_name: string;
  readonly saved: number;
}

export type SummaryRow = Omit<ExplorationRow, "content" | "plan" | "answer">;

const summaryColumns = [
  "id",
  "scenario_id",
  "kind",
  "title",
  "headline",
  "scenario_version",
  "input_digest",
  "solver_version",
  "cells",
  "tile_cells",
  "cell_values",
  "runner",
  "runner_account",
  "runner_until",
  "created_at",
  "created_by",
].map((column) => `${TABLE}.${column}`);

/** The explorations of a scenario, newest first, without what they hold. */
export async function listExplorations(database: Database, scenarioId: string): Promise<SummaryRow[]> {
  return explorationsIn(database)
    .where({ "explorations.scenario_id": scenarioId })
    .orderBy([
      { column: "explorations.created_at", order: "desc" },
      { column: "explorations.id", order: "asc" },
    ])
    .select<SummaryRow[]>(...summaryColumns, ...namesAndCount(database));
}

/** An exploration of a scenario that is in this very project. */
export async function findExploration(
  database: Database,
  projectId: string,
  id: string,
): Promise<ExplorationRow | null> {
  const [row] = await explorationsIn(database)
    .where({ "explorations.id": id, "scenarios.project_id": projectId })
    .select<ExplorationRow[]>(`${TABLE}.*`, ...namesAndCount(database));
  return row ?? null;
}

function explorationsIn(database: Database) {
  return database(TABLE)
    .join("scenarios", "scenarios.id", "explorations.scenario_id")
    .join("accounts", "accounts.id", "explorations.created_by")
    .leftJoin("accounts as runners", "runners.id", "explorations.runner_account");
}

function namesAndCount(database: Database) {
  return [
    "accounts.name as created_by_name",
    "runners.name as runner_name",
    database.raw(`(SELECT COUNT(*) FROM ${TILES} WHERE exploration_id = ${TABLE}.id) AS saved`),
  ];
}

/** The same row, locked until the transaction ends; null where there is no such exploration in the project. */
export async function lockExploration(
  transaction: Database,
  projectId: string,
  id: string,
): Promise<ExplorationRow | null> {
  // The lock comes first: a plain reading before it would still be what the transaction sees after it.
  await transaction(TABLE).where({ id }).forUpdate().first("id");
  return findExploration(transaction, projectId, id);
}

/** Bytes that the explorations of a project hold or will hold when they are done; the project is locked meanwhile. */
export async function lockBytes(transaction: Database, projectId: string): Promise<number> {
  await transaction("projects").where({ id: projectId }).forUpdate().first("id");
  const [{ bytes }] = await transaction(TABLE)
    .join("scenarios", "scenarios.id", "explorations.scenario_id")
    .where({ "scenarios.project_id": projectId })
    .select<{ bytes: string | null }[]>(
      transaction.raw("SUM(explorations.cells * explorations.cell_values * 8) AS bytes"),
    );
  return Number(bytes ?? 0);
}

interface Insertion {
  readonly scenarioId: string;
  readonly accountId: string;
  readonly content: Scenario;
  readonly inputDigest: string;
  readonly draft: z.output<typeof explorationDraftSchema>;
}

export async function insertExploration(database: Database, insertion: Insertion): Promise<string> {
  const { draft } = insertion;
  const id = randomUUID();
  await database(TABLE).insert({
    id,
    scenario_id: insertion.scenarioId,
    kind: draft.kind,
    title: draft.title,
    headline: draft.conclusion?.headline ?? null,
    content: JSON.stringify(canonicalForm(insertion.content)),
    scenario_version: draft.scenarioVersion,
    input_digest: Buffer.from(insertion.inputDigest, "hex"),
    solver_version: draft.solverVersion,
    plan: JSON.stringify(draft.plan),
    answer: draft.conclusion ? JSON.stringify(draft.conclusion.answer) : null,
    cells: draft.tileCells.reduce((sum, cells) => sum + cells, 0),
    tile_cells: JSON.stringify(draft.tileCells),
    cell_values: draft.cellValues,
    created_at: new Date(),
    created_by: insertion.accountId,
  });
  return id;
}

/** Gives an exploration to a runner until a time, or to nobody. */
export async function holdExploration(
  database: Database,
  id: string,
  holder: { runner: string; accountId: string; until: Date } | null,
): Promise<void> {
  await database(TABLE)
    .where({ id })
    .update({
      runner: holder?.runner ?? null,
      runner_account: holder?.accountId ?? null,
      runner_until: holder?.until ?? null,
    });
}

export async function concludeExploration(
  database: Database,
  id: string,
  conclusion: { headline: string; answer: unknown },
): Promise<void> {
  await database(TABLE)
    .where({ id })
    .update({ headline: conclusion.headline, answer: JSON.stringify(conclusion.answer) });
}

/** Adds a tile. One that is there stays: the same cells of the same plan have the same numbers, whoever computes them. */
export async function insertTile(database: Database, id: string, number: number, content: Buffer): Promise<void> {
  await database(TILES)
    .insert({ exploration_id: id, number, content, saved_at: new Date() })
    .onConflict(["exploration_id", "number"])
    .ignore();
}

export async function findTiles(database: Database, id: string, numbers: readonly number[]): Promise<StoredTile[]> {
  const rows = await database(TILES)
    .where({ exploration_id: id })
    .whereIn("number", numbers)
    .select<{ number: number; content: Buffer }[]>("number", "content");
  return rows.map(({ number, content }) => ({ number, content: content.toString("base64") }));
}

/** Numbers of the tiles that are there. */
export async function listTileNumbers(database: Database, id: string): Promise<number[]> {
  const rows = await database(TILES)
    .where({ exploration_id: id })
    .orderBy("number")
    .select<{ number: number }[]>("number");
  return rows.map(({ number }) => number);
}

/** Removes an exploration and its tiles. */
export async function deleteExploration(database: Database, id: string): Promise<void> {
  await database(TABLE).where({ id }).delete();
}
