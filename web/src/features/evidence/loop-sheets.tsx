import { useMemo } from "react";
import type { PlotSheet } from "../../components/plot-image.ts";
import { Plot } from "../../components/plot.tsx";
import type { PlotTheme } from "../../components/plot-theme.ts";
import { useWidth } from "../../components/use-width.ts";
import { instantAt } from "../../compute/instant.ts";
import { loopFigure } from "./loop-figure.ts";
import { loopFrames, loopPart, type LoopAxis, type LoopFrame, type LoopPart } from "./loop-frame.ts";
import { acrossOf, downOf, loopLabels, type LoopLabel, type Size } from "./loop-labels.ts";
import { loopWords } from "./plot-words.ts";
import { fromDrive, type RunView } from "./run-view.ts";
import { SavePlot } from "./save-plot.tsx";
import { SheetLabels } from "./sheet-labels.tsx";
import type { Range } from "./part-of-run.ts";

interface LoopSheetsProps {
  view: RunView;
  /** What is seen above. */
  range: Range;
  t: number;
  theme: PlotTheme;
}

/** Phase plane and force–displacement loop, side by side over the same displacement. */
export function LoopSheets({ view, range, t, theme }: LoopSheetsProps) {
  const part = useMemo(() => loopPart(view, range), [view, range]);
  const frames = useMemo(() => loopFrames(view, part), [view, part]);
  return (
    <div className="mt-4 grid grid-cols-1 gap-4 desk:grid-cols-2 desk:gap-6">
      {frames.map((frame) => (
        <LoopSheet key={frame.key} view={view} part={part} frame={frame} t={t} theme={theme} />
      ))}
    </div>
  );
}

const HEIGHT = 340;

/** What a file of a loop says beside its lines. */
function loopSheet(
  { scenario }: RunView,
  part: LoopPart,
  { title, across, upright }: LoopFrame,
  labels: readonly LoopLabel[],
  size: Size,
  theme: PlotTheme,
): Omit<PlotSheet, "data" | "layout"> {
  const named = ({ name, unit }: LoopAxis): string => `${name}, ${unit.label}`;
  return {
    title: `${scenario.title || "Untitled"}: ${title.toLowerCase()}, ${part.words}`,
    words: [
      { text: named(upright), x: 16, y: 30, anchor: "start", colour: theme.ink },
      { text: named(across), x: size.width - 24, y: size.height - 4, anchor: "end", colour: theme.ink },
      ...labels.map(({ tone, ...label }) => ({ ...label, colour: theme[tone] })),
    ],
  };
}

interface LoopSheetProps extends Omit<LoopSheetsProps, "range"> {
  part: LoopPart;
  frame: LoopFrame;
}

function LoopSheet({ view, part, frame, t, theme }: LoopSheetProps) {
  const [ref, width] = useWidth<HTMLDivElement>(567);
  const size = useMemo(() => ({ width, height: HEIGHT }), [width]);
  const { data, layout } = useMemo(() => loopFigure(view, part, frame, size, theme), [view, part, frame, size, theme]);
  const labels = useMemo(() => loopLabels(view, part, frame, size), [view, part, frame, size]);
  return (
    <figure className="border-line bg-raised max-desk:-mx-(--page-pad) max-desk:border-y desk:rounded desk:border">
      <figcaption className="flex flex-wrap justify-between gap-x-4 px-4 pt-4 text-15 font-bold">
        <span>
          {frame.title}, {part.words}
        </span>
        <SavePlot
          name={frame.title.toLowerCase()}
          theme={theme}
          sheet={() => ({ ...loopSheet(view, part, frame, labels, size, theme), data, layout })}
        />
      </figcaption>
      <div ref={ref} className="relative">
        <Plot data={data} layout={layout} label={loopWords(view, frame)} />
        <p className="absolute top-3 left-4 text-13 text-quiet">
          <span className="text-ink">{frame.upright.name}</span>, {frame.upright.unit.label}
        </p>
        <p className="absolute right-6 bottom-1 text-13 text-quiet">
          <span className="text-ink">{frame.across.name}</span>, {frame.across.unit.label}
        </p>
        <svg className="pointer-events-none absolute inset-0 h-full w-full" aria-hidden="true">
          <SheetLabels labels={labels} />
          <CursorRing view={view} frame={frame} size={size} t={t} />
        </svg>
      </div>
    </figure>
  );
}

/** The cursor on a loop; nothing where it is beyond what is drawn. */
function CursorRing({ view, frame, size, t }: Pick<LoopSheetProps, "view" | "frame" | "t"> & { size: Size }) {
  const here = instantAt(view.samples, t);
  const { across, upright } = frame;
  const place = fromDrive(view, here);
  const value = frame.key === "velocity" ? here.v : here.f;
  const isSeen = place >= across.low && place <= across.high && value >= upright.low && value <= upright.high;
  if (!isSeen) return null;
  return (
    <circle
      cx={acrossOf(across, place, size)}
      cy={downOf(upright, value, size)}
      r={4.5}
      className="fill-raised stroke-ink"
      strokeWidth={1.75}
    />
  );
}
