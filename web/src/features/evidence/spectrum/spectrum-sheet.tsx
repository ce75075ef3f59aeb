import { useMemo, useState } from "react";
import { Plot } from "../../../components/plot.tsx";
import type { PlotTheme } from "../../../components/plot-theme.ts";
import { useWidth } from "../../../components/use-width.ts";
import type { LoopLabel, Size } from "../loop-labels.ts";
import { Option } from "../option.tsx";
import type { Range } from "../part-of-run.ts";
import type { RunView } from "../run-view.ts";
import { SavePlot } from "../save-plot.tsx";
import { SheetLabels } from "../sheet-labels.tsx";
import { PeakTable } from "./peak-table.tsx";
import { channelName, spectrumChannels, type RunSpectrum, type SpectrumChannel } from "./run-spectrum.ts";
import { spectrumFigure, spectrumFrame, spectrumLabels, type SpectrumFrame } from "./spectrum-figure.ts";
import type { WindowPart } from "./spectrum-window.ts";
import { methodSentences, spectrumWords, windowWords } from "./spectrum-words.ts";
import { useSpectrum } from "./use-spectrum.ts";

interface SpectrumSheetProps {
  view: RunView;
  /** What is seen above. */
  range: Range;
  theme: PlotTheme;
}

/** The spectrum of displacement, velocity or acceleration: its curve, its peaks and how it was made. */
export function SpectrumSheet({ view, range, theme }: SpectrumSheetProps) {
  const [channel, setChannel] = useState<SpectrumChannel>("displacement");
  const [part, setPart] = useState<WindowPart>("steady");
  const [isLog, setLog] = useState(false);
  const { spectrum, trouble } = useSpectrum(view, part, range, channel);
  return (
    <figure className="mt-6 border-line bg-raised max-desk:-mx-(--page-pad) max-desk:border-y desk:rounded desk:border">
      <figcaption className="px-4 pt-4 text-15 font-bold">
        Spectrum{spectrum && `, ${windowWords(spectrum.window, part)}`}
      </figcaption>
      <div className="flex flex-wrap items-center gap-x-6 px-4 pt-1 text-13">
        <span className="flex flex-wrap gap-x-3" role="group" aria-label="Spectrum of">
          {spectrumChannels.map((each) => (
            <Option
              key={each}
              label={channelName(view.scenario, each)}
              isChosen={each === channel}
              onChoose={() => setChannel(each)}
            />
          ))}
        </span>
        <span className="flex gap-x-3" role="group" aria-label="Window of the spectrum">
          <Option label="steady part" isChosen={part === "steady"} onChoose={() => setPart("steady")} />
          <Option label="what is seen" isChosen={part === "seen"} onChoose={() => setPart("seen")} />
        </span>
        <span className="flex gap-x-3" role="group" aria-label="Scale of the spectrum">
          <Option label="linear" isChosen={!isLog} onChoose={() => setLog(false)} />
          <Option label="logarithmic" isChosen={isLog} onChoose={() => setLog(true)} />
        </span>
      </div>
      {spectrum && spectrum.peaks.length === 0 && <p className="p-4">{spectrumWords(spectrum, view.scenario, part)}</p>}
      {spectrum && spectrum.peaks.length > 0 && (
        <Told view={view} spectrum={spectrum} part={part} isLog={isLog} theme={theme} />
      )}
      {!spectrum && (
        <p className="min-h-[340px] p-4 text-quiet" role="status">
          {trouble ?? <span className="late">Computing the spectrum</span>}
        </p>
      )}
    </figure>
  );
}

interface ToldProps {
  view: RunView;
  spectrum: RunSpectrum;
  part: WindowPart;
  isLog: boolean;
  theme: PlotTheme;
}

const HEIGHT = 340;

function Told({ view, spectrum, part, isLog, theme }: ToldProps) {
  const { scenario, result } = view;
  const [ref, width] = useWidth<HTMLDivElement>(780);
  const size = useMemo(() => ({ width, height: HEIGHT }), [width]);
  const frame = useMemo(() => spectrumFrame(spectrum, isLog), [spectrum, isLog]);
  const { data, layout } = useMemo(() => spectrumFigure(spectrum, frame, size, theme), [spectrum, frame, size, theme]);
  const labels = useMemo(() => spectrumLabels(spectrum, frame, size), [spectrum, frame, size]);
  const name = channelName(scenario, spectrum.channel);
  const heads = headsOf(frame, name, size);
  const sheet = () => ({
    title: `${scenario.title || "Untitled"}: spectrum of the ${name}, ${windowWords(spectrum.window, part)}`,
    words: [...heads, ...labels].map(({ tone, ...word }) => ({ ...word, colour: theme[tone] })),
    data,
    layout,
  });
  return (
    <div className="grid desk:grid-cols-[minmax(0,1fr)_340px]">
      <div ref={ref} className="relative min-w-0">
        <Plot data={data} layout={layout} label={spectrumWords(spectrum, scenario, part)} />
        <svg className="pointer-events-none absolute inset-0 h-full w-full" aria-hidden="true">
          <SheetLabels labels={[...heads, ...labels]} />
        </svg>
        <p className="px-4 pb-2">
          <SavePlot name={`spectrum of the ${name}`} theme={theme} sheet={sheet} />
        </p>
      </div>
      <div className="px-4 pt-3 pb-4">
        <PeakTable spectrum={spectrum} />
        {methodSentences(spectrum, result.outcome, part).map((sentence) => (
          <p key={sentence} className="mt-2 text-13 text-quiet">
            {sentence}
          </p>
        ))}
      </div>
    </div>
  );
}

/** What stands along the axes, with its unit. */
const headsOf = (frame: SpectrumFrame, name: string, { width, height }: Size): LoopLabel[] => [
  { text: `amplitude of ${name}, ${frame.upright.label}`, x: 16, y: 24, anchor: "start", tone: "ink" },
  { text: `frequency, ${frame.across.label}`, x: width - 24, y: height - 6, anchor: "end", tone: "ink" },
];
