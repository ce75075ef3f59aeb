import type { StoredExploration } from "@restband/api/contract";
import { cellCount, solverVersion, type Scenario } from "@restband/solver";
import { ApiFailure } from "../../../api/api-failure.ts";
import { call } from "../../../api/client.ts";
import { readTiles, saveTile } from "../../../api/explorations.ts";
import { CalledOff } from "../../../compute/errand.ts";
import { explorePool } from "../../../compute/explore-pools.ts";
import { runTiles } from "../../../compute/run-tiles.ts";
import { storedSweep } from "./stored-sweep.ts";
import { SweepCells } from "./sweep-cells.ts";
import { runnerId } from "./runner-id.ts";

/** How a sweep stands on this page. */
export type SweepState =
  | { readonly kind: "waiting" }
  | { readonly kind: "running"; readonly elapsed: number; readonly doneBefore: number }
  | { readonly kind: "failed"; readonly message: string };

const AT_A_TIME = 4;
const TRY_AGAIN_MS = 3000;

/**
 * One sweep while it is open or computed: it lives outside the page's parts, so that it goes on while somebody looks
 * elsewhere. Tiles are saved as they come; what cannot be saved waits and is tried again.
 */
export class SweepRun {
  readonly cells: SweepCells;
  /** The scenario whose cells are run. */
  readonly scenario: Scenario;
  state: SweepState = { kind: "waiting" };
  /** Why tiles wait to be saved; null while all are. */
  trouble: string | null = null;
  /** Tiles that could not be computed, with the reason. */
  readonly failed = new Map<number, string>();
  /** Cells done of tiles under way. */
  private readonly under = new Map<number, number>();
  private readonly unsaved = new Map<number, Float64Array>();
  private isSaving = false;
  private edition = 0;
  private readonly listeners = new Set<() => void>();
  private controller: AbortController | null = null;
  private reading: Promise<void> = Promise.resolve();

  constructor(
    private readonly projectId: string,
    private readonly stored: StoredExploration,
  ) {
    const { plan, scenario } = storedSweep(stored);
    this.scenario = scenario;
    this.cells = new SweepCells(plan, scenario.limits.length);
  }

  readonly editionNow = (): number => this.edition;
  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  get done(): number {
    return this.cells.done + [...this.under.values()].reduce((sum, each) => sum + each, 0);
  }

  get isComplete(): boolean {
    return this.cells.done === cellCount(this.cells.plan);
  }

  get unsavedCount(): number {
    return this.unsaved.size;
  }

  /** Reads those of the saved tiles that are not here yet; one reading at a time. */
  fetch(saved: readonly number[]): Promise<void> {
    this.reading = this.reading.then(() => this.fetchNow(saved)).catch(() => undefined);
    return this.reading;
  }

  private async fetchNow(saved: readonly number[]): Promise<void> {
    const missing = saved.filter((tile) => !this.cells.hasTile(tile));
    for (let i = 0; i < missing.length; i += AT_A_TIME) {
      const tiles = await readTiles(this.projectId, this.stored.id, missing.slice(i, i + AT_A_TIME));
      for (const { number, rows } of tiles) this.cells.setTile(number, rows);
      this.tell();
    }
  }

  /**
   * Computes what is missing, until it is complete or stopped. `isKept` false: the person may not save, it is computed
   * for this page alone.
   */
  async start(isKept: boolean): Promise<void> {
    if (this.state.kind === "running") return;
    const controller = (this.controller = new AbortController());
    const since = performance.now();
    const doneBefore = this.cells.done;
    const progress = (): void => this.set({ kind: "running", elapsed: performance.now() - since, doneBefore });
    progress();
    try {
      if (isKept) await this.claim();
      await this.reading;
      await runTiles({
        scenario: this.scenario,
        plan: this.cells.plan,
        pool: explorePool,
        signal: controller.signal,
        rowsOf: (tile) => this.cells.rowsOf(tile),
        onTile: (tile, rows) => {
          this.take(tile, rows, isKept);
          progress();
        },
        onCells: (tile, done) => {
          this.under.set(tile, done);
          progress();
        },
        onFailed: (tile, reason) => {
          this.under.delete(tile);
          this.failed.set(tile, reason);
          progress();
        },
      });
      this.set({ kind: "waiting" });
    } catch (error) {
      this.under.clear();
      this.set(error instanceof CalledOff ? { kind: "waiting" } : { kind: "failed", message: sentenceOf(error) });
    }
  }

  /** Frees the workers at once; what is computed stays. */
  stop(): void {
    this.controller?.abort();
    void call("releaseExploration", { ...this.at, body: { runner: runnerId() } }).catch(() => undefined);
  }

  private get at() {
    return { params: { projectId: this.projectId, explorationId: this.stored.id } };
  }

  private async claim(): Promise<void> {
    const stored = await call("claimExploration", { ...this.at, body: { runner: runnerId(), solverVersion } });
    await this.fetch(stored.saved);
  }

  private take(tile: number, rows: Float64Array, isKept: boolean): void {
    this.under.delete(tile);
    this.failed.delete(tile);
    this.cells.setTile(tile, rows);
    if (isKept) {
      this.unsaved.set(tile, rows);
      void this.save();
    }
  }

  /** Saves one tile after the other; a server that is gone is tried again, one that refuses is not. */
  private async save(): Promise<void> {
    if (this.isSaving) return;
    this.isSaving = true;
    for (let next = first(this.unsaved); next; next = first(this.unsaved)) {
      const [tile, rows] = next;
      try {
        await saveTile(this.projectId, this.stored.id, tile, runnerId(), rows);
        this.unsaved.delete(tile);
        this.trouble = null;
      } catch (error) {
        this.trouble = error instanceof ApiFailure ? error.message : "Saving has failed.";
        if (error instanceof ApiFailure && error.status === 404) this.unsaved.clear();
        else await new Promise((resolve) => setTimeout(resolve, TRY_AGAIN_MS));
      }
      this.tell();
    }
    this.isSaving = false;
  }

  private set(state: SweepState): void {
    this.state = state;
    this.tell();
  }

  private tell(): void {
    this.edition += 1;
    for (const listener of this.listeners) listener();
  }
}

const first = <K, V>(map: Map<K, V>): [K, V] | undefined => map.entries().next().value;

const sentenceOf = (error: unknown): string => (error instanceof Error ? error.message : String(error));

const runs = new Map<string, SweepRun>();
const MOST_OPEN = 8;

/** The run of a sweep, the same as long as the page is open. */
export function sweepRunOf(projectId: string, stored: StoredExploration): SweepRun {
  const known = runs.get(stored.id);
  if (known) return known;
  for (const [id, run] of runs) if (runs.size >= MOST_OPEN && run.state.kind !== "running") runs.delete(id);
  const run = new SweepRun(projectId, stored);
  runs.set(stored.id, run);
  return run;
}
