import type { Dimension } from "@restband/solver";
import { instantAt, type Instant } from "../../compute/instant.ts";
import { readQuantity, say, type Reading } from "../../format/format-quantity.ts";
import { nounOf } from "../../format/noun.ts";
import type { Unit } from "../../format/unit.ts";
import type { Frame, PanelKey } from "./frame.ts";
import { overlayAt, type Overlay } from "./overlay.ts";
import type { RunView } from "./run-view.ts";

/** A figure at the cursor, in the colour of its curve. */
export interface CursorReading extends Reading {
  readonly name: string;
  readonly tone: "slip" | "quiet" | "ink" | "band" | "stick";
}

/** What stands in the gutter beside each panel: the values at the cursor, exact where an event is. */
export function readingsAt(
  view: RunView,
  frame: Frame,
  t: number,
  overlays: readonly Overlay[] = [],
): Record<PanelKey, CursorReading[]> {
  const here = withoutNoise(instantAt(view.samples, t), view);
  const unitOf = (key: PanelKey): Unit | undefined => unitIn(frame, key);
  const others = (channel: "x" | "v"): CursorReading[] =>
    overlays.flatMap((overlay) => overlayReading(view, frame, t, overlay, channel) ?? []);
  return {
    displacement: [
      // The band is drawn: beside the panel it makes room for what is compared.
      ...displacementReadings(view, here, unitOf("displacement")).filter(
        ({ tone }) => tone !== "band" || overlays.length === 0,
      ),
      ...others("x"),
    ],
    velocity: [
      reading(view, "velocity", here.v, "velocity", "slip", { unit: unitOf("velocity") }),
      ...(unitOf("acceleration") ? [] : [reading(view, "acceleration", here.a, "acceleration", "ink")]),
      ...others("v"),
    ],
    acceleration: [reading(view, "acceleration", here.a, "acceleration", "slip", { unit: unitOf("acceleration") })],
    friction: frictionReadings(view, here, unitOf("friction")),
    drive: view.drive
      ? [reading(view, view.drive.name, view.drive.at(here), "force", "ink", { unit: unitOf("drive") })]
      : [],
  };
}

/** Share of a channel's peak below which a figure is what sums leave of a zero. */
const NOISE = 1e-10;

function withoutNoise(here: Instant, { peaks }: RunView): Instant {
  const clean = (channel: "x" | "v" | "a" | "f"): number =>
    Math.abs(here[channel]) <= NOISE * peaks[channel] ? 0 : here[channel];
  return { ...here, x: clean("x"), v: clean("v"), a: clean("a"), f: clean("f") };
}

const unitIn = (frame: Frame, key: PanelKey): Unit | undefined => frame.panels.find((panel) => panel.key === key)?.unit;

/** Displacement or velocity of another motion at the cursor; null beyond its end. */
export function overlayReading(
  view: RunView,
  frame: Frame,
  t: number,
  overlay: Overlay,
  channel: "x" | "v",
): CursorReading | null {
  const there = overlayAt(overlay, t);
  const key = channel === "x" ? "displacement" : "velocity";
  return there && reading(view, overlay.label, there[channel], key, "quiet", { unit: unitIn(frame, key) });
}

function displacementReadings(view: RunView, { t, x }: Instant, unit: Unit | undefined): CursorReading[] {
  const { scenario, inputs } = view;
  const own = reading(view, nounOf(scenario), x, "displacement", "slip", { unit });
  const band = inputs.restBand === null ? [] : [bandReading(view, inputs.restBand)];
  if (scenario.base.length === 0) return [own, ...band];
  const y = inputs.base(t);
  const isBehind = view.scenario.base.some(({ kind }) => kind === "ramp");
  return [
    own,
    reading(view, "drive", y, "displacement", "quiet", { unit }),
    reading(view, isBehind && x < y ? "behind drive" : "ahead of drive", x - y, "displacement", "ink"),
    ...band,
  ];
}

function bandReading(view: RunView, restBand: number): CursorReading {
  const band = reading(view, "rest band", restBand, "displacement", "band", { digits: 3 });
  return { ...band, text: `±${band.text}` };
}

function frictionReadings(view: RunView, { t, f, v, phase }: Instant, unit: Unit | undefined): CursorReading[] {
  const { scenario, inputs } = view;
  const { counterface } = scenario.contact;
  const own = reading(view, "friction", f, "force", phase === 0 ? "stick" : "slip", { unit });
  const hold = inputs.hold(t);
  const holding = hold > 0 ? [reading(view, "holds up to", hold, "force", "stick")] : [];
  if (counterface === "base") return [own, ...holding];
  const sliding = v - (typeof counterface === "object" ? counterface.velocity : 0);
  const heat = phase === 0 ? 0 : -f * sliding;
  return [own, reading(view, "heat in contact", heat, "power", "ink", { digits: 3 }), ...holding];
}

function reading(
  { scenario }: RunView,
  name: string,
  value: number,
  dimension: Dimension,
  tone: CursorReading["tone"],
  options: { unit?: Unit; digits?: number } = {},
): CursorReading {
  return { name, tone, ...readQuantity(value, { dimension, motion: scenario.motion }, { digits: 4, ...options }) };
}

/** "slipping forward for 13.2 ms": the phase at a time and how long it has lasted. */
export function phaseWords({ intervals, scenario }: RunView, t: number): { phase: string; since: string } {
  const interval = intervals.find(({ from, to }) => t >= from && t < to) ?? intervals[intervals.length - 1];
  if (!interval) return { phase: "", since: "" };
  const words = { [-1]: "slipping back", 0: "stuck", 1: "slipping forward" }[interval.phase];
  const lasted = Math.max(0, t - interval.from);
  return {
    phase: words,
    since: lasted > 0 ? ` for ${say(lasted, { dimension: "time", motion: scenario.motion })}` : "",
  };
}
