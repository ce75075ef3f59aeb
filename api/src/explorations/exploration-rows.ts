import type { Scenario } from "@restband/solver";
import { notFound } from "../errors.ts";
import type { ExplorationSummary, StoredExploration } from "./explorations-schema.ts";
import type { ExplorationRow, SummaryRow } from "./explorations-store.ts";

/** How many cells each tile has. */
export const tilesOf = ({ tile_cells: tileCells }: SummaryRow): number[] => JSON.parse(tileCells) as number[];
/** True while the page that computes it is heard of. */
export const isHeld = ({ runner_until: until }: SummaryRow): boolean => until !== null && until.getTime() > Date.now();

/** `digest`: of what a run reads of the scenario now. */
export function summaryOf(row: SummaryRow, digest: string): ExplorationSummary {
  return {
    id: row.id,
    scenarioId: row.scenario_id,
    kind: row.kind,
    title: row.title,
    headline: row.headline,
    state: row.headline !== null ? "done" : isHeld(row) ? "running" : "stopped",
    tilesSaved: Number(row.saved),
    tiles: tilesOf(row).length,
    scenarioVersion: row.scenario_version,
    isStale: row.input_digest.toString("hex") !== digest,
    createdAt: row.created_at.toISOString(),
    createdBy: { accountId: row.created_by, name: row.created_by_name },
  };
}

export function explorationOf(row: ExplorationRow, saved: number[], digest: string): StoredExploration {
  const { runner_account: accountId, runner_name: name } = row;
  return {
    ...summaryOf(row, digest),
    content: JSON.parse(row.content) as Scenario,
    solverVersion: row.solver_version,
    plan: JSON.parse(row.plan) as Record<string, unknown>,
    tileCells: tilesOf(row),
    cellValues: row.cell_values,
    answer: row.answer === null ? null : (JSON.parse(row.answer) as Record<string, unknown>),
    saved,
    runner: isHeld(row) && accountId !== null && name !== null ? { accountId, name } : null,
  };
}

export function missing(): never {
  throw notFound();
}
