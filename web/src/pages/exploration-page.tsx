import type { StoredExploration } from "@restband/api/contract";
import { useSuspenseQueries } from "@tanstack/react-query";
import { useParams } from "react-router-dom";
import { explorationQuery } from "../api/explorations.ts";
import { projectQuery } from "../api/projects.ts";
import { ButtonLink } from "../components/button.tsx";
import { WorkHeader } from "../features/account/work-header.tsx";
import { SentenceGlance } from "../features/answer/answer-glance.tsx";
import { SweepView } from "../features/explore/sweep/sweep-view.tsx";
import { StudyView } from "../features/explore/study/study-view.tsx";
import { ThresholdAnswer } from "../features/explore/threshold/threshold-answer.tsx";
import { storedReading } from "../features/explore/threshold/threshold-reading.ts";
import { mayEdit } from "../features/project-home/roles.ts";
import { compareReference, paths } from "../paths.ts";
import type { Computed } from "../compute/use-run.ts";
import { useOpenScenario } from "./use-open-scenario.ts";

/** One exploration that is kept: a sweep as it fills, for whoever looks. */
export function ExplorationPage() {
  const { projectId = "", scenarioId = "", explorationId = "" } = useParams();
  const [{ data: project }, { data: stored }] = useSuspenseQueries({
    queries: [projectQuery(projectId), explorationQuery(projectId, explorationId)],
  });
  const canEdit = mayEdit(project.role) && project.archivedAt === null;
  const open = useOpenScenario(projectId);
  return (
    <>
      <title>{`${stored.title} · Restband`}</title>
      <WorkHeader
        trail={[
          { label: project.name, to: paths.project(projectId) },
          { label: stored.content.title || "Untitled", to: paths.scenario(projectId, scenarioId) },
          { label: "Explore", to: paths.explore(projectId, scenarioId) },
        ]}
        title={stored.title}
      />
      <main id="content" tabIndex={-1} className="page-width grow py-8 desk:py-9">
        {stored.kind === "sweep" && (
          <SweepView
            key={stored.id}
            {...{ projectId, stored, canEdit }}
            answer={cellAnswer}
            {...(canEdit && { open })}
            compare={(cell) => (
              <ButtonLink
                to={paths.compare(projectId, compareReference.scenario(scenarioId), compareReference.given(cell))}
              >
                Compare with the scenario
              </ButtonLink>
            )}
          />
        )}
        {stored.kind === "study" && <StudyView key={stored.id} {...{ projectId, stored, canEdit }} />}
        {stored.kind === "search" && <KeptSearch stored={stored} {...(canEdit && { open })} />}
      </main>
    </>
  );
}

function KeptSearch({ stored, open }: { stored: StoredExploration; open?: ReturnType<typeof useOpenScenario> }) {
  const reading = storedReading(stored);
  if (!reading) return <p className="text-18">This search holds no answer that this page can read.</p>;
  return (
    <>
      <h1 className="mb-6 text-18 text-quiet">{stored.title}</h1>
      <ThresholdAnswer reading={reading} scenario={stored.content} {...(open && { open })} />
      {stored.isStale && (
        <p className="mt-6 max-w-(--measure) border-l-4 border-band-line pl-3">
          The scenario has other numbers by now. This answer is of its version {stored.scenarioVersion}.
        </p>
      )}
    </>
  );
}

const cellAnswer = (computed: Computed) => (
  <div className="mb-3 text-24 leading-[1.35] font-semibold">
    <SentenceGlance computed={computed} />
  </div>
);
