/**
 * The points of a curve worth drawing between two times: of each of `count`/4 equal stretches its first, lowest, highest
 * and last sample, and every one whose index is in `keep`. Extremes of the curve are never lost.
 */
export function thinned(
  times: Float64Array,
  values: Float64Array,
  range: { from: number; to: number },
  count: number,
  keep: readonly number[] = [],
): Int32Array {
  const first = Math.max(0, firstAtLeast(times, range.from) - 1);
  const end = Math.min(times.length, firstAtLeast(times, range.to) + 1);
  if (end - first <= count) return Int32Array.from({ length: end - first }, (_, i) => first + i);
  const kept = new Set<number>();
  const stretches = Math.max(1, Math.floor(count / 4));
  for (let s = 0; s < stretches; s++) {
    const from = first + Math.floor((s * (end - first)) / stretches);
    const to = first + Math.floor(((s + 1) * (end - first)) / stretches);
    for (const index of extremes(values, from, to)) kept.add(index);
  }
  for (const index of keep) if (index >= first && index < end) kept.add(index);
  return Int32Array.from(kept).sort();
}

function extremes(values: Float64Array, from: number, to: number): number[] {
  if (to <= from) return [];
  let low = from;
  let high = from;
  for (let i = from + 1; i < to; i++) {
    if (values[i] < values[low]) low = i;
    if (values[i] > values[high]) high = i;
  }
  return [from, low, high, to - 1];
}

/** Index of the first time that is not before t; the length where there is none. */
function firstAtLeast(times: Float64Array, t: number): number {
  let low = 0;
  let high = times.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (times[middle] < t) low = middle + 1;
    else high = middle;
  }
  return low;
}
