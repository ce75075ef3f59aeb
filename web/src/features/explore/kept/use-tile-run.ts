import type { StoredExploration } from "@restband/api/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useEffect, useRef, useSyncExternalStore } from "react";
import { call } from "../../../api/client.ts";
import { explorationQuery, explorationsQuery, type Conclusion } from "../../../api/explorations.ts";
import { isRunningHere } from "./running-here.ts";
import type { TileRun, TileStore } from "./tile-run.ts";

interface TileRunSettings {
  readonly projectId: string;
  readonly stored: StoredExploration;
  readonly canEdit: boolean;
  /** What it says once all its rows are there; null until that is known. */
  readonly conclusion: Conclusion | null;
}

/**
 * Fills a run with what is saved, tells each change, and concludes it when it is complete. What this browser was computing goes
 * on by itself, as soon as no other page does.
 */
export function useTileRun(run: TileRun<TileStore>, settings: TileRunSettings): void {
  const { projectId, stored, canEdit, conclusion } = settings;
  useSyncExternalStore(run.subscribe, run.editionNow);
  const client = useQueryClient();
  useEffect(() => void run.fetch(stored.saved), [run, stored.saved]);

  const isOpen = canEdit && stored.headline === null;
  useEffect(() => {
    if (isOpen && !run.isComplete && isRunningHere(stored.id)) void run.start(true);
  }, [run, isOpen, stored.id, stored.state]);

  const isElsewhere = run.state.kind === "elsewhere";
  useEffect(() => {
    // Read anew it says who computes it, and is read again as long as somebody does.
    if (isElsewhere) void client.invalidateQueries({ queryKey: explorationQuery(projectId, stored.id).queryKey });
  }, [client, isElsewhere, projectId, stored.id]);

  const isConcluding = useRef(false);
  const isToConclude = canEdit && stored.headline === null && run.isComplete && run.unsavedCount === 0;
  useEffect(() => {
    if (!isToConclude || !conclusion || isConcluding.current) return;
    isConcluding.current = true;
    const at = { params: { projectId, explorationId: stored.id } };
    const then = async (): Promise<void> => {
      await client.invalidateQueries({ queryKey: explorationQuery(projectId, stored.id).queryKey });
      await client.invalidateQueries({ queryKey: explorationsQuery(projectId, stored.scenarioId).queryKey });
    };
    void call("concludeExploration", { ...at, body: conclusion })
      .then(then)
      .catch(() => (isConcluding.current = false));
  }, [client, conclusion, isToConclude, projectId, stored]);
}
