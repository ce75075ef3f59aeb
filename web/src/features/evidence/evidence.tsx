import { Suspense, useMemo } from "react";
import { classNames } from "../../components/class-names.ts";
import { Figure } from "../../components/figure.tsx";
import { lazyPart } from "../../components/lazy-part.ts";
import { usePlotTheme } from "../../components/plot-theme.ts";
import { useShortcut } from "../../components/shortcuts.tsx";
import { useIsPhone } from "../../components/use-media.ts";
import { useThrottled } from "../../components/use-throttled.ts";
import { useWidth } from "../../components/use-width.ts";
import { readQuantity } from "../../format/format-quantity.ts";
import { DockedStrip } from "./docked-strip.tsx";
import { frameOf } from "./frame.ts";
import { ReadingsRow } from "./gutter.tsx";
import { LoopSheets } from "./loop-sheets.tsx";
import type { Overlay } from "./overlay.ts";
import { OverlayChoice } from "./overlay-choice.tsx";
import { PanelChoice } from "./panel-choice.tsx";
import { PlayButtons } from "./play-buttons.tsx";
import { phaseWords } from "./readings.ts";
import { neighbourEvent, type RunView } from "./run-view.ts";
import { SaveRun } from "./save-run.tsx";
import { scalesOf } from "./scales.ts";
import { TimeCursor } from "./time-cursor.tsx";
import { TimeFigure } from "./time-figure.tsx";
import { usePanels } from "./use-panels.ts";
import { useSeenPart, within } from "./use-part.ts";
import { usePlay } from "./use-play.ts";
import { useScenarioOverlay } from "./use-scenario-overlay.ts";
import { ViewChoice } from "./view-choice.tsx";

const SpectrumSheet = lazyPart(async () => (await import("./spectrum/spectrum-sheet.tsx")).SpectrumSheet);

interface EvidenceProps {
  view: RunView;
  /** The cursor's time, s. */
  t: number;
  onMove: (t: number) => void;
  isStale: boolean;
  /** Other motions drawn behind this one; a scenario to overlay is then not offered. */
  beside?: readonly Overlay[];
}

/**
 * While a value is dragged the plots take the newest run five times a second: drawing them takes longer than a frame. So do
 * the plots below the time axis while what is seen of it moves.
 */
const DRAWN_EVERY_MS = 200;

/** The motion strip and the plots of a run over one time axis, under one cursor. */
export function Evidence({ view: newest, t, onMove, isStale, beside }: EvidenceProps) {
  const view = useThrottled(newest, DRAWN_EVERY_MS);
  const isPhone = useIsPhone();
  const [ref, width] = useWidth<HTMLDivElement>(1160);
  const part = useSeenPart(view.end, t);
  const { range } = part;
  const slow = useThrottled(range, DRAWN_EVERY_MS);
  const settling = useMemo(() => within(slow, view.end), [slow, view.end]);
  const [panels, togglePanel] = usePanels();
  const overlay = useScenarioOverlay(view.scenario.motion);
  const overlays = beside ?? overlay.overlays;
  const frame = useMemo(
    () => frameOf(width, range, scalesOf(view, range, panels, overlays)),
    [view, width, range, panels, overlays],
  );
  const theme = usePlotTheme();
  const moveTo = (next: number): void => {
    onMove(next);
    part.follow(next);
  };
  const step = (direction: 1 | -1): void => moveTo(neighbourEvent(view, t, direction) ?? t);
  const play = usePlay({ range, t, onMove, next: (after) => neighbourEvent(view, after, 1) });
  useShortcut(" ", "Play and pause", play.toggle);
  useShortcut("ArrowLeft", "Cursor to the event before", () => step(-1));
  useShortcut("ArrowRight", "Cursor to the next event", () => step(1));
  return (
    <div className={classNames(isStale && "stale")}>
      <div className="mb-3 flex flex-wrap items-center gap-x-5 gap-y-2">
        <PlayButtons play={play} onStep={step} hasSteps={!isPhone} />
        <CursorWords view={view} t={t} />
        <ViewChoice view={view} part={part} />
      </div>
      <div className="flex flex-wrap items-center gap-x-6 max-desk:mb-3">
        <PanelChoice hasDrive={view.drive !== null} chosen={panels} onToggle={togglePanel} />
        {!beside && <OverlayChoice overlay={overlay} />}
      </div>
      {isPhone && <ReadingsRow view={view} frame={frame} t={t} overlays={overlays} />}
      <div className="border-line bg-raised max-desk:-mx-(--page-pad) max-desk:border-y desk:rounded desk:border">
        <div ref={ref} className="relative">
          <TimeFigure
            view={view}
            frame={frame}
            t={t}
            theme={theme}
            overlays={overlays}
            onMove={moveTo}
            onSpan={part.span}
          >
            <TimeCursor view={view} frame={frame} t={t} onMove={moveTo} part={part} />
          </TimeFigure>
        </div>
      </div>
      <LoopSheets view={view} range={settling} t={t} theme={theme} />
      {panels.includes("spectrum") && (
        <Suspense fallback={<div className="min-h-[420px]" />}>
          <SpectrumSheet view={view} range={settling} theme={theme} />
        </Suspense>
      )}
      <SaveRun view={view} />
      {isPhone && <DockedStrip view={view} range={range} t={t} onMove={moveTo} onStep={step} />}
    </div>
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
