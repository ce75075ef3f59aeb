import type { Exploring } from "@restband/solver";
import { useCallback, useEffect, useRef, useState } from "react";
import { CalledOff } from "./errand.ts";
import type { ErrandPool } from "./errand-pool.ts";
import { explorePool } from "./explore-pools.ts";
import { goThrough, type ExploreProgress } from "./go-through.ts";

/** How far an exploration that somebody asked for has come. */
export type ExploringState<T> =
  | { readonly kind: "idle" }
  | { readonly kind: "running"; readonly done: number; readonly total: number; readonly elapsed: number }
  | { readonly kind: "done"; readonly value: T }
  | { readonly kind: "stopped" }
  | { readonly kind: "failed"; readonly message: string };

export interface ExploringRun<T> {
  readonly state: ExploringState<T>;
  /** Begins anew; what ran before is called off. Tells what it came to, null where it was called off or failed. */
  readonly begin: (exploring: Exploring<T>) => Promise<T | null>;
  readonly stop: () => void;
}

/** Goes through an exploration in the pool when asked to, and no longer than the part of the page that asked is there. */
export function useExploring<T>(pool: ErrandPool = explorePool): ExploringRun<T> {
  const [state, setState] = useState<ExploringState<T>>({ kind: "idle" });
  const under = useRef<AbortController | null>(null);
  useEffect(() => () => under.current?.abort(), []);

  const begin = useCallback(
    async (exploring: Exploring<T>): Promise<T | null> => {
      under.current?.abort();
      const controller = (under.current = new AbortController());
      const set = (next: ExploringState<T>): void => {
        if (under.current === controller) setState(next);
      };
      const since = performance.now();
      set({ kind: "running", done: 0, total: 0, elapsed: 0 });
      try {
        const tell = ({ done, total }: ExploreProgress): void =>
          set({ kind: "running", done, total, elapsed: performance.now() - since });
        const value = await goThrough(exploring, { pool, signal: controller.signal, tell });
        set({ kind: "done", value });
        return value;
      } catch (error) {
        set(error instanceof CalledOff ? { kind: "stopped" } : { kind: "failed", message: sentenceOf(error) });
        return null;
      }
    },
    [pool],
  );
  const stop = useCallback(() => under.current?.abort(), []);
  return { state, begin, stop };
}

const sentenceOf = (error: unknown): string =>
  `The computation failed: ${error instanceof Error ? error.message : String(error)}`;
