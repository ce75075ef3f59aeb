import { rowLength, type SweepPlan } from "@restband/solver";
import type { ExplorationDraft } from "../../../api/explorations.ts";
import { tileSizes } from "../../../compute/run-tiles.ts";

/** A sweep as the server keeps it, before any of it is computed. */
export const sweepDraftFor = (
  plan: SweepPlan,
  title: string,
  scenarioVersion: number,
  solverVersion: string,
): ExplorationDraft => ({
  kind: "sweep",
  title,
  scenarioVersion,
  solverVersion,
  plan: { ...plan },
  tileCells: tileSizes(plan),
  cellValues: rowLength(plan),
});
