import { expect, test } from "vitest";
import { run } from "../../support/run.ts";

// m v̇ = −N (μ0 + s v) stops at (m/sN) ln(1 + s v0/μ0): a linear equation of first order (elementary)
test.each([
  { start: 0.2, rise: 1, speed: 0.5 },
  { start: 0.4, rise: 30, speed: 0.02 },
  { start: 0.3, rise: -0.25, speed: 0.8 },
])("friction linear in speed stops the body when the closed form says: %o", ({ start, rise, speed }) => {
  const points = [
    [0, start],
    [1, start + rise],
  ] satisfies [number, number][];
  const { events } = run({
    body: { inertia: 3, stiffness: 0 },
    contact: { law: { model: "table", points }, normal: { preload: 2 } },
    initial: { velocity: speed },
    span: { seconds: 100 },
  });
  const expected = (3 / (rise * 2)) * Math.log(1 + (rise * speed) / start);
  expect(events[1].kind).toBe("stop");
  expect(Math.abs(events[1].t - expected)).toBeLessThan(1e-9 * expected);
});

test("bristles outlive a contact that fades away and comes back", () => {
  const [preload, amplitude, hz, stiffness] = [1, 1.6, 0.2, 7];
  const { ended, samples, energy } = run(
    {
      body: { inertia: 1, stiffness: 1 },
      contact: {
        law: { model: "bristle", static: 1, kinetic: 1, velocity: 1e-3, stiffness, damping: 0, fluid: 0 },
        normal: { preload, ripple: { amplitude, hz, phase: 0 } },
      },
      base: [{ kind: "ramp", rate: 0.2 }],
      span: { seconds: 25, untilRest: false },
    },
    { samples: 2000 },
  );
  expect(ended).toBe("time");
  samples!.t.forEach((t, i) => {
    const normal = Math.max(0, preload + amplitude * Math.cos(2 * Math.PI * hz * t));
    // z follows g late where N falls faster than the bristles yield, but never holds more than the most there was
    expect(Math.abs(samples!.f[i])).toBeLessThanOrEqual(normal > 0 ? preload + amplitude : 0);
  });
  expect(Math.abs(energy!.residual)).toBeLessThan(1e-8 * energy!.heatContact);
});

test("a jump of the counterface breaks a body on bristles away, and stuck means slow from there on", () => {
  const threshold = 1e-3;
  const { events, samples } = run(
    {
      body: { inertia: 1, stiffness: 1, viscous: 2 },
      contact: {
        law: { model: "bristle", static: 1, kinetic: 1, velocity: 1, stiffness: 50, damping: 1, fluid: 0 },
        normal: { preload: 1 },
        counterface: "base",
      },
      base: [{ kind: "ramp", rate: 0.5, start: 1 }],
      span: { seconds: 6, untilRest: false },
    },
    { samples: 3000 },
  );
  expect(events[1]).toMatchObject({ t: 1, kind: "break-away" });
  expect(events[2]?.kind).toBe("stop");
  samples!.t.forEach((t, i) => {
    const slip = samples!.v[i] - (t >= 1 ? 0.5 : 0);
    if (Math.abs(Math.abs(slip) - threshold) > 1e-6)
      expect([t, samples!.phase[i] === 0]).toEqual([t, Math.abs(slip) < threshold]);
  });
});

test("friction that drops with infinite slope at rest is told to eight digits from the start of a slip on", () => {
  const peaks = [1e-10, 1e-12].map((tolerance) => {
    const { quantities } = run(
      {
        body: { inertia: 1, stiffness: 0, viscous: 2 },
        contact: {
          law: { model: "stribeck", static: 1, kinetic: 0, velocity: 1, exponent: 0.5, fluid: 0 },
          normal: { preload: 1 },
          counterface: "base",
        },
        force: [{ kind: "ramp", rate: -0.159, start: 0.0002 }],
        initial: { displacement: -6 },
        span: { seconds: 25, untilRest: false },
      },
      { tolerance, quantities: ["peakDisplacement"] },
    );
    return quantities.peakDisplacement ?? NaN;
  });
  expect(Math.abs(peaks[0] - peaks[1])).toBeLessThan(1e-8 * peaks[1]);
});
