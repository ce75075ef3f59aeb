import { isConstantFrom } from "./quantities/drive.ts";
import type { Reading } from "./quantities/reading.ts";
import type { Ended, Outcome } from "./result.ts";
import { isRisingOver, trendOf, type Trend } from "./trend.ts";

/** True where a run was stopped before it came to its own end. */
export function isCutOff(ended: Ended): boolean {
  return ended === "max-events" || ended === "max-work" || ended === "cancelled";
}

/**
 * How a run is judged: the first that applies of never-moved, came-to-rest, too-short, growing, stick-slip, settles,
 * not-settled and smooth-sliding. Null for a run that was cut off.
 */
export function outcomeOf(reading: Reading): Outcome | null {
  const { motion } = reading;
  if (isCutOff(motion.ended)) return null;
  return outcomeOfStick(reading) ?? outcomeOfMotion(reading);
}

/** Of a run that ends in a stick, where the next break-away tells. */
function outcomeOfStick({ motion, breakAways, steadyBreakAways }: Reading): Outcome | null {
  const { nextBreakAway: next } = motion;
  if (motion.phase(motion.count - 1) !== 0 || Number.isNaN(next)) return null;
  if (next < Infinity) return steadyBreakAways.length < 2 ? "too-short" : null;
  return motion.phase(0) === 0 && breakAways.length === 0 ? "never-moved" : "came-to-rest";
}

function outcomeOfMotion(reading: Reading): Outcome {
  const isStopping = reading.steadyStops.length > 0;
  // What does not swing further from part to part does not grow: of a body that stops no more need be known, which is most of the work.
  if (isStopping && !isRisingOver(reading.parts)) return "stick-slip";
  const trend = trendOf(reading);
  if (grows(trend)) return "growing";
  if (isStopping) return "stick-slip";
  if (settles(reading)) return "settles";
  return isSteady(trend) || runsEvenly(reading) ? "smooth-sliding" : "not-settled";
}

function grows({ isRising, limit, amplitudes, isNothing }: Trend): boolean {
  return isRising && (limit === null || limit > 2 * amplitudes[amplitudes.length - 1]) && !isNothing();
}

/** Left alone, the body slows down without ever stopping. */
function settles(reading: Reading): boolean {
  const { end } = reading.motion;
  if (reading.stops.length > 0 || !isConstantFrom(reading.problem, end)) return false;
  return lastTenth(reading, "slip").peak("slip") < 1e-3 * reading.whole.peak("slip");
}

/** Neither the amplitude nor the mean has 2 % left to go. */
function isSteady({ amplitudes, limit, amplitude, mean, halves, isNothing }: Trend): boolean {
  const room = 0.02 * Math.max(amplitude, Math.abs(mean));
  const last = amplitudes[amplitudes.length - 1];
  const drift = limit === null ? Math.max(...amplitudes) - Math.min(...amplitudes) : Math.abs(limit - last);
  return Math.abs(halves[1] - halves[0]) <= room && (drift <= room || isNothing());
}

/** The velocity of the last tenth of the run varies by less than 2 % of its mean. */
function runsEvenly(reading: Reading): boolean {
  const late = lastTenth(reading, "velocity");
  return 2 * late.halfSwing("velocity") < 0.02 * Math.abs(late.mean("velocity"));
}

function lastTenth(reading: Reading, channel: "slip" | "velocity") {
  const { end } = reading.motion;
  return reading.over(0.9 * end, end, channel);
}
