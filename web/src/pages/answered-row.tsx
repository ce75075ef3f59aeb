import type { StoredScenario } from "@restband/api/contract";
import { useEffect } from "react";
import { useRun } from "../compute/use-run.ts";
import { standingOf, type Standing } from "../features/project-home/headline.ts";
import { LimitsLine } from "../features/project-home/limits-line.tsx";
import { ScenarioRow } from "../features/project-home/scenario-row.tsx";

interface AnsweredRowProps {
  stored: StoredScenario;
  ownId: string;
  /** Only a row that is seen is computed. */
  isSeen: boolean;
  /** Told how the scenario stands against its limits, once that is computed. */
  onStanding: (standing: Standing) => void;
}

/** A row of the project home with its answer, computed here. */
export function AnsweredRow({ stored, ownId, isSeen, onStanding }: AnsweredRowProps) {
  const { computed } = useRun(isSeen ? stored.content : null);
  const result = computed && "result" in computed ? computed.result : null;
  const standing = result && standingOf(result.limits);
  useEffect(() => {
    if (standing) onStanding(standing);
    // Told once for each standing; the callback is a new one with each render.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [standing]);
  return (
    <ScenarioRow
      stored={stored}
      ownId={ownId}
      strip={null}
      sentence={null}
      limits={result && <LimitsLine limits={result.limits} />}
    />
  );
}
