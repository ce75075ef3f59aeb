import FFT from "fft.js";

/** The lines of an amplitude spectrum, evenly apart from 0 Hz up to half the rate of the values. */
export interface Spectrum {
  /** Distance between lines, 1/(the window's length), Hz. */
  readonly step: number;
  /** Per line the amplitude a harmonic there has, in the unit of the values; 0 at 0 Hz: the mean is taken off. */
  readonly amplitudes: Float64Array;
}

/** A peak of a spectrum, read between its lines. */
export interface SpectralPeak {
  readonly hz: number;
  /** Amplitude of the harmonic (half its peak-to-peak), in the unit of the values. */
  readonly amplitude: number;
}

/**
 * Amplitude spectrum of evenly spaced values over `seconds` (the first at its beginning, none at its end), seen through a
 * Hann window w = (1 − cos 2πi/n)/2. Lines are |X|·2/Σw (Σw/n = 1/2 is the window's coherent gain): a harmonic with whole
 * periods in the window stands at its line with its amplitude to rounding, half of it in the lines to either side, and 0
 * elsewhere. Between two lines it shows up to 1 − 8/(3π) = 15.1 % too low; `spectralPeaks` makes that good. The mean, as
 * the window weighs it, is taken off beforehand. No zeros are added; what swings faster than half the rate of the values is folded back.
 *
 * @param values their number a power of two, at least 4; else RangeError.
 * Source: F. J. Harris, Proc. IEEE 66 (1978) 51, for window and gain, from memory.
 */
export function amplitudeSpectrum(values: Float64Array, seconds: number): Spectrum {
  const n = values.length;
  if (n < 4 || (n & (n - 1)) !== 0) throw new RangeError(`a spectrum takes 4, 8, 16 … values, not ${n}`);
  const window = Float64Array.from(values, (_, i) => (1 - Math.cos((2 * Math.PI * i) / n)) / 2);
  const mean = values.reduce((sum, value, i) => sum + window[i] * value, 0) / (n / 2);
  const seen = Float64Array.from(values, (value, i) => window[i] * (value - mean));
  const transform = new FFT(n);
  const lines = transform.createComplexArray() as number[];
  transform.realTransform(lines, seen);
  const amplitudes = Float64Array.from(
    { length: n / 2 },
    (_, k) => Math.hypot(lines[2 * k], lines[2 * k + 1]) / (n / 4),
  );
  amplitudes[0] = 0;
  return { step: 1 / seconds, amplitudes };
}

/** The two lines beside a peak belong to it: a Hann window is four lines wide. */
const reach = 2;

/**
 * The highest peaks, `most` at most and none below `least` (a share of the highest), in the order of frequency; of what has
 * less than two periods in the window a line tells nothing. Frequency
 * and amplitude are read from the highest line and its higher neighbour: with α their ratio, the peak lies
 * δ = (2α − 1)/(α + 1) beyond the line and is πδ(1 − δ²)/sin πδ as high: true of a harmonic that stands alone, and near one
 * as far as its neighbours lie more than four lines away.
 *
 * Source: T. Grandke, IEEE Trans. IM-32 (1983) 350, for the Hann window, from memory.
 */
export function spectralPeaks({ step, amplitudes }: Spectrum, most: number, least: number): SpectralPeak[] {
  const floor = least * amplitudes.reduce((highest, each) => Math.max(highest, each), 0);
  const tops: number[] = [];
  for (let k = reach; k + 1 < amplitudes.length; k++) {
    if (amplitudes[k] > floor && isTop(amplitudes, k)) tops.push(k);
  }
  return tops
    .sort((a, b) => amplitudes[b] - amplitudes[a])
    .slice(0, most)
    .map((k) => between(amplitudes, k, step))
    .sort((a, b) => a.hz - b.hz);
}

/** Of equal lines the first is the top. */
function isTop(amplitudes: Float64Array, k: number): boolean {
  for (let d = 1; d <= reach; d++) {
    if (amplitudes[k] <= amplitudes[k - d] || amplitudes[k] < (amplitudes[k + d] ?? 0)) return false;
  }
  return true;
}

function between(amplitudes: Float64Array, k: number, step: number): SpectralPeak {
  const side = amplitudes[k + 1] > amplitudes[k - 1] ? 1 : -1;
  const ratio = amplitudes[k + side] / amplitudes[k];
  const beyond = (2 * ratio - 1) / (ratio + 1);
  // The limit at a whole line is 1; closer than this a quotient of roundings would stand for it.
  const rise = Math.abs(beyond) < 1e-9 ? 1 : (Math.PI * beyond * (1 - beyond ** 2)) / Math.sin(Math.PI * beyond);
  return { hz: (k + side * beyond) * step, amplitude: amplitudes[k] * rise };
}
