import type { Problem } from "../scenario/problem.ts";
import { isFed, isPeriodic, lowestHz } from "./drive.ts";

/** The stretch of a run that stands for how it goes on. */
export interface SteadyWindow {
  readonly kind: "periodic" | "feed" | "whole";
  readonly from: number;
  readonly to: number;
  /** Number of equal parts the trend is read from: the ten periods of a periodic window, else quarters. */
  readonly parts: 4 | 10;
}

const periods = 10;

/**
 * The steady window of a run that ended at `end` s. All inputs constant or harmonic and one at least harmonic: the last ten
 * periods of the lowest frequency, the whole run if that is shorter. Else a feed of the base, or a belt: the last half.
 * Else the whole run.
 */
export function steadyWindow(problem: Problem, end: number): SteadyWindow {
  if (isPeriodic(problem)) return periodicWindow(periods / (lowestHz(problem) as number), end);
  if (isFed(problem) || problem.counterface === "belt") return { kind: "feed", from: end / 2, to: end, parts: 4 };
  return { kind: "whole", from: 0, to: end, parts: 4 };
}

function periodicWindow(length: number, end: number): SteadyWindow {
  // A run of exactly ten periods is one, however its length was rounded.
  const isLongEnough = end >= length * (1 - 1e-12);
  return { kind: "periodic", from: Math.max(0, end - length), to: end, parts: isLongEnough ? periods : 4 };
}
