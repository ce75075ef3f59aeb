import type { Data } from "plotly.js-dist-min";
import type { PlotTheme } from "../../../components/plot-theme.ts";
import { say } from "../../../format/format-quantity.ts";
import { fromSi, type Unit } from "../../../format/unit.ts";
import { unitFor } from "../../../format/units.ts";
import { plainAxis, type FigureLayout } from "../evidence-layout.ts";
import { apart, type LoopLabel, type Size } from "../loop-labels.ts";
import { loopMargin } from "../loop-figure.ts";
import { thinned } from "../thin.ts";
import type { RunSpectrum } from "./run-spectrum.ts";
import { orderOf } from "./spectrum-words.ts";

/** A spectrum in place: what it is drawn over and in what units. */
export interface SpectrumFrame {
  /** Highest frequency drawn, Hz. */
  readonly top: number;
  readonly isLog: boolean;
  /** Lowest and highest amplitude of the picture, SI; the lowest of a logarithmic one is above 0. */
  readonly low: number;
  readonly high: number;
  readonly across: Unit;
  readonly upright: Unit;
}

const frequency = { dimension: "frequency", motion: "linear" } as const;
const MOST_POINTS = 4000;
/** A logarithmic picture reaches so far below the highest peak. */
const DECADES = 4;

/** Of a spectrum with peaks: up to a little beyond the last that is a hundredth of the highest, and some way beyond that one. */
export function spectrumFrame(
  { peaks, highest, amplitudes, step, measure }: RunSpectrum,
  isLog: boolean,
): SpectrumFrame {
  const strongest = peaks.reduce((best, peak) => (peak.amplitude > best.amplitude ? peak : best));
  const telling = peaks.filter(({ amplitude }) => amplitude >= 0.01 * highest).map(({ hz }) => hz);
  const wanted = Math.max(1.15 * Math.max(...telling), 2.5 * strongest.hz);
  const top = Math.min(wanted, step * (amplitudes.length - 1));
  const reached = Math.max(strongest.amplitude, highest);
  return {
    top,
    isLog,
    low: isLog ? reached / 10 ** DECADES : 0,
    high: reached * (isLog ? 2.2 : 1.18),
    across: unitFor(top, frequency),
    upright: unitFor(reached, measure),
  };
}

/** Lines joined to one curve, with a stem up to each peak and a plus on it. */
export function spectrumFigure(
  { amplitudes, step, peaks }: RunSpectrum,
  frame: SpectrumFrame,
  size: Size,
  theme: PlotTheme,
): { data: Data[]; layout: FigureLayout } {
  const { across, upright, isLog, low } = frame;
  const lines = Float64Array.from(amplitudes, (_, k) => k * step);
  const kept = thinned(lines, amplitudes, { from: 0, to: frame.top }, MOST_POINTS);
  const drawn = (value: number): number => fromSi(isLog ? Math.max(value, low / 10) : value, upright);
  const scatter = { type: "scatter", hoverinfo: "skip", showlegend: false } as const;
  const curve: Data = {
    ...scatter,
    mode: "lines",
    x: Float64Array.from(kept, (k) => fromSi(lines[k], across)),
    y: Float64Array.from(kept, (k) => drawn(amplitudes[k])),
    line: { color: theme.slip, width: 1, simplify: false },
  };
  const stems: Data = {
    ...scatter,
    mode: "lines",
    x: peaks.flatMap(({ hz }) => [fromSi(hz, across), fromSi(hz, across), NaN]),
    y: peaks.flatMap(({ amplitude }) => [drawn(0), drawn(amplitude), NaN]),
    line: { color: theme.slip, width: 2.25 },
  };
  const marks: Data = {
    ...scatter,
    mode: "markers",
    x: peaks.map(({ hz }) => fromSi(hz, across)),
    y: peaks.map(({ amplitude }) => drawn(amplitude)),
    marker: { symbol: "cross-thin", size: 8, line: { color: theme.ink, width: 1.5 } },
  };
  return { data: [curve, stems, marks], layout: layoutOf(frame, size, theme) };
}

function layoutOf(frame: SpectrumFrame, { width, height }: Size, theme: PlotTheme): FigureLayout {
  const { left, right, top, bottom } = loopMargin;
  const { across, upright, isLog, low, high } = frame;
  const end = (value: number): number => (isLog ? Math.log10(fromSi(value, upright)) : fromSi(value, upright));
  return {
    width,
    height,
    autosize: false,
    margin: { l: left, r: right, t: top, b: bottom, pad: 0 },
    paper_bgcolor: "rgba(0,0,0,0)",
    plot_bgcolor: "rgba(0,0,0,0)",
    separators: ".\u202f",
    uirevision: "spectrum",
    showlegend: false,
    hovermode: false,
    xaxis: {
      ...plainAxis(theme),
      range: [0, fromSi(frame.top, across)],
      nticks: Math.max(3, Math.floor((width - left - right) / 90)),
      showline: true,
      linecolor: theme.ink,
      linewidth: 1,
      tickcolor: theme.ink,
      ticklen: 4,
    },
    yaxis: {
      ...plainAxis(theme),
      ...(isLog ? { type: "log", dtick: 1 } : { nticks: 6 }),
      range: [end(low), end(high)],
      tickcolor: "rgba(0,0,0,0)",
      ticklen: 5,
    },
  };
}

/** Where a frequency stands along the sheet, px. */
const acrossOf = ({ top }: SpectrumFrame, hz: number, { width }: Size): number =>
  loopMargin.left + (hz / top) * (width - loopMargin.left - loopMargin.right);

/** Where an amplitude stands down the sheet, px. */
function downOf({ isLog, low, high }: SpectrumFrame, amplitude: number, { height }: Size): number {
  const share = isLog ? Math.log(high / amplitude) / Math.log(high / low) : (high - amplitude) / (high - low);
  return loopMargin.top + share * (height - loopMargin.top - loopMargin.bottom);
}

/** Of a sheet narrower than this, px, the table alone tells order and amplitude. */
const NARROW = 500;

/** The peaks by their figures, the highest first: what finds no room is in the table. */
export function spectrumLabels(spectrum: RunSpectrum, frame: SpectrumFrame, size: Size): LoopLabel[] {
  const { window, measure } = spectrum;
  const isNarrow = size.width < NARROW;
  const labels = [...spectrum.peaks]
    .filter(({ hz, amplitude }) => hz <= frame.top && amplitude >= frame.low)
    .sort((a, b) => b.amplitude - a.amplitude)
    .slice(0, isNarrow ? 3 : 5)
    .map(({ hz, amplitude }): LoopLabel => {
      const order = orderOf(hz, window);
      const more = isNarrow ? [] : [...(order ? [`${order}×`] : []), say(amplitude, measure)];
      const x = acrossOf(frame, hz, size);
      const isLate = x > 0.75 * size.width;
      return {
        text: [say(hz, frequency, { digits: 4 }), ...more].join(" · "),
        x: x + (isLate ? -8 : 8),
        y: downOf(frame, amplitude, size) - 4,
        anchor: isLate ? "end" : "start",
        tone: "ink",
      };
    });
  return apart(labels, size);
}
