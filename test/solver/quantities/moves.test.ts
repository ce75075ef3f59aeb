import { describe, expect, test } from "vitest";
import { run } from "../../support/run.ts";
import { coulombForces, type TermSketch } from "../../support/scenario-builder.ts";

const held = { body: { inertia: 1, stiffness: 100 }, contact: coulombForces(1, 1.5) };
const move = (distance: number, start: number): TermSketch => ({
  kind: "move",
  distance,
  speed: 0.1,
  acceleration: 1,
  start,
});

describe("after a move", () => {
  test("the offset is what the stuck body lacks, with or without a band", () => {
    const { quantities } = run({ ...held, base: [move(0.01, 0)], span: { seconds: 2 } });
    expect(quantities.settleOffset).toBeCloseTo(-0.01, 14);
    expect(quantities.settleTime).toBeNull();
  });

  test("it has settled at once where it is never outside the band, and never where it ends outside", () => {
    const within = run({ ...held, base: [move(0.01, 0)], settleBand: 0.02, span: { seconds: 2 } });
    expect(within.quantities.settleTime).toBe(0);
    const outside = run({ ...held, base: [move(0.01, 0)], settleBand: 0.005, span: { seconds: 2 } });
    expect(outside.quantities.settleTime).toBeNull();
    expect(outside.quantities.settleOffset).toBeCloseTo(-0.01, 14);
  });

  test("it has settled when |d| leaves the band for the last time", () => {
    // At the end of a steady feed d = 0 and ḋ = V: d = (V/ωd) e^(−ζωt) sin ωd t from there on (ω = 1, ζ = 0.1).
    const [ratio, rate, stop] = [0.1, 0.3, 2];
    const damped = Math.sqrt(1 - ratio ** 2);
    const d = (t: number) => (rate / damped) * Math.exp(-ratio * t) * Math.sin(damped * t);
    // just past the third turning point; the fourth is 27 % lower
    const last = (2.5 * Math.PI + 0.3) / damped;
    const { quantities } = run({
      body: { inertia: 1, stiffness: 1, viscous: 2 * ratio },
      base: [{ kind: "ramp", rate, stop }],
      initial: { velocity: rate },
      settleBand: d(last),
      span: { seconds: 60 },
    });
    expect(quantities.settleTime).toBeCloseTo(last, 11);
    expect(quantities.settleOffset).toBeCloseTo(d(58), 12);
  });

  test("there is nothing to settle from without a move that ends within the run", () => {
    const endless = run({ ...held, base: [{ kind: "ramp", rate: 0.001 }], settleBand: 0.1, span: { seconds: 2 } });
    expect(endless.quantities).toMatchObject({ settleTime: null, settleOffset: null });
    const cut = run({ ...held, base: [move(0.01, 1.9)], settleBand: 0.1, span: { seconds: 2 } });
    expect(cut.quantities).toMatchObject({ settleTime: null, settleOffset: null });
  });
});

describe("lost motion", () => {
  // Stuck, the body takes k y: it lets go at y = −Fs/k = −15 mm, 25 mm after the reversal at 10 mm.
  test.each([1, -1])("is what the base travels back before the body follows (side %d)", (side) => {
    const base = [move(side * 0.01, 0), move(side * -0.03, 1)];
    const { quantities } = run({ ...held, base, span: { seconds: 3 } });
    expect(quantities.lostMotion).toBeCloseTo(0.025, 12);
  });

  test("has no meaning without a reversal, or where the body does not follow", () => {
    expect(run({ ...held, base: [move(0.03, 0)], span: { seconds: 3 } }).quantities.lostMotion).toBeNull();
    const still = run({ ...held, base: [move(0.01, 0), move(-0.01, 1)], span: { seconds: 3 } });
    expect(still.quantities.lostMotion).toBeNull();
  });
});
