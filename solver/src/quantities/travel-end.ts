import type { Travel } from "../excitation/excitation-term.ts";
import type { Problem } from "../scenario/problem.ts";
import type { Reading } from "./reading.ts";

/** Travels of the base in time order, those a run is judged by. */
export function travelsOf({ base }: Problem): readonly Travel[] {
  return base.flatMap(({ travels }) => travels).sort((a, b) => a.from - b.from);
}

/** When the last move of the base ends, s; null where the base does not travel, or not to an end within the run. */
export function travelEnd({ problem, motion }: Reading): number | null {
  const travels = travelsOf(problem);
  const end = Math.max(...travels.map(({ to }) => to));
  return travels.length === 0 || end > motion.end ? null : end;
}
