import { rowLength, tileCells, tileCount, type SweepPlan } from "@restband/solver";
import type { StoredExploration } from "../../api/src/contract.ts";
import type { Browser } from "./browser.ts";

export const runner = "11111111-1111-4111-8111-111111111111";
export const otherRunner = "22222222-2222-4222-8222-222222222222";

/** A sweep of kinetic friction in so many steps, as a page asks for it to be kept. */
export function sweepOf(count: number, quantities: SweepPlan["quantities"] = [], rows = 1) {
  const axis = (path: string, from: number, to: number, steps: number) => ({
    ...({ path, spacing: "linear", from, to, count: steps } as const),
  });
  const second = rows > 1 ? [axis("body.viscous", 0, 10, rows)] : [];
  const axes = [axis("contact.law.kinetic", 0.1, 0.19, count), ...second];
  const sweep: SweepPlan = { format: "restband-sweep/1", axes, links: {}, quantities, continuation: "none" };
  return {
    kind: "sweep",
    title: `kinetic friction in ${count} steps`,
    ...{ scenarioVersion: 1, solverVersion: "0.2.0", plan: { sweep, seconds: 5 } },
    tileCells: Array.from({ length: tileCount(sweep) }, (_, tile) => tileCells(sweep, tile).length),
    cellValues: rowLength(sweep),
  };
}

/** Twelve cells of three numbers: three tiles, of 3, 6 and 3 cells. */
export const smallSweep = sweepOf(12);

/** The numbers of a tile of a sweep. */
export const cellsOf = (tile: number, { tileCells: sizes, cellValues } = smallSweep): Float64Array =>
  Float64Array.from({ length: sizes[tile] * cellValues }, (_, i) => 10 * tile + i / 3);

export const tileContent = (numbers: Float64Array): string => Buffer.from(numbers.buffer).toString("base64");

export async function createExploration(author: Browser, projectId: string, scenarioId: string, more: object = {}) {
  return author.get<StoredExploration>("createExploration", {
    params: { projectId, scenarioId },
    body: { ...smallSweep, ...more },
  });
}
