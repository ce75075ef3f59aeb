import type { Samples } from "@restband/solver";
import { indexAt } from "../../compute/instant.ts";
import { nounOf } from "../../format/noun.ts";
import type { Measure, Unit } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";
import { densified } from "./densified.ts";
import { padded } from "./frame.ts";
import { fromDrive, lastCycles, phaseChanges, type RunView } from "./run-view.ts";
import { driveSpeed, extremesOf, frictionExtremes } from "./scales.ts";
import type { Range } from "./part-of-run.ts";

/** One axis of a loop: range in SI, unit, and what is measured along it. */
export interface LoopAxis {
  readonly name: string;
  readonly measure: Measure;
  readonly low: number;
  readonly high: number;
  /** What the body itself reaches. */
  readonly extremes: readonly [number, number];
  readonly unit: Unit;
}

/** What both loops share: the part of the run they show and where the body is in it. */
export interface LoopPart {
  readonly range: Range;
  /** What part it is, in words. */
  readonly words: string;
  readonly samples: Samples;
  /** Displacement, or distance from the drive, of each sample; m (rad). */
  readonly places: Float64Array;
  /** The samples within at which a new phase begins. */
  readonly events: readonly number[];
  readonly across: LoopAxis;
}

/** A loop: something of the body over where the body is. */
export interface LoopFrame {
  readonly key: "velocity" | "friction";
  readonly title: string;
  readonly across: LoopAxis;
  readonly upright: LoopAxis;
}

/** The last cycles where the whole run is seen and has cycles; else what is seen. */
export function loopPart(view: RunView, seen: Range): LoopPart {
  const isWhole = seen.from === 0 && seen.to === view.end;
  const last = isWhole ? lastCycles(view) : null;
  const range = last ?? seen;
  const samples = cut(densified(view.samples, range), range);
  const places = samples.t.map((t, i) => fromDrive(view, { t, x: samples.x[i] }));
  return {
    range,
    words: last ? "last cycles" : isWhole ? "whole run" : "the part seen above",
    samples,
    places,
    events: phaseChanges(samples),
    across: placeAxis(view, places),
  };
}

function cut(samples: Samples, { from, to }: Range): Samples {
  const before = indexAt(samples.t, from);
  const first = samples.t[before] < from ? before + 1 : before;
  const end = indexAt(samples.t, to) + 1;
  const part = (values: Float64Array): Float64Array => values.subarray(first, end);
  const { t, x, v, a, f, phase } = samples;
  return { t: part(t), x: part(x), v: part(v), a: part(a), f: part(f), phase: part(phase) };
}

function placeAxis({ scenario }: RunView, places: Float64Array): LoopAxis {
  const name = scenario.base.length > 0 ? "from the drive" : scenario.motion === "angular" ? "angle" : "displacement";
  const low = places.reduce((least, place) => Math.min(least, place), Infinity);
  const high = places.reduce((most, place) => Math.max(most, place), -Infinity);
  return axisOf(name, { dimension: "displacement", motion: scenario.motion }, [low, high]);
}

/** Velocity, and friction, over where the body is; both over the same range. */
export function loopFrames(view: RunView, { samples, range, across }: LoopPart): readonly [LoopFrame, LoopFrame] {
  const { motion } = view.scenario;
  const speeds = extremesOf(samples, "v", range);
  const forces = extremesOf(samples, "f", range);
  const held = frictionExtremes({ ...view, samples }, range);
  return [
    {
      key: "velocity",
      title: "Phase plane",
      across,
      upright: axisOf("velocity", { dimension: "velocity", motion }, speeds, [0, ...driveSpeed(view)]),
    },
    {
      key: "friction",
      title: "Force against displacement",
      across,
      upright: axisOf(`friction on the ${nounOf(view.scenario)}`, { dimension: "force", motion }, forces, held),
    },
  ];
}

/** An axis for what the body reaches and for what it is measured against. */
function axisOf(
  name: string,
  measure: Measure,
  extremes: readonly [number, number],
  references: readonly number[] = [],
): LoopAxis {
  const [low, high] = [Math.min(...extremes, ...references), Math.max(...extremes, ...references)];
  const unit = unitFor(Math.max(Math.abs(low), Math.abs(high)), measure);
  return { name, measure, unit, extremes, ...padded(low, high, unit.factor) };
}
