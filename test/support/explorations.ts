import type { StoredExploration } from "../../api/src/contract.ts";
import type { Browser } from "./browser.ts";

export const runner = "11111111-1111-4111-8111-111111111111";
export const otherRunner = "22222222-2222-4222-8222-222222222222";

/** Five cells of two numbers in tiles of two: three tiles, the last of one cell. */
export const smallSweep = {
  kind: "sweep",
  title: "kinetic friction in 5 steps",
  scenarioVersion: 1,
  solverVersion: "0.2.0",
  plan: { axes: [] },
  tileCells: [2, 2, 1],
  cellValues: 2,
};

/** The numbers of a tile of the small sweep. */
export const cellsOf = (tile: number): Float64Array =>
  Float64Array.from({ length: tile === 2 ? 2 : 4 }, (_, i) => 10 * tile + i / 3);

export const tileContent = (numbers: Float64Array): string => Buffer.from(numbers.buffer).toString("base64");

export async function createExploration(author: Browser, projectId: string, scenarioId: string, more: object = {}) {
  return author.get<StoredExploration>("createExploration", {
    params: { projectId, scenarioId },
    body: { ...smallSweep, ...more },
  });
}
