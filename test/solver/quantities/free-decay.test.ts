import { describe, expect, test } from "vitest";
import { run } from "../../support/run.ts";
import { coulombForces } from "../../support/scenario-builder.ts";

/*
 * A free body, m = 1 kg, k = 100 N/m (ω = 10), sliding friction 1 N and 1.5 N at rest: it swings about ±xk = ±10 mm, half a
 * period π/10 s each, and stops for good at the first turning point within ±15 mm. From 105 mm: −85, 65, −45, 25, −5 mm.
 * Rules of free decay with dry friction: Lorenz 1924, from memory; the numbers follow from them by hand.
 */
const released = run({
  body: { inertia: 1, stiffness: 100 },
  contact: coulombForces(1, 1.5),
  initial: { displacement: 0.105 },
  span: { seconds: 10 },
}).quantities;
const amplitudes = [0.095, 0.075, 0.055, 0.035, 0.015];
const duration = (5 * Math.PI) / 10;

describe("a free body with dry friction", () => {
  test.each([
    ["naturalHz", 10 / (2 * Math.PI)],
    ["dampingRatio", 0],
    ["restBand", 0.015],
    ["restTime", duration],
    ["restDisplacement", -0.005],
    ["restOffset", -0.005],
    ["halfCycles", 5],
    ["peakDisplacement", 0.105],
    ["peakVelocity", 10 * 0.095],
    ["peakAcceleration", 100 * 0.095],
    ["slipVelocityPeak", 10 * 0.095],
    ["amplitude", (0.105 + 0.085) / 2],
    // the centres of the five swings, 10 mm to one side three times and to the other twice
    ["meanDisplacement", 0.01 / 5],
    ["followingErrorPeak", 0.105],
    ["stickFraction", 0],
    ["driveForcePeak", 10.5],
    ["driveForceRms", 100 * Math.sqrt(sumOfSquares(amplitudes) / 5 / 2 + 0.01 ** 2)],
    ["frictionPowerPeak", 10 * 0.095],
    ["frictionPowerMean", (1 * 0.55) / duration],
  ])("%s", (name, expected) => {
    expect(released[name]).toBeCloseTo(expected, 12);
  });

  test.each([
    "sticksPerCycle",
    "stickSlipHz",
    "cycleStickFraction",
    "slipDistance",
    "velocityRipple",
    "settleTime",
    "settleOffset",
    "lostMotion",
    "slipPerCycle",
    "driftPerCycle",
    "transmissibility",
  ])("%s has no meaning", (name) => {
    expect(released[name]).toBeNull();
  });
});

function sumOfSquares(values: readonly number[]): number {
  return values.reduce((sum, value) => sum + value * value, 0);
}

describe("where it rests", () => {
  test("is told from the equilibrium that load and weight alone would have", () => {
    // 2 kg upright on a spring of 100 N/m with 5 N upwards: equilibrium at (5 − 2 g)/100
    const { quantities } = run({
      body: { inertia: 2, stiffness: 100 },
      contact: coulombForces(1, 1.5),
      incline: 90,
      force: [{ kind: "constant", value: 5 }],
      initial: { displacement: 0 },
      span: { seconds: 10 },
    });
    const equilibrium = (5 - 2 * 9.80665) / 100;
    const [xk, start] = [0.01, -equilibrium];
    const swings = Math.ceil((start - 0.015) / (2 * xk));
    const offset = (swings % 2 === 0 ? 1 : -1) * (start - 2 * xk * swings);
    expect(quantities.restOffset).toBeCloseTo(offset, 12);
    expect(quantities.restDisplacement).toBeCloseTo(equilibrium + offset, 12);
  });

  test("is where it starts, at 0 s, for a body that nothing ever moves", () => {
    const { quantities } = run({
      body: { inertia: 1, stiffness: 100 },
      contact: coulombForces(1, 1.5),
      initial: { displacement: 0.012 },
      span: { seconds: 3, untilRest: false },
    });
    expect(quantities).toMatchObject({ restTime: 0, restDisplacement: 0.012, restOffset: 0.012, halfCycles: 0 });
    expect(quantities).toMatchObject({ stickFraction: 1, slipVelocityPeak: 0, driveForcePeak: 1.2 });
  });

  test("is unknown while a load goes on swinging under a body that never moved", () => {
    const { quantities } = run({
      body: { inertia: 1, stiffness: 100 },
      contact: coulombForces(1, 1.5),
      force: [{ kind: "harmonic", amplitude: 1, hz: 2 }],
      span: { seconds: 3, untilRest: false },
    });
    expect(quantities).toMatchObject({ restTime: null, restDisplacement: null, restOffset: null, halfCycles: null });
  });

  test("is reached when the last input has become constant under the stuck body", () => {
    const { quantities } = run({
      body: { inertia: 1, stiffness: 100 },
      contact: coulombForces(1, 1.5),
      base: [{ kind: "move", distance: 0.01, speed: 0.1, acceleration: 1, start: 0.5 }],
      span: { seconds: 3, untilRest: false },
    });
    // 0.1 s to speed up and slow down, 10 mm at no more than 0.1 m/s: 0.2 s
    expect(quantities.restTime).toBeCloseTo(0.7, 12);
    expect(quantities.restDisplacement).toBeCloseTo(0, 14);
  });

  test("is nowhere without a stop: damping alone only slows the body down", () => {
    const { quantities } = run({
      body: { inertia: 1, stiffness: 100, viscous: 4 },
      initial: { velocity: 1 },
      span: { seconds: 9 },
    });
    expect(quantities).toMatchObject({ restTime: null, restDisplacement: null, restOffset: null, halfCycles: null });
    expect(quantities.dampingRatio).toBeCloseTo(0.2, 14);
  });

  test("has no band and no frequency without a spring", () => {
    const { quantities } = run({
      body: { inertia: 4, stiffness: 0 },
      contact: coulombForces(2),
      initial: { velocity: 3 },
      span: { seconds: 20 },
    });
    // v/(F/m) and m v²/2F
    expect(quantities.restTime).toBeCloseTo(6, 12);
    expect(quantities.restDisplacement).toBeCloseTo(9, 12);
    expect(quantities).toMatchObject({
      naturalHz: null,
      dampingRatio: null,
      restBand: null,
      restOffset: null,
      halfCycles: 1,
    });
  });
});
