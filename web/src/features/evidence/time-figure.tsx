import type { Scenario } from "@restband/solver";
import { useMemo, type ReactNode } from "react";
import { MotionStrip } from "../../components/motion-strip.tsx";
import { Plot } from "../../components/plot.tsx";
import type { PlotSheet } from "../../components/plot-image.ts";
import type { PlotTheme } from "../../components/plot-theme.ts";
import { nounOf } from "../../format/noun.ts";
import type { Motion } from "../../format/unit.ts";
import { evidenceFigure } from "./evidence-figure.ts";
import type { FigureLayout } from "./evidence-layout.ts";
import { xOf, type Frame, type PanelKey } from "./frame.ts";
import { Gutter } from "./gutter.tsx";
import type { Overlay } from "./overlay.ts";
import { panelLabels, type PanelLabel } from "./panel-labels.ts";
import { figureWords, stripWords } from "./plot-words.ts";
import type { RunView } from "./run-view.ts";
import { SavePlot } from "./save-plot.tsx";
import { SheetLabels } from "./sheet-labels.tsx";
import { StripDrag } from "./strip-drag.tsx";

interface TimeFigureProps {
  view: RunView;
  frame: Frame;
  t: number;
  theme: PlotTheme;
  /** Other motions, drawn behind this one. */
  overlays: readonly Overlay[];
  onMove: (t: number) => void;
  onSpan: (one: number, other: number) => void;
  /** The cursor, over all panels. */
  children: ReactNode;
}

/** The motion strip and the panels over one time axis, with what is read at the cursor. */
export function TimeFigure({ view, frame, t, theme, overlays, onMove, onSpan, children }: TimeFigureProps) {
  const { data, layout } = useMemo(() => evidenceFigure(view, frame, theme, overlays), [view, frame, theme, overlays]);
  const words = useMemo(() => figureWords(view, frame), [view, frame]);
  const labels = useMemo(() => panelLabels(view, frame, overlays), [view, frame, overlays]);
  return (
    <>
      <StripRow view={view} frame={frame} t={t}>
        <StripDrag frame={frame} onMove={onMove} onSpan={onSpan} />
      </StripRow>
      <div className="relative">
        <Plot data={data} layout={layout} label={words} />
        <Heads frame={frame} scenario={view.scenario} />
        <svg className="pointer-events-none absolute inset-0 h-full w-full" aria-hidden="true">
          <SheetLabels labels={labels} />
        </svg>
        {children}
        {frame.right > 100 && <Gutter view={view} frame={frame} t={t} overlays={overlays} />}
      </div>
      <p className="absolute bottom-0 left-4">
        <SavePlot
          name="plots over time"
          theme={theme}
          sheet={() => ({ data, ...timeSheet(view, frame, layout, labels, theme) })}
        />
      </p>
    </>
  );
}

/** Room to the right of the panels in a file, px: the readings at the cursor are not in it. */
const FILE_RIGHT = 28;

/** The panels as a file: what it says beside their lines, and no room for readings. */
function timeSheet(
  { scenario }: RunView,
  frame: Frame,
  layout: FigureLayout,
  labels: readonly PanelLabel[],
  theme: PlotTheme,
): Omit<PlotSheet, "data"> {
  const end = { x: frame.width - frame.right, y: frame.height - 2 };
  return {
    title: `${scenario.title || "Untitled"}: motion over time`,
    layout: { ...layout, width: end.x + FILE_RIGHT, margin: { ...layout.margin, r: FILE_RIGHT } },
    words: [
      ...frame.panels.map(({ key, top, unit }) => ({
        text: `${panelName(scenario, key)}, ${unit.label}`,
        x: 16,
        y: top - 8,
        anchor: "start" as const,
        colour: theme.ink,
      })),
      ...labels.map(({ key: _, tone, ...label }) => ({ ...label, colour: theme[tone] })),
      { text: "time, s", ...end, anchor: "end", colour: theme.quiet },
    ],
  };
}

/** The strip over the same axis as the plots, with the head of the cursor. */
function StripRow({ view, frame, t, children }: Pick<TimeFigureProps, "view" | "frame" | "t" | "children">) {
  const isSeen = t >= frame.from && t <= frame.to;
  const words = useMemo(() => stripWords(view.intervals), [view]);
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
        label={words}
        isNever={view.result.outcome === "never-moved"}
      />
      {isSeen && (
        <svg className="pointer-events-none absolute inset-0 h-full w-full" aria-hidden="true">
          <path d={`M${xOf(frame, t)} 18l-5.5-9h11z`} className="fill-ink" />
          <path d={`M${xOf(frame, t)} 12V60`} className="stroke-ink" strokeWidth={1.25} />
        </svg>
      )}
      {children}
    </div>
  );
}

const names: Record<Motion, Record<PanelKey, string>> = {
  linear: {
    displacement: "displacement",
    velocity: "velocity",
    acceleration: "acceleration",
    friction: "friction",
    drive: "drive force",
  },
  angular: {
    displacement: "angle",
    velocity: "angular velocity",
    acceleration: "angular acceleration",
    friction: "friction torque",
    drive: "drive torque",
  },
};

/** What a panel shows, of what body. */
function panelName(scenario: Scenario, key: PanelKey): string {
  const name = names[scenario.motion][key];
  return key === "friction" ? `${name} on the ${nounOf(scenario)}` : name;
}

/** The unit at the head of each axis, with what is drawn. */
function Heads({ frame, scenario }: { frame: Frame; scenario: Scenario }) {
  return (
    <>
      {frame.panels.map(({ key, top, unit }) => (
        <p key={key} className="absolute text-13 text-quiet" style={{ top: top - 24, left: frame.left > 60 ? 16 : 8 }}>
          <span className="text-ink">{panelName(scenario, key)}</span>, {unit.label}
        </p>
      ))}
      <p className="absolute text-13 text-quiet" style={{ bottom: 2, right: frame.right }}>
        time, s
      </p>
    </>
  );
}
