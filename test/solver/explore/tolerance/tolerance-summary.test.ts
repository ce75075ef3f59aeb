import {
  checkTolerancePlan,
  drawsOf,
  runDraws,
  toleranceSummary,
  type Scenario,
  type TolerancePlan,
  type ToleranceSummary,
} from "@restband/solver";
import { describe, expect, it } from "vitest";
import { exactInterval } from "../../../../solver/src/numerics/binomial-interval.ts";
import { buildScenario } from "../../../support/scenario-builder.ts";

const uniform = (path: string, low: number, high: number) => ({ path, distribution: { kind: "uniform", low, high } });

function study(scenario: Scenario, plan: object): ToleranceSummary {
  const checked = checkTolerancePlan({ format: "restband-tolerance/1", seed: 11, runs: 1000, ...plan }, scenario);
  expect(checked.faults).toEqual([]);
  const { runs } = checked.plan as TolerancePlan;
  const draws = drawsOf(checked.plan as TolerancePlan);
  const rows = runDraws(scenario, checked.plan as TolerancePlan, draws, [0, runs]);
  return toleranceSummary(checked.plan as TolerancePlan, scenario, rows as Float64Array);
}

/** x_b = μs N/k = 0.2 N/800: 2.5 mm as entered. */
const released = buildScenario({
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
  initial: { displacement: 0.02 },
  span: { seconds: 20 },
  limits: [
    { quantity: "restBand", max: 0.003 },
    { quantity: "halfCycles", max: 100 },
  ],
});

describe("what a tolerance study says", () => {
  it("of a number it knows: a preload anywhere from 8 to 14 N", () => {
    const summary = study(released, { inputs: [uniform("contact.normal.preload", 8, 14)], quantities: ["naturalHz"] });
    const [band] = summary.spreads;
    expect(band.quantity).toBe("restBand");
    // 2 to 3.5 mm, evenly: one thousandth of the way apart from draw to draw
    expect(band.mean).toBeCloseTo(0.00275, 6);
    expect(band.least).toBeCloseTo(0.002, 5);
    expect(band.largest).toBeCloseTo(0.0035, 5);
    for (const { share, value } of band.percentiles) expect(value).toBeCloseTo(0.002 + 0.0015 * share, 5);
    expect(band.histogram.counts.reduce((sum, count) => sum + count, 0)).toBe(1000);
    expect(band.histogram.edges).toHaveLength(band.histogram.counts.length + 1);
    expect(band.influences[0].rankCorrelation).toBeCloseTo(1, 12);
    // kept below 12 N: two thirds of them
    const { kept, convergence } = summary.limits[0];
    expect(kept.estimate.value).toBeCloseTo(2 / 3, 3);
    expect(kept.of).toBe(1000);
    expect(kept.bounded).toEqual(kept.exact);
    expect(convergence.at(-1)).toEqual({ runs: 1000, estimate: kept.estimate });
    expect(summary.allLimits).toEqual(kept);
    expect(summary.limits[1].kept.estimate.value).toBe(1);
    expect(summary.outcomes.map(({ outcome }) => outcome)).toEqual(["came-to-rest"]);
    const frequency = summary.spreads.find(({ quantity }) => quantity === "naturalHz");
    expect(frequency?.deviation).toBeCloseTo(0, 12);
    expect(frequency?.influences[0]).toEqual({
      path: "contact.normal.preload",
      rankCorrelation: null,
      varianceShare: null,
    });
  });

  it("what matters: ln x_b = ln μs N − ln k, its variances by hand", () => {
    const inputs = [uniform("contact.normal.preload", 9, 11), uniform("body.stiffness", 760, 840)];
    const [band] = study(released, { inputs, runs: 4000 }).spreads;
    // (width/mean)²/12 each, for narrow ranges: 0.2² to 0.1²
    const [first, second] = band.influences;
    expect([first.path, second.path]).toEqual(["contact.normal.preload", "body.stiffness"]);
    expect(first.varianceShare?.value).toBeCloseTo(0.8, 1);
    expect(first.varianceShare?.low).toBeLessThan(0.8);
    expect(first.varianceShare?.high).toBeGreaterThan(0.8);
    expect(second.rankCorrelation).toBeLessThan(-0.3);
    expect(study(released, { inputs, runs: 500 }).spreads[0].influences[0].varianceShare).toBeNull();
  });

  it("counts draws that are refused, and bounds the probability by them", () => {
    // static friction below the kinetic 0.15 cannot be: a quarter of 0.1…0.3
    const summary = study(released, { inputs: [uniform("contact.law.static", 0.1, 0.3)], links: {} });
    expect(summary.refused).toEqual([
      {
        refusal: "refused",
        count: 250,
        path: "contact.law.static",
        first: expect.any(Number) as number,
        example: expect.stringMatching(
          /^Static friction cannot be smaller than kinetic friction; they are 0\.1/,
        ) as string,
      },
    ]);
    const { kept } = summary.limits[0];
    // kept up to 0.24: 450 of the 750 that can be
    expect([kept.count, kept.of]).toEqual([450, 750]);
    expect(kept.estimate.value).toBe(0.6);
    expect(kept.bounded.low).toBe(exactInterval(450, 1000, 0.95).low);
    expect(kept.bounded.high).toBe(exactInterval(700, 1000, 0.95).high);
    expect(summary.spreads[0].count).toBe(750);
  });

  it("groups draws that are refused by their reason, whatever their figures", () => {
    const inputs = [uniform("contact.law.static", 0.14, 0.24), uniform("contact.normal.preload", -5, 15)];
    const { refused } = study(released, { inputs, links: {} });
    expect(refused.map(({ path, count }) => [path, count])).toEqual([
      ["contact.normal.preload", 250],
      ["contact.law.static", expect.closeTo(75, -2)],
    ]);
  });

  it("of the draws there are so far", () => {
    const { plan } = checkTolerancePlan(
      { format: "restband-tolerance/1", seed: 1, runs: 1000, inputs: [uniform("contact.normal.preload", 8, 14)] },
      released,
    );
    const draws = drawsOf(plan as TolerancePlan);
    const rows = runDraws(released, plan as TolerancePlan, draws, [0, 300]) as Float64Array;
    expect(toleranceSummary(plan as TolerancePlan, released, rows).runs).toBe(300);
    expect(() => toleranceSummary(plan as TolerancePlan, released, rows.subarray(1))).toThrow(/whole number of rows/);
    expect(toleranceSummary(plan as TolerancePlan, released, new Float64Array(0)).limits[0].kept.exact).toEqual({
      low: 0,
      high: 1,
    });
    expect(runDraws(released, plan as TolerancePlan, draws, [0, 300], { onDraw: (done) => done < 10 })).toBeNull();
  });
});

