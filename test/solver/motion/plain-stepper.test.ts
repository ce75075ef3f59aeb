import fc from "fast-check";
import { expect, test } from "vitest";
import { exactSlip, runExact } from "../../../solver/src/motion/exact/run-exact.ts";
import { PlainStepper } from "../../../solver/src/motion/exact/plain-stepper.ts";
import type { Motion } from "../../../solver/src/motion/motion.ts";
import { runSegments } from "../../../solver/src/motion/run.ts";
import { compileProblem } from "../../../solver/src/scenario/compile-problem.ts";
import type { Problem } from "../../../solver/src/scenario/problem.ts";
import { newStance } from "../../../solver/src/motion/stance.ts";
import { buildScenario, coulombForces } from "../../support/scenario-builder.ts";

const real = (min: number, max: number) => fc.double({ min, max, noNaN: true });
const hz = 1 / (2 * Math.PI);

/** Bodies of about 1 rad/s on ground, belt or base, swung by force, base or both, fed or not; μs above μk or not. */
const plainProblem = fc
  .record({
    inertia: real(0.3, 3),
    viscous: real(0, 0.5),
    kinetic: real(0.05, 0.8),
    extra: fc.constantFrom(0, 0.2),
    counterface: fc.constantFrom("ground" as const, "base" as const, { velocity: 0.4 }),
    force: real(0, 2),
    constant: real(-0.5, 0.5),
    base: fc.constantFrom(0, 0.7),
    feed: fc.constantFrom(0, 0, 0.3),
    omega: real(0.1, 3),
    phase: real(0, 360),
    displacement: real(-3, 3),
    velocity: fc.constantFrom(0, 1.3),
  })
  .map((draw) => {
    const swing = { hz: draw.omega * hz, phase: draw.phase } as const;
    return compileProblem(
      buildScenario({
        body: { inertia: draw.inertia, stiffness: 1, viscous: draw.viscous },
        contact: {
          ...coulombForces(draw.kinetic, draw.kinetic + draw.extra),
          counterface: draw.counterface,
        },
        force: [
          { kind: "constant", value: draw.constant },
          { kind: "harmonic", amplitude: draw.force, ...swing },
        ],
        base: [
          { kind: "harmonic", amplitude: draw.base, ...swing },
          { kind: "ramp", rate: draw.feed, start: 0, stop: "none" },
        ],
        initial: { displacement: draw.displacement, velocity: draw.velocity },
        span: { seconds: 100, untilRest: draw.force === 0 },
      }),
    );
  });

const inFull = (problem: Problem): Motion => runSegments(problem, "exact", exactSlip);

/** The same events in the same order, each at the same time, the body at the same place. */
function expectSame(short: Motion, full: Motion): void {
  expect(short.events.map(({ kind }) => kind)).toEqual(full.events.map(({ kind }) => kind));
  short.events.forEach(({ t }, i) => expect(Math.abs(t - full.events[i].t)).toBeLessThan(1e-8));
  expect([short.ended, short.count]).toEqual([full.ended, full.count]);
  expect(
    Math.abs(short.nextBreakAway - full.nextBreakAway) < 1e-8 || Object.is(short.nextBreakAway, full.nextBreakAway),
  ).toBe(true);
}

test("the short cut of plain problems tells what the rules in full tell", () => {
  fc.assert(
    fc.property(plainProblem, (problem) => expectSame(runExact(problem), inFull(problem))),
    { numRuns: 300, seed: 20261201, endOnFailure: true },
  );
});

test("a steady motion with stops is told by the short cut alone", () => {
  const problem = compileProblem(
    buildScenario({
      body: { inertia: 1, stiffness: 1, viscous: 0.02 },
      contact: coulombForces(0.6),
      force: [{ kind: "harmonic", amplitude: 1, hz: 0.4 * hz }],
      span: { seconds: 1000, untilRest: false },
    }),
  );
  const stance = newStance();
  const stepper = PlainStepper.of(problem);
  const happenings = [stepper?.start(stance)];
  while (stance.t < 1000) happenings.push(stepper?.step(stance));
  expect(happenings.length).toBeGreaterThan(250);
  expect(happenings).not.toContain(undefined);
});

test.each([
  ["cubic stiffness", { body: { inertia: 1, stiffness: 1, cubic: 1 } }],
  ["two frequencies", { force: [1, 2].map((n) => ({ kind: "harmonic" as const, amplitude: 1, hz: n })) }],
  ["an input that starts later", { base: [{ kind: "ramp" as const, rate: 1, start: 2, stop: "none" as const }] }],
  ["near-critical damping", { body: { inertia: 1, stiffness: 1, viscous: 1.95 } }],
  ["undamped resonance", { force: [{ kind: "harmonic" as const, amplitude: 1, hz }] }],
])("%s is no plain problem", (_, sketch) => {
  const body = { inertia: 1, stiffness: 1 };
  const problem = buildScenario({ body, contact: coulombForces(0.3), span: { seconds: 1 }, ...sketch });
  expect(PlainStepper.of(compileProblem(problem))).toBeNull();
});
