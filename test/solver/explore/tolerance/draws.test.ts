import { checkTolerancePlan, drawsOf, drawScenario, type Scenario, type TolerancePlan } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { quantileOf } from "../../../../solver/src/explore/tolerance/draws.ts";
import { correlationOf, deviationOf, meanOf, rankCorrelation } from "../../../../solver/src/numerics/ranks.ts";
import { buildScenario } from "../../../support/scenario-builder.ts";

const scenario = buildScenario({
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
  span: { seconds: 5 },
});
const uniform = (path: string, low: number, high: number) => ({ path, distribution: { kind: "uniform", low, high } });

function planned(more: object): TolerancePlan {
  const checked = checkTolerancePlan(
    { format: "restband-tolerance/1", inputs: [], seed: 5, runs: 1000, ...more },
    scenario,
  );
  expect(checked.faults).toEqual([]);
  return checked.plan as TolerancePlan;
}

function columnsOf(plan: TolerancePlan): Float64Array[] {
  const draws = drawsOf(plan);
  const width = draws.length / plan.runs;
  return Array.from({ length: width }, (_, j) =>
    Float64Array.from({ length: plan.runs }, (__, i) => draws[i * width + j]),
  );
}

describe("distributions", () => {
  /* scipy.stats 1.17.1: truncnorm(−1, 0.5, 2, 4), truncnorm(6, 7), triang(0.25, 1, 4), norm(2, 4). */
  it.each([
    [0.001, -1.9912018796514546, 6.000162245969133, 1.0632455532033676, -10.360929224671253],
    [0.3, 0.11238130708827043, 6.0575631913034345, 2.1017246507621126, -0.09760205083216356],
    [0.999, 3.9939487829423337, 6.9195676613166235, 4.890455488498967, 14.360929224671253],
  ])("have the quantiles of SciPy at %d", (share, truncated, far, triangular, normal) => {
    const mean = 2;
    const deviation = 4;
    expect(quantileOf({ kind: "truncated", mean, deviation, low: -2, high: 4 }, share)).toBeCloseTo(truncated, 12);
    expect(quantileOf({ kind: "truncated", mean: 0, deviation: 1, low: 6, high: 7 }, share)).toBeCloseTo(far, 10);
    expect(quantileOf({ kind: "triangular", low: 1, likeliest: 2, high: 5 }, share)).toBeCloseTo(triangular, 12);
    expect(quantileOf({ kind: "normal", mean, deviation }, share)).toBeCloseTo(normal, 12);
  });
});

describe("the draws of a study", () => {
  const inputs = [
    uniform("body.stiffness", 0, 1000),
    uniform("body.inertia", 1, 2),
    uniform("contact.normal.preload", 5, 6),
  ];

  it("follow from the seed alone", () => {
    expect(drawsOf(planned({ inputs }))).toEqual(drawsOf(planned({ inputs })));
    expect(drawsOf(planned({ inputs, seed: 6 }))).not.toEqual(drawsOf(planned({ inputs })));
  });

  it("take every equally likely stretch once", () => {
    const [stiffness] = columnsOf(planned({ inputs }));
    expect([...stiffness].map(Math.floor).sort((a, b) => a - b)).toEqual(Array.from({ length: 1000 }, (_, i) => i));
    const [anywhere] = columnsOf(planned({ inputs, sampling: "random" }));
    expect(new Set([...anywhere].map(Math.floor)).size).toBeLessThan(700);
  });

  it("have the rank correlations asked for, whatever the distributions", () => {
    const correlations = [
      { first: 0, second: 1, value: 0.8 },
      { first: 1, second: 2, value: -0.5 },
    ];
    const skewed = { path: "body.inertia", distribution: { kind: "triangular", low: 1, likeliest: 1, high: 9 } };
    const plan = planned({ inputs: [inputs[0], skewed, inputs[2]], correlations, runs: 2000 });
    const [a, b, c] = columnsOf(plan);
    expect(rankCorrelation(a, b)).toBeCloseTo(0.8, 1);
    expect(Math.abs((rankCorrelation(a, b) ?? 0) - 0.8)).toBeLessThan(0.02);
    expect(Math.abs((rankCorrelation(b, c) ?? 0) + 0.5)).toBeLessThan(0.02);
    expect(Math.abs(rankCorrelation(a, c) ?? 1)).toBeLessThan(0.02);
    // only the order has changed
    const [free] = columnsOf(planned({ inputs: [inputs[0], skewed, inputs[2]], runs: 2000 }));
    expect([...a].sort()).toEqual([...free].sort());
  });

  it("scatter together as a covariance says", () => {
    const covariance = [
      [400, 12],
      [12, 0.5],
    ];
    const joint = [{ paths: ["body.stiffness", "body.inertia"], means: [800, 5], covariance }];
    const [k, m] = columnsOf(planned({ joint, runs: 20_000 }));
    expect(meanOf(k)).toBeCloseTo(800, 1);
    expect(meanOf(m)).toBeCloseTo(5, 2);
    expect(deviationOf(k)).toBeCloseTo(20, 0);
    expect(deviationOf(m)).toBeCloseTo(Math.sqrt(0.5), 2);
    expect(correlationOf(k, m)).toBeCloseTo(12 / Math.sqrt(400 * 0.5), 2);
  });

  it("can be opened as scenarios, or say why not", () => {
    const plan = planned({ inputs: [uniform("contact.law.static", 0.1, 0.3)], links: {} });
    const draws = drawsOf(plan);
    const opened = Array.from({ length: 50 }, (_, i) => drawScenario(scenario, plan, draws, i));
    opened.forEach(({ scenario: drawn, faults }, i) => {
      if (draws[i] < 0.15) expect(faults[0].path).toBe("contact.law.static");
      else expect((drawn as Scenario).contact.law).toMatchObject({ static: draws[i], kinetic: 0.15 });
    });
    expect(opened.some(({ faults }) => faults.length > 0)).toBe(true);
  });
});
