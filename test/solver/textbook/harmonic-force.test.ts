import { describe, expect, test } from "vitest";
import { equivalentViscousRatio } from "../../../solver/src/textbook/equivalent-viscous-amplitude.ts";
import { noStopLimit, noStopMotion } from "../../../solver/src/textbook/no-stop-motion.ts";
import { noStopLimit as independentLimit } from "../../support/den-hartog.ts";
import { expectPrinted } from "../../support/printed.ts";
import { coulombForces, type ScenarioSketch } from "../../support/scenario-builder.ts";
import { pageOf, reasonOf, rowOf } from "./page.ts";

/* Units m = k = P = 1; published and recomputed values as in test/reference/harmonic-coulomb.test.ts. */

const forced = (r: number, beta: number, ratio = 0, periods = 400, fixed = beta): ScenarioSketch => ({
  body: { inertia: 1, stiffness: 1, viscous: 2 * ratio },
  contact: coulombForces(beta, fixed),
  force: [{ kind: "harmonic", amplitude: 1, hz: r / (2 * Math.PI) }],
  span: { seconds: (2 * Math.PI * periods) / r, untilRest: false },
});

describe("the motion without stops", () => {
  const table: [r: number, limit: string, ...X: string[]][] = [
    [0.5, "0.333333", "1.333333", "–", "–"],
    [0.7, "0.722071", "1.927775", "1.825167", "1.639948"],
    [0.8, "0.817406", "2.711415", "2.501788", "2.106551"],
    [0.9, "0.819650", "5.110040", "4.620342", "3.661416"],
    [1.1, "0.746772", "4.590925", "4.034744", "2.878094"],
    [1.25, "0.698821", "1.708218", "1.480050", "0.988996"],
    [1.5, "0.646579", "0.765942", "0.653197", "0.400000"],
    [2, "0.596285", "0.317980", "0.266667", "–"],
    [3, "0.562500", "0.118927", "0.098484", "–"],
  ];
  test.each(table)("r %s: limit %s; amplitudes at β 0.2, 0.4, 0.6", (r, limit, ...amplitudes) => {
    expectPrinted(noStopLimit(r, 0), limit);
    amplitudes.forEach((X, i) => {
      const motion = noStopMotion(r, 0, [0.2, 0.4, 0.6][i]);
      if (X === "–") expect(motion?.isWithoutStop ?? false).toBe(false);
      else expectPrinted(motion?.amplitude ?? NaN, X);
    });
  });

  test("a stop within the half-cycle counts (r 0.3), and r = 1/3 has no motion without one", () => {
    expectPrinted(noStopLimit(0.3, 0), "0.0864");
    expect(noStopLimit(0.3, 0)).toBeCloseTo(independentLimit(0.3).beta, 5);
    expect(noStopLimit(1 / 3, 0)).toBe(0);
  });

  const damped: [r: number, ratio: number, beta: number, X: string, equivalent: string][] = [
    [0.8, 0.1, 0.3, "2.0339222705", "1.98493"],
    [1, 0.1, 0.5, "1.8120885783", "1.81690"],
    [0.6, 0.05, 0.3, "1.4689100741", "1.38332"],
    [1.25, 0.05, 0.4, "1.2652231723", "1.31403"],
    [2, 0.2, 0.3, "0.2573446536", "0.26764"],
  ];
  test.each(damped)("r %s, ζ %s, β %s: %s; as a damper %s", (r, ratio, beta, X, equivalent) => {
    expectPrinted(noStopMotion(r, ratio, beta)?.amplitude ?? NaN, X);
    expectPrinted(equivalentViscousRatio(r, ratio, beta) ?? NaN, equivalent);
    const page = pageOf(forced(r, beta, ratio, 150));
    expect(rowOf(page, "den-hartog-amplitude").difference).toBeCloseTo(0, 8);
    const { value, ofRun } = rowOf(page, "equivalent-viscous-amplitude");
    expectPrinted(value, equivalent);
    expect(ofRun).toBeCloseTo(Number(X), 8);
  });
});

