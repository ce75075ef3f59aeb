import type { RevisionSummary, ScenarioSummary } from "@restband/api/contract";
import { memo, type ReactNode } from "react";
import { SentenceGlance, StripGlance } from "../features/answer/answer-glance.tsx";
import { hasRanges } from "../features/answer/lead-line.ts";
import type { Glance } from "../features/project-home/glances/glance-book.ts";
import { LimitsLine } from "../features/project-home/limits-line.tsx";
import { RevisionStanding } from "../features/revision/revision-standing.tsx";
import { ScenarioRow } from "../features/project-home/scenario-row.tsx";

interface AnsweredRowProps {
  projectId: string;
  summary: ScenarioSummary;
  ownId: string;
  /** Of this scenario, newest first. */
  revisions: readonly RevisionSummary[];
  glance: Glance | undefined;
  menu: ReactNode;
}

/** A row of the project home with its answer, as far as it is computed. */
export function AnsweredRow({ projectId, summary, ownId, revisions, glance, menu }: AnsweredRowProps) {
  const computed = glance?.computed;
  return (
    <ScenarioRow
      projectId={projectId}
      summary={summary}
      ownId={ownId}
      strip={glance && <Strip glance={glance} />}
      sentence={<Sentence glance={glance} />}
      limits={
        computed &&
        "result" in computed && (
          <LimitsLine limits={computed.result.limits} isAsEntered={hasRanges(computed.scenario)} />
        )
      }
      state={revisions.length > 0 && <RevisionStanding revisions={revisions} digest={summary.digest} />}
      menu={menu}
    />
  );
}

// Drawn once for each run, however often the list around it is.
const Strip = memo(({ glance }: { glance: Glance }) => glance.computed && <StripGlance computed={glance.computed} />);
Strip.displayName = "Strip";

const Sentence = memo(({ glance }: { glance: Glance | undefined }) => {
  if (!glance) return <p className="late text-quiet">Computing</p>;
  return glance.computed ? (
    <SentenceGlance computed={glance.computed} />
  ) : (
    <p className="text-quiet">{glance.failure}</p>
  );
});
Sentence.displayName = "Sentence";
