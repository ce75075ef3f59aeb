import type { StoredScenario } from "@restband/api/contract";
import { useEffect } from "react";
import { useRun, type Computed } from "../compute/use-run.ts";
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

/** A row of the project home with its answer, computed here. */
export function AnsweredRow({ stored, ownId, isSeen, onStanding }: AnsweredRowProps) {
  const { computed, failure } = useRun(isSeen ? stored.content : null);
  const standing = computed && standingOfRun(computed);
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
      sentence={computed ? <SentenceGlance computed={computed} /> : <Waiting failure={failure} />}
      limits={computed && "result" in computed && <LimitsLine limits={computed.result.limits} />}
    />
  );
}

/** A scenario that this version cannot compute keeps no limit and breaks none. */
function standingOfRun(computed: Computed): Standing {
  if ("result" in computed) return standingOf(computed.result.limits);
  return computed.scenario.limits.length > 0 ? "unjudged" : "no-limits";
}

function Waiting({ failure }: { failure: string | null }) {
  return <p className={failure ? "text-quiet" : "late text-quiet"}>{failure ?? "Computing"}</p>;
}
