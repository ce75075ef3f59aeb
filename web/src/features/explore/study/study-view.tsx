import type { StoredExploration } from "@restband/api/contract";
import type { Scenario, ToleranceSummary } from "@restband/solver";
import { useEffect, useMemo, useState } from "react";
import { idlePool } from "../../../compute/explore-pools.ts";
import { useUnitSystem } from "../../../format/unit-system.ts";
import { TileProgress } from "../kept/tile-progress.tsx";
import { tileRunOf, type TileRun } from "../kept/tile-run.ts";
import { useTileRun } from "../kept/use-tile-run.ts";
import { LimitChances } from "./limit-chances.tsx";
import { QuantitySpreads } from "./quantity-spreads.tsx";
import { StudySentence } from "./study-sentence.tsx";
import { storedStudy, studyWork, type StudyRows } from "./stored-study.ts";
import { studyHeadline } from "./study-words.ts";

interface StudyViewProps {
  projectId: string;
  stored: StoredExploration;
  canEdit: boolean;
}

/** A tolerance study: how likely each limit is kept, how each quantity scatters, and what matters most. */
export function StudyView({ projectId, stored, canEdit }: StudyViewProps) {
  useUnitSystem();
  const scenario = stored.content;
  const plan = useMemo(() => storedStudy(stored), [stored]);
  const run = tileRunOf(projectId, stored, () => studyWork(plan, scenario));
  const summary = useSummary(run, stored, scenario);
  const conclusion = useMemo(
    () => (summary?.runs === plan.runs ? { headline: studyHeadline(summary, scenario), answer: {} } : null),
    [summary, plan.runs, scenario],
  );
  useTileRun(run, { projectId, stored, canEdit, conclusion });
  return (
    <>
      <div className="grid gap-x-12 gap-y-5 pb-8 wide:grid-cols-[minmax(0,1fr)_388px]">
        <h1 className="text-24 leading-[1.25] font-semibold desk:text-34">
          {summary ? studyHeadline(summary, scenario) : "No draw is there yet."}
        </h1>
        <div>
          <StudySentence plan={plan} scenario={scenario} />
          {stored.isStale && (
            <p className="mt-3 border-l-4 border-band-line pl-3">
              The scenario has other numbers by now. This study is of its version {stored.scenarioVersion}.
            </p>
          )}
        </div>
      </div>
      <div className="flex flex-col gap-8 border-t border-line pt-6">
        <TileProgress run={run} stored={stored} canEdit={canEdit} noun="draws" />
        {summary && (
          <>
            <LimitChances summary={summary} scenario={scenario} />
            <QuantitySpreads summary={summary} scenario={scenario} />
          </>
        )}
      </div>
    </>
  );
}

const EVERY_MS = 1500;

/** What the draws say that are there, worked out beside the page: now and then while they come, and once more at the end. */
function useSummary(run: TileRun<StudyRows>, stored: StoredExploration, scenario: Scenario): ToleranceSummary | null {
  const [summary, setSummary] = useState<ToleranceSummary | null>(null);
  const { store } = run;
  const { done } = store;
  useEffect(() => {
    if (done === 0) return;
    const controller = new AbortController();
    const work = async (): Promise<void> => {
      const rows = store.first();
      if (rows.length === 0) return;
      const errand = { kind: "summary" as const, scenario, plan: storedStudy(stored), rows };
      setSummary(await idlePool.send(errand, controller.signal));
    };
    const timer = setTimeout(() => void work().catch(() => undefined), done === store.count ? 0 : EVERY_MS);
    return () => {
      clearTimeout(timer);
      controller.abort();
    };
    // The exploration is read anew while it runs elsewhere; its plan stays.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [store, done, scenario.format, stored.id]);
  return summary;
}
