import { resultOf, type Project, type Revision } from "@restband/api/contract";
import { useQuery, useSuspenseQueries } from "@tanstack/react-query";
import { useLayoutEffect, useMemo, useState } from "react";
import { useParams } from "react-router-dom";
import { projectQuery } from "../api/projects.ts";
import { integrityQuery, replaysQuery, revisionQuery } from "../api/revisions.ts";
import { useAccount } from "../api/session.ts";
import { Button, ButtonLink } from "../components/button.tsx";
import { ErrorNote } from "../components/error-note.tsx";
import { ProgressLine } from "../components/progress-line.tsx";
import { Section, WorkedPage } from "../components/section.tsx";
import { samplesFor } from "../compute/samples-for.ts";
import { useRun, type Run } from "../compute/use-run.ts";
import { WorkHeader } from "../features/account/work-header.tsx";
import { FrozenAnswer } from "../features/answer/frozen-answer.tsx";
import { Cautions } from "../features/cautions/cautions.tsx";
import { runViewOf, type RunView } from "../features/evidence/run-view.ts";
import { ReplayPanel } from "../features/replay/replay-panel.tsx";
import { TitleBlock } from "../features/revision/title-block.tsx";
import { UnitsSwitch } from "../features/revision/units-switch.tsx";
import { WithoutOrigin } from "../features/revision/without-origin.tsx";
import { FrozenStatement } from "../features/statement/frozen-statement.tsx";
import { fieldAt } from "../features/statement/scenario-fields.ts";
import { sayField } from "../features/statement/say-field.ts";
import { lendUnitSystem, ownUnitSystem, useUnitSystem, type UnitSystem } from "../format/unit-system.ts";
import { compareReference, paths } from "../paths.ts";
import { sharedValue } from "../shared-value.ts";
import { useCursor, type Cursor } from "./cursor.ts";
import { eventKeys, RunEvidence } from "./run-evidence.tsx";
import { RevisionComments, RevisionReview } from "./revision-review.tsx";

/** One revision as a worked page: what was claimed, asked and frozen; replays, evidence, checks, cautions. */
export function RevisionPage() {
  const { projectId = "", revisionId = "" } = useParams();
  const [{ data: project }, { data: revision }] = useSuspenseQueries({
    queries: [projectQuery(projectId), revisionQuery(projectId, revisionId)],
  });
  const [isOwn, setOwn] = useState(false);
  const units = isOwn ? ownUnitSystem() : revision.units;
  const isLent = useLentUnits(units);
  return (
    isLent && (
      <OpenRevision key={`${revisionId} ${units}`} project={project} revision={revision}>
        {revision.units !== ownUnitSystem() && <UnitsSwitch units={revision.units} isOwn={isOwn} onChange={setOwn} />}
      </OpenRevision>
    )
  );
}

/** Puts units in force as long as the page is open; false until they are, so that nothing is told in others. */
function useLentUnits(units: UnitSystem): boolean {
  const own = ownUnitSystem();
  // Anew where the person chooses other units meanwhile: that is no choice for this page.
  useLayoutEffect(() => lendUnitSystem(units), [units, own]);
  return useUnitSystem() === units;
}

interface OpenRevisionProps {
  project: Project;
  revision: Revision;
  /** The choice of units. */
  children: React.ReactNode;
}

