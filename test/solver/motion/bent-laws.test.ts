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

test("a slip too short to rise out of the integrator's error still ends where v_r is 0", () => {
  // between the turn and the stop at 2.879 s v_r stays below 1e-8 of its size in the run; 0.00060237 s by SciPy's LSODA at 1e-12
  const { events } = run({
    body: { inertia: 1, stiffness: 1, viscous: 2 },
    contact: {
      law: {
        model: "table",
        points: [
          [0, 1.421],
          [1, 0.59],
        ],
      },
      normal: { preload: 1, ripple: { amplitude: 1.596, hz: 0.2, phase: 30 } },
      counterface: "base",
    },
    base: [
      {
        kind: "staircase",
        increment: -0.847,
        count: 3,
        dwell: 6.283185307179586,
        speed: 0.5392169471953414,
        acceleration: 0.8581904254506009,
        start: 1.5707963267948966,
      },
    ],
    initial: { displacement: 0.0009069480909617981, velocity: -0.000014032814214058787 },
    span: { seconds: 3, untilRest: false },
  });
  const turn = events.findIndex(({ kind, t }) => kind === "turn" && t > 2);
  expect(events[turn + 1].kind).toBe("stop");
  expect(events[turn + 1].t - events[turn].t).toBeCloseTo(0.00060237, 7);
});

test.each([0, 25.132741228718345])(
  "a slip that starts with no acceleration stops at one time, whenever it begins: %d s",
  (later) => {
    // 2.023608598 s at a hundredth of the tolerance, from either start
    const times = [0, 1.8849555921538759, 5.654866776461628].map((t) => t + later);
    const { events } = run({
      body: { inertia: 1, stiffness: 0 },
      contact: {
        law: {
          model: "table",
          points: [
            [0, 0.492],
            [1, 0.02],
            [2, 0.321],
          ],
        },
        normal: { preload: 1, faces: 2 },
      },
      force: [
        {
          kind: "record",
          times: later === 0 ? times : [0, ...times],
          values: later === 0 ? [0, -1, -0.006327172401290972] : [0, 0, -1, -0.006327172401290972],
        },
      ],
      span: { seconds: 25.132741228718345 + later, untilRest: false },
    });
    const stop = events.find(({ kind }) => kind === "stop");
    expect(Math.abs(stop!.t - later - 2.023608598)).toBeLessThan(1e-8);
  },
);
