import {
  checkScenario,
  exploreRanges,
  fieldPaths,
  planRanges,
  simulate,
  type PointReply,
  type Result,
  type Scenario,
} from "@restband/solver";
import { describe, expect, it } from "vitest";
import { startingPoints } from "../../../web/src/features/starting-points/index.ts";
import { readPath } from "../../../web/src/features/statement/path.ts";

const g = 9.80665;

function scenarioOf(key: string): Scenario {
  const point = startingPoints.find((each) => each.key === key);
  if (!point) throw new Error(key);
  return point.scenario;
}

const results = new Map<string, Result>();
function resultOf(key: string): Result {
  const known = results.get(key) ?? simulate(scenarioOf(key), { samples: 0 });
  if ("error" in known) throw new Error(`${key}: ${known.error.path}: ${known.error.message}`);
  results.set(key, known);
  return known;
}

const keys = startingPoints.map(({ key }) => key);
const needsNoOrigin = (scenario: Scenario, path: string): boolean => {
  const value = readPath(scenario, path);
  const isDefault = value === 0 || (value === 1 && /\.(?:faces|radius)$/u.test(path));
  return isDefault || path.startsWith("span.");
};

describe("the starting points", () => {
  it("are at least twelve, each of its own key and name", () => {
    expect(startingPoints.length).toBeGreaterThanOrEqual(12);
    expect(new Set(keys).size).toBe(startingPoints.length);
    expect(new Set(startingPoints.map(({ name }) => name)).size).toBe(startingPoints.length);
  });

  it("cover every purpose a case of the trade has, and both kinds of body", () => {
    const purposes = new Set(startingPoints.map(({ scenario }) => scenario.purpose));
    expect(purposes).toEqual(new Set(["feed", "positioning", "braking", "isolation", "holding", "test", "other"]));
    expect(new Set(startingPoints.map(({ scenario }) => scenario.motion)).size).toBe(2);
  });

  describe.each(keys)("%s", (key) => {
    const scenario = scenarioOf(key);

    it("is a complete scenario that this version computes, with every limit judged", () => {
      expect(checkScenario(scenario)).toEqual({ scenario, faults: [] });
      const { ended, limits } = resultOf(key);
      expect(["rest", "time"]).toContain(ended);
      expect(limits.length).toBeGreaterThan(0);
      for (const { kept } of limits) expect(kept).not.toBeNull();
    });

    it("says where each of its numbers comes from", () => {
      const bare = fieldPaths(scenario).filter((path) => !needsNoOrigin(scenario, path) && !scenario.origins[path]);
      expect(bare).toEqual([]);
      for (const { kind, source } of Object.values(scenario.origins)) {
        expect(source).toMatch(/\S/u);
        if (kind === "assumed") expect(source).toMatch(/^common practice: /u);
      }
    });

    it("was entered within its ranges", () => {
      for (const { entered, low, high } of planRanges(scenario).ranges) {
        expect(entered).toBeGreaterThanOrEqual(low);
        expect(entered).toBeLessThanOrEqual(high);
      }
    });
  });
});

