import type { StoredExploration } from "@restband/api/contract";
import { rowLength, studyRows, type Scenario, type TolerancePlan } from "@restband/solver";
import type { ExplorationDraft } from "../../../api/explorations.ts";
import type { TileStore, TileWork } from "../kept/tile-run.ts";

const MOST_IN_TILE = 1000;
const TILES = 40;
const FEWEST_IN_TILE = 50;

const tileLength = (runs: number): number => Math.min(MOST_IN_TILE, Math.max(FEWEST_IN_TILE, Math.ceil(runs / TILES)));

/** Draws of each tile of a study, in order. */
function drawsOfTiles(runs: number): number[] {
  const length = tileLength(runs);
  return Array.from({ length: Math.ceil(runs / length) }, (_, i) => Math.min(length, runs - i * length));
}

/** A study for the server to keep, before any of it is computed. */
export const studyToKeep = (
  plan: TolerancePlan,
  scenario: Scenario,
  about: { title: string; scenarioVersion: number; solverVersion: string },
): ExplorationDraft => ({
  kind: "study",
  ...about,
  plan: { study: plan },
  tileCells: drawsOfTiles(plan.runs),
  cellValues: rowLength(studyRows(plan, scenario)),
});

/** What the server kept of one. */
export const storedStudy = ({ plan }: StoredExploration): TolerancePlan =>
  (plan as unknown as { study: TolerancePlan }).study;

/** The draws that are there so far. A summary is of the first draws without a gap. */
export class StudyRows implements TileStore {
  readonly count: number;
  done = 0;
  private readonly tiles = new Map<number, Float64Array>();
  private readonly length: number;

  constructor(runs: number, length: number) {
    this.count = runs;
    this.length = length;
  }

  readonly hasTile = (tile: number): boolean => this.tiles.has(tile);

  setTile(tile: number, rows: Float64Array): void {
    if (this.tiles.has(tile)) return;
    this.tiles.set(tile, rows);
    this.done += rows.length / this.length;
  }

  /** Rows of the first draws, up to the first that is missing. */
  first(): Float64Array {
    const there: Float64Array[] = [];
    for (let tile = 0; this.tiles.has(tile); tile++) there.push(this.tiles.get(tile) ?? new Float64Array());
    const rows = new Float64Array(there.reduce((sum, each) => sum + each.length, 0));
    let at = 0;
    for (const each of there) {
      rows.set(each, at);
      at += each.length;
    }
    return rows;
  }
}

/** The draws of a study in their order. */
export function studyWork(plan: TolerancePlan, scenario: Scenario): TileWork<StudyRows> {
  const sizes = drawsOfTiles(plan.runs);
  const length = tileLength(plan.runs);
  return {
    store: new StudyRows(plan.runs, rowLength(studyRows(plan, scenario))),
    errandOf: (tile) => ({ kind: "draws", scenario, plan, from: tile * length, to: tile * length + sizes[tile] }),
    order: () => sizes.map((_, tile) => tile),
  };
}
