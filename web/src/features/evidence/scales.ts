import type { Samples } from "@restband/solver";
import { indexAt } from "../../compute/instant.ts";
import type { Measure } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";
import { padded, type PanelKey, type PanelScale } from "./frame.ts";
import type { RunView } from "./run-view.ts";

interface Range {
  from: number;
  to: number;
}

/** The panels' ranges and units for a part of a run. */
export function scalesOf(view: RunView, range: Range): PanelScale[] {
  const { samples, scenario } = view;
  const measure = (dimension: Measure["dimension"]): Measure => ({ dimension, motion: scenario.motion });
  return [
    scale("displacement", [...extremesOf(samples, "x", range), ...bandEdges(view, range)], measure("displacement")),
    scale("velocity", [0, ...extremesOf(samples, "v", range), ...driveSpeed(view)], measure("velocity")),
    scale("friction", [0, ...frictionExtremes(view, range)], measure("force")),
  ];
}

function scale(key: PanelKey, values: number[], measure: Measure): PanelScale {
  const [low, high] = [Math.min(...values), Math.max(...values)];
  const unit = unitFor(Math.max(Math.abs(low), Math.abs(high)), measure);
  return { key, ...padded(low, high, unit.factor), unit };
}

function extremesOf(samples: Samples, channel: "x" | "v" | "f", { from, to }: Range): [number, number] {
  const values = samples[channel];
  let low = Infinity;
  let high = -Infinity;
  for (let i = indexAt(samples.t, from); i <= indexAt(samples.t, to); i++) {
    low = Math.min(low, values[i]);
    high = Math.max(high, values[i]);
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
function frictionExtremes({ samples, inputs }: RunView, range: Range): number[] {
  const [low, high] = extremesOf(samples, "f", range);
  const hold = inputs.hold(range.from);
  const isNear = hold <= 3 * Math.max(Math.abs(low), Math.abs(high));
  return [low, high, ...(isNear && low < 0 ? [-hold] : []), ...(isNear && high > 0 ? [hold] : [])];
}