describe("the answer of", () => {
  const value = (key: string, name: string): number => resultOf(key).quantities[name] ?? NaN;

  it("the machine slide: sticks and slips, as 20 mm/min is below what damping of 5 % can smooth", () => {
    // Lowest smooth feed at ζ = 0.05: 1.09809 ΔF/√(km) = 1.44 mm/s, with ΔF = (0.21 − 0.133) m g = 226.5 N.
    const lowest = (1.09809 * 0.077 * 300 * g) / Math.sqrt(300 * 1e8);
    expect(0.02 / 60).toBeLessThan(lowest / 4);
    expect(resultOf("machine-slide")).toMatchObject({
      outcome: "stick-slip",
      limits: [{ kept: false }, { kept: true }],
    });
    expect(1 / value("machine-slide", "stickSlipHz")).toBeCloseTo(0.02, 2);
    // Behind by no more than the spring must be stretched to break away, μs N/k = 6.2 μm, and what damping adds.
    expect(value("machine-slide", "followingErrorPeak")).toBeGreaterThan((0.21 * 300 * g) / 1e8);
    expect(value("machine-slide", "followingErrorPeak")).toBeLessThan((1.01 * 0.21 * 300 * g) / 1e8);
  });

  it("the axis reversal: loses no more than 2 μs N/k", () => {
    expect(resultOf("axis-reversal").outcome).toBe("came-to-rest");
    expect(value("axis-reversal", "lostMotion")).toBeGreaterThan(0);
    expect(value("axis-reversal", "lostMotion")).toBeLessThanOrEqual((2 * 0.09 * 300 * g) / 5e7);
  });

  it("the staircase: stands for three steps and goes with the fourth", () => {
    // μs N/k = 6.18 μm: three steps of 2 μm are held, the fourth, from 0.6 s on, is not.
    const first = resultOf("small-steps").events.find(({ kind, t }) => kind === "break-away" && t > 0);
    expect(first?.t).toBeGreaterThan(0.6);
    expect(first?.t).toBeLessThan(0.62);
    expect(resultOf("small-steps")).toMatchObject({ outcome: "came-to-rest", limits: [{ kept: false }] });
    expect(value("small-steps", "slipDistance")).toBeGreaterThan(2 * 2e-6);
  });

  it("the move: settles within its time, inside the rest band", () => {
    // μs N/k = 0.196 μm.
    expect(resultOf("move-and-settle")).toMatchObject({
      outcome: "came-to-rest",
      limits: [{ kept: true }, { kept: true }],
    });
    expect(value("move-and-settle", "settleTime")).toBeLessThan(0.1);
    expect(Math.abs(value("move-and-settle", "settleOffset"))).toBeLessThanOrEqual((0.01 * 60 * g) / 3e7);
  });

  it("the pad brake: J ω/(2 μk N r) and ω t/2", () => {
    const torque = 0.38 * 2 * 1200 * 0.12;
    expect(resultOf("pad-brake").outcome).toBe("came-to-rest");
    expect(value("pad-brake", "restTime")).toBeCloseTo((2.4 * 50 * Math.PI) / torque, 9);
    expect(value("pad-brake", "restDisplacement") / (2 * Math.PI)).toBeCloseTo(
      (25 * value("pad-brake", "restTime")) / 2,
      9,
    );
  });

  it("the isolator: at resonance 4 F/π and c ω X balance k Y, to the first harmonic", () => {
    // Relative swing X = (k Y − 4 F/π)/(c ω) = 4.54 mm, a quarter turn behind the floor's 2 mm.
    const relative = (49_348 * 0.002 - (4 * 0.2 * 300) / Math.PI) / (157 * 10 * Math.PI);
    expect(resultOf("friction-damped-isolator").outcome).toBe("smooth-sliding");
    const predicted = Math.hypot(0.002, relative) / 0.002;
    expect(value("friction-damped-isolator", "transmissibility") / predicted).toBeCloseTo(1, 1);
  });

  it("the clamp, the stage and the shaken part: never move, and use F/(μs N) of the hold", () => {
    for (const key of ["forced-clamp", "vertical-stage", "shaken-part"])
      expect(resultOf(key)).toMatchObject({ outcome: "never-moved", limits: [{ kept: true }] });
    expect(value("forced-clamp", "holdUse")).toBeCloseTo(400 / (0.15 * 5000), 12);
    expect(value("vertical-stage", "holdUse")).toBeCloseTo((8 * g) / (0.2 * 600), 12);
    expect(value("shaken-part", "holdUse")).toBeCloseTo((0.001 * (16 * Math.PI) ** 2) / (0.3 * g), 9);
  });

  it("the mass on a belt: period and reach of the textbook cycle", () => {
    // d = ΔF/k, slip amplitude √(d² + V²/ω²) about Fk/k; period (2/ω)(π − atan(dω/V)) + 2d/V.
    const [omega, d] = [20, (0.15 * 5 * g) / 2000];
    const period = (2 / omega) * (Math.PI - Math.atan((d * omega) / 0.1)) + (2 * d) / 0.1;
    expect(resultOf("mass-on-a-belt").outcome).toBe("stick-slip");
    expect(value("mass-on-a-belt", "stickSlipHz")).toBeCloseTo(1 / period, 9);
    const reach = (0.35 * 5 * g) / 2000 + Math.hypot(d, 0.1 / omega);
    expect(value("mass-on-a-belt", "peakDisplacement")).toBeCloseTo(reach, 12);
  });

  it("the drawer: swings once about Fk/k and stays in the rest band", () => {
    // From x₀ about c = μk m g/k with ζ = 30/(2√720): the first turn is at c − (x₀ − c) e^(−πζ/√(1−ζ²)).
    const [centre, zeta] = [(0.015 * 12 * g) / 60, 30 / (2 * Math.sqrt(720))];
    const turn = centre - (0.3 - centre) * Math.exp((-Math.PI * zeta) / Math.sqrt(1 - zeta ** 2));
    expect(resultOf("drawer")).toMatchObject({ outcome: "came-to-rest", limits: [{ kept: true }] });
    expect(value("drawer", "restDisplacement")).toBeCloseTo(turn, 12);
    expect(Math.abs(turn)).toBeLessThan((0.02 * 12 * g) / 60);
  });

  it("the spool: without dither it would stand; with it, it swings about 4 N / 8 N/mm", () => {
    expect(resultOf("valve-spool")).toMatchObject({ outcome: "smooth-sliding", limits: [{ kept: true }] });
    expect(value("valve-spool", "meanDisplacement")).toBeCloseTo(4 / 8000, 8);
    const still = simulate({ ...scenarioOf("valve-spool"), force: [{ kind: "constant", value: 4 }], origins: {} });
    expect(still).toMatchObject({ outcome: "never-moved" });
  });

  it("the coupon: rests after dozens of swings, within its rest band", () => {
    // Each half swing loses 2 μN/k = 50 μm and 1 − √((1−ρ)/(1+ρ)) = 1.6 % of its size, ρ = πη/2.
    let size = 0.005;
    let swings = 0;
    const ratio = Math.sqrt((1 - 0.005 * Math.PI) / (1 + 0.005 * Math.PI));
    for (; size > 0.05 / 2000; swings++) size = size * ratio - (0.05 / 2000) * (1 + ratio);
    expect(resultOf("ring-down-coupon")).toMatchObject({ outcome: "came-to-rest", limits: [{ kept: true }] });
    expect(Math.abs(value("ring-down-coupon", "halfCycles") - swings)).toBeLessThanOrEqual(1);
    expect(swings).toBeGreaterThan(36);
  });
});

