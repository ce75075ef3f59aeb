import {
  exploreRanges,
  planRanges,
  simulate,
  type Origin,
  type PointReply,
  type RangeReport,
  type Scenario,
} from "@restband/solver";
import { describe, expect, it } from "vitest";
import { buildScenario, type ScenarioSketch } from "../../support/scenario-builder.ts";

/*
 * Most cases limit the half-width of the rest band, x_b = μs N/k: whether it is kept anywhere in the ranges can be told by
 * hand. As entered: μs 0.15, N 100 N, k 1000 N/m, so x_b = 15 mm.
 */
const band: ScenarioSketch = {
  body: { inertia: 1, stiffness: 1000 },
  contact: { law: { model: "coulomb", static: 0.15, kinetic: 0.12 }, normal: { preload: 100 } },
  span: { seconds: 0.1 },
};

type Ranges = Record<string, [low: number | undefined, high: number | undefined]>;

function withRanges(sketch: ScenarioSketch, ranges: Ranges): Scenario {
  const origins = Object.entries(ranges).map(([path, [low, high]]): [string, Origin] => [
    path,
    { kind: "assumed", ...(low === undefined ? {} : { low }), ...(high === undefined ? {} : { high }) },
  ]);
  return { ...buildScenario(sketch), origins: Object.fromEntries(origins) };
}

function runOf(scenario: Scenario): PointReply {
  const result = simulate(scenario, { samples: 0, events: false, energy: false, quantities: [] });
  return "error" in result ? { reason: result.error.message } : result.limits;
}

interface Explored extends RangeReport {
  runs: Scenario[];
}

function explore(scenario: Scenario): Explored {
  const entered = runOf(scenario);
  if ("reason" in entered) throw new Error(entered.reason);
  const steps = exploreRanges(scenario, entered);
  const runs: Scenario[] = [];
  let step = steps.next();
  while (!step.done) {
    runs.push(step.value.scenario);
    expect(step.value.done).toBeLessThan(step.value.total);
    step = steps.next(runOf(step.value.scenario));
  }
  return { ...step.value, runs };
}

const bandAtMost = (max: number): ScenarioSketch => ({ ...band, limits: [{ quantity: "restBand", max }] });

