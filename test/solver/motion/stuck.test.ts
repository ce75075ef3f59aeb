import { expect, test } from "vitest";
import { run } from "../../support/run.ts";
import { coulombForces } from "../../support/scenario-builder.ts";

// invented; expected by the definition: a body that needs no force stays where it is, held or not
test.each([
  [1.1, 30, 25],
  [1.05, 77, 25],
  [1.5, 0, 25],
  [1.2, 30, 2000],
])("a body that needs no force rests under a ripple that lets it go: %d N, %d°, %d s", (amplitude, phase, seconds) => {
  const contact = coulombForces(1);
  const ripple = { amplitude, hz: 0.2, phase };
  for (const untilRest of [false, true]) {
    const result = run({
      body: { inertia: 1, stiffness: 1 },
      contact: { ...contact, normal: { ...contact.normal, ripple } },
      span: { seconds, untilRest },
    });
    expect(result.events.map(({ kind }) => kind)).toEqual(["start", "end"]);
    expect([result.outcome, result.quantities.restTime]).toEqual(["never-moved", 0]);
  }
});

test("a body held against a constant force breaks away where a sweep on top passes what holds it", () => {
  const [held, constant, amplitude] = [1, 0.5, -0.6];
  const { events } = run({
    body: { inertia: 1, stiffness: 100, viscous: 1 },
    contact: coulombForces(0.8, held),
    force: [
      { kind: "constant", value: constant },
      { kind: "chirp", amplitude, fromHz: 1, toHz: 2, seconds: 3, spacing: "linear" },
    ],
    span: { seconds: 3, untilRest: false },
  });
  expect(events[1].kind).toBe("break-away");
  // a linear sweep has turned by f₀ t + (f₁ − f₀) t²/2T at t
  const { t } = events[1];
  const turns = t + t ** 2 / 6;
  expect(constant + amplitude * Math.cos(2 * Math.PI * turns)).toBeCloseTo(held, 9);
});

test.each([
  [2 ** -52, "came-to-rest"],
  [3e-14, "too-short"],
])("a belt and a force ramp apart by a share of %d under a ripple: %s", (apart, expected) => {
  const contact = coulombForces(0.5);
  const rate = -0.15915494309189535;
  const { ended, outcome } = run({
    body: { inertia: 1, stiffness: 1 },
    contact: {
      ...contact,
      normal: { ...contact.normal, ripple: { amplitude: 0.37, hz: 0.2, phase: 0 } },
      counterface: { velocity: rate * (1 + apart) },
    },
    force: [{ kind: "ramp", rate }],
    span: { seconds: 75, untilRest: false },
  });
  expect([ended, outcome]).toEqual(["time", expected]);
});

test("moves of a micrometre late in a run do not shake a body off its base by rounding", () => {
  const contact = coulombForces(0.15, 0.2);
  const { events, quantities } = run({
    body: { inertia: 10, stiffness: 1e4 },
    contact: { ...contact, normal: { preload: 200 }, counterface: "base" },
    base: [{ kind: "staircase", increment: 1e-6, count: 300, dwell: 1, speed: 0.01, acceleration: 1, start: 0.3 }],
    span: { seconds: 300, untilRest: false },
  });
  expect(events).toHaveLength(2);
  // m a = 10 N of the 40 N that hold
  expect(quantities.holdUse).toBeCloseTo(0.25, 9);
});
