import type { Samples } from "@restband/solver";
import { ahead } from "../../compute/instant.ts";
import { roughlyFromSi, type Unit } from "../../format/unit.ts";

/** A curve as two lines, sliding and stuck, each broken (NaN) where the other goes on. Values in `unit`; along in s, or in the unit of what it is drawn over. */
export interface Curve {
  readonly slip: Line;
  readonly stick: Line;
}

export interface Line {
  readonly x: Float64Array;
  readonly y: Float64Array;
}

type Channel = "x" | "v" | "a" | "f";

/** x and v are continuous; a and f may jump at an event, where both sides are drawn. */
const jumps: Record<Channel, boolean> = { x: false, v: false, a: true, f: true };

/**
 * The samples at `indices` as a curve. `isDense`: too many events to tell stretches apart; everything is then one line.
 * `across`: what it is drawn over instead of time, a value to each sample.
 */
export function curveOf(
  samples: Samples,
  channel: Channel,
  indices: Int32Array,
  unit: Unit,
  isDense: boolean,
  across?: { values: Float64Array; unit: Unit },
): Curve {
  const pens = { slip: new Pen(unit), stick: new Pen(unit) };
  const { phase } = samples;
  const along = (i: number): number => (across ? roughlyFromSi(across.values[i], across.unit) : samples.t[i]);
  const values = samples[channel];
  const penAt = (i: number): Pen => (isDense || phase[i] !== 0 ? pens.slip : pens.stick);
  let pen: Pen | null = null;
  for (let k = 0; k < indices.length; k++) {
    const i = indices[k];
    const next = penAt(i);
    const isEvent = k > 0 && i > 0 && phase[i - 1] !== phase[i] && !isDense;
    if (isEvent && pen) meet(pen, next, pens.slip, along(i), leftOf(samples, channel, i), values[i]);
    else next.add(along(i), values[i]);
    pen = next;
  }
  return { slip: pens.slip.line(), stick: pens.stick.line() };
}

/** The value just before the event at sample i. */
function leftOf(samples: Samples, channel: Channel, i: number): number {
  const values = samples[channel];
  return jumps[channel] ? ahead(samples.t, values, samples.phase, i - 1, samples.t[i]) : values[i];
}

/** One stretch ends and the next begins; the jump between them, if any, is drawn as sliding. */
function meet(before: Pen, after: Pen, sliding: Pen, along: number, left: number, right: number): void {
  before.add(along, left);
  if (before === sliding) before.add(along, right);
  if (before === after) return;
  before.lift();
  if (after === sliding) after.add(along, left);
  after.add(along, right);
}

/** Collects the points of a line. */
class Pen {
  private readonly x: number[] = [];
  private readonly y: number[] = [];
  private readonly unit: Unit;

  constructor(unit: Unit) {
    this.unit = unit;
  }

  add(along: number, value: number): void {
    this.x.push(along);
    this.y.push(roughlyFromSi(value, this.unit));
  }

  lift(): void {
    this.x.push(NaN);
    this.y.push(NaN);
  }

  line(): Line {
    return { x: Float64Array.from(this.x), y: Float64Array.from(this.y) };
  }
}
