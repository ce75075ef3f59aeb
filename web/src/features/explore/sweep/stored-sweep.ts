import type { StoredExploration } from "@restband/api/contract";
import { rowLength, tileOrder, type Scenario, type SweepPlan } from "@restband/solver";
import type { ExplorationDraft } from "../../../api/explorations.ts";
import type { TileWork } from "../kept/tile-run.ts";
import { SweepCells } from "./sweep-cells.ts";
import { tileSizes } from "../../../compute/run-tiles.ts";

/** A sweep as it is asked: its plan, and how long each run lasts, which need not be as long as the scenario's own. */
export interface AskedSweep {
  readonly plan: SweepPlan;
  /** s */
  readonly seconds: number;
}

/** The scenario whose cells are run. */
export const lasting = (scenario: Scenario, seconds: number): Scenario => ({
  ...scenario,
  span: { ...scenario.span, seconds },
});

/** A sweep for the server to keep, before any of it is computed. */
export const sweepToKeep = (
  { plan, seconds }: AskedSweep,
  about: { title: string; scenarioVersion: number; solverVersion: string },
): ExplorationDraft => ({
  kind: "sweep",
  ...about,
  plan: { sweep: plan, seconds },
  tileCells: tileSizes(plan),
  cellValues: rowLength(plan),
});

/** What the server kept of one, with the scenario its cells are of. */
export function storedSweep({ plan, content }: StoredExploration): AskedSweep & { readonly scenario: Scenario } {
  const { sweep, seconds } = plan as unknown as { sweep: SweepPlan; seconds: number };
  return { plan: sweep, seconds, scenario: lasting(content, seconds) };
}

/** The cells of a sweep, and how its tiles are run: a coarse look first, then where it shows a boundary. */
export function sweepWork(plan: SweepPlan, scenario: Scenario): TileWork<SweepCells> {
  const store = new SweepCells(plan, scenario.limits.length);
  return {
    store,
    errandOf: (tile) => ({ kind: "tile", scenario, plan, tile }),
    order: () => tileOrder(plan, store.rowsOf(0) ?? null),
  };
}
