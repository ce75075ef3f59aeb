import type { Outcome, Scenario } from "@restband/solver";
import { formatNumber } from "../../../format/format-number.ts";
import { say } from "../../../format/format-quantity.ts";
import { capitalised, sayCount } from "../../../format/words.ts";
import { channelName, type RunSpectrum } from "./run-spectrum.ts";
import { FEWEST_PERIODS, type SpectrumWindow, type WindowPart } from "./spectrum-window.ts";

const hz = { dimension: "frequency", motion: "linear" } as const;
const seconds = { dimension: "time", motion: "linear" } as const;

/** A frequency as a multiple of the rate it is compared with, "3"; null without a rate. */
export function orderOf(frequency: number, { rate }: SpectrumWindow): string | null {
  if (!rate) return null;
  const order = frequency / rate.hz;
  const isWhole = Math.abs(order - Math.round(order)) < 5e-4 && Math.round(order) > 0;
  return isWhole ? String(Math.round(order)) : formatNumber(order, 3);
}

/** "the last 10 periods of the drive". */
export function windowWords({ from, rate, periods }: SpectrumWindow, part: WindowPart): string {
  const within = part === "seen" ? " of what is seen above" : "";
  if (!rate || periods === null) {
    if (part === "seen") return "what is seen above";
    return from === 0 ? "the whole run" : "the steady part of the run";
  }
  if (rate.name === "stick–slip") return `${periods} cycles from break-away to break-away${within}`;
  return periods === 1
    ? `the last period of the ${rate.name}${within}`
    : `the last ${periods} periods of the ${rate.name}${within}`;
}

/** The spectrum in words, for those who cannot see it: its window, and its peaks from the highest down. */
export function spectrumWords(spectrum: RunSpectrum, scenario: Scenario, part: WindowPart): string {
  const { channel, measure, window, peaks } = spectrum;
  const begin = `Spectrum of the ${channelName(scenario, channel)} over ${windowWords(window, part)}`;
  if (peaks.length === 0) return `${begin}: nothing swings.`;
  const told = [...peaks]
    .sort((a, b) => b.amplitude - a.amplitude)
    .map(({ hz: frequency, amplitude }) => {
      const order = orderOf(frequency, window);
      const compared = order === null ? "" : `, order ${order}`;
      return `${say(frequency, hz, { digits: 4 })}${compared}, ${say(amplitude, measure)}`;
    });
  return `${begin}. ${ordersWords(window)}Peaks, highest first: ${told.join("; ")}.`;
}

/** What orders are multiples of, as a sentence; empty without a rate. */
const ordersWords = ({ rate }: SpectrumWindow): string =>
  rate ? `Orders are multiples of the ${rate.name}'s ${say(rate.hz, hz, { digits: 4 })}. ` : "";

/** How the spectrum was made, and what it can and cannot tell; one sentence each. */
export function methodSentences({ window, step }: RunSpectrum, outcome: Outcome | null, part: WindowPart): string[] {
  const { from, to, count, periods, rate } = window;
  return [
    `Window: ${windowWords(window, part)}, ${say(from, seconds, { digits: 4 })} to ${say(to, seconds, { digits: 4 })}, ` +
      `at ${formatNumber(count, 7)} even instants.`,
    "It is weighted after Hann, and what that takes off is put back (coherent gain 1/2): a harmonic shows its amplitude, half its peak-to-peak. The mean is left out.",
    `${ordersWords(window)}Lines stand ${say(step, hz, { digits: 4 })} apart; no zeros are added.`,
    periods === null || !rate
      ? "The window is no whole number of periods, so each peak leaks into the lines beside it and may stand up to 15\u00a0% too low. The figures are read between the lines: of a harmonic that stands alone, five lines up or more, to 0.1\u00a0%."
      : `${capitalised(rate.name === "stick–slip" ? "the cycles" : `the periods of the ${rate.name}`)} are whole: multiples of ${rate.name === "stick–slip" ? "their rate" : "its frequency"} stand on lines and leak into the two beside them alone.`,
    ...(periods !== null && periods < FEWEST_PERIODS
      ? [`So few periods tell no order from the next: it takes ${sayCount(FEWEST_PERIODS)}.`]
      : []),
    ...(outcome !== null && unsteady.has(outcome)
      ? ["This motion does not keep its size: a peak tells its mean size over the window, as the window weighs it."]
      : []),
  ];
}

const unsteady: ReadonlySet<Outcome> = new Set(["came-to-rest", "growing", "settles", "not-settled", "too-short"]);
