import type { Samples } from "@restband/solver";
import { ahead, indexAt } from "../../compute/instant.ts";
import type { Measure } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";
import { padded, type PanelKey, type PanelScale } from "./frame.ts";
import type { Overlay } from "./overlay.ts";
import type { RunView } from "./run-view.ts";
import type { Extra } from "./use-panels.ts";

interface Range {
  from: number;
  to: number;
}

/** The panels' ranges and units for a part of a run, from top to bottom; `extras` are those asked for beside the usual three. */
export function scalesOf(
  view: RunView,
  range: Range,
  extras: readonly Extra[] = [],
  overlays: readonly Overlay[] = [],
): PanelScale[] {
  const { samples, scenario } = view;
  const measure = (dimension: Measure["dimension"]): Measure => ({ dimension, motion: scenario.motion });
  const others = (channel: "x" | "v"): number[] =>
    overlays.flatMap((overlay) => extremesOf(overlay.samples, channel, range));
  return [
    scale(
      "displacement",
      [...extremesOf(samples, "x", range), ...others("x"), ...bandEdges(view, range)],
      measure("displacement"),
    ),
    scale(
      "velocity",
      [0, ...extremesOf(samples, "v", range), ...others("v"), ...driveSpeed(view)],
      measure("velocity"),
    ),
    ...(extras.includes("acceleration")
      ? [scale("acceleration", [0, ...extremesOf(samples, "a", range)], measure("acceleration"))]
      : []),
    scale("friction", [0, ...frictionExtremes(view, range)], measure("force")),
    ...(extras.includes("drive") && view.drive
      ? [scale("drive", [0, ...driveExtremes(view, range)], measure("force"))]
      : []),
  ];
}

/** Of the applied force all corners count, of what comes through the spring the samples. */
export function driveExtremes({ drive, samples }: RunView, range: Range): [number, number] {
  let [low, high] = [0, 0];
  for (const { force } of drive?.between(samples, range) ?? []) {
    low = Math.min(low, force);
    high = Math.max(high, force);
  }
  return [low, high];
}

function scale(key: PanelKey, values: number[], measure: Measure): PanelScale {
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const unit = unitFor(Math.max(Math.abs(low), Math.abs(high)), measure);
  return { key, ...padded(low, high, unit.factor), unit };
}

/** Lowest and highest of a channel in a part of a run; of a and f, which jump at events, to both sides of the jump. */
export function extremesOf(samples: Samples, channel: "x" | "v" | "a" | "f", { from, to }: Range): [number, number] {
  const { t, phase, [channel]: values } = samples;
  const canJump = channel === "a" || channel === "f";
  let low = Infinity;
  let high = -Infinity;
  const first = indexAt(t, from);
  const last = indexAt(t, to);
  for (let i = first; i <= last; i++) {
    const isEvent = canJump && i > first && phase[i - 1] !== phase[i];
    const before = isEvent ? ahead(t, values, phase, i - 1, t[i]) : values[i];
    low = Math.min(low, values[i], before);
    high = Math.max(high, values[i], before);
  }
  return [low, high];
}

function bandEdges(view: RunView, range: Range): number[] {
  const { equilibrium, restBand } = view.inputs;
  const times = view.inputs.times(range.from, range.to);
  if (restBand === null || times === null) return [];
  return times.flatMap((t) => {
    const centre = equilibrium(t);
    return centre === null ? [] : [centre - restBand, centre + restBand];
  });
}

/** The speed of a steady feed or belt: drawn beside the body's own. */
export function driveSpeed({ scenario }: RunView): number[] {
  const feed = scenario.base.find((term) => term.kind === "ramp");
  if (feed?.kind === "ramp") return [feed.rate];
  const { counterface } = scenario.contact;
  return typeof counterface === "object" ? [counterface.velocity] : [];
}

/** What friction can hold belongs to the picture where the friction comes near it. */
export function frictionExtremes({ samples, inputs }: RunView, range: Range): number[] {
  const [low, high] = extremesOf(samples, "f", range);
  const hold = inputs.hold(range.from);
  const isNear = hold <= 3 * Math.max(Math.abs(low), Math.abs(high));
  return [low, high, ...(isNear && low < 0 ? [-hold] : []), ...(isNear && high > 0 ? [hold] : [])];
}
