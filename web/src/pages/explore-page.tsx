import type { ExplorationSummary } from "@restband/api/contract";
import { solverVersion } from "@restband/solver";
import { useQuery, useSuspenseQueries } from "@tanstack/react-query";
import { useState } from "react";
import { useNavigate, useParams } from "react-router-dom";
import { explorationsQuery, useExplorationActs, type ExplorationDraft } from "../api/explorations.ts";
import { projectQuery } from "../api/projects.ts";
import { scenarioQuery } from "../api/scenarios.ts";
import { Confirm } from "../components/confirm.tsx";
import { Section, WorkedPage } from "../components/section.tsx";
import { announce } from "../components/status.tsx";
import { WorkHeader } from "../features/account/work-header.tsx";
import { KeptList } from "../features/explore/kept/kept-list.tsx";
import { noteRunning } from "../features/explore/kept/running-here.ts";
import { sweepToKeep } from "../features/explore/sweep/stored-sweep.ts";
import { SweepBuilder } from "../features/explore/sweep/sweep-builder.tsx";
import { studyToKeep } from "../features/explore/study/stored-study.ts";
import { StudyBuilder } from "../features/explore/study/study-builder.tsx";
import { CuresSection } from "../features/explore/threshold/cures-section.tsx";
import { HoldingSection } from "../features/explore/threshold/holding-section.tsx";
import { searchToKeep } from "../features/explore/threshold/threshold-reading.ts";
import { ThresholdSection } from "../features/explore/threshold/threshold-section.tsx";
import { mayEdit } from "../features/project-home/roles.ts";
import { useUnitSystem } from "../format/unit-system.ts";
import { paths } from "../paths.ts";
import { useOpenScenario } from "./use-open-scenario.ts";

/** What an engineer asks of a scenario after its first answer. */
export function ExplorePage() {
  const { projectId = "", scenarioId = "" } = useParams();
  const units = useUnitSystem();
  const [{ data: project }, { data: stored }] = useSuspenseQueries({
    queries: [projectQuery(projectId), scenarioQuery(projectId, scenarioId)],
  });
  const canEdit = mayEdit(project.role) && project.archivedAt === null;
  const open = useOpenScenario(projectId);
  const keep = useKeep(projectId, scenarioId);
  const scenario = stored.content;
  const frame = { scenario, ...(canEdit && { open }) };
  const name = scenario.title || "Untitled";
  const about = { scenarioVersion: stored.version, solverVersion };
  return (
    <>
      <title>{`Explore ${name} · Restband`}</title>
      <WorkHeader
        trail={[
          { label: project.name, to: paths.project(projectId) },
          { label: name, to: paths.scenario(projectId, scenarioId) },
        ]}
        title="Explore"
      />
      <WorkedPage key={units}>
        <Section name="Threshold" help="From which value on something is so. Both sides are run.">
          <h1 className="sr-only">Explore {name}</h1>
          <ThresholdSection
            {...frame}
            {...(canEdit && {
              onFound: (reading, { title, headline }) =>
                keep.aside(searchToKeep(reading, { headline }, { ...about, title })),
            })}
          />
        </Section>
        <Section name="Cures" help="The change needed in one value alone.">
          <CuresSection {...frame} />
        </Section>
        <Section name="How far it holds" help="The room around each value.">
          <HoldingSection scenario={scenario} />
        </Section>
        {canEdit && (
          <Section name="Sweep" help="One or two fields over a range, each cell a run.">
            <SweepBuilder
              scenario={scenario}
              onRun={(asked, title) => keep.andOpen(sweepToKeep(asked, { ...about, title }))}
            />
          </Section>
        )}
        {canEdit && (
          <Section name="Tolerance" help="What becomes of the limits where values scatter.">
            <StudyBuilder
              scenario={scenario}
              onRun={(plan, title) => keep.andOpen(studyToKeep(plan, scenario, { ...about, title }))}
            />
          </Section>
        )}
        <Section name="Asked before" help="Kept with the scenario, for everybody in the project.">
          <Kept projectId={projectId} scenarioId={scenarioId} canEdit={canEdit} />
        </Section>
      </WorkedPage>
    </>
  );
}

/** Keeps what was asked with the scenario: beside what one does, or to be opened and computed. */
function useKeep(projectId: string, scenarioId: string) {
  const { create } = useExplorationActs(projectId);
  const navigate = useNavigate();
  return {
    aside(draft: ExplorationDraft): void {
      create(scenarioId, draft).catch((error: Error) => announce(`The search is not kept. ${error.message}`));
    },
    async andOpen(draft: ExplorationDraft): Promise<void> {
      const { id } = await create(scenarioId, draft);
      noteRunning(id);
      await navigate(paths.exploration(projectId, scenarioId, id));
    },
  };
}

interface KeptProps {
  projectId: string;
  scenarioId: string;
  canEdit: boolean;
}

function Kept({ projectId, scenarioId, canEdit }: KeptProps) {
  const { data, error } = useQuery(explorationsQuery(projectId, scenarioId));
  const { remove } = useExplorationActs(projectId);
  const [toDelete, setToDelete] = useState<ExplorationSummary | null>(null);
  if (!data) return <p className="late text-quiet">{error ? error.message : "Reading what was asked before"}</p>;
  return (
    <>
      <KeptList
        explorations={data}
        addressOf={(id) => paths.exploration(projectId, scenarioId, id)}
        {...(canEdit && { onDelete: setToDelete })}
      />
      <Confirm
        isOpen={toDelete !== null}
        title="Delete it?"
        action="Delete"
        onConfirm={() => (toDelete ? remove(scenarioId, toDelete.id) : Promise.resolve())}
        onClose={() => setToDelete(null)}
      >
        {toDelete?.title}: its result goes for everybody. The scenario stays, and the same can be asked again.
      </Confirm>
    </>
  );
}