describe("the share of starts from which a belt slides", () => {
  /*
   * ẍ = −x − 0.1 ẋ + μ(V − ẋ), μ = 0.5 + 0.5 exp(−|v|/0.5), V 1.5, starts evenly in [−2, 2] × [0, 2] (parameters after Stender,
   * Hoffmann & Papangelo 2020): 0.307 by an event solver of another hand on a grid of 120 × 120.
   */
  it("is 0.307 within its interval", { timeout: 120_000 }, () => {
    const belt = buildScenario({
      body: { inertia: 1, stiffness: 1, viscous: 0.1 },
      contact: {
        law: { model: "stribeck", static: 1, kinetic: 0.5, velocity: 0.5, exponent: 1 },
        normal: { preload: 1 },
        counterface: { velocity: 1.5 },
      },
      span: { seconds: 120, untilRest: false },
    });
    const inputs = [uniform("initial.displacement", -2, 2), uniform("initial.velocity", 0, 2)];
    const summary = study(belt, { inputs, runs: 600 });
    expect(summary.refused).toEqual([]);
    const sticks = summary.outcomes.find(({ outcome }) => outcome === "stick-slip")?.share;
    expect(sticks?.of).toBe(600);
    expect(sticks?.estimate.low).toBeLessThan(1 - 0.307);
    expect(sticks?.estimate.high).toBeGreaterThan(1 - 0.307);
    expect((sticks?.estimate.high ?? 1) - (sticks?.estimate.low ?? 0)).toBeLessThan(0.08);
  });
});
