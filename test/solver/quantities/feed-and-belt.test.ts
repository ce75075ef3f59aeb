import { describe, expect, test } from "vitest";
import { run } from "../../support/run.ts";
import { coulombForces } from "../../support/scenario-builder.ts";

/*
 * Stick-slip at constant drive speed without damping: with e = (Fs − Fk)/k the slip is half of a circle and more of radius
 * A = √(e² + (V/ω)²) about Fk/k, lasts (2/ω)(π − atan(e ω/V)), and the stick after it 2e/V. Derived; textbook-known.
 */
const [m, k, Fs, Fk, V] = [1, 1, 1, 0.5, 0.2];
const omega = Math.sqrt(k / m);
const excess = (Fs - Fk) / k;
const radius = Math.hypot(excess, V / omega);
const slipTime = (2 / omega) * (Math.PI - Math.atan((excess * omega) / V));
const stickTime = (2 * excess) / V;
const period = slipTime + stickTime;

describe.each([
  [
    "a belt",
    run({
      body: { inertia: m, stiffness: k },
      contact: { ...coulombForces(Fk, Fs), counterface: { velocity: V } },
      initial: { velocity: V },
      span: { seconds: 100, untilRest: false },
    }).quantities,
  ],
  [
    "a feed backwards",
    run({
      body: { inertia: m, stiffness: k },
      contact: coulombForces(Fk, Fs),
      base: [{ kind: "ramp", rate: -V }],
      span: { seconds: 100, untilRest: false },
    }).quantities,
  ],
])("stick-slip on %s", (drive, quantities) => {
  test.each([
    ["amplitude", radius],
    ["stickSlipHz", 1 / period],
    ["cycleStickFraction", stickTime / period],
    ["slipDistance", V * period],
    // against the belt the fastest slip is backwards; under a feed the body overtakes the drive
    ["slipVelocityPeak", V + radius * omega],
    ["followingErrorPeak", Fk / k + radius],
    ["driveForcePeak", Fk + radius * k],
    ["holdUse", 1],
    ["frictionPowerPeak", Fk * (V + radius * omega)],
  ])("%s", (name, expected) => {
    expect(quantities[name]).toBeCloseTo(expected, 11);
  });

  test("the largest displacement is told of the body, mean and amplitude of d where the base feeds", () => {
    if (drive === "a belt") expect(quantities.peakDisplacement).toBeCloseTo(Fk / k + radius, 11);
    else expect(quantities.peakDisplacement).toBeGreaterThan(19);
    expect(Math.abs(quantities.meanDisplacement! - Fk / k)).toBeLessThan(radius);
  });

  test("the ripple of its speed is a matter of a feed", () => {
    if (drive === "a belt") expect(quantities.velocityRipple).toBeNull();
    else expect(quantities.velocityRipple! * V).toBeCloseTo(V + radius * omega, 1);
  });

  test("per cycle of an input there is nothing to tell", () => {
    expect(quantities).toMatchObject({ sticksPerCycle: null, slipPerCycle: null, driftPerCycle: null });
  });
});

describe("smooth sliding under a feed", () => {
  // d = −Fk/k + a sin ωt, slower than the feed: no stop; the steady window, the last half, is four whole periods.
  const [rate, a] = [0.5, 0.3];
  const { quantities } = run({
    body: { inertia: m, stiffness: k },
    contact: coulombForces(Fk, Fs),
    base: [{ kind: "ramp", rate }],
    initial: { displacement: -Fk / k, velocity: rate + a },
    span: { seconds: 16 * Math.PI, untilRest: false },
  });

  test.each([
    ["velocityRipple", (2 * a) / rate],
    ["amplitude", a],
    ["meanDisplacement", -Fk / k],
    ["followingErrorPeak", Fk / k + a],
    ["followingErrorRms", Math.hypot(Fk / k, a / Math.SQRT2)],
    ["driveForceRms", Math.hypot(Fk, (k * a) / Math.SQRT2)],
    ["frictionPowerMean", Fk * rate],
    ["stickFraction", 0],
  ])("%s", (name, expected) => {
    expect(quantities[name]).toBeCloseTo(expected, 12);
  });

  test("a body that stays where it is has no ripple: its mean speed is 0", () => {
    const { quantities } = run({
      body: { inertia: 1, stiffness: 1 },
      contact: coulombForces(1),
      base: [{ kind: "ramp", rate: 0.01, stop: 20 }],
      span: { seconds: 50, untilRest: false },
    });
    expect(quantities).toMatchObject({ velocityRipple: null, stickFraction: 1, amplitude: 0 });
    expect(quantities.meanDisplacement).toBeCloseTo(-0.2, 14);
  });
});
