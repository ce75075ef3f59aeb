import { describe, expect, test } from "vitest";
import { runExact } from "../../solver/src/motion/exact/run-exact.ts";
import type { Motion } from "../../solver/src/motion/motion.ts";
import { notesOf } from "../../solver/src/notes.ts";
import { Reading } from "../../solver/src/quantities/reading.ts";
import { compileProblem } from "../../solver/src/scenario/compile-problem.ts";
import { noStopMotion } from "../support/den-hartog.ts";
import { run } from "../support/run.ts";
import { buildScenario, coulombForces, type ScenarioSketch } from "../support/scenario-builder.ts";

const held: ScenarioSketch = {
  body: { inertia: 1, stiffness: 100 },
  contact: coulombForces(1, 1.5),
  span: { seconds: 4, untilRest: false },
};
const atResonance: ScenarioSketch = {
  body: { inertia: 1, stiffness: 1 },
  force: [{ kind: "harmonic", amplitude: 1, hz: 1 / (2 * Math.PI) }],
  span: { seconds: 200, untilRest: false },
};
const outcome = (sketch: ScenarioSketch) => run(sketch, { quantities: [] }).outcome;

describe("a body that ends in a stick", () => {
  test("has never moved where nothing ever will", () => {
    expect(outcome(held)).toBe("never-moved");
    expect(outcome({ ...held, force: [{ kind: "harmonic", amplitude: 1.4, hz: 2 }] })).toBe("never-moved");
  });

  test("has come to rest where it moved before", () => {
    expect(outcome({ ...held, initial: { displacement: 0.1 } })).toBe("came-to-rest");
    const pushed = { kind: "pulse", shape: "rectangle", peak: 3, duration: 0.2 } as const;
    expect(outcome({ ...held, force: [pushed] })).toBe("came-to-rest");
  });

  test("was followed too briefly where it will break away, and the note says when", () => {
    // needed force 1.5 N = 2 N/s · t for the first time at 0.75 s
    const ramp = { kind: "ramp", rate: 2 } as const;
    const result = run({ ...held, force: [ramp], span: { seconds: 0.5 } });
    expect(result.outcome).toBe("too-short");
    expect(result.notes).toEqual([{ code: "next-break-away", message: expect.any(String) as string, t: 0.75 }]);
    // one cycle needs two break-aways within the last half of a run on a belt
    const belt = { ...coulombForces(0.5, 1), counterface: { velocity: 0.2 } };
    const carried = { body: { inertia: 1, stiffness: 1 }, contact: belt, initial: { velocity: 0.2 } };
    expect(outcome({ ...carried, span: { seconds: 12 } })).toBe("too-short");
    expect(outcome({ ...carried, span: { seconds: 50 } })).toBe("stick-slip");
  });
});

describe("a body that goes on moving", () => {
  test("grows where nothing limits it: friction below π/4 of the force at resonance, undamped", () => {
    expect(outcome({ ...atResonance, contact: coulombForces(0.5) })).toBe("growing");
  });

  test("has not settled where damping will limit it later", () => {
    const damped = { ...atResonance, body: { inertia: 1, stiffness: 1, viscous: 0.02 }, span: { seconds: 120 } };
    expect(outcome(damped)).toBe("not-settled");
    expect(outcome({ ...damped, span: { seconds: 2000 } })).toBe("smooth-sliding");
  });

  test("slides smoothly on the orbit without stops, and sticks and slips where friction is too strong for it", () => {
    const driven = (friction: number, r: number): ScenarioSketch => {
      const hz = r / (2 * Math.PI);
      const { amplitude, phase } = noStopMotion(r, 0, Math.min(friction, 0.5));
      return {
        body: { inertia: 1, stiffness: 1 },
        contact: coulombForces(friction),
        force: [{ kind: "harmonic", amplitude: 1, hz, phase }],
        initial: { displacement: amplitude },
        span: { seconds: 40 / hz, untilRest: false },
      };
    };
    // Den Hartog's limit at r = 0.8 is 0.817406
    expect(outcome(driven(0.5, 0.8))).toBe("smooth-sliding");
    expect(outcome(driven(0.9, 0.8))).toBe("stick-slip");
  });

  test("slides smoothly at constant speed, however far it goes", () => {
    const pushed: ScenarioSketch = {
      body: { inertia: 1, stiffness: 0, viscous: 2 },
      contact: coulombForces(1),
      force: [{ kind: "constant", value: 2 }],
      initial: { velocity: 0.5 },
      span: { seconds: 20 },
    };
    expect(outcome(pushed)).toBe("smooth-sliding");
    expect(outcome({ ...pushed, force: [{ kind: "ramp", rate: 0.2 }] })).toBe("growing");
  });

  test("settles where it only slows down, without ever stopping", () => {
    const free = { body: { inertia: 1, stiffness: 100, viscous: 2 }, initial: { displacement: 1 } };
    expect(outcome({ ...free, span: { seconds: 10 } })).toBe("settles");
    expect(outcome({ ...free, span: { seconds: 4 } })).toBe("not-settled");
  });

  test("is judged by d, not by x, where the base feeds", () => {
    const feed: ScenarioSketch = {
      body: { inertia: 1, stiffness: 1, viscous: 0.2 },
      contact: coulombForces(0.5),
      base: [{ kind: "ramp", rate: 1 }],
      initial: { velocity: 1.2 },
      span: { seconds: 100 },
    };
    expect(outcome(feed)).toBe("smooth-sliding");
  });
});

