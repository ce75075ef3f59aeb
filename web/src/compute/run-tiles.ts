import { tileCells, tileCount, type SweepPlan } from "@restband/solver";
import { CalledOff, type TileErrand } from "./errand.ts";
import type { ErrandPool } from "./errand-pool.ts";

export interface TilesToRun {
  readonly errandOf: (tile: number) => TileErrand;
  /** The tiles in the order they are best run; asked once the first tile is there. */
  readonly order: () => readonly number[];
  readonly hasTile: (tile: number) => boolean;
  readonly pool: ErrandPool;
  readonly signal: AbortSignal;
  readonly onTile: (tile: number, rows: Float64Array) => void;
  /** Rows done of a tile under way. */
  readonly onRows: (tile: number, done: number) => void;
  /** A tile that two workers died of, or that the solver threw at: the others go on. */
  readonly onFailed: (tile: number, reason: string) => void;
}

/**
 * Runs the tiles that are not there yet: the first, which may tell what comes next, then all others. No more are under way
 * than the pool has workers, so that others get their turn.
 * @throws CalledOff once the signal is aborted
 */
export async function runTiles(run: TilesToRun): Promise<void> {
  if (!run.hasTile(0)) await runTile(run, 0);
  const left = run.order().filter((tile) => tile !== 0);
  const next = async (): Promise<void> => {
    for (let tile = left.shift(); tile !== undefined; tile = left.shift())
      if (!run.hasTile(tile)) await runTile(run, tile);
  };
  await Promise.all(Array.from({ length: run.pool.size }, next));
}

async function runTile(run: TilesToRun, tile: number): Promise<void> {
  try {
    const rows = await run.pool.send(run.errandOf(tile), run.signal, (done) => run.onRows(tile, done));
    run.onTile(tile, rows);
  } catch (error) {
    if (error instanceof CalledOff) throw error;
    run.onFailed(tile, error instanceof Error ? error.message : String(error));
  }
}

/** Cells of each tile of a sweep. */
export const tileSizes = (plan: SweepPlan): number[] =>
  Array.from({ length: tileCount(plan) }, (_, tile) => tileCells(plan, tile).length);
