import { tileCells, tileCount, tileOrder, type Scenario, type SweepPlan } from "@restband/solver";
import { CalledOff } from "./errand.ts";
import type { ErrandPool } from "./errand-pool.ts";

export interface TileRun {
  readonly scenario: Scenario;
  readonly plan: SweepPlan;
  readonly pool: ErrandPool;
  readonly signal: AbortSignal;
  /** Rows of a tile that is there already, computed before or by somebody else. */
  readonly rowsOf: (tile: number) => Float64Array | undefined;
  readonly onTile: (tile: number, rows: Float64Array) => void;
  /** Cells done of a tile under way. */
  readonly onCells: (tile: number, done: number) => void;
  /** A tile that two workers died of, or that the solver threw at: the others go on. */
  readonly onFailed: (tile: number, reason: string) => void;
}

/**
 * Runs the tiles of a sweep that are not there yet: first the coarse look over the whole map, then those with a boundary
 * in them. No more are under way than the pool has workers, so that others get their turn.
 * @throws CalledOff once the signal is aborted
 */
export async function runTiles(run: TileRun): Promise<void> {
  const { plan, rowsOf } = run;
  if (!rowsOf(0)) await runTile(run, 0);
  const order = tileOrder(plan, rowsOf(0) ?? null).filter((tile) => tile !== 0);
  const next = async (): Promise<void> => {
    for (let tile = order.shift(); tile !== undefined; tile = order.shift())
      if (!rowsOf(tile)) await runTile(run, tile);
  };
  await Promise.all(Array.from({ length: run.pool.size }, next));
}

async function runTile(
  { scenario, plan, pool, signal, onTile, onCells, onFailed }: TileRun,
  tile: number,
): Promise<void> {
  try {
    const rows = await pool.send({ kind: "tile", scenario, plan, tile }, signal, (done) => onCells(tile, done));
    onTile(tile, rows);
  } catch (error) {
    if (error instanceof CalledOff) throw error;
    onFailed(tile, error instanceof Error ? error.message : String(error));
  }
}

/** Cells of each tile of a sweep. */
export const tileSizes = (plan: SweepPlan): number[] =>
  Array.from({ length: tileCount(plan) }, (_, tile) => tileCells(plan, tile).length);
