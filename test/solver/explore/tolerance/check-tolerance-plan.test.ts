import { checkTolerancePlan } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { buildScenario } from "../../../support/scenario-builder.ts";

const scenario = buildScenario({
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
  span: { seconds: 5 },
});
const uniform = { path: "body.stiffness", distribution: { kind: "uniform", low: 700, high: 900 } };
const normal = { path: "body.inertia", distribution: { kind: "normal", mean: 2, deviation: 0.1 } };
const plan = (more: object) => ({
  format: "restband-tolerance/1",
  inputs: [uniform, normal],
  seed: 1,
  runs: 100,
  ...more,
});
const faultsOf = (more: object) => checkTolerancePlan(plan(more), scenario).faults;
const scattered = (distribution: object) => ({ inputs: [{ path: "body.stiffness", distribution }] });

describe("a plan of a tolerance study", () => {
  it("needs inputs, a seed and a number of runs; all else may be left out", () => {
    expect(checkTolerancePlan(plan({}), scenario).plan).toMatchObject({
      correlations: [],
      joint: [],
      links: {},
      sampling: "latin-hypercube",
      quantities: [],
    });
    const friction = { path: "contact.law.static", distribution: { kind: "uniform", low: 0.1, high: 0.3 } };
    expect(checkTolerancePlan(plan({ inputs: [friction] }), scenario).plan?.links).toEqual({
      "contact.law.kinetic": { of: "contact.law.static", factor: 0.15 / 0.2 },
    });
  });

  it.each<[string, object, string, RegExp]>([
    ["nothing that scatters", { inputs: [] }, "inputs", /Nothing scatters/],
    ["too few runs", { runs: 99 }, "runs", /at least 100/],
    ["too many runs", { runs: 100_001 }, "runs", /at most 100000/],
    ["half a seed", { seed: 0.5 }, "seed", /whole number/],
    ["an unknown member", { draws: 5 }, "draws", /not known here/],
    [
      "a number that the scenario does not use",
      { inputs: [{ ...uniform, path: "contact.law.velocity" }] },
      "inputs[0].path",
      /no number called/,
    ],
    ["the same number twice", { inputs: [uniform, uniform] }, "inputs[1].path", /already/],
    ["whole numbers", { inputs: [{ ...uniform, path: "contact.normal.faces" }] }, "inputs[0].path", /whole number/],
    [
      "an empty range",
      scattered({ kind: "uniform", low: 3, high: 3 }),
      "inputs[0].distribution.high",
      /above the low end/,
    ],
    [
      "a deviation of 0",
      scattered({ kind: "normal", mean: 3, deviation: 0 }),
      "inputs[0].distribution.deviation",
      /more than 0/,
    ],
    [
      "ends far away from the mean",
      scattered({ kind: "truncated", mean: 0, deviation: 1, low: 9, high: 10 }),
      "inputs[0].distribution.low",
      /next to nothing/,
    ],
    [
      "a likeliest value outside",
      scattered({ kind: "triangular", low: 1, likeliest: 5, high: 4 }),
      "inputs[0].distribution.likeliest",
      /between 1 and 4/,
    ],
    [
      "a correlation of 1",
      { correlations: [{ first: 0, second: 1, value: 1 }] },
      "correlations[0].value",
      /between -1 and 1/,
    ],
    ["a correlation with itself", { correlations: [{ first: 0, second: 0, value: 0.5 }] }, "correlations[0]", /two of/],
    [
      "a covariance that none can have",
      {
        inputs: [],
        joint: [
          {
            paths: ["body.stiffness", "body.inertia"],
            means: [1, 1],
            covariance: [
              [1, 2],
              [2, 1],
            ],
          },
        ],
      },
      "joint[0].covariance",
      /positive definite\. Value 2 and value 1 would correlate by 2\.00/,
    ],
    [
      "a variance of 0",
      { inputs: [], joint: [{ paths: ["body.stiffness"], means: [1], covariance: [[0]] }] },
      "joint[0].covariance[0][0]",
      /more than 0/,
    ],
    [
      "the same pair twice",
      {
        correlations: [
          { first: 0, second: 1, value: 0.2 },
          { first: 1, second: 0, value: 0.3 },
        ],
      },
      "correlations[1].second",
      /already/,
    ],
    [
      "a covariance that is not symmetric",
      {
        inputs: [],
        joint: [
          {
            paths: ["body.stiffness", "body.inertia"],
            means: [1, 1],
            covariance: [
              [1, 0.2],
              [0.1, 1],
            ],
          },
        ],
      },
      "joint[0].covariance",
      /symmetric/,
    ],
    [
      "means that are missing",
      { inputs: [], joint: [{ paths: ["body.stiffness"], means: [], covariance: [[1]] }] },
      "joint[0].means",
      /1 values and 0 means/,
    ],
  ])("refuses %s", (_what, more, path, message) => {
    expect(faultsOf(more)).toEqual([{ path, message: expect.stringMatching(message) as string }]);
  });

  it("refuses correlations that cannot all hold", () => {
    const inputs = [
      uniform,
      normal,
      { path: "contact.normal.preload", distribution: { kind: "uniform", low: 1, high: 2 } },
    ];
    const correlations = [
      { first: 0, second: 1, value: 0.9 },
      { first: 1, second: 2, value: 0.9 },
      { first: 0, second: 2, value: -0.9 },
    ];
    expect(faultsOf({ inputs, correlations }).map(({ path }) => path)).toEqual(["correlations"]);
  });

  it("refuses correlations whose scores cannot hold, though their ranks might: else none of them would be drawn", () => {
    const path = ["body.stiffness", "body.inertia", "contact.normal.preload"];
    const inputs = path.map((each) => ({ path: each, distribution: { kind: "uniform", low: 1, high: 2 } }));
    // of three equal negative ones −1/2 is the least; as correlations of scores −0.49 is −0.507
    const equal = (value: number) => [0, 1, 2].map((i) => ({ first: i, second: (i + 1) % 3, value }));
    expect(faultsOf({ inputs, correlations: equal(-0.49) }).map((fault) => fault.path)).toEqual(["correlations"]);
    expect(faultsOf({ inputs, correlations: equal(-0.48) })).toEqual([]);
  });

  it("takes the source of a covariance along", () => {
    const joint = [{ paths: ["body.stiffness"], means: [800], covariance: [[4]], source: "Fit of ring-down 3" }];
    expect(checkTolerancePlan(plan({ inputs: [], joint }), scenario).plan?.joint).toEqual(joint);
  });

  it("never throws", () => {
    for (const garbage of [null, 3, "plan", [], { inputs: [null] }, { inputs: [uniform], joint: 1 }])
      expect(checkTolerancePlan(garbage, scenario).faults.length).toBeGreaterThan(0);
  });
});
