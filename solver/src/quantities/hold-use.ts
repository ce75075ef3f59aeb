import type { Quantity } from "./quantity.ts";
import type { Reading } from "./reading.ts";

export const holdUse: Quantity = {
  name: "holdUse",
  label: "Use of the hold",
  dimension: "none",
  signed: false,
  meaning: "largest |needed force|/(μs N r) over all time stuck, 1 at break-away; instants with N = 0 left out",
  absent: "the body is never held by friction, or its law has no rest",
  whole: ["holdShare"],
  value: (reading) => {
    if (reading.problem.law.bristle !== undefined) return null;
    if (breaksAway(reading)) return 1;
    const most = reading.whole.max("holdShare");
    // Held means up to a hair more than μs N r: that hair is rounding.
    return most < 0 ? null : Math.min(1, most);
  },
};

/** True where a hold was used up: a break-away with friction at hand. */
function breaksAway(reading: Reading): boolean {
  if (reading.problem.law.atRest === 0) return false;
  return reading.breakAways.some((t) => reading.at(t).normal > 0);
}
