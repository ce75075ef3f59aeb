import { solverVersion, type SweepPlan } from "@restband/solver";
import { useSuspenseQueries } from "@tanstack/react-query";
import { useNavigate, useParams } from "react-router-dom";
import { useExplorationActs } from "../api/explorations.ts";
import { projectQuery } from "../api/projects.ts";
import { scenarioQuery } from "../api/scenarios.ts";
import { Section, WorkedPage } from "../components/section.tsx";
import { WorkHeader } from "../features/account/work-header.tsx";
import { sweepDraftFor } from "../features/explore/kept/drafts.ts";
import { SweepBuilder } from "../features/explore/sweep/sweep-builder.tsx";
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
  const acts = useExplorationActs(projectId);
  const navigate = useNavigate();
  const scenario = stored.content;
  const frame = { scenario, ...(canEdit && { open }) };
  const title = scenario.title || "Untitled";

  const runSweep = async (plan: SweepPlan, asked: string): Promise<void> => {
    const made = await acts.create(scenarioId, sweepDraftFor(plan, asked, stored.version, solverVersion));
    await navigate(paths.exploration(projectId, scenarioId, made.id), { state: { isFresh: true } });
  };
  return (
    <>
      <title>{`Explore ${title} · Restband`}</title>
      <WorkHeader
        trail={[
          { label: project.name, to: paths.project(projectId) },
          { label: title, to: paths.scenario(projectId, scenarioId) },
        ]}
        title="Explore"
      />
      <WorkedPage key={units}>
        <Section name="Threshold" help="From which value on something is so. Both sides are run.">
          <ThresholdSection {...frame} />
        </Section>
        {canEdit && (
          <Section name="Sweep" help="One or two fields over a range, each cell a run.">
            <SweepBuilder scenario={scenario} onRun={runSweep} />
          </Section>
        )}
      </WorkedPage>
    </>
  );
}
