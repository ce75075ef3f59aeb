import { describe, expect, it } from "vitest";
import { amplitudeSpectrum, spectralPeaks } from "../../../solver/src/numerics/spectrum.ts";

const turn = 2 * Math.PI;

/** A function of time at `count` instants evenly over `seconds`, the last of them left out. */
const looked = (value: (t: number) => number, seconds = 1, count = 4096): Float64Array =>
  Float64Array.from({ length: count }, (_, i) => value((i * seconds) / count));

const peaksOf = (values: Float64Array, seconds = 1, most = 12) =>
  spectralPeaks(amplitudeSpectrum(values, seconds), most, 1e-9);

describe("an amplitude spectrum", () => {
  it("gives a harmonic with whole periods its amplitude at its line, half of it to either side and nothing elsewhere", () => {
    const { step, amplitudes } = amplitudeSpectrum(
      looked((t) => 7 + 0.03 * Math.cos(turn * 40 * t + 0.4), 2),
      2,
    );
    expect(step).toBe(0.5);
    expect(amplitudes[80]).toBeCloseTo(0.03, 14);
    expect([amplitudes[79], amplitudes[81]]).toEqual([expect.closeTo(0.015, 14), expect.closeTo(0.015, 14)]);
    const others = [...amplitudes.subarray(0, 78), ...amplitudes.subarray(83)];
    expect(Math.max(...others)).toBeLessThan(1e-14);
  });

  it("shows a harmonic half way between two lines 15.1 % too low, and its peak to 0.1 %", () => {
    const values = looked((t) => Math.cos(turn * 200.5 * t + 1));
    const highest = Math.max(...amplitudeSpectrum(values, 1).amplitudes);
    expect(highest).toBeCloseTo(8 / (3 * Math.PI), 4);
    const [peak] = peaksOf(values, 1, 1);
    expect(peak.hz).toBeCloseTo(200.5, 4);
    expect(peak.amplitude).toBeCloseTo(1, 4);
  });

  it("tells two harmonics of unlike height apart, the mean left out", () => {
    const values = looked((t) => 5 + 2 * Math.sin(turn * 50 * t) + 0.001 * Math.cos(turn * 57 * t), 1);
    expect(peaksOf(values)).toEqual([
      { hz: expect.closeTo(50, 9) as number, amplitude: expect.closeTo(2, 11) as number },
      { hz: expect.closeTo(57, 9) as number, amplitude: expect.closeTo(0.001, 11) as number },
    ]);
  });

  it("gives a square wave 4/(πn) at its odd orders (Fourier 1822) and nothing at its even ones", () => {
    // The values fall on both levels alike: at a jump the middle.
    const square = (t: number): number => Math.sign(Number(Math.sin(turn * 16 * t).toFixed(12)));
    const values = looked(square, 1, 65_536);
    const peaks = peaksOf(values, 1, 5);
    expect(peaks.map(({ hz }) => Math.round(hz))).toEqual([16, 48, 80, 112, 144]);
    // What swings faster than half the rate of the values folds back: n = 9 by 7e-6 of itself here.
    for (const { hz, amplitude } of peaks) expect(amplitude / (4 / (Math.PI * (hz / 16)))).toBeCloseTo(1, 4);
    expect(amplitudeSpectrum(values, 1).amplitudes[32]).toBeLessThan(1e-12);
  });

  it("finds no peak in what does not swing, nor in less than two periods", () => {
    expect(peaksOf(looked(() => 3))).toEqual([]);
    expect(peaksOf(looked((t) => Math.sin(turn * t)))).toEqual([]);
  });

  it("names the highest peaks, those too low left out", () => {
    const values = looked(
      (t) => Math.sin(turn * 20 * t) + 0.1 * Math.sin(turn * 90 * t) + 0.5 * Math.sin(turn * 300 * t),
    );
    const spectrum = amplitudeSpectrum(values, 1);
    expect(spectralPeaks(spectrum, 2, 0).map(({ hz }) => Math.round(hz))).toEqual([20, 300]);
    expect(spectralPeaks(spectrum, 9, 0.2).map(({ hz }) => Math.round(hz))).toEqual([20, 300]);
  });

  it("takes no other number of values than a power of two", () => {
    expect(() => amplitudeSpectrum(new Float64Array(6), 1)).toThrow(RangeError);
    expect(() => amplitudeSpectrum(new Float64Array(2), 1)).toThrow(RangeError);
  });
});
