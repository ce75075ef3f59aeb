import type { Term } from "@restband/solver";

/** A term, and its value over time written out anew from the format's table, not from the code under test. */
export interface Formula {
  term: Term;
  value: (t: number) => number;
  /** Instants where the value jumps; elsewhere it is continuous. */
  jumps?: number[];
  /** True where its speed is continuous as well: a moving base must not jerk the body. */
  hasSmoothSpeed?: boolean;
}

const degrees = Math.PI / 180;

const ramp = { kind: "ramp", rate: -3, start: 0.4, stop: 1.7 } as const;
const half = { kind: "pulse", shape: "half-sine", peak: 150, start: 0.25, duration: 0.08 } as const;
const chirp = { kind: "chirp", amplitude: 6, fromHz: 1, toHz: 9, seconds: 1.5, spacing: "linear" } as const;

/** Position along a trapezoidal or triangular move, by integrating its speed piece by piece. */
function moved(distance: number, speed: number, acceleration: number, elapsed: number): number {
  const length = Math.abs(distance);
  const top = Math.min(speed, Math.sqrt(length * acceleration));
  const rampTime = top / acceleration;
  const cruise = (length - top * rampTime) / top;
  const up = Math.min(Math.max(elapsed, 0), rampTime);
  const flat = Math.min(Math.max(elapsed - rampTime, 0), cruise);
  const down = Math.min(Math.max(elapsed - rampTime - cruise, 0), rampTime);
  const way = (acceleration * up ** 2) / 2 + top * flat + top * down - (acceleration * down ** 2) / 2;
  return Math.sign(distance) * way;
}

const stairs = {
  kind: "staircase",
  increment: -2e-5,
  count: 12,
  dwell: 0.1,
  speed: 0.002,
  acceleration: 0.5,
  start: 0.05,
} as const;

const times = [0.2, 0.5, 0.9, 1, 1.6];
const values = [0.5, 9, -7, 5, 11];

function interpolated(t: number): number {
  const i = times.findIndex((time) => time > t);
  return values[i - 1] + ((values[i] - values[i - 1]) * (t - times[i - 1])) / (times[i] - times[i - 1]);
}

const recorded = (t: number) => (t < 0.2 ? 0.5 : t >= 1.6 ? 11 : interpolated(t));

/** ∫f dt of a chirp by Simpson's rule: independent of its closed form. */
function cycles(hz: (t: number) => number, t: number): number {
  const steps = 2000;
  let sum = hz(0) + hz(t);
  for (let i = 1; i < steps; i++) sum += (i % 2 === 1 ? 4 : 2) * hz((i * t) / steps);
  return (sum * t) / (3 * steps);
}

export const formulas: Formula[] = [
  { term: { kind: "constant", value: -2.5 }, value: () => -2.5 },
  { term: { kind: "ramp", rate: 3, start: 0.4, stop: "none" }, value: (t) => (t < 0.4 ? 0 : 3 * (t - 0.4)) },
  { term: ramp, value: (t) => -3 * Math.max(0, Math.min(t, 1.7) - 0.4) },
  { term: { kind: "step", value: 7, start: 0.6 }, value: (t) => (t < 0.6 ? 0 : 7), jumps: [0.6] },
  {
    term: { kind: "harmonic", amplitude: 5, hz: 1.6, phase: -90 },
    value: (t) => 5 * Math.cos(2 * Math.PI * 1.6 * t - 90 * degrees),
  },
  {
    term: { kind: "unbalance", mass: 0.05, eccentricity: 0.25, hz: 24, phase: 30 },
    value: (t) => 0.05 * 0.25 * (2 * Math.PI * 24) ** 2 * Math.cos(2 * Math.PI * 24 * t + 30 * degrees),
  },
  { term: half, value: (t) => (t < 0.25 || t >= 0.33 ? 0 : 150 * Math.sin((Math.PI * (t - 0.25)) / 0.08)) },
  {
    term: { kind: "pulse", shape: "rectangle", peak: 40, start: 0.125, duration: 0.0625 },
    value: (t) => (t < 0.125 || t >= 0.1875 ? 0 : 40),
    jumps: [0.125, 0.1875],
  },
  {
    term: { kind: "pulse", shape: "triangle", peak: -60, start: 0.9, duration: 0.2 },
    value: (t) => -60 * Math.max(0, 1 - Math.abs(t - 1) / 0.1),
  },
  {
    term: chirp,
    value: (t) => (t < 0 || t >= 1.5 ? 0 : 6 * Math.cos(2 * Math.PI * (t + (8 * t * t) / 3))),
    jumps: [0, 1.5],
  },
  {
    term: { ...chirp, spacing: "log" },
    value: (t) => (t < 0 || t >= 1.5 ? 0 : 6 * Math.cos(2 * Math.PI * cycles((s) => 9 ** (s / 1.5), t))),
    jumps: [0, 1.5],
  },
  {
    term: { kind: "move", distance: 0.02, speed: 0.05, acceleration: 0.8, start: 0.05 },
    value: (t) => moved(0.02, 0.05, 0.8, t - 0.05),
    hasSmoothSpeed: true,
  },
  {
    term: { kind: "move", distance: -0.002, speed: 0.05, acceleration: 0.8, start: 0.3 },
    value: (t) => moved(-0.002, 0.05, 0.8, t - 0.3),
    hasSmoothSpeed: true,
  },
  {
    term: stairs,
    value: (t) => {
      const all = Array.from({ length: 12 }, (_, k) => moved(-2e-5, 0.002, 0.5, t - 0.05 - 0.1 * k));
      return all.reduce((sum, each) => sum + each, 0);
    },
    hasSmoothSpeed: true,
  },
  { term: { kind: "record", times, values }, value: recorded },
  {
    term: { kind: "acceleration-record", times, values },
    value: (t) => (t < 0.2 || t >= 1.6 ? 0 : interpolated(t)),
    jumps: [0.2, 1.6],
  },
];