describe("friction as a damper, undamped: −4.4, −14.9, −2.0, +3.4, +5.4, +7.6 % off", () => {
  const pairs: [r: number, beta: number, off: string][] = [
    [0.8, 0.4, "-4.4"],
    [0.8, 0.6, "-14.9"],
    [0.9, 0.4, "-2.0"],
    [1.25, 0.4, "3.4"],
    [1.5, 0.4, "5.4"],
    [2, 0.4, "7.6"],
  ];
  test.each(pairs)("r %s, β %s: %s %%", (r, beta, off) => {
    const page = pageOf(forced(r, beta));
    const { value, ofRun } = rowOf(page, "equivalent-viscous-amplitude");
    expectPrinted(100 * (value / ofRun - 1), off);
    expect(rowOf(page, "den-hartog-amplitude").difference).toBeCloseTo(0, 6);
  });
});

test("50 N at 10 Hz on 10 kg and 1.2e4 N/m, μ 0.07: 1.7814 mm exactly, 1.7916 mm as a damper", () => {
  const page = pageOf({
    body: { inertia: 10, stiffness: 1.2e4 },
    contact: { law: { model: "coulomb", static: 0.07, kinetic: 0.07 }, normal: { weight: true } },
    force: [{ kind: "harmonic", amplitude: 50, hz: 10 }],
    span: { seconds: 60, untilRest: false },
  });
  expectPrinted(rowOf(page, "den-hartog-amplitude").value * 1e3, "1.7814");
  expectPrinted(rowOf(page, "equivalent-viscous-amplitude").value * 1e3, "1.7916");
  expect(rowOf(page, "den-hartog-amplitude").difference).toBeCloseTo(0, 5);
});

test("beyond its limit the exact formula stands back with the limit; the damper has none above π/4", () => {
  const page = pageOf(forced(2, 0.6, 0, 60));
  expect(reasonOf(page, "den-hartog-amplitude")).toContain("above 0.596");
  expect(reasonOf(pageOf(forced(0.8, 0.8, 0, 60)), "equivalent-viscous-amplitude")).toMatch(/π\/4/);
  expect(reasonOf(pageOf(forced(0.7, 0.4, 0, 60, 0.95)), "den-hartog-amplitude")).toMatch(/Static friction holds/);
});

describe("at undamped resonance", () => {
  const page = pageOf(forced(1, 0.5, 0, 300));
  test("β 0.5: the amplitude grows by π − 2 a cycle", () => {
    const { value, ofRun } = rowOf(page, "resonance-growth");
    expect(value).toBeCloseTo(Math.PI - 2, 12);
    expect(ofRun).toBeCloseTo(value, 4);
  });
  test("no amplitude is told", () => {
    expect(reasonOf(page, "den-hartog-amplitude")).toMatch(/resonance/);
    expect(reasonOf(page, "equivalent-viscous-amplitude")).toMatch(/resonance/);
    expect(reasonOf(pageOf(forced(1, 0.9, 0, 60)), "resonance-growth")).toMatch(/π\/4/);
  });
});

describe("the static answer", () => {
  test.each([1, 1.25, 4])("β %s: 1/β of the friction is used and nothing moves", (beta) => {
    const { value, ofRun } = rowOf(pageOf(forced(0.7, beta, 0, 5)), "static-answer");
    expect(value).toBeCloseTo(1 / beta, 14);
    expect(ofRun).toBeCloseTo(value, 12);
  });
  test("counts weight, spring and force together", () => {
    const sketch = { ...forced(0.7, 20, 0, 5), incline: 30, initial: { displacement: 2 } };
    const { value, ofRun } = rowOf(pageOf(sketch), "static-answer");
    expect(value).toBeCloseTo((9.80665 / 2 + 2 + 1) / 20, 12);
    expect(ofRun).toBeCloseTo(value, 9);
  });
  test("has no place where the force overcomes friction", () => {
    expect(reasonOf(pageOf(forced(0.7, 0.9, 0, 20)), "static-answer")).toMatch(/overcomes/);
  });
});
