import type { Samples, Scenario } from "@restband/solver";
import { instantAt, type Instant } from "../../compute/instant.ts";
import type { Inputs } from "../../compute/inputs.ts";

/** A scenario at one instant, as the sketch draws it; SI. */
export interface SketchState {
  readonly scenario: Scenario;
  readonly here: Instant;
  /** What the scale beneath measures: d = x − y where the base moves, x elsewhere. */
  readonly place: number;
  /** Middle of the rest band on that scale, and half its width; null without a spring or without friction. */
  readonly band: { readonly centre: number; readonly half: number } | null;
  /** The applied force at the instant, N (N·m). */
  readonly force: number;
  /** The lowest and highest place of the run, the rest band counted in. */
  readonly range: { readonly low: number; readonly high: number };
}

/** True where the sketch and its scale stand on the base that moves. */
export const isToldOfBase = ({ base }: Scenario): boolean => base.length > 0;

/** What of a run the sketch's scale spans; worked out once a run. */
export function sketchRange(scenario: Scenario, inputs: Inputs, samples: Samples): SketchState["range"] {
  let [low, high] = [0, 0];
  const see = (place: number): void => {
    low = Math.min(low, place);
    high = Math.max(high, place);
  };
  const { t, x } = samples;
  for (let i = 0; i < t.length; i++) {
    see(placeAt(scenario, inputs, t[i], x[i]));
    const band = bandAt(scenario, inputs, t[i]);
    if (band) see(band.centre - band.half);
    if (band) see(band.centre + band.half);
  }
  return { low, high };
}

export function sketchState(
  scenario: Scenario,
  inputs: Inputs,
  samples: Samples,
  range: SketchState["range"],
  t: number,
): SketchState {
  const here = instantAt(samples, t);
  return {
    scenario,
    here,
    place: placeAt(scenario, inputs, t, here.x),
    band: bandAt(scenario, inputs, t),
    force: inputs.force(t),
    range,
  };
}

const originAt = (scenario: Scenario, inputs: Inputs, t: number): number =>
  isToldOfBase(scenario) ? inputs.base(t) : 0;

const placeAt = (scenario: Scenario, inputs: Inputs, t: number, x: number): number => x - originAt(scenario, inputs, t);

function bandAt(scenario: Scenario, inputs: Inputs, t: number): SketchState["band"] {
  const middle = inputs.equilibrium(t);
  if (inputs.restBand === null || middle === null) return null;
  return { centre: middle - originAt(scenario, inputs, t), half: inputs.restBand };
}
