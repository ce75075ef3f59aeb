import { useEffect, useMemo, useState, type ReactNode } from "react";
import { Button } from "../../components/button.tsx";
import { classNames } from "../../components/class-names.ts";
import { ErrorNote } from "../../components/error-note.tsx";
import { MotionStrip } from "../../components/motion-strip.tsx";
import { ProgressLine } from "../../components/progress-line.tsx";
import { intervalsOf, shownEnd } from "../../compute/intervals.ts";
import type { RangeRun } from "../../compute/use-ranges.ts";
import type { Computed, Run } from "../../compute/use-run.ts";
import { answerSentence } from "./answer-sentence.ts";
import { leadLine, limitsLine } from "./lead-line.ts";
import { LimitRulers } from "./limit-rulers.tsx";
import { RangeCoverage } from "./range-coverage.tsx";
import { rangesLine, type SayValue } from "./range-words.ts";
import { Verdict } from "../../components/verdict.tsx";

interface AnswerProps {
  run: Run;
  /** A run to compare with, while a value is being changed: the one before the edit. */
  before: Computed | null;
  ranges: RangeRun;
  /** Says a number of the scenario the run is of. */
  say: SayValue;
  /** The body drawn beside the sentence. */
  sketch: ReactNode;
}

/** What the body will do, in one sentence; how it moves; what became of the limits. */
export function Answer({ run, before, ranges, say, sketch }: AnswerProps) {
  const { computed, isStale, progress, failure } = run;
  return (
    <div aria-busy={isStale || computed === null}>
      <div className={classNames(isStale && "stale")}>
        {computed ? (
          <Computation computed={computed} before={before} ranges={ranges} say={say} sketch={sketch} />
        ) : (
          <p className="late text-24 text-quiet">Running the scenario</p>
        )}
      </div>
      <ReadOut words={computed && !isStale ? answerWords(computed) : null} />
      {progress !== null && (
        <div className="late mt-4">
          <ProgressLine label="Running" fraction={progress} onCancel={run.cancel} />
        </div>
      )}
      {failure && (
        <ErrorNote className="mt-4" action={<Button onClick={run.again}>Run it again</Button>}>
          {failure}
        </ErrorNote>
      )}
    </div>
  );
}

function Computation({ computed, before, ranges, say, sketch }: Omit<AnswerProps, "run"> & { computed: Computed }) {
  if ("refusal" in computed) return <Refused message={computed.refusal.message} />;
  const { scenario, result } = computed;
  const report = ranges.state.kind === "done" ? ranges.state.report : null;
  const { before: subject, verdict, after, outcome } = answerSentence(scenario, result);
  return (
    <>
      <div className="grid gap-x-10 gap-y-6 wide:grid-cols-[minmax(0,1fr)_384px]">
        <div className="min-w-0">
          <h1 className="max-w-[860px] text-24 leading-[1.35] font-semibold desk:text-34 desk:leading-[1.3]">
            {subject}
            <Verdict outcome={outcome}>{verdict}</Verdict>
            {after}
          </h1>
          <p className="mt-3 max-w-(--measure) text-18 text-quiet">
            {leadLine(scenario, result, report && rangesLine(report, say))}
          </p>
          <Strips computed={computed} before={before} />
        </div>
        <div className="min-w-0 max-w-[400px]">{sketch}</div>
      </div>
      <LimitRulers scenario={scenario} limits={result.limits} report={report} say={say} />
      <RangeCoverage ranges={ranges} />
    </>
  );
}

/** ms without another change until an answer is read out. */
const SETTLED = 700;

/** Reads an answer out once it has stood for a moment: not each one on the way of a drag. Null while a run goes on. */
function ReadOut({ words }: { words: string | null }) {
  const [told, setTold] = useState("");
  useEffect(() => {
    if (words === null) return;
    const timer = setTimeout(() => setTold(words), SETTLED);
    return () => clearTimeout(timer);
  }, [words]);
  return (
    <p role="status" className="sr-only">
      {told}
    </p>
  );
}

/** The sentence and what became of the limits, as they are read out. */
function answerWords({ scenario, ...outcome }: Computed): string {
  if (!("result" in outcome)) return "There is no answer to this yet.";
  const { before, verdict, after } = answerSentence(scenario, outcome.result);
  return `${before}${verdict}${after} ${limitsLine(scenario, outcome.result.limits)}`.trim();
}

/** A valid scenario without an answer here: what is missing is said at the part of the statement it concerns. */
function Refused({ message }: { message: string }) {
  return (
    <>
      <h1 className="text-24 font-semibold desk:text-34">There is no answer to this yet.</h1>
      <p className="mt-3 max-w-(--measure) text-18 text-quiet">
        {message === "not computed by this version"
          ? "The scenario is valid and is kept, but part of it is not computed by this version; the statement says which."
          : message}
      </p>
    </>
  );
}

/**
 * "now" alone, or with "before this edit" under it while a value is changed. Its room is always there: a press that ends
 * an edit would else miss its button, moved up before the finger is lifted.
 */
function Strips({ computed, before }: { computed: Computed; before: Computed | null }) {
  return (
    <div className="mt-5 grid min-h-12 max-w-[640px] content-start gap-y-2">
      <StripRow label="now" computed={computed} isOnly={before === null} />
      {before && <StripRow label="before this edit" computed={before} isFaint />}
    </div>
  );
}

function StripRow({
  label,
  computed,
  isOnly,
  isFaint,
}: {
  label: string;
  computed: Computed;
  isOnly?: boolean;
  isFaint?: boolean;
}) {
  const strip = useStrip(computed);
  if (!strip) return null;
  return (
    <div
      className={classNames(
        "grid items-center gap-3",
        !isOnly && "grid-cols-[116px_minmax(0,1fr)]",
        isFaint && "opacity-70",
      )}
    >
      {!isOnly && <span className="text-13 text-quiet">{label}</span>}
      <MotionStrip {...strip} label={`Motion ${label}`} />
    </div>
  );
}

/** Intervals and ends of a run's strip; null where there is nothing to draw. */
export function useStrip(computed: Computed): ReturnType<typeof stripOf> {
  return useMemo(() => stripOf(computed), [computed]);
}

function stripOf(computed: Computed) {
  const result = "result" in computed ? computed.result : null;
  if (!result?.samples) return null;
  const to = shownEnd(computed.scenario, result);
  return { intervals: intervalsOf(result.samples, to), from: 0, to, isNever: result.outcome === "never-moved" };
}
