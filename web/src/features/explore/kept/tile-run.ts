import type { StoredExploration } from "@restband/api/contract";
import { solverVersion } from "@restband/solver";
import { ApiFailure } from "../../../api/api-failure.ts";
import { call } from "../../../api/client.ts";
import { readTiles, saveTile } from "../../../api/explorations.ts";
import { CalledOff, type TileErrand } from "../../../compute/errand.ts";
import { explorePool } from "../../../compute/explore-pools.ts";
import { runTiles } from "../../../compute/run-tiles.ts";
import { runnerId } from "./runner-id.ts";
import { noteRunning, noteStopped } from "./running-here.ts";

/** The rows of a sweep or a study that are there so far. */
export interface TileStore {
  /** Rows there will be, and rows there are. */
  readonly count: number;
  readonly done: number;
  readonly hasTile: (tile: number) => boolean;
  setTile(tile: number, rows: Float64Array): void;
}

/** What is computed, and in which order its tiles are best run. */
export interface TileWork<Store extends TileStore> {
  readonly store: Store;
  readonly errandOf: (tile: number) => TileErrand;
  readonly order: () => readonly number[];
}

/** How a computation stands on this page. */
export type TileState =
  | { readonly kind: "waiting" }
  | { readonly kind: "running"; readonly elapsed: number; readonly doneBefore: number }
  /** Another page computes it. */
  | { readonly kind: "elsewhere" }
  | { readonly kind: "failed"; readonly message: string };

const AT_A_TIME = 4;
const TRY_AGAIN_MS = 3000;
const TELL_EVERY_MS = 200;
/** What a server says that will say so again: it knows no such exploration any more, or takes no such tile. */
const FINAL = [400, 404, 413, 422];

/**
 * A sweep or a study while it is open or computed: it lives outside the page's parts, so that it goes on while somebody looks
 * elsewhere. Tiles are saved as they come; what cannot be saved waits and is tried again.
 */
export class TileRun<Store extends TileStore> {
  readonly store: Store;
  state: TileState = { kind: "waiting" };
  /** Why tiles wait to be saved; null while all are. */
  trouble: string | null = null;
  /** Tiles that could not be computed, with the reason. */
  readonly failed = new Map<number, string>();
  /** Rows done of tiles under way. */
  private readonly under = new Map<number, number>();
  private readonly unsaved = new Map<number, Float64Array>();
  private isSaving = false;
  private edition = 0;
  private news: ReturnType<typeof setTimeout> | null = null;
  private readonly listeners = new Set<() => void>();
  private controller: AbortController | null = null;
  /** Why the server takes no more of it; null while it does. */
  private refusal: string | null = null;
  private reading: Promise<void> = Promise.resolve();

  constructor(
    private readonly projectId: string,
    private readonly explorationId: string,
    private readonly work: TileWork<Store>,
  ) {
    this.store = work.store;
  }

  readonly editionNow = (): number => this.edition;
  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  get done(): number {
    return this.store.done + [...this.under.values()].reduce((sum, each) => sum + each, 0);
  }

  get isComplete(): boolean {
    return this.store.done === this.store.count;
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
    const missing = saved.filter((tile) => !this.store.hasTile(tile));
    for (let i = 0; i < missing.length; i += AT_A_TIME) {
      const tiles = await readTiles(this.projectId, this.explorationId, missing.slice(i, i + AT_A_TIME));
      for (const { number, rows } of tiles) this.store.setTile(number, rows);
      if (this.isComplete) noteStopped(this.explorationId);
      this.tell();
    }
  }

  /**
   * Computes what is missing, until it is complete or stopped; where another page does so already, that one goes on. `isKept`
   * false: the person may not save, it is computed for this page alone.
   */
  async start(isKept: boolean): Promise<void> {
    if (this.state.kind === "running") return;
    this.refusal = null;
    if (isKept) noteRunning(this.explorationId);
    const controller = (this.controller = new AbortController());
    const since = performance.now();
    const doneBefore = this.store.done;
    const progress = (): void => this.set({ kind: "running", elapsed: performance.now() - since, doneBefore });
    progress();
    try {
      if (isKept) await this.claim();
      await this.reading;
      await runTiles({
        errandOf: this.work.errandOf,
        order: this.work.order,
        hasTile: this.store.hasTile,
        pool: explorePool,
        signal: controller.signal,
        onTile: (tile, rows) => {
          this.take(tile, rows, isKept);
          progress();
        },
        onRows: (tile, done) => {
          this.under.set(tile, done);
          progress();
        },
        onFailed: (tile, reason) => {
          this.under.delete(tile);
          this.failed.set(tile, reason);
          progress();
        },
      });
      if (this.isComplete) noteStopped(this.explorationId);
      this.set({ kind: "waiting" });
    } catch (error) {
      this.under.clear();
      this.set(this.endOf(error));
    }
  }

