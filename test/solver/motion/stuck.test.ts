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

test("a spring force of exactly what the contact holds is held, and what the spring's own damping adds is not asked for", () => {
  const tie = 1e-6 * (1 + 1.2e-13);
  const { ended, outcome, events } = run({
    body: { inertia: 1, stiffness: 1e6, viscous: 2000 },
    solid: { model: "displacement-proportional", lossFactor: 0.6 },
    contact: { ...coulombForces(0.5, 1), counterface: "base" },
    initial: { displacement: tie },
    span: { seconds: 1, untilRest: false, maxWork: 1000 },
  });
  expect([ended, outcome, events.length]).toEqual(["time", "never-moved", 2]);
});

test("a force that grows from nothing moves a body that only its spring's damping holds, where nothing is stretched yet", () => {
  const { ended, samples } = run(
    {
      body: { inertia: 1, stiffness: 1 },
      solid: { model: "displacement-proportional", lossFactor: 0.15 },
      contact: { law: { model: "none" }, counterface: { velocity: -0.16 } },
      force: [{ kind: "ramp", rate: -0.5 }],
      span: { seconds: 0.1, untilRest: false, maxWork: 1000 },
    },
    { samples: 3 },
  );
  expect(ended).toBe("time");
  // d ≈ rate t³/6m: stiffness and its damping come in at t⁵
  expect(samples!.x[2]).toBeCloseTo((-0.5 * 0.1 ** 3) / 6, 6);
});
