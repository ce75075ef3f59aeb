import type { ScenarioSketch, TermSketch } from "./scenario-builder.ts";

/** Draws numbers for one scenario. */
export interface Draw {
  /** Uniform in [low, high). */
  readonly between: (low: number, high: number) => number;
  /** One of the list. */
  of<T>(list: readonly T[]): T;
  /** Plus or minus, alike. */
  sign(): number;
}

/** The sizes of one drawn body, which all that acts on it is scaled by. */
export interface Frame {
  /** m, k, f_n = √(k/m)/2π in Hz, and a length of the motion. */
  inertia: number;
  stiffness: number;
  hz: number;
  length: number;
}

export type Drive = (draw: Draw, frame: Frame) => Partial<ScenarioSketch>;

const degrees = (draw: Draw): number => draw.between(-180, 180);

/** A harmonic whose frequency is a whole multiple of a tenth of the natural one: two of them have a short common period. */
function harmonic(draw: Draw, { hz }: Frame, amplitude: number): TermSketch {
  return { kind: "harmonic", amplitude, hz: hz * draw.of([0.3, 0.5, 0.7, 0.9, 1.2, 1.6, 2.1]), phase: degrees(draw) };
}

/** A force as a part of the force that moves the spring by the motion's length, N. */
const forceOf = (draw: Draw, { stiffness, length }: Frame, low = 0.1, high = 1): number =>
  draw.between(low, high) * stiffness * length;

/** A few points over the span's first part, end values held. */
function points(draw: Draw, { hz }: Frame, size: number): { times: number[]; values: number[] } {
  const count = draw.of([4, 7, 12]);
  const times = Array.from({ length: count }, (_, i) => ((i + draw.between(0, 0.8)) * 0.5) / hz);
  return { times, values: times.map(() => draw.between(-size, size)) };
}

