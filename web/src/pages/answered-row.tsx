import type { StoredScenario } from "@restband/api/contract";
import { useEffect } from "react";
import type { RunOptions } from "../compute/solver-job.ts";
import { useRun } from "../compute/use-run.ts";
import { SentenceGlance, StripGlance } from "../features/answer/answer-glance.tsx";
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

/** A strip needs no samples but those at the events, which are always there. */
const options: RunOptions = { samples: 2, energy: false };

/** A row of the project home with its answer, computed here. */
export function AnsweredRow({ stored, ownId, isSeen, onStanding }: AnsweredRowProps) {
  const { computed } = useRun(isSeen ? stored.content : null, options);
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
      strip={computed && <StripGlance computed={computed} />}
      sentence={computed && <SentenceGlance computed={computed} />}
      limits={result && <LimitsLine limits={result.limits} />}
    />
  );
}
