import type { Scenario } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { judge } from "../support/judge.ts";
import { freeDecay } from "../support/free-decay.ts";
import { noStopMotion } from "../support/den-hartog.ts";
import { buildScenario, coulombForces, type ScenarioSketch } from "../support/scenario-builder.ts";

/* The judge is held against closed forms before it may judge the solver. */

const errorAt = (scenario: Scenario, h: number, expected: number): number =>
  Math.abs(judge(scenario, h).x.at(-1)! - expected);

/** The mean error over eight neighbouring steps: where an event falls within its step is chance, and evens out. */
function meanError(scenario: Scenario, h: number, expected: number): number {
  const steps = Array.from({ length: 8 }, (_, i) => h * (1 + i / 17));
  return steps.reduce((total, step) => total + errorAt(scenario, step, expected), 0) / steps.length;
}

/** The power of h that the error falls with, from h to h/4. */
const orderOf = (scenario: Scenario, h: number, expected: number): number =>
  Math.log(meanError(scenario, h, expected) / meanError(scenario, h / 4, expected)) / Math.log(4);

const belt: ScenarioSketch = {
  body: { inertia: 1, stiffness: 1 },
  contact: { ...coulombForces(0.5, 1), counterface: { velocity: 0.2 } },
  initial: { velocity: 0.2 },
  span: { seconds: 25.3 },
};

/** x on the belt: sticks from Fk/k − d to Fk/k + d, then swings by A about Fk/k (see belt-stick-slip.test.ts). */
function beltAt(t: number): number {
  const slip = 2 * (Math.PI - Math.atan(2.5));
  if (t < 5) return 0.2 * t;
  const within = (t - 5) % (slip + 5);
  return within < slip ? 0.5 + 0.5 * Math.cos(within) + 0.2 * Math.sin(within) : 0.2 * (within - slip);
}

describe("the judge converges", () => {
  test("without contact, to the closed form of a damped body, with h²", () => {
    const scenario = buildScenario({
      body: { inertia: 2, stiffness: 50, viscous: 2 },
      initial: { displacement: 0.3, velocity: -1 },
      span: { seconds: 3 },
    });
    const damped = Math.sqrt(25 - 0.25);
    const expected = Math.exp(-1.5) * (0.3 * Math.cos(3 * damped) + ((-1 + 0.15) / damped) * Math.sin(3 * damped));
    expect(orderOf(scenario, 0.01, expected)).toBeCloseTo(2, 1);
    expect(errorAt(scenario, 0.001, expected)).toBeLessThan(1e-6);
  });

  test("with turns, to the closed form of free Coulomb decay, with h", () => {
    const scenario = buildScenario({
      body: { inertia: 1, stiffness: 1 },
      contact: coulombForces(0.1),
      initial: { displacement: 2.05 },
      span: { seconds: 21 },
    });
    // After six half-cycles of 0.2 each, 0.85 is left; then x = 0.1 + 0.75 cos(t − 6π).
    const expected = 0.1 + 0.75 * Math.cos(21 - 6 * Math.PI);
    expect(orderOf(scenario, 0.02, expected)).toBeGreaterThan(0.8);
    expect(meanError(scenario, 0.005, expected)).toBeLessThan(0.002);
  });

  test("with sticks, µs > µk, to the closed form of the belt's cycle, with h", () => {
    const scenario = buildScenario(belt);
    const order = orderOf(scenario, 0.04, beltAt(25.3));
    expect(order).toBeGreaterThan(0.8);
    expect(order).toBeLessThan(1.3);
    expect(meanError(scenario, 0.01, beltAt(25.3))).toBeLessThan(0.02);
  });

  test("to itself, h against h/2 against h/4, smooth and with sticks", () => {
    for (const drive of [0.3, 0.9]) {
      const scenario = buildScenario({
        body: { inertia: 1, stiffness: 1, viscous: 0.1 },
        contact: coulombForces(drive === 0.3 ? 0.5 : 0.1),
        force: [{ kind: "harmonic", amplitude: 1, hz: drive / (2 * Math.PI) }],
        span: { seconds: 60 },
      });
      const at = [15, 30, 45];
      const positions = (h: number) => {
        const { t, x } = judge(scenario, h, at);
        return at.map((time) => x[t.indexOf(time)]);
      };
      const [whole, half, quarter] = [0.02, 0.01, 0.005].map(positions);
      const distance = (a: number[], b: number[]) => Math.hypot(...a.map((x, i) => x - b[i]));
      expect(distance(half, quarter)).toBeLessThan(0.75 * distance(whole, half));
    }
  });
});

