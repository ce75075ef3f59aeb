import { Button } from "../../components/button.tsx";
import { ProgressLine } from "../../components/progress-line.tsx";
import type { RangeRun } from "../../compute/use-ranges.ts";
import { formatNumber } from "../../format/format-number.ts";
import { coverageWords } from "./range-words.ts";

/** How far the ranges have been gone through, under the limits they bear on. */
export function RangeCoverage({ ranges }: { ranges: RangeRun }) {
  const { state, cancel, begin } = ranges;
  if (state.kind === "none") return null;
  return (
    <div className="mt-2 flex min-h-10 max-w-[860px] flex-wrap items-center gap-x-4 gap-y-2 text-13 text-quiet">
      {state.kind === "waiting" && <p>The ranges are run next, in the background.</p>}
      {state.kind === "running" && (
        <ProgressLine
          label="Running the ranges"
          fraction={state.done / state.total}
          remark={`Running the ranges, ${state.done} of ${state.total} points`}
          onCancel={cancel}
        />
      )}
      {state.kind === "done" && <p>{coverageWords(state.report)}</p>}
      {(state.kind === "long" || state.kind === "cancelled") && (
        <>
          <p>
            {state.kind === "long"
              ? `The ranges have not been run: that takes about ${sayLong(state.seconds)}.`
              : "The ranges have not been run."}
          </p>
          <Button onClick={begin}>Run the ranges</Button>
        </>
      )}
    </div>
  );
}

const sayLong = (seconds: number): string =>
  seconds < 100 ? `${formatNumber(seconds, 2)} s` : `${formatNumber(seconds / 60, 2)} min`;