describe("the verdict over ranges", () => {
  it("is kept where no point of the ranges breaks the limit, and says how many points were run", () => {
    // At most 0.18 × 100 / 1000 = 18 mm.
    const report = explore(withRanges(bandAtMost(0.018), { "contact.law.static": [0.12, 0.18] }));
    expect(report.verdicts).toEqual([{ kind: "kept" }]);
    expect(report.ran).toEqual({ corners: 2, along: 8, within: 24 });
    expect(report.notPossible).toBe(0);
  });

  it("finds the value that breaks the limit alone", () => {
    // x_b passes 16.2 mm at μs = 0.162, whatever the mass.
    const ranges: Ranges = { "contact.law.static": [0.12, 0.18], "body.inertia": [0.8, 1.2] };
    const [verdict] = explore(withRanges(bandAtMost(0.0162), ranges)).verdicts;
    if (verdict.kind !== "breaks") throw new Error(verdict.kind);
    expect(verdict.together).toEqual([]);
    expect(verdict.alone).toHaveLength(1);
    const [{ path, entered, keeps, breaks }] = verdict.alone;
    expect([path, entered]).toEqual(["contact.law.static", 0.15]);
    expect(keeps).toBeLessThanOrEqual(0.162);
    expect(breaks).toBeGreaterThan(0.162);
    expect(breaks - keeps).toBeLessThan(1e-6);
  });

  it("names what breaks it nearest first, on both sides", () => {
    // From 16 mm: μs from 0.16 (a third of what is left of its range), N from 106.7 N (two thirds), k below 937.5 N/m (a sixth).
    const ranges: Ranges = {
      "contact.law.static": [0.15, 0.18],
      "contact.normal.preload": [100, 110],
      "body.stiffness": [625, 1000],
    };
    const [verdict] = explore(withRanges(bandAtMost(0.016), ranges)).verdicts;
    if (verdict.kind !== "breaks") throw new Error(verdict.kind);
    expect(verdict.alone.map(({ path }) => path)).toEqual([
      "body.stiffness",
      "contact.law.static",
      "contact.normal.preload",
    ]);
    expect(verdict.alone.map(({ breaks }) => breaks)).toEqual([
      expect.closeTo(937.5, 1),
      expect.closeTo(0.16, 5),
      expect.closeTo(320 / 3, 3) as number,
    ]);
  });

  it("says which values break it together where none does alone, without those that are not needed", () => {
    // (0.15 + 0.01 s)(100 + 6 s)/1000 = 16.5 mm at s = (√(1.9² + 4·0.06·1.5) − 1.9)/0.12; alone they reach 16 and 15.9 mm.
    const ranges: Ranges = {
      "contact.law.static": [0.14, 0.16],
      "body.inertia": [0.5, 2],
      "contact.normal.preload": [95, 106],
    };
    const [verdict] = explore(withRanges(bandAtMost(0.0165), ranges)).verdicts;
    if (verdict.kind !== "breaks") throw new Error(verdict.kind);
    const s = (Math.sqrt(1.9 ** 2 + 4 * 0.06 * 1.5) - 1.9) / 0.12;
    expect(verdict.alone).toEqual([]);
    expect(verdict.together.map(({ path }) => path)).toEqual(["contact.law.static", "contact.normal.preload"]);
    expect(verdict.together.map(({ breaks }) => breaks)).toEqual([
      expect.closeTo(0.15 + 0.01 * s, 5) as number,
      expect.closeTo(100 + 6 * s, 2) as number,
    ]);
  });

  it("sees a break inside a range whose ends keep the limit", () => {
    // Slides k = 1000 N/m, m = 1 kg, driven at 5 Hz: with k = m (10π)² = 987 N/m in between, it is at resonance.
    const sketch: ScenarioSketch = {
      body: { inertia: 1, stiffness: 400, viscous: 1 },
      force: [{ kind: "harmonic", amplitude: 1, hz: 5 }],
      span: { seconds: 20, untilRest: false },
      limits: [{ quantity: "amplitude", max: 0.01 }],
    };
    const report = explore(withRanges(sketch, { "body.stiffness": [400, 1600] }));
    expect(report.verdicts[0]).toMatchObject({ kind: "breaks" });
    const [verdict] = report.verdicts;
    if (verdict.kind !== "breaks") throw new Error(verdict.kind);
    expect(verdict.alone[0].breaks).toBeGreaterThan(800);
    expect(verdict.alone[0].breaks).toBeLessThan((10 * Math.PI) ** 2);
  });

  it("is broken as entered, without a search, where the limit is not even kept as entered", () => {
    const report = explore(withRanges(bandAtMost(0.014), { "contact.law.static": [0.12, 0.18] }));
    expect(report.verdicts).toEqual([{ kind: "broken" }]);
    expect(report.runs).toHaveLength(2 + 6 + 24);
  });

  it("cannot be judged where a point has no verdict and none breaks it", () => {
    // 1 m/s against μk g: at rest after 0.85 s with 0.12, not within the run of 1 s with 0.09.
    const braked: ScenarioSketch = {
      ...band,
      body: { inertia: 1, stiffness: 0 },
      contact: { law: { model: "coulomb", static: 0.15, kinetic: 0.12 }, normal: { weight: true } },
      initial: { velocity: 1 },
      span: { seconds: 1 },
      limits: [{ quantity: "restTime", max: 5 }],
    };
    const report = explore(withRanges(braked, { "contact.law.kinetic": [0.09, 0.14] }));
    expect(report.verdicts[0]).toMatchObject({
      kind: "unjudged",
      reason: expect.stringContaining("has no value") as string,
    });
  });

  it("counts values that cannot stand together as not possible, not as failures", () => {
    // Static 0.12 with kinetic 0.14: one of four corners. Along: static 0.12 … 0.14 with 0.12, kinetic up to 0.14 with 0.15.
    const ranges: Ranges = { "contact.law.static": [0.12, 0.18], "contact.law.kinetic": [0.1, 0.14] };
    const report = explore(withRanges(bandAtMost(0.02), ranges));
    expect(report.verdicts).toEqual([{ kind: "kept" }]);
    expect(report.ran.corners).toBe(3);
    expect(report.ran.along).toBe(16);
    expect(report.notPossible).toBe(1 + (24 - report.ran.within));
    for (const { contact } of report.runs)
      if (contact.law.model === "coulomb") expect(contact.law.static).toBeGreaterThanOrEqual(contact.law.kinetic);
  });

  it("runs no combination twice", () => {
    const ranges: Ranges = { "contact.law.static": [0.12, 0.18], "contact.normal.preload": [90, 120] };
    const { runs } = explore(withRanges(bandAtMost(0.0162), ranges));
    expect(new Set(runs.map((each) => JSON.stringify(each))).size).toBe(runs.length);
  });

  it("judges a scenario without ranges by its one run", () => {
    expect(explore(withRanges(bandAtMost(0.02), {}))).toMatchObject({ verdicts: [{ kind: "kept" }], runs: [] });
  });
});

