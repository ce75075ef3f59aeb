import type { Data, Layout, LayoutAxis } from "plotly.js-dist-min";
import type { PlotTheme } from "../../components/plot-theme.ts";
import { fromSi } from "../../format/unit.ts";
import { curveOf, type Line } from "./curve.ts";
import { plainAxis, type FigureLayout } from "./evidence-layout.ts";
import type { LoopAxis, LoopFrame, LoopPart } from "./loop-frame.ts";
import type { RunView } from "./run-view.ts";
import { driveSpeed } from "./scales.ts";
import { thinned } from "./thin.ts";

const MOST_POINTS = 4000;

/** Room about a loop, px. */
export const loopMargin = { left: 64, right: 24, top: 46, bottom: 46 };

/** A loop as plotly wants it: sliding thin, stuck thick, and what it is measured against dashed or dotted. */
export function loopFigure(
  view: RunView,
  part: LoopPart,
  frame: LoopFrame,
  size: { width: number; height: number },
  theme: PlotTheme,
): { data: Data[]; layout: FigureLayout } {
  const { slip, stick } = loopCurve(part, frame);
  const level = (si: number, stroke: Partial<Stroke>): Data =>
    line(
      {
        x: Float64Array.of(fromSi(frame.across.low, frame.across.unit), fromSi(frame.across.high, frame.across.unit)),
        y: Float64Array.of(fromSi(si, frame.upright.unit), fromSi(si, frame.upright.unit)),
      },
      { color: theme.quiet, width: 1, dash: "dash", ...stroke },
    );
  const levels =
    frame.key === "velocity"
      ? driveSpeed(view).map((speed) => level(speed, {}))
      : holdLevels(view, part, frame).map((force) => level(force, { color: theme.stick, width: 1.5, dash: "dot" }));
  const data = [...levels, line(slip, { color: theme.slip, width: 2 }), line(stick, { color: theme.stick, width: 3 })];
  return { data, layout: layoutOf(frame, size, theme) };
}

/** What friction can hold, where it is constant and within the picture. */
export function holdLevels(view: RunView, { range }: LoopPart, { upright }: LoopFrame): number[] {
  const hold = view.inputs.hold(range.from);
  if (hold === 0 || view.scenario.contact.normal.ripple) return [];
  return [hold, -hold].filter((force) => force > upright.low && force < upright.high);
}

function loopCurve({ samples, places, events, range }: LoopPart, { key, across, upright }: LoopFrame) {
  const channel = key === "velocity" ? "v" : "f";
  const isDense = events.length > MOST_POINTS / 8;
  const keep = isDense ? [] : events.flatMap((i) => [i - 1, i]);
  // A loop is round: points that are spread evenly make it so, and none of its extremes is lost.
  const stride = Math.ceil(samples.t.length / (MOST_POINTS / 2));
  const even = Array.from({ length: Math.ceil(samples.t.length / stride) }, (_, k) => k * stride);
  const about = thinned(samples.t, places, range, MOST_POINTS / 8, [...keep, ...even]);
  const indices = thinned(samples.t, samples[channel], range, MOST_POINTS / 8, [...about]);
  return curveOf(samples, channel, indices, upright.unit, isDense, { values: places, unit: across.unit });
}

function layoutOf(frame: LoopFrame, { width, height }: { width: number; height: number }, theme: PlotTheme) {
  const { left, right, top, bottom } = loopMargin;
  return {
    width,
    height,
    autosize: false,
    margin: { l: left, r: right, t: top, b: bottom, pad: 0 },
    paper_bgcolor: "rgba(0,0,0,0)",
    plot_bgcolor: "rgba(0,0,0,0)",
    separators: ".\u202f",
    uirevision: "loops",
    showlegend: false,
    hovermode: false,
    xaxis: {
      ...axis(frame.across, theme),
      nticks: Math.max(3, Math.floor((width - left - right) / 80)),
      showline: true,
      linecolor: theme.ink,
      linewidth: 1,
      tickcolor: theme.ink,
    },
    yaxis: { ...axis(frame.upright, theme), nticks: 6 },
  } satisfies Partial<Layout>;
}

const axis = ({ low, high, unit }: LoopAxis, theme: PlotTheme): Partial<LayoutAxis> => ({
  ...plainAxis(theme),
  range: [fromSi(low, unit), fromSi(high, unit)],
  zeroline: true,
  zerolinecolor: theme.edge,
  zerolinewidth: 1,
  tickcolor: "rgba(0,0,0,0)",
  ticklen: 5,
});

interface Stroke {
  color: string;
  width: number;
  dash?: "dash" | "dot";
}

const line = ({ x, y }: Line, stroke: Stroke): Data => ({
  type: "scatter",
  mode: "lines",
  x,
  y,
  line: { ...stroke, simplify: false },
  hoverinfo: "skip",
  showlegend: false,
});
