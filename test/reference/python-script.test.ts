import { describe, expect, it } from "vitest";
import { digestOf, pythonScript, simulate, type Result, type Scenario } from "@restband/solver";
import { runPython } from "../support/python.ts";
import { buildScenario } from "../support/scenario-builder.ts";

/** Runs that between them meet every rule of stick and slip; the file integrates what the solver knows in closed form. */
const scenarios: Record<string, Scenario> = {
  "a decay to rest on an incline": buildScenario({
    body: { inertia: 3, stiffness: 1200, viscous: 2 },
    contact: { law: { model: "coulomb", static: 0.3, kinetic: 0.22 }, normal: { weight: true } },
    incline: 12,
    initial: { displacement: 0.09, velocity: 0.4 },
    span: { seconds: 6 },
  }),
  "two harmonics and a pulse, with stops": buildScenario({
    body: { inertia: 1, stiffness: 400, viscous: 0.8 },
    contact: { law: { model: "coulomb", static: 1.3, kinetic: 1 }, normal: { preload: 6 } },
    force: [
      { kind: "harmonic", amplitude: 10, hz: 1.1, phase: 30 },
      { kind: "harmonic", amplitude: 3, hz: 3.3, phase: -60 },
      { kind: "pulse", shape: "triangle", peak: 8, start: 0.7, duration: 0.4 },
    ],
    span: { seconds: 9, untilRest: false },
  }),
  "a spring with damping of its own between a shaken base and the ground": buildScenario({
    body: { inertia: 2, stiffness: 500 },
    solid: { model: "displacement-proportional", lossFactor: 0.25 },
    contact: { law: { model: "coulomb", static: 0.8, kinetic: 0.6 }, normal: { preload: 10 } },
    base: [
      { kind: "harmonic", amplitude: 0.03, hz: 1.3 },
      { kind: "ramp", rate: 0.01, start: 0, stop: 2 },
    ],
    span: { seconds: 5, untilRest: false },
  }),
  "bristles that creep, let go and catch again": buildScenario({
    body: { inertia: 1, stiffness: 800, viscous: 2 },
    contact: {
      law: { model: "bristle", static: 0.4, kinetic: 0.25, velocity: 0.01, stiffness: 4e4, damping: 150, fluid: 0.5 },
      normal: { preload: 20, ripple: { amplitude: 6, hz: 3, phase: 40 } },
      counterface: { velocity: 0.02 },
    },
    force: [{ kind: "step", value: 2, start: 0.9 }],
    span: { seconds: 1.5, untilRest: false },
  }),
  "a slide shaken by a long record": buildScenario({
    body: { inertia: 20, stiffness: 8e4, viscous: 60 },
    contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 600 } },
    base: [{ kind: "record", ...swing(1200, 3) }],
    span: { seconds: 3.2 },
  }),
  "a feed that sticks and slips": buildScenario({
    body: { inertia: 120, stiffness: 4e6, viscous: 350 },
    contact: { law: { model: "coulomb", static: 0.15, kinetic: 0.12 }, normal: { preload: 800, weight: true } },
    base: [{ kind: "ramp", rate: 0.002 }],
    span: { seconds: 0.8, untilRest: false },
    settleBand: 1e-5,
  }),
  "a body that comes back to its belt's speed at each break-away": buildScenario({
    body: { inertia: 1, stiffness: 40 },
    contact: {
      law: { model: "coulomb", static: 0.3, kinetic: 0.3 },
      normal: { preload: 10 },
      counterface: { velocity: 0.1 },
    },
    span: { seconds: 4, untilRest: false },
  }),
  "a body on a belt with falling friction": buildScenario({
    body: { inertia: 2, stiffness: 800, cubic: 3e4, viscous: 0.5 },
    contact: {
      law: { model: "stribeck", static: 0.4, kinetic: 0.2, velocity: 0.1, exponent: 1, fluid: 0.3 },
      normal: { preload: 30 },
      counterface: { velocity: 0.05 },
    },
    span: { seconds: 6, untilRest: false },
  }),
  "a rotor with measured friction on a base that moves and shakes": buildScenario({
    motion: "angular",
    body: { inertia: 0.05, stiffness: 60 },
    solid: { model: "equivalent-viscous", lossFactor: 0.04, at: "natural" },
    contact: {
      law: {
        model: "table",
        points: [
          [0, 0.35],
          [0.02, 0.24],
          [0.2, 0.2],
          [1, 0.26],
        ],
      },
      normal: { preload: 40, faces: 2, ripple: { amplitude: 90, hz: 1.7, phase: 20 } },
      radius: 0.08,
    },
    base: [
      { kind: "move", distance: 0.3, speed: 0.5, acceleration: 4, start: 0.2 },
      { kind: "harmonic", amplitude: 0.05, hz: 2.3 },
    ],
    span: { seconds: 3, untilRest: false },
    settleBand: 0.01,
  }),
};

describe("a scenario as a Python file", () => {
  it.each(Object.entries(scenarios))("recomputes every quantity and event of %s within 1e-6", (_name, scenario) => {
    const result = run(scenario);
    expect(result.events.length).toBeGreaterThan(4);
    const { status, output } = runPython(scriptOf(scenario, result));
    expect(output).toMatch(/^agrees: /mu);
    expect(status).toBe(0);
    expect(output).not.toContain("Warning");
  });

  it("says so and ends with status 1 where a number is wrong", () => {
    const scenario = scenarios["a decay to rest on an incline"];
    const result = run(scenario);
    const quantities = { ...result.quantities, peakVelocity: (result.quantities.peakVelocity ?? 0) * (1 + 1e-5) };
    const { status, output } = runPython(scriptOf(scenario, { ...result, quantities }));
    expect(output).toMatch(/^peakVelocity .*more than allowed$/mu);
    expect(status).toBe(1);
  });
});

/** A swing that speeds up, at so many even times. */
function swing(points: number, seconds: number): { times: number[]; values: number[] } {
  const times = Array.from({ length: points }, (_, i) => (seconds * i) / (points - 1));
  return { times, values: times.map((t) => 0.004 * Math.sin(2 * Math.PI * (1 + 0.5 * t) * t)) };
}

function run(scenario: Scenario): Result {
  const result = simulate(scenario, { samples: 0 });
  if ("error" in result) throw new Error(result.error.message);
  return result;
}

function scriptOf(scenario: Scenario, result: Result): string {
  const claim = { ...result, eventCount: result.events.length, digest: digestOf(scenario), name: "this run" };
  return pythonScript(scenario, claim);
}
