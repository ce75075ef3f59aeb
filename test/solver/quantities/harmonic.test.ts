import { describe, expect, test } from "vitest";
import { noStopMotion } from "../../support/den-hartog.ts";
import { run } from "../../support/run.ts";
import { coulombForces } from "../../support/scenario-builder.ts";

describe("a body swinging without stops under a harmonic force", () => {
  // m = k = P = 1, r = 0.8, F = 0.4: Den Hartog's orbit, on which the run starts.
  const [r, friction] = [0.8, 0.4];
  const hz = r / (2 * Math.PI);
  const { amplitude, phase } = noStopMotion(r, 0, friction);
  const { quantities } = run({
    body: { inertia: 1, stiffness: 1 },
    contact: coulombForces(friction),
    force: [{ kind: "harmonic", amplitude: 1, hz, phase }],
    initial: { displacement: amplitude },
    span: { seconds: 20 / hz, untilRest: false },
  });

  test.each([
    ["amplitude", amplitude],
    ["meanDisplacement", 0],
    ["transmissibility", amplitude],
    ["slipPerCycle", 4 * amplitude],
    ["driftPerCycle", 0],
    ["frictionPowerMean", 4 * amplitude * friction * hz],
    ["sticksPerCycle", 0],
    ["stickFraction", 0],
  ])("%s", (name, expected) => {
    expect(quantities[name]).toBeCloseTo(expected, 10);
  });
});

describe("a body held by friction", () => {
  // 46.5 N against 0.25 × 300 N: 62 % of the hold
  const clamp = (amplitude: number, seconds = 2) =>
    run({
      body: { inertia: 2, stiffness: 50000 },
      contact: { law: { model: "coulomb", static: 0.25, kinetic: 0.2 }, normal: { preload: 300 } },
      force: [{ kind: "harmonic", amplitude, hz: 8 }],
      span: { seconds, untilRest: false },
    }).quantities;

  test("uses the share of the hold that the load asks for", () => {
    expect(clamp(46.5).holdUse).toBeCloseTo(0.62, 14);
    expect(clamp(46.5)).toMatchObject({ slipPerCycle: 0, driftPerCycle: 0, frictionPowerPeak: 0, stickFraction: 1 });
    expect(clamp(46.5)).toMatchObject({ sticksPerCycle: 0, stickSlipHz: null, peakDisplacement: 0 });
  });

  test("uses all of it once it breaks away", () => {
    expect(clamp(75.1).holdUse).toBe(1);
  });

  test("uses the most where a ripple of the pressing force leaves the least", () => {
    const { quantities } = run({
      body: { inertia: 1, stiffness: 100 },
      contact: {
        law: { model: "coulomb", static: 0.5, kinetic: 0.4 },
        normal: { preload: 10, ripple: { amplitude: 4, hz: 3, phase: 90 } },
      },
      initial: { displacement: 0.02 },
      span: { seconds: 1, untilRest: false },
    });
    expect(quantities.holdUse).toBeCloseTo(2 / (0.5 * (10 - 4)), 13);
  });

  test("has no hold to use without friction, or while it never sticks", () => {
    const free = run({ body: { inertia: 1, stiffness: 100 }, initial: { velocity: 1 }, span: { seconds: 1 } });
    expect(free.quantities.holdUse).toBeNull();
    const sliding = run({
      body: { inertia: 1, stiffness: 0, viscous: 1 },
      contact: coulombForces(1),
      force: [{ kind: "constant", value: 2 }],
      initial: { velocity: 0.5 },
      span: { seconds: 5 },
    });
    expect(sliding.quantities.holdUse).toBeNull();
  });
});

describe("transmissibility", () => {
  // On the steady orbit of an undamped body the base's swing Y comes out as Y/(1 − r²), r = f/fn.
  const shaken = (more: object) =>
    run({
      body: { inertia: 1, stiffness: 100 },
      base: [{ kind: "harmonic", amplitude: 0.01, hz: 20 / (2 * Math.PI) }],
      initial: { displacement: 0.01 / (1 - 4) },
      span: { seconds: 10 },
      ...more,
    }).quantities.transmissibility;

  test("of a shaken base is the ratio of the swings", () => {
    expect(shaken({})).toBeCloseTo(1 / 3, 12);
  });

  test("has no meaning with two harmonics, with none, or beside an input that goes on changing", () => {
    expect(shaken({ force: [{ kind: "harmonic", amplitude: 1, hz: 1 }] })).toBeNull();
    expect(shaken({ base: [] })).toBeNull();
    expect(shaken({ force: [{ kind: "ramp", rate: 1 }] })).toBeNull();
    expect(shaken({ force: [{ kind: "constant", value: 1 }] })).not.toBeNull();
  });
});

test("the mean place of a body without a spring that slides on is that of where it was", () => {
  // only its velocity repeats itself; the mean of evenly told places (trapezium rule) is the expected value
  const contact = coulombForces(0.8, 1);
  const { quantities, samples } = run(
    {
      body: { inertia: 1, stiffness: 0, viscous: 2 },
      contact: { ...contact, normal: { preload: 1, ripple: { amplitude: 0.5, hz: 0.2, phase: 0 } } },
      force: [{ kind: "constant", value: 3 }],
      span: { seconds: 50, untilRest: false },
    },
    { samples: 20_001 },
  );
  const { x } = samples!;
  const mean = (x.reduce((sum, place) => sum + place, 0) - (x[0] + x[x.length - 1]) / 2) / (x.length - 1);
  expect(Math.abs(quantities.meanDisplacement! - mean)).toBeLessThan(1e-6 * mean);
});
