import type { Project, StoredScenario } from "@restband/api/contract";
import { useSuspenseQueries } from "@tanstack/react-query";
import { Suspense, useCallback, useMemo, useState, type ComponentProps } from "react";
import { useParams } from "react-router-dom";
import { projectQuery } from "../api/projects.ts";
import { scenarioQuery } from "../api/scenarios.ts";
import { useAccount } from "../api/session.ts";
import { ButtonLink } from "../components/button.tsx";
import { Section, WorkedPage } from "../components/section.tsx";
import { samplesFor } from "../compute/samples-for.ts";
import { useRanges } from "../compute/use-ranges.ts";
import { useRun, type Computed, type Run } from "../compute/use-run.ts";
import { UnitsChoice } from "../features/account/units-choice.tsx";
import { WorkHeader } from "../features/account/work-header.tsx";
import { Answer } from "../features/answer/answer.tsx";
import { takeValues } from "../features/statement/changes.ts";
import { savedWords } from "../features/statement/saving/saved-words.ts";
import { useDraft } from "../features/statement/saving/use-draft.ts";
import { isSameWork } from "../features/statement/saving/work.ts";
import { sayField } from "../features/statement/say-field.ts";
import { Statement } from "../features/statement/statement.tsx";
import { UndoButtons, useUndoKeys } from "../features/statement/undo-buttons.tsx";
import { useUnitSystem } from "../format/unit-system.ts";
import { ArchivedScenario } from "../features/project-home/archived-scenario.tsx";
import { mayEdit } from "../features/project-home/roles.ts";
import { paths } from "../paths.ts";
import { sharedValue } from "../shared-value.ts";
import { lazyPart } from "../components/lazy-part.ts";
import { useThrottled } from "../components/use-throttled.ts";

// None of these is needed for the first answer: they come after it.
const CursorSketch = lazyPart(async () => (await import("./cursor-sketch.tsx")).CursorSketch);
const ScenarioExchange = lazyPart(
  async () => (await import("../features/statement/exchange/scenario-exchange.tsx")).ScenarioExchange,
);
const RunSections = lazyPart(async () => (await import("./run-sections.tsx")).RunSections);
const RevisionsSection = lazyPart(async () => (await import("./revisions-section.tsx")).RevisionsSection);
const ReckoningLinks = lazyPart(async () => (await import("../features/reckoning/reckoning-links.tsx")).ReckoningLinks);
const HoldingGlance = lazyPart(
  async () => (await import("../features/explore/threshold/holding-glance.tsx")).HoldingGlance,
);
const ConflictDialog = lazyPart(
  async () => (await import("../features/statement/saving/conflict-dialog.tsx")).ConflictDialog,
);

/**
 * The answer and its strip follow each run; what takes longer to draw than a frame (sketch, plots, tables) takes the newest
 * one five times a second.
 */
const DRAWN_EVERY_MS = 200;

/** One scenario as a worked page: answer, statement, evidence, checks, cautions. */
export function ScenarioPage() {
  const { projectId = "", scenarioId = "" } = useParams();
  const [{ data: project }, { data: stored }] = useSuspenseQueries({
    queries: [projectQuery(projectId), scenarioQuery(projectId, scenarioId)],
  });
  // Opened anew once it is restored: only then is what was left in this browser taken up.
  const isInUse = project.archivedAt === null && stored.archivedAt === null;
  return <OpenScenario key={`${scenarioId} ${isInUse}`} project={project} stored={stored} />;
}

