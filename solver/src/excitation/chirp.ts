import type { ExcitationTerm, SmoothPart } from "./excitation-term.ts";
import { level, piecewise } from "./piecewise.ts";
import { stillTerm } from "./still-term.ts";

export interface Chirp {
  kind: "chirp";
  amplitude: number;
  fromHz: number;
  toHz: number;
  seconds: number;
  spacing: "linear" | "log";
}

/** A cos(2π ∫f dt) on [0, seconds), zero after: neither polynomial nor harmonic. */
export const chirp: ExcitationTerm<"chirp", Chirp> = {
  kind: "chirp",
  label: "Chirp",
  summary: "sweeps through frequencies once",
  places: ["force"],
  sentence: {
    force: "A force swings by ±{amplitude}, sweeping from {fromHz} to {toHz} within {seconds} on a {spacing} scale",
  },
  fields: [
    { key: "amplitude", label: "Amplitude", dimension: "force", initial: 10 },
    { key: "fromHz", label: "From", dimension: "frequency", exclusiveMinimum: 0, initial: 1 },
    { key: "toHz", label: "To", dimension: "frequency", exclusiveMinimum: 0, initial: 20 },
    { key: "seconds", label: "Within", dimension: "time", exclusiveMinimum: 0, initial: 10 },
  ],
  choices: [
    {
      key: "spacing",
      label: "Scale",
      options: [
        { value: "linear", label: "linear" },
        { value: "log", label: "logarithmic" },
      ],
    },
  ],
  source: "by definition",
  faults: () => [],
  compile: (term) => ({
    ...stillTerm,
    ...piecewise([level(-Infinity, 0), level(0, 0), level(term.seconds, 0)]),
    isConstantFrom: (t) => t >= term.seconds || term.amplitude === 0,
    smooth: sweep(term),
  }),
};

function sweep({ amplitude, fromHz, toHz, seconds, spacing }: Chirp): SmoothPart {
  /** ln(f1/f0) per second; 0 sweeps nothing and is linear as well. */
  const growth = spacing === "log" ? Math.log(toHz / fromHz) / seconds : 0;
  const gain = spacing === "log" ? 0 : (toHz - fromHz) / seconds;
  const hzAt = (t: number) => fromHz * Math.exp(growth * t) + gain * t;
  const cyclesAt = (t: number) =>
    growth === 0 ? t * (fromHz + (gain * t) / 2) : (fromHz * Math.expm1(growth * t)) / growth;
  const hzRateAt = (t: number) => gain + fromHz * growth * Math.exp(growth * t);
  const turn = 2 * Math.PI;
  const fastestHz = Math.max(fromHz, toHz);
  // the phase's own derivatives at their largest: ω, ω̇, ω̈
  const omega = turn * fastestHz;
  const swept = turn * (Math.abs(gain) + Math.abs(growth) * fastestHz);
  const bent = turn * growth * growth * fastestHz;
  const bounds = [1, omega, omega ** 2 + swept, omega ** 3 + 3 * omega * swept + bent];
  return {
    from: 0,
    to: seconds,
    value: (t) => amplitude * Math.cos(turn * cyclesAt(t)),
    rate: (t) => -amplitude * turn * hzAt(t) * Math.sin(turn * cyclesAt(t)),
    second: (t) => {
      const angle = turn * cyclesAt(t);
      return -amplitude * turn * (turn * hzAt(t) ** 2 * Math.cos(angle) + hzRateAt(t) * Math.sin(angle));
    },
    bound: (n) => Math.abs(amplitude) * bounds[n],
    fastestHz,
  };
}
