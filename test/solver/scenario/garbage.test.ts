import { canonicalText, checkScenario } from "@restband/solver";
import fc from "fast-check";
import { describe, expect, it } from "vitest";
import { plainScenario } from "./plain-scenario.ts";

const rich = plainScenario({
  solid: { model: "equivalent-viscous", lossFactor: 0.1, at: { hz: 3 } },
  contact: {
    law: {
      model: "table",
      points: [
        [0, 0.2],
        [0.1, 0.1],
      ],
    },
    normal: { preload: 40, ripple: { amplitude: 1, hz: 2 } },
    counterface: { velocity: 0.1 },
  },
  force: [
    { kind: "record", times: [0, 1], values: [0, 1] },
    { kind: "ramp", rate: 1, stop: 2 },
  ],
  base: [{ kind: "staircase", increment: 0.1, count: 3, dwell: 1, speed: 1, acceleration: 1 }],
  limits: [{ quantity: "restTime", max: 1 }],
  origins: { "body.inertia": { kind: "assumed", low: 1 } },
});

/** Every path of plain data, as steps. */
function stepsIn(value: unknown, steps: string[] = []): string[][] {
  if (typeof value !== "object" || value === null) return [steps];
  return [steps, ...Object.entries(value).flatMap(([key, member]) => stepsIn(member, [...steps, key]))];
}

function replaced(value: unknown, [step, ...rest]: string[], by: unknown): unknown {
  if (step === undefined) return by;
  const copy: unknown = Array.isArray(value) ? [...(value as unknown[])] : { ...(value as object) };
  const record = copy as Record<string, unknown>;
  record[step] = replaced(record[step], rest, by);
  return copy;
}

const expectAnswer = (input: unknown) => {
  const { scenario, faults } = checkScenario(input);
  if (scenario !== null) {
    const text = canonicalText(scenario);
    expect(canonicalText(checkScenario(JSON.parse(text)).scenario ?? scenario)).toBe(text);
    expect(faults).toEqual([]);
    return;
  }
  expect(faults.length).toBeGreaterThan(0);
  for (const { path, message } of faults) {
    expect(typeof path).toBe("string");
    expect(message.length).toBeGreaterThan(10);
  }
};

const anything = fc.anything({
  withBigInt: true,
  withDate: true,
  withMap: true,
  withSparseArray: true,
  withNullPrototype: true,
});

describe("checkScenario never throws", { timeout: 60_000 }, () => {
  it("on any JSON", () => {
    fc.assert(fc.property(fc.jsonValue(), expectAnswer), { numRuns: 500 });
  });

  it("on any value at all", () => {
    fc.assert(fc.property(anything, expectAnswer), { numRuns: 500 });
  });

  it("on a scenario with anything put anywhere in it", () => {
    const place = fc.constantFrom(...stepsIn(rich));
    const odd = fc.oneof(fc.jsonValue(), anything, fc.constantFrom(NaN, -0, 1e308, 5e-324, "none", "__proto__"));
    const property = fc.property(place, odd, (steps, value) => expectAnswer(replaced(rich, steps, value)));
    fc.assert(property, { numRuns: 2000 });
  });

  it("on names that objects inherit", () => {
    const text = `{"__proto__": {"format": "restband-scenario/1"}, "constructor": 1, "origins": {"__proto__": {"kind": "assumed"}},
      "force": [{"kind": "__proto__"}, {"kind": "toString"}, {"kind": "constant", "value": 1, "__proto__": 3}]}`;
    const paths = checkScenario(JSON.parse(text)).faults.map((fault) => fault.path);
    expect(paths).toEqual(
      expect.arrayContaining([
        ...["format", "__proto__", "constructor", "origins.__proto__"],
        ...["force[0].kind", "force[1].kind", "force[2].__proto__"],
      ]),
    );
  });

  it("on what is deep or refers to itself", () => {
    let deep: unknown = [];
    for (let i = 0; i < 100_000; i++) deep = { force: [deep] };
    expectAnswer(deep);
    expectAnswer({ ...rich, title: deep });
    const round: Record<string, unknown> = { ...rich };
    round.force = [round];
    expectAnswer(round);
  });

  it("on what is huge, and names no more faults than a person can use", () => {
    const huge = [
      { force: Array(100_000).fill(7) },
      { force: [{ kind: "record", times: Array(200_000).fill("x"), values: Array(200_000).fill(1) }] },
      {
        force: [
          { kind: "record", times: Array.from({ length: 200_000 }, (_, i) => -i), values: Array(200_000).fill(1) },
        ],
      },
      { origins: Object.fromEntries(Array.from({ length: 100_000 }, (_, i) => [`x${i}`, i])) },
      Object.fromEntries(Array.from({ length: 100_000 }, (_, i) => [`x${i}`, i])),
    ];
    for (const part of huge) {
      const { faults } = checkScenario({ ...rich, ...part });
      expect(faults.length).toBeGreaterThan(0);
      expect(faults.length).toBeLessThanOrEqual(501);
    }
  });
});
