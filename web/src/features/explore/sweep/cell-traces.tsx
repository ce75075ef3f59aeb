import { compileProblem, isFed, lowestHz, type Result, type Samples, type Scenario } from "@restband/solver";
import { MotionStrip } from "../../../components/motion-strip.tsx";
import { intervalsOf } from "../../../compute/intervals.ts";
import { inputsOf } from "../../../compute/inputs.ts";
import { say } from "../../../format/format-quantity.ts";
import { SmallTrace } from "./small-trace.tsx";

interface CellTracesProps {
  scenario: Scenario;
  result: Result;
}

const CYCLES = 8;
const MOST_POINTS = 400;

/** The end of a run: where the body is and how fast, over a few cycles. */
export function CellTraces({ scenario, result }: CellTracesProps) {
  const { samples } = result;
  if (!samples || samples.t.length < 2) return null;
  const end = samples.t[samples.t.length - 1];
  const problem = compileProblem(scenario);
  const hz = result.quantities.stickSlipHz ?? lowestHz(problem);
  const from = hz ? Math.max(0, end - CYCLES / hz) : 0;
  const picked = pick(samples, from);
  const { base, restBand } = inputsOf(scenario);
  const isBehind = isFed(problem);
  const places = picked.map((i) => samples.x[i] - (isBehind ? base(samples.t[i]) : 0));
  const times = picked.map((i) => samples.t[i]);
  const { motion } = scenario;
  const intervals = intervalsOf(samples, end);
  return (
    <>
      <MotionStrip
        intervals={intervals}
        from={times[0]}
        to={end}
        isNever={result.outcome === "never-moved"}
        label="Motion over the same time"
      />
      <SmallTrace
        label={isBehind ? "ahead of the drive (−: behind)" : "displacement"}
        times={times}
        values={places}
        measure={{ dimension: "displacement", motion }}
        band={isBehind ? restBand : null}
      />
      <SmallTrace
        label="velocity"
        times={times}
        values={picked.map((i) => samples.v[i])}
        measure={{ dimension: "velocity", motion }}
      />
      <p className="mt-1 text-13 text-quiet">
        From {say(times[0], { dimension: "time", motion }, { digits: 4 })} to{" "}
        {say(end, { dimension: "time", motion }, { digits: 4 })}.
      </p>
    </>
  );
}

/** Samples from a time on, no more than can be drawn. */
function pick({ t }: Samples, from: number): number[] {
  const first = t.findIndex((time) => time >= from);
  const count = t.length - first;
  const step = Math.max(1, Math.ceil(count / MOST_POINTS));
  return Array.from({ length: Math.ceil(count / step) }, (_, i) => first + i * step);
}
