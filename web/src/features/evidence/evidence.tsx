import { useMemo, useState } from "react";
import { Button } from "../../components/button.tsx";
import { classNames } from "../../components/class-names.ts";
import { Figure } from "../../components/figure.tsx";
import { Icon } from "../../components/icon.tsx";
import { MotionStrip } from "../../components/motion-strip.tsx";
import { Plot } from "../../components/plot.tsx";
import { usePlotTheme } from "../../components/plot-theme.ts";
import { useShortcut } from "../../components/shortcuts.tsx";
import { useIsPhone } from "../../components/use-media.ts";
import { useThrottled } from "../../components/use-throttled.ts";
import { useWidth } from "../../components/use-width.ts";
import { readQuantity } from "../../format/format-quantity.ts";
import { DockedStrip } from "./docked-strip.tsx";
import { evidenceFigure } from "./evidence-figure.ts";
import { frameOf, xOf, type Frame } from "./frame.ts";
import { figureWords, stripWords } from "./plot-words.ts";
import { Gutter, ReadingsRow } from "./gutter.tsx";
import { phaseWords } from "./readings.ts";
import { lastCycles, neighbourEvent, type RunView } from "./run-view.ts";
import { scalesOf } from "./scales.ts";
import { TimeCursor } from "./time-cursor.tsx";
import { ViewChoice, type Range } from "./view-choice.tsx";

interface EvidenceProps {
  view: RunView;
  /** The cursor's time, s. */
  t: number;
  onMove: (t: number) => void;
  isStale: boolean;
}

/** While a value is dragged the plots take the newest run five times a second: drawing them takes longer than a frame. */
const DRAWN_EVERY_MS = 200;

/** The motion strip and the plots of a run over one time axis, under one cursor. */
export function Evidence({ view: newest, t, onMove, isStale }: EvidenceProps) {
  const view = useThrottled(newest, DRAWN_EVERY_MS);
  const isPhone = useIsPhone();
  const [ref, width] = useWidth<HTMLDivElement>(1160);
  const [part, setPart] = useState<Range | null>(null);
  const range = useMemo(() => within(part, view.end), [part, view.end]);
  const frame = useMemo(() => frameOf(width, range, scalesOf(view, range)), [view, width, range]);
  const theme = usePlotTheme();
  const { data, layout } = useMemo(() => evidenceFigure(view, frame, theme), [view, frame, theme]);
  const step = (direction: 1 | -1): void => onMove(neighbourEvent(view, t, direction) ?? t);
  useShortcut("ArrowLeft", "Cursor to the event before", () => step(-1));
  useShortcut("ArrowRight", "Cursor to the next event", () => step(1));
  return (
    <div className={classNames(isStale && "stale")}>
      <div className="mb-3 flex flex-wrap items-center gap-x-5 gap-y-2">
        {!isPhone && <EventButtons onStep={step} />}
        <CursorWords view={view} t={t} />
        <ViewChoice range={range} whole={view.end} last={lastCycles(view)} t={t} onChoose={setPart} />
      </div>
      {isPhone && <ReadingsRow view={view} frame={frame} t={t} />}
      <div className="border-line bg-raised max-desk:-mx-(--page-pad) max-desk:border-y desk:rounded desk:border">
        <div ref={ref} className="relative">
          <StripRow view={view} frame={frame} t={t} />
          <div className="relative">
            <Plot data={data} layout={layout} label={figureWords(view)} />
            <Heads frame={frame} motion={view.scenario.motion} />
            <TimeCursor view={view} frame={frame} t={t} onMove={onMove} />
            {frame.right > 100 && <Gutter view={view} frame={frame} t={t} />}
          </div>
        </div>
      </div>
      {isPhone && <DockedStrip view={view} t={t} onMove={onMove} onStep={step} />}
    </div>
  );
}

function within(part: Range | null, end: number): Range {
  if (!part || part.from >= end) return { from: 0, to: end };
  return { from: part.from, to: Math.min(part.to, end) };
}

export function EventButtons({ onStep }: { onStep: (direction: 1 | -1) => void }) {
  return (
    <span className="flex gap-2">
      <Button className="w-8 px-0!" aria-label="Event before" onClick={() => onStep(-1)}>
        <Icon name="previous" size={13} />
      </Button>
      <Button className="w-8 px-0!" aria-label="Next event" onClick={() => onStep(1)}>
        <Icon name="next" size={13} />
      </Button>
    </span>
  );
}

function CursorWords({ view, t }: { view: RunView; t: number }) {
  const { phase, since } = phaseWords(view, t);
  return (
    <p>
      Cursor at <Figure {...readQuantity(t, { dimension: "time", motion: "linear" }, { digits: 4 })} />,{" "}
      <span className={classNames("font-bold", phase === "stuck" ? "text-stick" : "text-slip")}>{phase}</span>
      {since}
    </p>
  );
}

/** The strip over the same axis as the plots, with the head of the cursor. */
function StripRow({ view, frame, t }: { view: RunView; frame: Frame; t: number }) {
  const isSeen = t >= frame.from && t <= frame.to;
  return (
    <div className="relative pt-5" style={{ paddingLeft: frame.left, paddingRight: frame.right }}>
      {frame.left > 60 && (
        <span className="absolute top-5 left-0 text-right text-13 text-quiet" style={{ width: frame.left - 12 }}>
          motion
        </span>
      )}
      <MotionStrip
        intervals={view.intervals}
        from={frame.from}
        to={frame.to}
        label={stripWords(view.intervals)}
        isNever={view.result.outcome === "never-moved"}
      />
      {isSeen && (
        <svg className="pointer-events-none absolute inset-0 h-full w-full" aria-hidden="true">
          <path d={`M${xOf(frame, t)} 18l-5.5-9h11z`} className="fill-ink" />
          <path d={`M${xOf(frame, t)} 12V60`} className="stroke-ink" strokeWidth={1.25} />
        </svg>
      )}
    </div>
  );
}

const names = {
  linear: { displacement: "displacement", velocity: "velocity", friction: "friction on the body" },
  angular: { displacement: "angle", velocity: "angular velocity", friction: "friction torque on the rotor" },
};

/** The unit at the head of each axis, with what is drawn. */
function Heads({ frame, motion }: { frame: Frame; motion: "linear" | "angular" }) {
  return (
    <>
      {frame.panels.map(({ key, top, unit }) => (
        <p key={key} className="absolute text-13 text-quiet" style={{ top: top - 24, left: frame.left > 60 ? 16 : 8 }}>
          <span className="text-ink">{names[motion][key]}</span>, {unit.label}
        </p>
      ))}
      <p className="absolute text-13 text-quiet" style={{ bottom: 2, right: frame.right }}>
        time, s
      </p>
    </>
  );
}