describe("the points of the ranges", () => {
  const inputs = ["inertia", "stiffness", "viscous"].map((key) => `body.${key}`);
  const many = [...inputs, "contact.law.static", "contact.normal.preload", "initial.velocity", "initial.displacement"];

  it("take the value entered for an end that is not given", () => {
    const { ranges } = planRanges(
      withRanges(band, { "contact.law.static": [undefined, 0.2], "contact.normal.preload": [80, undefined] }),
    );
    expect(ranges.map(({ path, low, high }) => [path, low, high])).toEqual([
      ["contact.law.static", 0.15, 0.2],
      ["contact.normal.preload", 80, 100],
    ]);
  });

  it("are all corners of up to six ranges, and a spread half of seven", () => {
    const six = planRanges(withRanges(band, Object.fromEntries(many.slice(0, 6).map((path) => [path, [0.1, 2]]))));
    expect([six.corners.length, six.allCorners]).toEqual([64, 64]);
    expect(new Set(six.corners.map(String)).size).toBe(64);
    const seven = planRanges(withRanges(band, Object.fromEntries(many.map((path) => [path, [0.1, 2]]))));
    expect([seven.corners.length, seven.allCorners]).toEqual([64, 128]);
    for (const a of [0, 2, 5])
      for (const b of [1, 6]) {
        const met = seven.corners.map((corner) => `${corner[a]} ${corner[b]} ${corner[3]}`);
        for (const each of new Set(met)) expect(met.filter((one) => one === each)).toHaveLength(8);
        expect(new Set(met).size).toBe(8);
      }
  });

  it("inside lie between the ends, spread over each range, the same every time", () => {
    const scenario = withRanges(band, { "contact.law.static": [0.12, 0.18], "contact.normal.preload": [90, 120] });
    const { within, ranges } = planRanges(scenario);
    expect(planRanges(scenario).within).toEqual(within);
    for (const [i, { low, high }] of ranges.entries()) {
      const quarters = within.map((point) => Math.floor((4 * (point[i] - low)) / (high - low)));
      expect(new Set(quarters)).toEqual(new Set([0, 1, 2, 3]));
    }
  });

  it("are whole numbers where only those are allowed", () => {
    const { lines, within } = planRanges(withRanges(band, { "contact.normal.faces": [1, 4] }));
    expect(lines).toEqual([[[2], [3], [4]]]);
    expect(within.flat().every(Number.isInteger)).toBe(true);
  });

  it("leave out what is no single number, and say so", () => {
    const table: ScenarioSketch = {
      ...band,
      contact: { law: { model: "table", points: [[0, 0.2], [0.1, 0.1]] }, normal: { preload: 10 } }, // prettier-ignore
    };
    const plan = planRanges(withRanges(table, { "contact.law.points": [0.1, 0.2] }));
    expect(plan).toMatchObject({ ranges: [], corners: [], within: [], leftOut: ["contact.law.points"] });
  });
});
