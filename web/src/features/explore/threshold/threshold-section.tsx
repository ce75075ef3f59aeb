import { thresholdSearch, type Exploring, type Scenario } from "@restband/solver";
import { useMemo, useState } from "react";
import { Button } from "../../../components/button.tsx";
import { ErrorNote } from "../../../components/error-note.tsx";
import { ProgressLine } from "../../../components/progress-line.tsx";
import { useExploring } from "../../../compute/use-exploring.ts";
import type { ExploreFrame } from "../explore-frame.ts";
import { exploreFields, likeliestField, rangeAround, theBody, type ExploreField } from "../explore-field.ts";
import { rateWords } from "../rate-words.ts";
import { SentenceSelect } from "../sentence-select.tsx";
import { readTyped, TypedNumber, typedOf, type Typed } from "../typed-number.tsx";
import { targetChoices, type TargetChoice } from "./targets.ts";
import { ThresholdAnswer } from "./threshold-answer.tsx";
import { sayThreshold } from "./threshold-words.ts";
import { readThreshold, type ThresholdReading } from "./threshold-reading.ts";

interface ThresholdSectionProps extends ExploreFrame {
  /** Keeps a finished search with the scenario. */
  onFound?: (reading: ThresholdReading, words: { title: string; headline: string }) => void;
}

/** Asks from which value of a field on something is so, and answers with both ends run. */
export function ThresholdSection({ scenario, open, onFound }: ThresholdSectionProps) {
  const fields = useMemo(() => exploreFields(scenario), [scenario]);
  const choices = useMemo(() => targetChoices(scenario), [scenario]);
  const [path, setPath] = useState(() => likeliestField(fields)?.path ?? "");
  const [targetKey, setTarget] = useState("no-stick-slip");
  const field = fields.find((each) => each.path === path) ?? fields[0];
  const choice = choices.find(({ key }) => key === targetKey) ?? choices[0];
  const range = useRange(field, scenario);
  const run = useExploring<ThresholdReading>();
  const faults = range.faults;

  const search = async (): Promise<void> => {
    if (!range.low || !range.high) return;
    const asked = { low: range.low.value, high: range.high.value, choice };
    const exploring = readingOf(scenario, field, asked);
    const reading = await run.begin(exploring);
    if (!reading) return;
    const { headline } = sayThreshold(reading, field, theBody(scenario));
    onFound?.(reading, { title: `From which ${field.name} on ${choice.ask}?`, headline });
  };
  return (
    <>
      <form
        className="max-w-[820px]"
        onSubmit={(event) => {
          event.preventDefault();
          if (faults.length === 0) void search();
        }}
      >
        <p className="text-18 leading-[1.85]">
          From which{" "}
          <SentenceSelect
            label="Field to search"
            choices={fields.map((each) => ({ value: each.path, label: each.name }))}
            value={field.path}
            onChange={setPath}
          />{" "}
          on{" "}
          <SentenceSelect
            label="What to search for"
            choices={choices.map(({ key, ask }) => ({ value: key, label: ask }))}
            value={choice.key}
            onChange={setTarget}
          />
          ?
        </p>
        <div className="mt-4 flex flex-wrap items-start gap-x-6 gap-y-4">
          <TypedNumber label="Looked at from" typed={range.typed.low} measure={field.measure} onChange={range.setLow} />
          <TypedNumber
            label="to"
            typed={range.typed.high}
            measure={field.measure}
            onChange={range.setHigh}
            error={faults.at(0)}
          />
          <Button type="submit" kind="primary" className="mt-[29px]" isBusy={run.state.kind === "running"}>
            Search
          </Button>
        </div>
      </form>
      <div className="mt-6" aria-live="polite">
        {run.state.kind === "running" && (
          <ProgressLine
            label="Searching"
            fraction={run.state.total > 0 ? run.state.done / run.state.total : null}
            remark={rateWords(run.state.done, run.state.total, run.state.elapsed, "runs")}
            onCancel={run.stop}
          />
        )}
        {run.state.kind === "failed" && <ErrorNote>{run.state.message}</ErrorNote>}
        {run.state.kind === "stopped" && <p className="text-quiet">Stopped. The question stands.</p>}
        {run.state.kind === "done" && <ThresholdAnswer reading={run.state.value} scenario={scenario} open={open} />}
      </div>
    </>
  );
}

/** A search whose result is ready to be shown and kept. */
function* readingOf(
  scenario: Scenario,
  { path }: ExploreField,
  asked: { low: number; high: number; choice: TargetChoice },
): Exploring<ThresholdReading> {
  const { low, high, choice } = asked;
  const threshold = yield* thresholdSearch({ scenario, path, low, high, target: choice.target });
  return readThreshold(threshold, asked);
}

/** The range typed for a field; each field starts from the values around its own. */
function useRange(field: ExploreField, scenario: Scenario) {
  const [typedBy, setTypedBy] = useState<Record<string, { low: Typed; high: Typed }>>({});
  const around = rangeAround(field, scenario);
  const typed = typedBy[field.path] ?? {
    low: typedOf(around.low, field.measure),
    high: typedOf(around.high, field.measure),
  };
  const set = (change: Partial<{ low: Typed; high: Typed }>): void =>
    setTypedBy((old) => ({ ...old, [field.path]: { ...typed, ...change } }));
  const [low, high] = [typed.low, typed.high].map((each) => readTyped(each, field.measure));
  return {
    typed,
    low: "value" in low ? low : null,
    high: "value" in high ? high : null,
    faults: rangeFaults(low, high),
    setLow: (next: Typed) => set({ low: next }),
    setHigh: (next: Typed) => set({ high: next }),
  };
}

type Read = ReturnType<typeof readTyped>;

function rangeFaults(low: Read, high: Read): string[] {
  if ("message" in low) return [low.message];
  if ("message" in high) return [high.message];
  if (low.value === high.value) return ["The range is empty: both ends are the same."];
  return low.value > high.value ? ["The range is reversed: it ends below where it starts."] : [];
}
