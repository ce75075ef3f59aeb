import type { StoredExploration } from "@restband/api/contract";
import { useQueryClient } from "@tanstack/react-query";
import { useEffect, useRef, useSyncExternalStore } from "react";
import { explorationQuery, explorationsQuery } from "../../../api/explorations.ts";
import { call } from "../../../api/client.ts";
import { sweepRunOf, type SweepRun } from "./sweep-run.ts";
import { sweepHeadline } from "./sweep-headline.ts";

/** The sweep's run on this page: filled with what is saved, told again with each change, concluded when it is complete. */
export function useSweep(projectId: string, stored: StoredExploration, canEdit: boolean): SweepRun {
  const run = sweepRunOf(projectId, stored);
  useSyncExternalStore(run.subscribe, run.editionNow);
  const client = useQueryClient();
  useEffect(() => void run.fetch(stored.saved), [run, stored.saved]);

  const isConcluding = useRef(false);
  const isToConclude = canEdit && stored.headline === null && run.isComplete && run.unsavedCount === 0;
  useEffect(() => {
    if (!isToConclude || isConcluding.current) return;
    isConcluding.current = true;
    const at = { params: { projectId, explorationId: stored.id } };
    const headline = sweepHeadline(run.cells).slice(0, 400);
    const then = async (): Promise<void> => {
      await client.invalidateQueries({ queryKey: explorationQuery(projectId, stored.id).queryKey });
      await client.invalidateQueries({ queryKey: explorationsQuery(projectId, stored.scenarioId).queryKey });
    };
    void call("concludeExploration", { ...at, body: { headline, answer: {} } })
      .then(then)
      .catch(() => (isConcluding.current = false));
  }, [client, isToConclude, projectId, run, stored]);
  return run;
}
