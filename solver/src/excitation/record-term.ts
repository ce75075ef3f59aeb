import type { KindFault, Rows } from "../field.ts";
import type { RecordPoints, Travel } from "./excitation-term.ts";

/** Points carried inline, or named by the SHA-256 of the little-endian Float64 times, then values. */
export type RecordTerm<Kind extends string> =
  { kind: Kind; times: number[]; values: number[] } | { kind: Kind; digest: string; points: number };

/** More points than this are refused. */
export const maximumPoints = 200_000;

/** Faults of inline points that no single number can tell; those of a stored record were found when it was stored. */
export function recordFaults(term: RecordTerm<string>): readonly KindFault[] {
  if (!("times" in term)) return [];
  const { times, values } = term;
  return [...countFaults(times.length, values.length), ...orderFaults(times)];
}

function countFaults(times: number, values: number): KindFault[] {
  const faults: KindFault[] = [];
  if (times < 2) faults.push({ path: "times", message: `A record has at least two points; it has ${times}.` });
  if (times > maximumPoints)
    faults.push({ path: "times", message: `A record has at most ${maximumPoints} points; it has ${times}.` });
  if (times > 0 && times !== values)
    faults.push({
      path: "values",
      message: `There is one value for each time; there are ${values} for ${times} times.`,
    });
  return faults;
}

function orderFaults(times: readonly number[]): KindFault[] {
  const faults: KindFault[] = [];
  for (let i = 1; i < times.length; i++) {
    if (times[i] <= times[i - 1])
      faults.push({
        path: `times[${i}]`,
        message: `Times rise from point to point; ${times[i]} comes after ${times[i - 1]}.`,
      });
  }
  return faults;
}

export const timesColumn: Rows["columns"][0] = {
  key: "times",
  label: "Time",
  symbol: "t",
  dimension: "time",
  initial: 0,
};

/**
 * Finds the last point at or before t: i with times[i] ≤ t < times[i + 1], −1 before the first, n − 1 from the last on.
 * O(1) where t moves little between calls, else O(log n). The answer depends on t alone; only the effort on the call before.
 */
export function pointFinder(times: Float64Array): (t: number) => number {
  const count = times.length;
  let hint = 0;
  return (t) => {
    if (t < times[0]) return -1;
    if (t >= times[count - 1]) return count - 1;
    if (times[hint] <= t) {
      if (t < times[hint + 1]) return hint;
      if (t < times[hint + 2]) return ++hint;
    }
    let [low, high] = [0, count - 1];
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (times[middle] <= t) low = middle;
      else high = middle;
    }
    hint = low;
    return low;
  };
}

/** Adds the line through point i and the next as a polynomial about t. */
export function addLine(times: Float64Array, values: Float64Array, i: number, t: number, into: Float64Array): void {
  const slope = (values[i + 1] - values[i]) / (times[i + 1] - times[i]);
  into[0] += values[i] + slope * (t - times[i]);
  into[1] += slope;
}

/** Float64Arrays of the points given; throws RangeError where a record comes without any. */
export function pointsOf(points: RecordPoints | undefined): { times: Float64Array; values: Float64Array } {
  if (points === undefined) throw new RangeError("a record is compiled with its points");
  return { times: Float64Array.from(points.times), values: Float64Array.from(points.values) };
}

/** The travels a run is judged by: the first stretch in each direction and the last; a stretch ends where it turns or halts. */
export function travelsOf(times: Float64Array, values: Float64Array): readonly Travel[] {
  const kept: Travel[] = [];
  let last: Travel | null = null;
  for (let from = 0, to = 1; to < times.length; to++) {
    const direction = Math.sign(values[to] - values[from]);
    const goesOn = to + 1 < times.length && Math.sign(values[to + 1] - values[to]) === direction;
    if (goesOn) continue;
    if (direction !== 0) {
      last = { from: times[from], to: times[to], distance: values[to] - values[from] };
      if (!kept.some((travel) => travel.distance * direction > 0)) kept.push(last);
    }
    from = to;
  }
  return last === null || kept.includes(last) ? kept : [...kept, last];
}
