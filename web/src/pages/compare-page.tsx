import { resultOf } from "@restband/api/contract";
import type { Result } from "@restband/solver";
import { useSuspenseQueries } from "@tanstack/react-query";
import { Suspense, useMemo, useState } from "react";
import { useParams, useSearchParams } from "react-router-dom";
import { projectQuery } from "../api/projects.ts";
import { revisionsQuery } from "../api/revisions.ts";
import { scenariosQuery } from "../api/scenarios.ts";
import { Button } from "../components/button.tsx";
import { lazyPart } from "../components/lazy-part.ts";
import { Section, WorkedPage } from "../components/section.tsx";
import { announce } from "../components/status.tsx";
import { samplesFor } from "../compute/samples-for.ts";
import { useRun, type Computed } from "../compute/use-run.ts";
import { WorkHeader } from "../features/account/work-header.tsx";
import { SentenceGlance, StripGlance } from "../features/answer/answer-glance.tsx";
import { AnswersTable } from "../features/compare/answers-table.tsx";
import { compareAnswers, comparisonWords, type AnswerComparison } from "../features/compare/compare-answers.ts";
import { compareFields } from "../features/compare/compare-fields.ts";
import {
  compareChoices,
  useCompareSubject,
  type CompareSubject,
  type SubjectReading,
} from "../features/compare/compare-subject.ts";
import { FieldsTable } from "../features/compare/fields-table.tsx";
import { SideHead } from "../features/compare/side-head.tsx";
import { runViewOf } from "../features/evidence/run-view.ts";
import { RevisionMark } from "../features/revision/revision-mark.tsx";
import { differencesOf } from "../features/statement/saving/differences.ts";
import { useUnitSystem } from "../format/unit-system.ts";
import { paths } from "../paths.ts";
import { sharedValue } from "../shared-value.ts";
import { useCursor, type Cursor } from "./cursor.ts";
import { fieldWords } from "./field-words.ts";

const Evidence = lazyPart(async () => (await import("../features/evidence/evidence.tsx")).Evidence);

/** Two scenarios or revisions of a project side by side; which they are stands in the address. */
export function ComparePage() {
  const { projectId = "" } = useParams();
  const [search, setSearch] = useSearchParams();
  const [{ data: project }, { data: scenarios }, { data: revisions }] = useSuspenseQueries({
    queries: [projectQuery(projectId), scenariosQuery(projectId), revisionsQuery(projectId)],
  });
  const units = useUnitSystem();
  const references = [search.get("a"), search.get("b")] as const;
  const first = useSide(projectId, references[0]);
  const second = useSide(projectId, references[1]);
  const choices = useMemo(() => compareChoices(scenarios, revisions), [scenarios, revisions]);
  const choose = (key: "a" | "b") => (reference: string) =>
    setSearch(
      (before) => {
        before.set(key, reference);
        return before;
      },
      { replace: true, preventScrollReset: true },
    );
  const swap = (): void => setSearch({ a: references[1] ?? "", b: references[0] ?? "" }, { replace: true });
  const [cursor] = useState(() => sharedValue<number | null>(null));
  const isReady = first.subject !== null && second.subject !== null;
  const answers = useMemo(
    () => (first.result && second.result ? compareAnswers(first.result, second.result) : null),
    [first.result, second.result],
  );
  return (
    <>
      <title>{`Compare · ${project.name} · Restband`}</title>
      <WorkHeader
        trail={[{ label: project.name, to: paths.project(project.id) }]}
        title="Compare"
        actions={
          <>
            <Button onClick={swap}>Swap</Button>
            <Button onClick={() => void copyLink()}>Copy the link</Button>
          </>
        }
      />
      <WorkedPage key={units} className="max-desk:pb-40">
        <Section name="Compare" help="The link to this page works for every member of the project.">
          <h1 className="mb-6 text-24 font-semibold">{answers ? comparisonWords(answers) : "Two side by side"}</h1>
          <div className="grid gap-x-10 gap-y-8 desk:grid-cols-2">
            {([first, second] as const).map((side, i) => (
              <SideHead
                key={i}
                place={i === 0 ? "first" : "second"}
                reference={references[i]}
                choices={choices}
                reading={side}
                onChoose={choose(i === 0 ? "a" : "b")}
                mark={side.subject?.revision && <RevisionMark state={side.subject.revision.state} />}
              >
                <SideAnswer side={side} />
              </SideHead>
            ))}
          </div>
        </Section>
        {isReady && <Differences first={first} second={second} answers={answers} />}
        {isReady && <Motions first={first} second={second} cursor={cursor} />}
      </WorkedPage>
    </>
  );
}

