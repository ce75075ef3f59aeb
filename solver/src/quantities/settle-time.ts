import type { Reading } from "./reading.ts";
import type { Quantity } from "./quantity.ts";
import { travelEnd } from "./travel-end.ts";

export const settleTime: Quantity = {
  name: "settleTime",
  label: "Settle time",
  dimension: "time",
  signed: false,
  meaning: "from the end of the last base move to the last time |d| is above the settle band",
  absent: "no settle band is given, the base makes no move that ends in the run, or the body ends outside the band",
  value: (reading) => {
    const { settleBand: band } = reading.problem;
    const moved = travelEnd(reading);
    if (band === null || moved === null || Math.abs(finalDeflection(reading)) > band) return null;
    const last = lastOutside(reading, Math.max(0, moved), band);
    return last === null ? 0 : last - moved;
  },
};

/** d at the end of the run. */
export function finalDeflection(reading: Reading): number {
  return reading.at(reading.motion.end).d;
}

/**
 * The last instant after `from` with |d| > band, to rounding; null without one. |d| is within the band at the end of the
 * run. Halves the stretch that holds it: extremes over a stretch are exact, so that no brief excursion is missed.
 */
function lastOutside(reading: Reading, from: number, band: number): number | null {
  const isOutside = (a: number, b: number) => reading.over(a, b, "deflection").peak("deflection") > band;
  let low = from;
  let high = reading.motion.end;
  if (!isOutside(low, high)) return null;
  for (;;) {
    const middle = low + (high - low) / 2;
    if (middle <= low || middle >= high) return high;
    if (isOutside(middle, high)) low = middle;
    else high = middle;
  }
}