describe("over its ranges", () => {
  function verdictOf(key: string) {
    const runOf = (scenario: Scenario): PointReply => {
      const result = simulate(scenario, { samples: 0, events: false, energy: false, quantities: [] });
      return "error" in result ? { reason: result.error.message } : result.limits;
    };
    const steps = exploreRanges(scenarioOf(key), resultOf(key).limits);
    let step = steps.next();
    while (!step.done) step = steps.next(runOf(step.value.scenario));
    return step.value.verdicts[0];
  }

  it.each<[string, string, number]>([
    // J ω/(2 N r t) with t = 4 s.
    ["pad-brake", "contact.law.kinetic", (2.4 * 50 * Math.PI) / (4 * 2 * 1200 * 0.12)],
    ["forced-clamp", "contact.law.static", 400 / (0.7 * 5000)],
    ["vertical-stage", "contact.law.static", (8 * g) / (0.8 * 600)],
    // Slips where ω² Y passes μs g.
    ["shaken-part", "contact.law.static", (0.001 * (16 * Math.PI) ** 2) / g],
  ])("%s breaks its limit from %s %d down", (key, path, boundary) => {
    const verdict = verdictOf(key);
    if (verdict.kind !== "breaks") throw new Error(verdict.kind);
    expect(verdict.alone).toHaveLength(1);
    expect(verdict.alone[0]).toMatchObject({ path, breaks: expect.closeTo(boundary, 5) as number });
  });

  it.each(["axis-reversal", "move-and-settle", "mass-on-a-belt", "valve-spool", "ring-down-coupon"])(
    "%s keeps its limit",
    (key) => expect(verdictOf(key)).toEqual({ kind: "kept" }),
  );

  it("the machine slide breaks its limit as entered", () =>
    expect(verdictOf("machine-slide")).toEqual({ kind: "broken" }));
});
