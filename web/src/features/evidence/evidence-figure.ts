import type { Data } from "plotly.js-dist-min";
import { faded, type PlotTheme } from "../../components/plot-theme.ts";
import { roughlyFromSi, type Unit } from "../../format/unit.ts";
import { curveOf, type Line } from "./curve.ts";
import { densified } from "./densified.ts";
import { axes, layoutOf, type FigureLayout } from "./evidence-layout.ts";
import type { Frame, PanelFrame } from "./frame.ts";
import type { Overlay } from "./overlay.ts";
import { phaseChanges, type RunView } from "./run-view.ts";
import { driveSpeed } from "./scales.ts";
import { thinned } from "./thin.ts";

const MOST_POINTS = 4000;
const channels = { displacement: "x", velocity: "v", acceleration: "a", friction: "f" } as const;

/** Displacement with its rest band, velocity and friction force over one time axis, as plotly wants it. */
export function evidenceFigure(
  view: RunView,
  frame: Frame,
  theme: PlotTheme,
  overlays: readonly Overlay[] = [],
): { data: Data[]; layout: FigureLayout } {
  const data = frame.panels.flatMap((panel) => [
    ...(panel.key === "displacement" ? bandTraces(view, frame, panel, theme) : []),
    ...(panel.key === "velocity" ? speedTraces(view, frame, panel, theme) : []),
    ...(panel.key === "friction" ? holdTraces(view, frame, panel, theme) : []),
    ...overlays.flatMap((overlay) => overlayTraces(overlay, frame, panel, theme)),
    ...(panel.key === "drive"
      ? driveTraces(view, frame, panel, theme)
      : curveTraces(view, frame, panel, panel.key, theme)),
  ]);
  return { data, layout: layoutOf(frame, theme) };
}

/** Sliding thin, stuck thick: told apart by width as well as by colour. */
function curveTraces(
  view: RunView,
  frame: Frame,
  panel: PanelFrame,
  key: keyof typeof channels,
  theme: PlotTheme,
): Data[] {
  const samples = densified(view.samples, frame);
  const events = samples === view.samples ? view.eventIndices : phaseChanges(samples);
  const channel = channels[key];
  const seen = events.filter((i) => samples.t[i] >= frame.from && samples.t[i] <= frame.to);
  const isDense = seen.length > MOST_POINTS / 4;
  // Told apart, each event costs points of its own; one dense line has them all for itself.
  const [count, keep] = isDense ? [0.9 * MOST_POINTS, []] : [MOST_POINTS / 2, seen.flatMap((i) => [i - 1, i])];
  const indices = thinned(samples.t, samples[channel], frame, count, keep);
  const { slip, stick } = curveOf(samples, channel, indices, panel.unit, isDense);
  return [line(panel, slip, { color: theme.slip, width: 2 }), line(panel, stick, { color: theme.stick, width: 3 })];
}

/** Displacement and velocity of another motion, dashed and quiet: what it is compared with stays in front. */
function overlayTraces({ samples }: Overlay, frame: Frame, panel: PanelFrame, theme: PlotTheme): Data[] {
  if (panel.key !== "displacement" && panel.key !== "velocity") return [];
  const channel = channels[panel.key];
  const seen = densified(samples, frame);
  const indices = thinned(seen.t, seen[channel], frame, MOST_POINTS);
  const { slip } = curveOf(seen, channel, indices, panel.unit, true);
  return [line(panel, slip, { color: theme.quiet, width: 1.5, dash: "dash" })];
}

/** The force that drives the body, one line whatever the body does. */
function driveTraces({ drive, samples }: RunView, frame: Frame, panel: PanelFrame, theme: PlotTheme): Data[] {
  const points = drive?.between(densified(samples, frame), frame) ?? [];
  const times = Float64Array.from(points, ({ t }) => t);
  const forces = Float64Array.from(points, ({ force }) => roughlyFromSi(force, panel.unit));
  const kept = thinned(times, forces, frame, MOST_POINTS);
  const drawn = { x: Float64Array.from(kept, (i) => times[i]), y: Float64Array.from(kept, (i) => forces[i]) };
  return [line(panel, drawn, { color: theme.quiet, width: 2 })];
}

/** The band in which friction can hold the body, about its equilibrium; left out where that swings too fast to be drawn. */
function bandTraces(view: RunView, frame: Frame, panel: PanelFrame, theme: PlotTheme): Data[] {
  const { equilibrium, restBand } = view.inputs;
  const times = view.inputs.times(frame.from, frame.to);
  if (restBand === null || times === null) return [];
  const edge = (offset: number): Line => at(times, (t) => (equilibrium(t) ?? 0) + offset, panel.unit);
  const drawn = { color: theme["band-line"], width: 1.5 };
  const fill: Partial<Data> = {
    fill: "tonexty",
    fillcolor: faded(theme.band, 0.2),
    fillpattern: {
      shape: "-",
      size: 5,
      solidity: 0.16,
      fgcolor: theme["band-line"],
      bgcolor: faded(theme.band, 0.2),
      fgopacity: 0.4,
    },
  };
  return [
    line(panel, edge(-restBand), drawn),
    { ...line(panel, edge(restBand), drawn), ...fill } as Data,
    line(panel, edge(0), { color: theme.quiet, width: 1, dash: "dash" }),
  ];
}

function speedTraces(view: RunView, frame: Frame, panel: PanelFrame, theme: PlotTheme): Data[] {
  return driveSpeed(view).map((speed) =>
    line(
      panel,
      at([frame.from, frame.to], () => speed, panel.unit),
      { color: theme.quiet, width: 1, dash: "dash" },
    ),
  );
}

/** What friction can hold, to both sides. */
function holdTraces(view: RunView, frame: Frame, panel: PanelFrame, theme: PlotTheme): Data[] {
  const { inputs, scenario } = view;
  if (inputs.hold(frame.from) === 0) return [];
  const ends = [frame.from, frame.to];
  const times = scenario.contact.normal.ripple ? (inputs.times(frame.from, frame.to) ?? ends) : ends;
  return [1, -1].map((side) =>
    line(
      panel,
      at(times, (t) => side * inputs.hold(t), panel.unit),
      { color: theme.stick, width: 1.5, dash: "dot" },
    ),
  );
}

const at = (times: readonly number[], value: (t: number) => number, unit: Unit): Line => ({
  x: Float64Array.from(times),
  y: Float64Array.from(times, (t) => roughlyFromSi(value(t), unit)),
});

interface Stroke {
  color: string;
  width: number;
  dash?: "dash" | "dot";
}

function line(panel: PanelFrame, { x, y }: Line, stroke: Stroke): Data {
  return {
    type: "scatter",
    mode: "lines",
    x,
    y,
    yaxis: axes[panel.key],
    line: { ...stroke, simplify: false },
    hoverinfo: "skip",
    showlegend: false,
  };
}