async function copyLink(): Promise<void> {
  try {
    await navigator.clipboard.writeText(window.location.href);
    announce("The link is copied. It works for every member of the project.");
  } catch {
    announce("The browser does not let this page copy. The link stands in its address line.");
  }
}

interface Side extends SubjectReading {
  /** The run made here, with samples. */
  readonly computed: Computed | null;
  /** What it came to: as it was frozen, else as it comes out here. */
  readonly result: Result | null;
}

function useSide(projectId: string, reference: string | null): Side {
  const reading = useCompareSubject(projectId, reference);
  const scenario = reading.subject?.scenario ?? null;
  const samples = scenario ? samplesFor(scenario) : 2;
  const { computed } = useRun(
    scenario,
    useMemo(() => ({ samples }), [samples]),
  );
  const own = computed && computed.scenario === scenario ? computed : null;
  const revision = reading.subject?.revision ?? null;
  const result = useMemo(
    () => (revision ? resultOf(revision.result) : own && "result" in own ? own.result : null),
    [revision, own],
  );
  return { ...reading, computed: own, result };
}

function SideAnswer({ side: { computed, result } }: { side: Side }) {
  const shown = useMemo(
    () => (computed && result ? { scenario: computed.scenario, result } : computed),
    [computed, result],
  );
  if (!shown) return <p className="late mt-3 text-quiet">Computing</p>;
  return (
    <>
      <div className="mt-2 text-18">
        <SentenceGlance computed={shown} />
      </div>
      <div className="mt-3 max-w-[420px]">{computed && <StripGlance computed={computed} />}</div>
    </>
  );
}

/** The name that tells two sides apart: their own, with the title where both have the same. */
function namesOf(a: CompareSubject, b: CompareSubject): [string, string] {
  return a.name === b.name || a.title !== b.title ? [longName(a), longName(b)] : [a.name, b.name];
}

const longName = ({ name, title, to, revision }: CompareSubject): string =>
  revision || to === null ? `${title}, ${name.toLowerCase()}` : title;

function Differences({ first, second, answers }: { first: Side; second: Side; answers: AnswerComparison | null }) {
  const [a, b] = [first.subject, second.subject];
  const fields = useMemo(() => {
    if (!a || !b) return null;
    const work = ({ scenario }: CompareSubject) => ({ content: scenario, switchedOff: [] });
    return compareFields(a.scenario, b.scenario, differencesOf(work(a), work(a), work(b)), fieldWords);
  }, [a, b]);
  if (!a || !b || !fields) return null;
  const names = namesOf(a, b);
  return (
    <Section name="What changed" help="Of what was asked, and of what came out.">
      <div className="grid items-start gap-x-10 gap-y-10 wide:grid-cols-2">
        <div className="min-w-0">
          <FieldsTable comparison={fields} names={names} />
        </div>
        <div className="min-w-0">
          {answers && <AnswersTable comparison={answers} names={names} motion={b.scenario.motion} />}
        </div>
      </div>
    </Section>
  );
}

/** Both motions over one time axis, the second in front, under one cursor. */
function Motions({ first, second, cursor }: { first: Side; second: Side; cursor: Cursor }) {
  const view = useView(second);
  const other = useView(first);
  const t = useCursor(cursor, view);
  const name = first.subject?.name === second.subject?.name ? first.subject?.title : first.subject?.name;
  const isAlike = view !== null && other !== null && view.scenario.motion === other.scenario.motion;
  const beside = useMemo(
    () => (isAlike ? [{ key: "first", label: name ?? "", samples: other.samples }] : []),
    [isAlike, other, name],
  );
  return (
    <Section id="evidence" name="Evidence" help="Both computed here; the first is dashed. One cursor for both.">
      {view ? (
        <>
          {!isAlike && other && <p className="mb-3">One turns and one slides: their motions share no axis.</p>}
          <Suspense fallback={<div className="min-h-[600px]" />}>
            <Evidence view={view} t={t} onMove={cursor.set} isStale={false} beside={beside} />
          </Suspense>
        </>
      ) : (
        <p className="late min-h-[600px] text-quiet">Computing</p>
      )}
    </Section>
  );
}

function useView({ computed }: Side) {
  return useMemo(
    () => (computed && "result" in computed ? runViewOf(computed.scenario, computed.result) : null),
    [computed],
  );
}