function OpenScenario({ project, stored }: { project: Project; stored: StoredScenario }) {
  const { id: accountId } = useAccount();
  // What is worked out once for a run is worked out anew for other units.
  const units = useUnitSystem();
  const archived = project.archivedAt ? "project" : stored.archivedAt ? "scenario" : null;
  const canEdit = mayEdit(project.role) && archived === null;
  const { draft, dispatch, saving, base, work, decide } = useDraft({ stored, accountId, canEdit });
  useUndoKeys(dispatch);
  const { inForce, faults } = draft;
  const samples = samplesFor(inForce);
  const run = useRun(
    inForce,
    useMemo(() => ({ samples }), [samples]),
  );
  const ranges = useRanges(run.computed, run.isStale);
  const subject = run.computed?.scenario ?? inForce;
  const say = (path: string, value: number, towards: number) => sayField(subject, path, value, towards);
  const drawn = useThrottled(run.computed, DRAWN_EVERY_MS);
  const [cursor] = useState(() => sharedValue<number | null>(null));
  const before = useBeforeEdit(run.computed, draft.merging !== null);
  const isTrying = !canEdit && !isSameWork(work, stored);
  const title = inForce.title || "Untitled";
  const aside = useCallback(
    (path: string) => (
      <Suspense>
        <ReckoningLinks
          path={path}
          scenario={inForce}
          keptUnder={stored.id}
          onTake={(taken) => dispatch(takeValues(taken))}
        />
      </Suspense>
    ),
    [inForce, stored.id, dispatch],
  );
  return (
    <>
      <title>{`${title} · Restband`}</title>
      <WorkHeader
        trail={[{ label: project.name, to: paths.project(project.id) }]}
        title={title}
        state={savedWords({ saving, canEdit, role: project.role, archived, isTrying, faults: faults.length })}
        actions={<Actions draft={draft} dispatch={dispatch} explore={paths.explore(project.id, stored.id)} />}
      />
      <WorkedPage className="max-desk:pb-40">
        <Section name="Answer" help="Computed here, anew with every change.">
          {stored.archivedAt !== null && (
            <ArchivedScenario
              stored={stored}
              archivedAt={stored.archivedAt}
              canRestore={mayEdit(project.role) && project.archivedAt === null}
            />
          )}
          <Answer
            key={units}
            run={run}
            before={before}
            ranges={ranges}
            say={say}
            sketch={
              drawn && (
                <Suspense fallback={<div className="min-h-[280px]" />}>
                  <CursorSketch computed={drawn} cursor={cursor} />
                </Suspense>
              )
            }
          />
        </Section>
        <Section name="Statement" help="Tab moves from value to value, Enter opens one, Esc puts it back.">
          <Statement
            draft={draft}
            dispatch={dispatch}
            aside={aside}
            refusal={run.computed && "refusal" in run.computed ? run.computed.refusal : null}
          />
          <StatementFoot run={run} explore={paths.explore(project.id, stored.id)} />
          <Suspense>
            <ScenarioExchange scenario={inForce} dispatch={dispatch} />
          </Suspense>
        </Section>
        <Suspense fallback={<div className="min-h-40" />}>
          <RevisionsSection {...{ stored, ownId: accountId, canEdit, run, inForce, saving, faults: faults.length }} />
        </Suspense>
        <Suspense fallback={<div className="min-h-[1200px]" />}>
          <RunSections key={`run ${units}`} computed={drawn} cursor={cursor} isStale={run.isStale} />
        </Suspense>
      </WorkedPage>
      {saving.kind === "conflict" && (
        <Suspense>
          <ConflictDialog
            base={base}
            mine={work}
            current={saving.current}
            onDecide={(decided) => decide(saving.current, decided)}
          />
        </Suspense>
      )}
    </>
  );
}

/** The run from before a value is typed or dragged, to be seen beside the new one; null while nothing is edited. */
function useBeforeEdit(computed: Computed | null, isEditing: boolean): Computed | null {
  const [settled, setSettled] = useState(computed);
  if (!isEditing && settled !== computed) setSettled(computed);
  return isEditing && settled !== computed ? settled : null;
}

/** Under the values: how far the answer holds around them, and the units they are shown in. */
function StatementFoot({ run: { computed, isStale }, explore }: { run: Run; explore: string }) {
  return (
    <>
      <Suspense>
        <HoldingGlance
          scenario={!isStale && computed && "result" in computed ? computed.scenario : null}
          to={explore}
        />
      </Suspense>
      <div className="mt-3">
        <UnitsChoice>for you, on every page; a unit chosen for one value stays with it</UnitsChoice>
      </div>
    </>
  );
}

/** What can be done from the head of the page. */
function Actions({ explore, ...undo }: ComponentProps<typeof UndoButtons> & { explore: string }) {
  return (
    <>
      <UndoButtons {...undo} />
      <ButtonLink to={explore}>Explore</ButtonLink>
    </>
  );
}
