import { energyChannels, energyOf } from "./energy.ts";
import { verdictOn } from "./limits.ts";
import type { Motion } from "./motion/motion.ts";
import { notesOf } from "./notes.ts";
import { outcomeOf } from "./outcome.ts";
import { quantities, quantityOf } from "./quantities/index.ts";
import type { Quantity } from "./quantities/quantity.ts";
import { Reading } from "./quantities/reading.ts";
import type { Result } from "./result.ts";
import type { Limit } from "./scenario/scenario.ts";

/** What of a run is wanted. Quantities that limits name are always computed. */
export interface Asked {
  /** Names of quantities; all where absent. Throws RangeError at a name that is none. */
  readonly quantities?: readonly string[];
  readonly energy: boolean;
}

export type Judgement = Pick<Result, "outcome" | "notes" | "limits" | "quantities" | "energy">;

/** What a run comes to, whatever the method that made it; only what is asked is computed. */
export function judge(motion: Motion, asked: Asked): Judgement {
  const { limits } = motion.problem;
  const wanted = wantedOf(asked, limits);
  const reading = readingFor(motion, wanted, asked.energy);
  const values = Object.fromEntries(wanted.map((quantity) => [quantity.name, valueOf(quantity, reading)]));
  const outcome = outcomeOf(reading);
  return {
    outcome,
    notes: notesOf(reading, outcome),
    limits: limits.map((limit) => verdictOn(limit, values[limit.quantity], motion.ended)),
    quantities: values,
    ...(asked.energy ? { energy: energyOf(reading) } : {}),
  };
}

function wantedOf(asked: Asked, limits: readonly Limit[]): readonly Quantity[] {
  if (asked.quantities === undefined) return quantities;
  const names = new Set([...asked.quantities, ...limits.map(({ quantity }) => quantity)]);
  return [...names].map(quantityOf);
}

/** Each window is surveyed once, for all channels wanted together. */
function readingFor(motion: Motion, wanted: readonly Quantity[], withEnergy: boolean): Reading {
  const whole = wanted.flatMap((quantity) => quantity.whole ?? []);
  const steady = wanted.flatMap((quantity) => quantity.steady ?? []);
  return new Reading(motion, [...whole, ...(withEnergy ? energyChannels : [])], steady);
}

/** A number that came out beyond the range of doubles has no value to show. */
function valueOf(quantity: Quantity, reading: Reading): number | null {
  const value = quantity.value(reading);
  // 0 + turns −0 into 0.
  return value !== null && Number.isFinite(value) ? 0 + value : null;
}
