import type { Outcome, Scenario } from "@restband/solver";
import { useState } from "react";
import { useWidth } from "../../../components/use-width.ts";
import { useScan, type ScanPoint } from "../../../compute/use-scan.ts";
import { runKey } from "../../../compute/run-cache.ts";
import { formatNumber } from "../../../format/format-number.ts";
import { outcomeWords } from "../../../format/outcomes.ts";
import { fromSi, toSi, type Unit } from "../../../format/unit.ts";
import { useDraftContext } from "../draft/draft-context.ts";
import { writePath } from "../path.ts";
import { stretchesOf, ticksOf, type Stretch } from "./ruler-scale.ts";
import type { NumberEntry } from "./use-number-entry.ts";
import "./drag-ruler.css";

interface DragRulerProps {
  path: string;
  /** The value when the editor opened: the middle of the scale, in SI, not 0. */
  before: number;
  entry: NumberEntry;
  label: string;
  /** Back to the value that was there, as it was. */
  onPutBack: () => void;
}

/** Decades to each side of the value that was there. */
const REACH = 1.5;
/** Width of the ring, px: the browser keeps it inside the track, so the scale begins and ends half a ring from the edges. */
const THUMB = 18;

/** A logarithmic scale to drag the value along; beneath it what the body would do at each value. */
export function DragRuler({ path, before, entry, label, onPutBack }: DragRulerProps) {
  const [ref, width] = useWidth<HTMLDivElement>(440);
  const stretches = stretchesOf(useOutcomesAlong(path, before), REACH);
  const position = Math.log10((entry.value ?? before) / before);
  const x = (at: number): number => THUMB / 2 + ((at + REACH) / (2 * REACH)) * (width - THUMB);
  // The value that was there stays within reach.
  const drag = (value: number): void =>
    Math.abs(value / before - 1) < 2e-3 ? onPutBack() : entry.set(rounded(value, entry.unit), entry.unit);
  const inUnit = (si: number): number => fromSi(si, entry.unit);
  return (
    <div ref={ref} className="relative mt-4 w-full desk:min-w-[480px]">
      <svg width="100%" height={52} className="block overflow-visible" aria-hidden="true">
        {ticksOf(inUnit(before), REACH).map(({ at, value, isLabelled }) => (
          <g key={at}>
            <path d={`M${x(at)} 26v${isLabelled ? -9 : -5}`} className="stroke-edge" />
            {isLabelled && (width >= WIDE || isDecade(value)) && (
              <text x={x(at)} y={12} textAnchor="middle" className="figures fill-quiet text-[12.5px]">
                {formatNumber(value)}
              </text>
            )}
          </g>
        ))}
        <path d={`M0 26H${width}`} className="stroke-edge" />
        <path d={`M${x(0)} 12V40`} className="stroke-ink" strokeDasharray="3 3" />
        {stretches.map((stretch) => (
          <Beneath key={stretch.from} stretch={stretch} x={x} />
        ))}
      </svg>
      <input
        type="range"
        min={-REACH}
        max={REACH}
        step={0.002}
        value={Number.isFinite(position) ? Math.min(Math.max(position, -REACH), REACH) : 0}
        aria-label={`Drag ${label}`}
        aria-valuetext={`${formatNumber(inUnit(entry.value ?? before), 4)} ${entry.unit.label}`}
        className="drag-ruler absolute inset-x-0 top-[18px] m-0 h-6 w-full"
        onChange={(event) => drag(before * 10 ** Number(event.currentTarget.value))}
        onKeyDown={(event) => {
          if (event.key !== "ArrowUp" && event.key !== "ArrowDown") return;
          event.preventDefault();
          entry.nudge(event.key === "ArrowUp" ? 1 : -1, event.shiftKey);
        }}
      />
      <Words stretches={stretches} before={before} entry={entry} />
    </div>
  );
}

/** Below this width, px, only whole decades have room for a figure. */
const WIDE = 420;
const isDecade = (value: number): boolean => Number.isInteger(Math.round(1e6 * Math.log10(Math.abs(value))) / 1e6);

/** Three significant digits of its unit: finer than a hand drags. */
const rounded = (value: number, unit: Unit): number => toSi(Number(fromSi(value, unit).toPrecision(3)), unit);

/** What the scenario as it was opened would do with this one value anywhere on the scale. */
function useOutcomesAlong(path: string, before: number): readonly ScanPoint[] {
  const { draft } = useDraftContext();
  const [opened] = useState<Scenario>(draft.inForce);
  const scenarioAt = (at: number): Scenario => writePath(opened, path, before * 10 ** (REACH * (2 * at - 1)));
  return useScan(scenarioAt, `${path} ${before} ${runKey({ scenario: opened, options: {} })}`);
}

const fills: Partial<Record<Outcome, string>> = {
  "stick-slip": "url(#hatch-stick)",
  "never-moved": "url(#hatch-never)",
  "came-to-rest": "url(#hatch-rest)",
  growing: "url(#hatch-broken)",
  "not-settled": "url(#hatch-not-settled)",
  "too-short": "url(#hatch-ground)",
  "smooth-sliding": "var(--slip)",
  settles: "var(--slip)",
};

function Beneath({ stretch, x }: { stretch: Stretch; x: (at: number) => number }) {
  const [left, right] = [x(stretch.from), x(stretch.to)];
  const fill = stretch.outcome ? fills[stretch.outcome] : "none";
  return (
    <rect
      x={left}
      y={28}
      width={Math.max(0, right - left)}
      height={10}
      fill={fill}
      className="stroke-edge"
      strokeWidth={0.75}
    />
  );
}

/** The outcomes in words, in the order of the scale, each with where it begins. */
function Words({ stretches, before, entry }: { stretches: readonly Stretch[]; before: number; entry: NumberEntry }) {
  const told = stretches.filter(({ outcome }) => outcome);
  return (
    <p className="flex min-h-5 flex-wrap justify-between gap-x-4 text-13 text-quiet">
      {told.slice(0, 6).map(({ from, outcome }) => (
        <span key={from}>
          {outcome && outcomeWords[outcome]}
          {from > -REACH &&
            ` from about ${formatNumber(Number(fromSi(before * 10 ** from, entry.unit).toPrecision(3)))}`}
        </span>
      ))}
    </p>
  );
}
