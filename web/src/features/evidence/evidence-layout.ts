import type { Layout, LayoutAxis } from "plotly.js-dist-min";
import type { PlotTheme } from "../../components/plot-theme.ts";
import { fromSi } from "../../format/unit.ts";
import { plotWidth, type Frame, type PanelFrame, type PanelKey } from "./frame.ts";

/** plotly's names of the panels' axes. */
export const axes: Record<PanelKey, "y" | "y2" | "y3" | "y4" | "y5"> = {
  displacement: "y",
  velocity: "y2",
  friction: "y3",
  acceleration: "y4",
  drive: "y5",
};

export type FigureLayout = Partial<Layout> & { width: number; height: number };

/** Panels one below the other over one time axis: no box, a quiet grid, only the bottom axis in ink. */
export function layoutOf(frame: Frame, theme: PlotTheme): FigureLayout {
  const { width, height, left, right, panels } = frame;
  const last = panels[panels.length - 1];
  const top = panels[0].top;
  const bottom = height - last.top - last.height;
  const share = (y: number): number => 1 - (y - top) / (height - top - bottom);
  return {
    width,
    height,
    autosize: false,
    margin: { l: left, r: right, t: top, b: bottom, pad: 0 },
    paper_bgcolor: "rgba(0,0,0,0)",
    plot_bgcolor: "rgba(0,0,0,0)",
    separators: ".\u202f",
    uirevision: "evidence",
    showlegend: false,
    hovermode: false,
    xaxis: timeAxis(frame, theme, last.key),
    ...Object.fromEntries(
      panels.map((panel) => [axes[panel.key].replace("y", "yaxis"), valueAxis(panel, theme, share)]),
    ),
  };
}

function timeAxis(frame: Frame, theme: PlotTheme, under: PanelKey): Partial<LayoutAxis> {
  return {
    ...plainAxis(theme),
    range: [frame.from, frame.to],
    anchor: axes[under],
    nticks: Math.max(3, Math.floor(plotWidth(frame) / 110)),
    showline: true,
    linecolor: theme.ink,
    linewidth: 1,
    tickcolor: theme.ink,
    ticklen: 4,
  };
}

function valueAxis(panel: PanelFrame, theme: PlotTheme, share: (y: number) => number): Partial<LayoutAxis> {
  return {
    ...plainAxis(theme),
    range: [fromSi(panel.low, panel.unit), fromSi(panel.high, panel.unit)],
    domain: [share(panel.top + panel.height), share(panel.top)],
    nticks: panel.height > 150 ? 6 : 5,
    // An invisible tick keeps the figures off the plot.
    tickcolor: "rgba(0,0,0,0)",
    ticklen: 5,
    zeroline: true,
    zerolinecolor: theme.edge,
    zerolinewidth: 1,
  };
}

/** What all our axes share. */
export const plainAxis = (theme: PlotTheme): Partial<LayoutAxis> => ({
  showgrid: true,
  gridcolor: theme.line,
  gridwidth: 1,
  zeroline: false,
  fixedrange: true,
  ticks: "outside",
  tickfont: { family: theme.mono, size: 12.5, color: theme.quiet },
  exponentformat: "power",
  // Its labels have their room: without measuring each for it, a plot is drawn a quarter faster.
  ticklabeloverflow: "allow",
});
