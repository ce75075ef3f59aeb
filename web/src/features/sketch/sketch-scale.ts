import { fromSi, type Measure, type Unit } from "../../format/unit.ts";
import { unitFor } from "../../format/units.ts";
import type { SketchState } from "./sketch-state.ts";

/** The scale under the sketch, in the unit it is read in. */
export interface SketchScale {
  readonly unit: Unit;
  readonly low: number;
  readonly high: number;
  readonly ticks: readonly number[];
}

/** Four to six round steps that span what the run reaches; of no motion and no band, a millimetre to each side. */
export function sketchScale({ range, scenario }: Pick<SketchState, "range" | "scenario">): SketchScale {
  const measure: Measure = { dimension: "displacement", motion: scenario.motion };
  const isEmpty = range.low === range.high;
  const [from, to] = isEmpty ? [range.low - 1e-3, range.high + 1e-3] : [range.low, range.high];
  const unit = unitFor(Math.max(Math.abs(from), Math.abs(to)), measure);
  const [first, last] = [fromSi(from, unit), fromSi(to, unit)];
  const step = roundStep((last - first) / 4);
  const count = (value: number): number => value / step;
  const [start, end] = [Math.floor(count(first) + 1e-9), Math.ceil(count(last) - 1e-9)];
  const ticks = Array.from({ length: end - start + 1 }, (_, i) => (start + i) * step);
  return { unit, low: ticks[0], high: ticks[ticks.length - 1], ticks };
}

/** The smallest of 1, 2 and 5 times a power of ten that is not below a step. */
function roundStep(step: number): number {
  const power = 10 ** Math.floor(Math.log10(step));
  const factor = [1, 2, 5, 10].find((each) => each * power >= step * (1 - 1e-9)) ?? 10;
  return factor * power;
}

/** How far the body is drawn from its middle place, `most` px at the ends of its range: to scale with it, larger than life. */
export function shiftOf({ place, range }: Pick<SketchState, "place" | "range">, most: number): number {
  const reach = Math.max(Math.abs(range.low), Math.abs(range.high));
  return reach === 0 ? 0 : most * Math.max(-1, Math.min(1, place / reach));
}
