import {
  amplitudeSpectrum,
  compileProblem,
  isFed,
  spectralPeaks,
  type Samples,
  type Scenario,
  type SpectralPeak,
} from "@restband/solver";
import type { Measure } from "../../../format/unit.ts";
import { inputsOf } from "../../../compute/inputs.ts";
import type { SpectrumWindow } from "./spectrum-window.ts";

/** What of the motion a spectrum is told of. */
export type SpectrumChannel = "displacement" | "velocity" | "acceleration";

export const spectrumChannels = ["displacement", "velocity", "acceleration"] as const;

/** What swings in a part of a run; SI. */
export interface RunSpectrum {
  readonly channel: SpectrumChannel;
  readonly measure: Measure;
  readonly window: SpectrumWindow;
  /** Distance of the lines, Hz. */
  readonly step: number;
  readonly amplitudes: Float64Array;
  readonly highest: number;
  /** Sorted by frequency; empty where nothing swings. */
  readonly peaks: readonly SpectralPeak[];
}

const MOST_PEAKS = 8;
/** Lower than a thousandth of the highest, a peak is no longer of use to anybody. */
const LEAST_SHARE = 1e-3;
/** Below this share of the largest value a swing is rounding. */
const ROUNDING = 1e-10;

/** The spectrum of a run's values at the even instants of a window; null where they are not those. */
export function runSpectrum(
  scenario: Scenario,
  values: Samples | undefined,
  window: SpectrumWindow,
  channel: SpectrumChannel,
): RunSpectrum | null {
  if (values?.t.length !== window.count) return null;
  const seen = valuesOf(scenario, values, channel);
  const { step, amplitudes } = amplitudeSpectrum(seen, window.to - window.from);
  const highest = largestOf(amplitudes);
  const isSwinging = highest > ROUNDING * largestOf(seen);
  return {
    channel,
    measure: { dimension: channel, motion: scenario.motion },
    window,
    step,
    amplitudes,
    highest: isSwinging ? highest : 0,
    peaks: isSwinging ? spectralPeaks({ step, amplitudes }, MOST_PEAKS, LEAST_SHARE) : [],
  };
}

/** Under a feed the place is that from the drive: a ramp has no spectrum. */
function valuesOf(scenario: Scenario, { t, x, v, a }: Samples, channel: SpectrumChannel): Float64Array {
  if (channel === "velocity") return v;
  if (channel === "acceleration") return a;
  if (!isFed(compileProblem(scenario))) return x;
  const { base } = inputsOf(scenario);
  return x.map((place, i) => place - base(t[i]));
}

const largestOf = (values: Float64Array): number => values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);

/** What the channel is called for a body: its displacement is told from the drive where that feeds. */
export function channelName(scenario: Scenario, channel: SpectrumChannel): string {
  if (channel === "displacement" && isFed(compileProblem(scenario))) return "displacement from the drive";
  if (scenario.motion === "linear") return channel;
  return { displacement: "angle", velocity: "angular velocity", acceleration: "angular acceleration" }[channel];
}