const freely: Drive = (draw, { length, hz }) => ({
  initial: { displacement: draw.sign() * draw.between(0.5, 1) * length, velocity: draw.between(-6, 6) * length * hz },
});
const onIncline: Drive = (draw, frame) => ({
  ...freely(draw, frame),
  incline: draw.between(-40, 40),
  contact: { normal: { weight: true } },
});
const angular: Drive = (draw, frame) => ({
  motion: "angular",
  initial: freely(draw, frame).initial,
  force: [harmonic(draw, frame, forceOf(draw, frame)), { kind: "constant", value: forceOf(draw, frame, -0.2, 0.2) }],
});
const oneHarmonic: Drive = (draw, frame) => ({ force: [harmonic(draw, frame, forceOf(draw, frame))] });
const twoHarmonics: Drive = (draw, frame) => ({
  force: [harmonic(draw, frame, forceOf(draw, frame)), harmonic(draw, frame, forceOf(draw, frame))],
});
const unbalanced: Drive = (draw, { inertia, length, hz }) => ({
  force: [
    {
      kind: "unbalance",
      mass: 0.1 * inertia,
      eccentricity: 4 * length,
      hz: hz * draw.of([0.6, 0.8, 1.3]),
      phase: degrees(draw),
    },
  ],
});
const pulses: Drive = (draw, frame) => ({
  force: (["half-sine", "rectangle", "triangle"] as const).map((shape, i) => ({
    kind: "pulse",
    shape,
    peak: draw.sign() * forceOf(draw, frame),
    start: (i * 2 + draw.between(0, 1)) / frame.hz,
    duration: draw.between(0.1, 0.9) / frame.hz,
  })),
});
const stepAndRamp: Drive = (draw, frame) => ({
  force: [
    { kind: "step", value: draw.sign() * forceOf(draw, frame), start: draw.between(0, 2) / frame.hz },
    {
      kind: "ramp",
      rate: draw.sign() * forceOf(draw, frame) * frame.hz * 0.3,
      start: draw.between(0, 1) / frame.hz,
      stop: draw.of([6 / frame.hz, "none"]),
    },
  ],
});
const forceRecord: Drive = (draw, frame) => ({
  force: [{ kind: "record", ...points(draw, frame, forceOf(draw, frame, 0.3, 1)) }],
});
const shakenBase: Drive = (draw, frame) => ({
  base: [harmonic(draw, frame, frame.length * draw.between(0.2, 1))],
  contact: { counterface: draw.of(["ground", "base"]) },
});
const fed: Drive = (draw, { length, hz }) => ({
  base: [
    {
      kind: "ramp",
      rate: draw.sign() * draw.of([0.005, 0.1, 0.5, 1, 2]) * draw.between(0.5, 1) * length * hz,
      start: draw.of([0, 0.4 / hz]),
    },
  ],
  contact: { counterface: draw.of(["ground", "ground", "base"]) },
});
const moved: Drive = (draw, { length, hz }) => ({
  base: [
    {
      kind: "move",
      distance: draw.sign() * draw.between(1, 3) * length,
      speed: length * hz,
      acceleration: 4 * length * hz * hz,
      start: 0.3 / hz,
    },
    {
      kind: "move",
      distance: draw.sign() * length,
      speed: length * hz,
      acceleration: draw.between(1, 4) * length * hz * hz,
      start: 5 / hz,
    },
  ],
  contact: { counterface: draw.of(["ground", "base"]) },
});
const stepped: Drive = (draw, { length, hz }) => ({
  base: [
    {
      kind: "staircase",
      increment: draw.sign() * draw.between(0.1, 0.6) * length,
      count: 4,
      dwell: draw.between(1.5, 2) / hz,
      speed: length * hz,
      acceleration: 6 * length * hz * hz,
      start: 0.2 / hz,
    },
  ],
});
const baseRecord: Drive = (draw, frame) => ({
  base: [{ kind: "record", ...points(draw, frame, frame.length) }],
  contact: { counterface: draw.of(["ground", "base"]) },
});
const shakenRelative: Drive = (draw, frame) => ({
  base: [{ kind: "acceleration-record", ...points(draw, frame, frame.length * (2 * Math.PI * frame.hz) ** 2) }],
  contact: { counterface: "base" },
});
const onBelt: Drive = (draw, { length, hz }) => ({
  contact: { counterface: { velocity: draw.sign() * draw.between(0.1, 3) * length * hz } },
});
const onBeltForced: Drive = (draw, frame) => ({ ...onBelt(draw, frame), ...oneHarmonic(draw, frame) });
const drumOnBelt: Drive = (draw, frame) => ({ ...onBelt(draw, frame), motion: "angular" });
const rippled: Drive = (draw, frame) => ({
  ...oneHarmonic(draw, frame),
  contact: {
    normal: {
      ripple: { amplitude: draw.between(0.1, 0.9), hz: frame.hz * draw.of([0.5, 0.9, 2.1]), phase: degrees(draw) },
    },
  },
});
const reidFree: Drive = (draw, frame) => ({ ...freely(draw, frame), solid: reid(draw) });
const reidForced: Drive = (draw, frame) => ({ ...oneHarmonic(draw, frame), solid: reid(draw) });
const reidBelt: Drive = (draw, frame) => ({ ...onBelt(draw, frame), solid: reid(draw) });
const reidBase: Drive = (draw, frame) => ({ ...shakenBase(draw, frame), solid: reid(draw) });
const withoutSpring: Drive = (draw, frame) => ({
  ...oneHarmonic(draw, frame),
  body: { inertia: frame.inertia, stiffness: 0 },
  solid: { model: "none" },
});
const withoutContact: Drive = (draw, frame) => ({ ...oneHarmonic(draw, frame), contact: { law: { model: "none" } } });

function reid(draw: Draw): ScenarioSketch["solid"] {
  return { model: "displacement-proportional", lossFactor: draw.between(0.02, 0.2) };
}

/** What may act on a drawn body, by name. */
export const driveKinds = {
  freely,
  onIncline,
  angular,
  oneHarmonic,
  twoHarmonics,
  unbalanced,
  pulses,
  stepAndRamp,
  forceRecord,
  shakenBase,
  fed,
  moved,
  stepped,
  baseRecord,
  shakenRelative,
  onBelt,
  onBeltForced,
  drumOnBelt,
  rippled,
  reidFree,
  reidForced,
  reidBelt,
  reidBase,
  withoutSpring,
  withoutContact,
} satisfies Record<string, Drive>;