describe("a run that was cut off", () => {
  test("has no outcome", () => {
    const result = run({ ...held, initial: { displacement: 0.1 }, span: { seconds: 4, maxEvents: 2 } });
    expect([result.ended, result.outcome]).toEqual(["max-events", null]);
    const cancelled = run({ ...atResonance, span: { seconds: 1e5 } }, { progress: () => false });
    expect([cancelled.ended, cancelled.outcome]).toEqual(["cancelled", null]);
  });
});

describe("the notes", () => {
  const codes = (sketch: ScenarioSketch) => run(sketch, { quantities: [] }).notes.map(({ code }) => code);

  test("say that a steady state depends on the start: undamped, at an even fraction of the natural frequency", () => {
    const driven = (hz: number, viscous = 0): ScenarioSketch => ({
      body: { inertia: 1, stiffness: (2 * Math.PI) ** 2, viscous },
      contact: coulombForces(8),
      force: [{ kind: "harmonic", amplitude: 40, hz }],
      span: { seconds: 100 },
    });
    expect(codes(driven(0.5))).toEqual(["steady-state-depends-on-start"]);
    expect(codes(driven(0.25 * 1.0009))).toEqual(["steady-state-depends-on-start"]);
    expect(codes(driven(0.4))).toEqual([]);
    expect(codes(driven(1 / 3))).toEqual([]);
    expect(codes(driven(0.5, 0.1))).toEqual([]);
    expect(codes({ ...driven(0.4), contact: {} })).toEqual(["steady-state-depends-on-start"]);
  });

  test("say from when on the contact is lost", () => {
    const still: ScenarioSketch = { ...held, contact: { ...held.contact, normal: { preload: 0 } } };
    expect(run({ ...still, initial: { displacement: 0.1 } }).notes).toMatchObject([{ code: "contact-lost", t: 0 }]);
    expect(codes({ ...still, contact: {} })).toEqual([]);
  });

  test.each([
    [12, -110],
    [12, 170],
    [12, 200],
    [-12, 0],
    [-30, 75],
    [10, 30],
    [9.9, 0],
  ])("say when a ripple of %d N, phase %d°, on 10 N first lets the contact go", (amplitude, degrees) => {
    const ripple = { amplitude, hz: 0.4, phase: (degrees * Math.PI) / 180, origin: 0 };
    const problem = compileProblem(buildScenario({ ...held, contact: { ...held.contact, normal: { preload: 10 } } }));
    // No method of this version follows a ripple as large: a run without it, told as if it had one.
    const motion = Object.assign(Object.create(runExact(problem)) as Motion, { problem: { ...problem, ripple } });
    const pressing = (t: number) => 10 + amplitude * Math.cos(2 * Math.PI * 0.4 * t + ripple.phase);
    const grid = Array.from({ length: 400_001 }, (_, i) => i / 1e5);
    const first = grid.find((t) => pressing(t) <= 1e-9);
    const note = notesOf(new Reading(motion), null).find(({ code }) => code === "contact-lost");
    if (first === undefined) expect(note).toBeUndefined();
    else expect(Math.abs(note!.t! - first)).toBeLessThanOrEqual(1.1e-5);
  });

  test("say that a damper for solid damping holds for a steady swing only", () => {
    const solid = { model: "equivalent-viscous", lossFactor: 0.05, at: "natural" } as const;
    expect(codes({ ...held, solid, initial: { displacement: 0.1 } })).toEqual(["solid-steady-only"]);
    const driven = { ...atResonance, solid, contact: coulombForces(0.1) };
    expect(codes({ ...driven, span: { seconds: 50 } })).toEqual(["solid-steady-only"]);
    expect(codes({ ...driven, span: { seconds: 2000 } })).toEqual([]);
  });

  test("say that a limit of one side leaves the other open", () => {
    const limits = [
      { quantity: "restDisplacement", max: 0.01 },
      { quantity: "restOffset", min: -0.01, max: 0.01 },
      { quantity: "peakDisplacement", max: 1 },
      { quantity: "meanDisplacement", min: -0.01 },
    ];
    const { notes } = run({ ...held, limits });
    expect(notes.map(({ message }) => message)).toEqual([
      "Rest position can be of either sign and has only an upper limit. Add a lower one if both sides matter.",
      "Mean displacement can be of either sign and has only a lower limit. Add an upper one if both sides matter.",
    ]);
  });
});
