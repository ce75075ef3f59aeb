import type { Result, Scenario } from "@restband/solver";
import { useMemo } from "react";
import { MotionStrip } from "../../components/motion-strip.tsx";
import { Verdict } from "../../components/verdict.tsx";
import { intervalsOf, shownEnd } from "../../compute/intervals.ts";
import { answerSentence } from "./answer-sentence.ts";
import { leadLine } from "./lead-line.ts";
import { LimitRulers } from "./limit-rulers.tsx";
import type { SayValue } from "./range-words.ts";

interface FrozenAnswerProps {
  scenario: Scenario;
  /** Without samples. */
  result: Result;
  /** The run drawn small: its times and phases. */
  trace: { readonly t: readonly number[]; readonly phase: readonly number[] };
  say: SayValue;
}

/** What came out when it was frozen: the sentence, how it moved, what became of the limits. */
export function FrozenAnswer({ scenario, result, trace, say }: FrozenAnswerProps) {
  const { before, verdict, after, outcome } = answerSentence(scenario, result);
  // Of very many events only the first are kept: the trace goes on to the end.
  const to = Math.max(shownEnd(scenario, result), trace.t.at(-1) ?? 0);
  const intervals = useMemo(() => {
    const [t, phase] = [Float64Array.from(trace.t), Float64Array.from(trace.phase)];
    return intervalsOf({ t, phase, x: t, v: t, a: t, f: t }, to);
  }, [trace, to]);
  return (
    <div className="min-w-0">
      <h1 className="max-w-[860px] text-24 leading-[1.35] font-semibold desk:text-34 desk:leading-[1.3]">
        {before}
        <Verdict outcome={outcome}>{verdict}</Verdict>
        {after}
      </h1>
      <p className="mt-3 max-w-(--measure) text-18 text-quiet">{leadLine(scenario, result, null)}</p>
      {intervals.length > 0 && (
        <div className="mt-5 max-w-[640px]">
          <MotionStrip
            intervals={intervals}
            from={0}
            to={to}
            isNever={result.outcome === "never-moved"}
            label="Motion as it was frozen"
          />
        </div>
      )}
      <LimitRulers scenario={scenario} limits={result.limits} report={null} say={say} />
    </div>
  );
}