function OpenRevision({ project, revision, children }: OpenRevisionProps) {
  const { projectId, id, scenarioId, number, content, title: frozenTitle } = revision;
  const { id: ownId } = useAccount();
  const { data: replays } = useQuery(replaysQuery(projectId, id));
  const { data: integrity } = useQuery(integrityQuery(projectId));
  const samples = samplesFor(content);
  const run = useRun(
    content,
    useMemo(() => ({ samples }), [samples]),
  );
  const view = useMemo(
    () => (run.computed && "result" in run.computed ? runViewOf(content, run.computed.result) : null),
    [content, run.computed],
  );
  const frozen = useMemo(() => resultOf(revision.result), [revision.result]);
  const [cursor] = useState(() => sharedValue<number | null>(null));
  const title = frozenTitle || "Untitled";
  const labels = revision.withoutOrigin.map((path) => fieldAt(content, path)?.label ?? path);
  return (
    <>
      <title>{`Revision ${number}, ${title} · Restband`}</title>
      <WorkHeader
        trail={[
          { label: project.name, to: paths.project(project.id) },
          { label: title, to: paths.scenario(projectId, scenarioId) },
        ]}
        title={`Revision ${number}`}
        actions={
          <>
            <ButtonLink to={`${paths.scenario(projectId, scenarioId)}#revisions`}>All revisions</ButtonLink>
            <ButtonLink
              to={paths.compare(projectId, compareReference.revision(id), compareReference.scenario(scenarioId))}
            >
              Compare
            </ButtonLink>
          </>
        }
      />
      <WorkedPage className="max-desk:pb-40">
        <Section name="Claim" help="Frozen: nothing on this page can be edited.">
          <Faults faults={revision.faults} />
          <div className="grid gap-x-10 gap-y-6 wide:grid-cols-[minmax(0,1fr)_400px]">
            <FrozenAnswer
              scenario={content}
              result={frozen}
              trace={revision.trace}
              say={(path, value, towards) => sayField(content, path, value, towards)}
            />
            <TitleBlock revision={revision} replays={replays} integrity={integrity} />
          </div>
        </Section>
        <Section name="Statement" help="As it was frozen.">
          <FrozenStatement scenario={content} />
          <WithoutOrigin labels={labels} />
          {children}
        </Section>
        <Section id="replay" name="Replay" help="On your machine, in your browser.">
          <ReplayPanel revision={revision} ownId={ownId} />
        </Section>
        <RevisionComments project={project} revision={revision} ownId={ownId} />
        <RunSections run={run} view={view} cursor={cursor} />
        <Section name="Cautions" help="Always shown where they apply.">
          <Cautions scenario={content} result={frozen} />
        </Section>
        <RevisionReview project={project} revision={revision} ownId={ownId} replays={replays ?? []} />
      </WorkedPage>
    </>
  );
}

/** What does not fit of a row that somebody has changed since. */
function Faults({ faults }: { faults: readonly string[] }) {
  if (faults.length === 0) return null;
  return (
    <ErrorNote className="mb-6">
      <p className="font-bold">This revision is not as it was frozen. Do not rely on it.</p>
      {faults.map((fault) => (
        <p key={fault}>{fault}</p>
      ))}
    </ErrorNote>
  );
}

/** The run computed anew from the frozen scenario: its motion, its events and its own checks, under one cursor. */
function RunSections({ run, view, cursor }: { run: Run; view: RunView | null; cursor: Cursor }) {
  const t = useCursor(cursor, view);
  const refusal = run.computed && "refusal" in run.computed ? run.computed.refusal.message : null;
  if (!view)
    return (
      <Section id="evidence" name="Evidence" help="Computed here from the frozen scenario.">
        {refusal !== null ? (
          <p className="max-w-(--measure)">
            This version of the solver does not compute it, so there is nothing to draw: {refusal}. What was frozen
            stands above.
          </p>
        ) : run.failure ? (
          <ErrorNote action={<Button onClick={run.again}>Run it again</Button>}>{run.failure}</ErrorNote>
        ) : (
          <div className="min-h-[600px]">
            {run.progress !== null && <ProgressLine label="Running" fraction={run.progress} onCancel={run.cancel} />}
          </div>
        )}
      </Section>
    );
  return (
    <RunEvidence
      view={view}
      t={t}
      onMove={cursor.set}
      isStale={false}
      help={{
        evidence: <>Computed here from the frozen scenario. {eventKeys} next event.</>,
        checks: "Of the run computed here.",
      }}
    />
  );
}
