import type { z } from "@restband/solver";
import type { Database } from "../database/database.ts";
import { badRequest, notFound, Refusal } from "../errors.ts";
import { isHeld, missing, tilesOf } from "./exploration-rows.ts";
import type { claimExplorationSchema, conclusionSchema, StoredTile, tileDraftSchema } from "./explorations-schema.ts";
import {
  concludeExploration,
  findExploration,
  findTiles,
  holdExploration,
  insertTile,
  lockExploration,
  type SummaryRow,
} from "./explorations-store.ts";

/** A runner that has not been heard of for so long has let go: its page was closed, its lid shut. */
const HELD_MS = 30_000;

/** An exploration by the ids in a path. */
export interface Place {
  readonly projectId: string;
  readonly explorationId: string;
}

type Claim = z.output<typeof claimExplorationSchema>;

/** What the pages do that compute an exploration: claim it, hand in tiles, let go, conclude. */
export function createRunners(database: Database) {
  return {
    /**
     * Lets one page compute, for as long as it is heard of.
     * @throws Refusal 409 where another page computes it, or where the page's solver is another version
     */
    async claim(
      { projectId, explorationId }: Place,
      { runner, solverVersion }: Claim,
      accountId: string,
    ): Promise<void> {
      await database.transaction(async (transaction) => {
        const row = (await lockExploration(transaction, projectId, explorationId)) ?? missing();
        if (row.solver_version !== solverVersion) throw otherSolver(row.solver_version, solverVersion);
        if (isHeld(row) && row.runner !== runner) throw isRunning(row.runner_name ?? "Somebody");
        await holdExploration(transaction, explorationId, { runner, accountId, until: heldUntil() });
      });
    },

    /** The page computes no more; where another page does, that one goes on. */
    async release({ projectId, explorationId }: Place, runner: string): Promise<void> {
      await database.transaction(async (transaction) => {
        const row = (await lockExploration(transaction, projectId, explorationId)) ?? missing();
        if (row.runner === runner) await holdExploration(transaction, explorationId, null);
      });
    },

    /** Keeps a tile; doing it again, or by two pages, changes nothing. The page that computes is heard of by it. */
    async saveTile(
      { projectId, explorationId }: Place,
      number: number,
      { runner, content }: z.output<typeof tileDraftSchema>,
      accountId: string,
    ): Promise<void> {
      const row = (await findExploration(database, projectId, explorationId)) ?? missing();
      const bytes = Buffer.from(content, "base64");
      demandTile(row, number, bytes);
      await insertTile(database, explorationId, number, bytes);
      const isTheirs = row.runner === runner || !isHeld(row);
      if (isTheirs) await holdExploration(database, explorationId, { runner, accountId, until: heldUntil() });
    },

    async readTiles({ projectId, explorationId }: Place, numbers: readonly number[]): Promise<StoredTile[]> {
      if (!(await findExploration(database, projectId, explorationId))) throw notFound();
      return findTiles(database, explorationId, numbers);
    },

    /**
     * Keeps what came of it; once kept it stays, for the same tiles say the same to everybody.
     * @throws Refusal 409 while tiles are missing
     */
    async conclude(place: Place, conclusion: z.output<typeof conclusionSchema>): Promise<void> {
      await database.transaction(async (transaction) => {
        const row = (await lockExploration(transaction, place.projectId, place.explorationId)) ?? missing();
        const all = tilesOf(row).length;
        const left = all - Number(row.saved);
        if (left > 0) throw new Refusal(409, "not-done", `${left} of ${all} tiles are not there yet.`);
        if (row.headline !== null) return;
        await concludeExploration(transaction, place.explorationId, conclusion);
        await holdExploration(transaction, place.explorationId, null);
      });
    },
  };
}

const heldUntil = (): Date => new Date(Date.now() + HELD_MS);

function demandTile(row: SummaryRow, number: number, bytes: Buffer): void {
  const tiles = tilesOf(row);
  if (number >= tiles.length) throw badRequest([{ path: "number", message: `There are ${tiles.length} tiles.` }]);
  const cells = tiles[number];
  const expected = cells * row.cell_values * 8;
  if (bytes.length === expected) return;
  const message = `Tile ${number} has ${expected} bytes: ${cells} cells of ${row.cell_values} numbers. These are ${bytes.length}.`;
  throw badRequest([{ path: "content", message }]);
}

const otherSolver = (stored: string, mine: string): Refusal =>
  new Refusal(409, "other-solver", `It was begun by solver ${stored}; this page has ${mine}. Begin it anew.`);

const isRunning = (name: string): Refusal =>
  new Refusal(409, "running", `${name} computes this just now. The cells appear here as they come.`);
