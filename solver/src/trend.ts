import type { Extent } from "./quantities/extent.ts";
import type { Reading } from "./quantities/reading.ts";

/** Where the motion of the steady window is going: the excursion (x, or d under a feed) in its parts, one after another. */
export interface Trend {
  /** Half peak-to-peak of each part. */
  readonly amplitudes: readonly number[];
  /** What the amplitudes tend to, by Aitken's Δ²; null where their differences do not shrink. */
  readonly limit: number | null;
  /** True where each amplitude is above the one before. */
  readonly isRising: boolean;
  /** True where the last amplitude is but rounding beside the run's peak. To be asked where it matters: it takes a look at the whole run. */
  readonly isNothing: () => boolean;
  /** Half peak-to-peak and mean of the whole window, and the means of its halves. */
  readonly amplitude: number;
  readonly mean: number;
  readonly halves: readonly [number, number];
}

/** Amplitudes that differ by less, relative, count as equal; a last one below this share of the run's peak counts as 0. */
const resolution = 1e-9;

/** Whether each part swings further than the one before. Looks no further than the first that does not. */
export const isRisingOver = (parts: readonly Extent[]): boolean =>
  parts.every((part, i) => i === 0 || isAbove(part.halfSwing("excursion"), parts[i - 1].halfSwing("excursion")));

const isAbove = (value: number, before: number): boolean => value > before * (1 + resolution);

/** Source of the extrapolation: A. C. Aitken 1926, Proc. R. Soc. Edinburgh 46:289 (not held). */
export function trendOf(reading: Reading): Trend {
  const extents = reading.parts;
  const parts = extents.length;
  const amplitudes = extents.map((extent) => extent.halfSwing("excursion"));
  const means = extents.map((extent) => extent.mean("excursion"));
  const highest = Math.max(...extents.map((extent) => extent.max("excursion")));
  const lowest = Math.min(...extents.map((extent) => extent.min("excursion")));
  return {
    amplitudes,
    limit: limitOf(amplitudes),
    isRising: isRisingOver(extents),
    isNothing: () => amplitudes[parts - 1] < resolution * reading.whole.peak("excursion"),
    amplitude: (highest - lowest) / 2,
    mean: average(means),
    halves: [average(means.slice(0, parts / 2)), average(means.slice(parts / 2))],
  };
}

/** a₃ − Δ₂²/(Δ₂ − Δ₁) of the last three; the last where the last two are equal, null where |Δ₂| ≥ |Δ₁|. */
function limitOf(amplitudes: readonly number[]): number | null {
  const [first, second, last] = amplitudes.slice(-3);
  const before = second - first;
  const step = last - second;
  if (Math.abs(step) <= resolution * last) return last;
  return Math.abs(step) < Math.abs(before) ? last - (step * step) / (step - before) : null;
}

function average(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value, 0) / values.length;
}
