import {
  checkScenario,
  compileProblem,
  needsAdaptive,
  recordDigest,
  type Scenario,
  unsupported,
} from "@restband/solver";
import { describe, expect, it } from "vitest";
import { plainScenario, withContact } from "./plain-scenario.ts";

const checked = (input: unknown) => {
  const { scenario, faults } = checkScenario(input);
  expect(faults).toEqual([]);
  return scenario as Scenario;
};
const compile = (input: unknown) => compileProblem(checked(input));
const weighing = (incline: number) => withContact({ normal: { preload: 3, faces: 2, weight: true } }, { incline });

describe("compileProblem", () => {
  it("adds the weight's share to the preload of all faces", () => {
    const level = compile(weighing(0));
    expect(level.normal).toBe(6 + 2 * 9.80665);
    expect(Object.is(level.weight, 0)).toBe(true);
    const inclined = compile(weighing(30));
    expect(inclined.normal).toBeCloseTo(6 + 2 * 9.80665 * Math.cos(Math.PI / 6), 13);
    expect(inclined.weight).toBeCloseTo(-2 * 9.80665 * 0.5, 13);
  });

  it("stands a wall exactly upright", () => {
    expect(compile(weighing(90))).toMatchObject({ normal: 6, weight: -2 * 9.80665 });
    expect(compile(weighing(-90))).toMatchObject({ normal: 6, weight: 2 * 9.80665 });
  });

  it("gives an angular body no weight", () => {
    expect(compile({ ...withContact({ radius: 0.1 }), motion: "angular" })).toMatchObject({
      isLinear: false,
      normal: 40,
      weight: 0,
      radius: 0.1,
    });
  });

  it("turns phases into radians and leaves a ripple of nothing out", () => {
    const normal = { preload: 40, ripple: { amplitude: 5, hz: 3, phase: 90 } };
    expect(compile(withContact({ normal })).ripple).toEqual({ amplitude: 5, hz: 3, phase: Math.PI / 2, origin: 0 });
    const still = { preload: 40, ripple: { amplitude: 0, hz: 3 } };
    expect(compile(withContact({ normal: still })).ripple).toBeNull();
  });

  it("reads a counterface as ground, base or belt", () => {
    expect(compile(plainScenario())).toMatchObject({ counterface: "ground", beltVelocity: 0 });
    expect(compile(withContact({ counterface: "base" }))).toMatchObject({ counterface: "base", beltVelocity: 0 });
    expect(compile(withContact({ counterface: { velocity: -2 } }))).toMatchObject({
      counterface: "belt",
      beltVelocity: -2,
    });
  });

  it("takes the drive from the forces first, then from the base", () => {
    const solid = { model: "equivalent-viscous", lossFactor: 0.1, at: "drive" };
    const base = [{ kind: "harmonic", amplitude: 1, hz: 2 }];
    const unbalance = { kind: "unbalance", mass: 1, eccentricity: 1, hz: 5 };
    expect(compile(plainScenario({ solid, base })).solid.viscous).toBeCloseTo(80 / (4 * Math.PI), 12);
    expect(compile(plainScenario({ solid, base, force: [unbalance] })).solid.viscous).toBeCloseTo(
      80 / (10 * Math.PI),
      12,
    );
  });

  it("is relative with an acceleration record, and reads stored points", () => {
    const [times, values] = [
      [0, 1, 2],
      [0, 3, 0],
    ];
    const digest = recordDigest(times, values);
    const base = [{ kind: "acceleration-record", digest, points: 3 }];
    const scenario = checked(withContact({ counterface: "base" }, { base }));
    const records = new Map([[digest, { times: Float64Array.from(times), values: Float64Array.from(values) }]]);
    expect(unsupported(scenario)).toMatchObject({ path: "base[0].digest" });
    expect(unsupported(scenario, records)).toBeNull();
    expect(() => compileProblem(scenario)).toThrow(RangeError);
    const problem = compileProblem(scenario, records);
    const c = new Float64Array(4);
    problem.base[0].addPolynomial(0.5, c);
    expect([problem.isRelative, c[0]]).toEqual([true, 1.5]);
  });
});

describe("needsAdaptive", () => {
  const ripple = (preload: number, amplitude: number, model = "coulomb") => {
    const law = model === "none" ? { model } : { model, static: 0.2, kinetic: 0.1 };
    return withContact({ law, normal: { preload, ripple: { amplitude, hz: 3 } } });
  };
  const chirp = { kind: "chirp", amplitude: 1, fromHz: 1, toHz: 2, seconds: 1, spacing: "log" };
  const cases: [name: string, scenario: unknown, path: string | null][] = [
    ["a plain scenario", plainScenario(), null],
    [
      "a law that falls",
      withContact({ law: { model: "stribeck", static: 1, kinetic: 1, velocity: 1, exponent: 1 } }),
      "contact.law.model",
    ],
    ["a table", withContact({ law: { model: "table", points: [[0, 1]] } }), "contact.law.model"],
    ["a cubic spring", plainScenario({ body: { inertia: 1, stiffness: 1, cubic: -1 } }), "body.cubic"],
    ["a chirp", plainScenario({ force: [{ kind: "constant", value: 1 }, chirp] }), "force[1].kind"],
    ["a ripple that keeps contact", ripple(40, -39.99), null],
    ["a ripple that loses contact", ripple(40, -50), null],
    ["a ripple with nothing to lose", ripple(40, 50, "none"), null],
  ];
  it.each(cases)("%s", (_name, scenario, path) => {
    expect(needsAdaptive(checked(scenario))?.path ?? null).toBe(path);
  });
});