describe("the judge sees the events", () => {
  test("of a free decay: its turning points and the rest, µs ≠ µk, with a same-side halt", () => {
    for (const body of [
      { x0: 20, xk: 0.5, xs: 0.5, ratio: 0.02 },
      { x0: 10, xk: 1.96, xs: 2.45, ratio: 0 },
      { x0: 39, xk: 1.99967, xs: 1.99967, ratio: 0 },
    ]) {
      const run = judge(
        buildScenario({
          body: { inertia: 1, stiffness: 1, viscous: 2 * body.ratio },
          contact: coulombForces(body.xk, body.xs),
          initial: { displacement: body.x0 },
          span: { seconds: 100 },
        }),
        0.002,
      );
      const [first, ...swings] = run.events;
      const points = freeDecay(body);
      expect(first.kind).toBe("break-away");
      expect(swings.map(({ kind }) => kind)).toEqual(
        points.slice(1).map((_, i) => (i < points.length - 2 ? "turn" : "stop")),
      );
      swings.forEach(({ x }, i) => expect(Math.abs(x - points[i + 1])).toBeLessThan(0.005 * body.x0));
      expect(run.outcome).toBe("came-to-rest");
    }
  });

  test("of a forced body at its no-stop amplitude", () => {
    const { amplitude, phase } = noStopMotion(0.8, 0, 0.4);
    const run = judge(
      buildScenario({
        body: { inertia: 1, stiffness: 1 },
        contact: coulombForces(0.4),
        force: [{ kind: "harmonic", amplitude: 1, hz: 0.4 / Math.PI, phase }],
        initial: { displacement: amplitude },
        span: { seconds: 30 * 2.5 * Math.PI },
      }),
      0.002,
    );
    expect(Math.max(...run.x.slice(-4000).map(Math.abs))).toBeCloseTo(amplitude, 2);
    expect(run.events.filter(({ kind }) => kind === "stop")).toEqual([]);
    expect(run.outcome).toBe("smooth-sliding");
  });

  test("of Reid's damping: the half-cycle ratio", () => {
    const run = judge(
      buildScenario({
        body: { inertia: 1, stiffness: 1 },
        solid: { model: "displacement-proportional", lossFactor: 0.1 },
        initial: { displacement: 1 },
        span: { seconds: 20 },
      }),
      0.001,
    );
    const turns = run.events.filter(({ kind }) => kind === "turn");
    expect(turns.length).toBe(6);
    turns.forEach(({ x }, i) => expect(x).toBeCloseTo((-0.8535159657) ** (i + 1), 2));
  });
});

describe("the judge names the outcome", () => {
  const outcomeOf = (sketch: ScenarioSketch, h = 0.005) => judge(buildScenario(sketch), h).outcome;
  const body = { inertia: 1, stiffness: 1 };

  test("never-moved, where it is held for good", () => {
    const harmonic = { kind: "harmonic", amplitude: 0.9, hz: 0.1 } as const;
    expect(outcomeOf({ body, contact: coulombForces(1), force: [harmonic], span: { seconds: 4 } })).toBe("never-moved");
  });

  test("too-short, where a stuck body would still break away", () => {
    const feed = { kind: "ramp", rate: 0.01 } as const;
    expect(outcomeOf({ body, contact: coulombForces(1), base: [feed], span: { seconds: 50 } })).toBe("too-short");
    const late = { kind: "step", value: 3, start: 9 } as const;
    expect(outcomeOf({ body, contact: coulombForces(1), force: [late], span: { seconds: 5 } })).toBe("too-short");
  });

  test("growing, at undamped resonance", () => {
    const resonant = { kind: "harmonic", amplitude: 1, hz: 0.5 / Math.PI } as const;
    expect(outcomeOf({ body, contact: coulombForces(0.3), force: [resonant], span: { seconds: 100 } })).toBe("growing");
  });

  test("stick-slip on a slow belt; settles where only damping works; smooth on a fast, damped belt", () => {
    expect(outcomeOf({ ...belt, span: { seconds: 150 } })).toBe("stick-slip");
    expect(outcomeOf({ body: { ...body, viscous: 0.6 }, initial: { displacement: 1 }, span: { seconds: 60 } })).toBe(
      "settles",
    );
    const fast = {
      ...belt,
      body: { ...body, viscous: 0.4 },
      contact: { ...belt.contact, counterface: { velocity: 5 } },
    };
    expect(outcomeOf({ ...fast, span: { seconds: 100 } })).toBe("smooth-sliding");
  });

  test("not-settled, where the swing still changes by more than 2 %", () => {
    const sketch = { body: { ...body, viscous: 0.02 }, initial: { displacement: 1 }, span: { seconds: 60 } };
    expect(outcomeOf(sketch)).toBe("not-settled");
  });
});