  private endOf(error: unknown): TileState {
    if (error instanceof ApiFailure && error.code === "running") return { kind: "elsewhere" };
    if (error instanceof CalledOff)
      return this.refusal === null ? { kind: "waiting" } : { kind: "failed", message: this.refusal };
    return { kind: "failed", message: sentenceOf(error) };
  }

  /** Takes tiles that were computed elsewhere; those that are there stay as they are. */
  bringIn(tiles: readonly Float64Array[]): void {
    this.stop();
    tiles.forEach((rows, tile) => {
      if (!this.store.hasTile(tile)) this.take(tile, rows, true);
    });
    this.tell();
  }

  /** Frees the workers at once; what is computed stays. */
  stop(): void {
    noteStopped(this.explorationId);
    this.controller?.abort();
    void call("releaseExploration", { ...this.at, body: { runner: runnerId() } }).catch(() => undefined);
  }

  private get at() {
    return { params: { projectId: this.projectId, explorationId: this.explorationId } };
  }

  private async claim(): Promise<void> {
    const stored = await call("claimExploration", { ...this.at, body: { runner: runnerId(), solverVersion } });
    await this.fetch(stored.saved);
  }

  private take(tile: number, rows: Float64Array, isKept: boolean): void {
    this.under.delete(tile);
    this.failed.delete(tile);
    this.store.setTile(tile, rows);
    if (isKept) {
      this.unsaved.set(tile, rows);
      void this.save();
    }
  }

  /** Saves one tile after the other; a server that is gone is tried again, one that refuses ends the run. */
  private async save(): Promise<void> {
    if (this.isSaving) return;
    this.isSaving = true;
    for (let next = first(this.unsaved); next; next = first(this.unsaved)) {
      const [tile, rows] = next;
      try {
        await saveTile(this.projectId, this.explorationId, tile, runnerId(), rows);
        this.unsaved.delete(tile);
        this.trouble = null;
      } catch (error) {
        this.trouble = error instanceof ApiFailure ? error.message : "Saving has failed.";
        if (error instanceof ApiFailure && FINAL.includes(error.status)) this.giveUp(error.message);
        else await new Promise((resolve) => setTimeout(resolve, TRY_AGAIN_MS));
      }
      this.tell();
    }
    this.isSaving = false;
  }

  private giveUp(refusal: string): void {
    this.unsaved.clear();
    this.refusal = refusal;
    noteStopped(this.explorationId);
    if (this.state.kind === "running") this.controller?.abort();
    else this.set({ kind: "failed", message: refusal });
  }

  private set(state: TileState): void {
    const isOther = state.kind !== this.state.kind;
    this.state = state;
    if (isOther) this.tellNow();
    else this.tell();
  }

  /** Rows come much faster than they can be drawn: news waits for each other, so that workers are never kept waiting by a page that draws. */
  private tell(): void {
    this.news ??= setTimeout(() => this.tellNow(), TELL_EVERY_MS);
  }

  private tellNow(): void {
    if (this.news !== null) clearTimeout(this.news);
    this.news = null;
    this.edition += 1;
    for (const listener of this.listeners) listener();
  }
}

const first = <K, V>(map: Map<K, V>): [K, V] | undefined => map.entries().next().value;

const sentenceOf = (error: unknown): string => (error instanceof Error ? error.message : String(error));

const runs = new Map<string, TileRun<TileStore>>();
const MOST_OPEN = 8;

/** The run of an exploration, the same as long as the page is open. `workOf` makes it where it is not there yet. */
export function tileRunOf<Store extends TileStore>(
  projectId: string,
  { id }: StoredExploration,
  workOf: () => TileWork<Store>,
): TileRun<Store> {
  const known = runs.get(id);
  if (known) return known as TileRun<Store>;
  for (const [other, run] of runs) if (runs.size >= MOST_OPEN && run.state.kind !== "running") runs.delete(other);
  const run = new TileRun(projectId, id, workOf());
  runs.set(id, run);
  return run;
}
