import { describe, expect, test } from "vitest";
import { expectPrinted } from "../../support/printed.ts";
import { coulombForces, type ScenarioSketch } from "../../support/scenario-builder.ts";
import { pageOf, reasonOf, rowOf } from "./page.ts";

/* Published and recomputed values: see test/reference/free-coulomb.test.ts and coulomb-and-viscous.test.ts for the sources. */

interface Released {
  m?: number;
  k?: number;
  c?: number;
  fixed?: number;
  kinetic: number;
  x0: number;
  v0?: number;
  seconds?: number;
}

const released = ({ m = 1, k = 1, c = 0, fixed, kinetic, x0, v0 = 0, seconds = 1000 }: Released): ScenarioSketch => ({
  body: { inertia: m, stiffness: k, viscous: c },
  contact: coulombForces(kinetic, fixed),
  initial: { displacement: x0, velocity: v0 },
  span: { seconds },
});

/** Formula and run, both as printed. */
function expectBoth(page: ReturnType<typeof pageOf>, key: string, printed: string, unit = 1): void {
  const { value, ofRun } = rowOf(page, key);
  expectPrinted(value * unit, printed);
  expectPrinted(ofRun * unit, printed);
  expect(Math.abs(ofRun - value)).toBeLessThanOrEqual(1e-9 * Math.abs(value));
}

describe("Coulomb friction alone", () => {
  const problem482 = pageOf(released({ m: 0.5, k: 245, kinetic: 0.1 * 0.5 * 9.8, x0: 0.03 }));

  test("0.5 kg on 245 N/m, μ 0.1, from 30 mm: 7 half cycles, rest at −2.000 mm after 0.99346 s", () => {
    expectBoth(problem482, "half-cycles-to-rest", "7");
    expectBoth(problem482, "rest-position", "-2.000", 1e3);
    expectBoth(problem482, "time-to-rest", "0.99346");
    expectBoth(problem482, "coulomb-decrement", "4.000", 1e3);
  });

  test("the envelope falls straight: 2 F ω/(π k)", () => {
    const { value, ofRun } = rowOf(problem482, "envelope-slope");
    expect(value).toBeCloseTo((2 * 0.49 * Math.sqrt(245 / 0.5)) / (Math.PI * 245), 12);
    expect(ofRun).toBeCloseTo(value, 12);
  });

  test("the last swing stays on its side: 12.74 kg, 20 N/mm, 39 mm rests at −0.99341 mm after 10 half cycles", () => {
    const kinetic = 1.99967e-3 * 20000;
    const page = pageOf(released({ m: 12.74, k: 20000, kinetic, x0: 0.039 }));
    expectBoth(page, "half-cycles-to-rest", "10");
    expectBoth(page, "rest-position", "-0.9934", 1e3);
    expectBoth(page, "time-to-rest", "0.792902");
  });

  test("a tie halts: 20 → −12 → 4 mm, the edge of the band", () => {
    const page = pageOf(released({ m: 1.6, k: 1000, kinetic: 4, x0: 0.02 }));
    expectBoth(page, "half-cycles-to-rest", "2");
    expectBoth(page, "rest-position", "4.00", 1e3);
  });

  test("static friction above kinetic halts earlier: 10 → −6.08 → 2.16 mm at 0.198692 s", () => {
    const page = pageOf(released({ k: 1000, kinetic: 1.96, fixed: 2.45, x0: 0.01 }));
    expectBoth(page, "rest-position", "2.16", 1e3);
    expectBoth(page, "time-to-rest", "0.198692");
  });

  test("weight and a constant force only move the equilibrium", () => {
    const sketch = released({ m: 2, k: 800, kinetic: 3, x0: 0.1 });
    const page = pageOf({ ...sketch, incline: 20, force: [{ kind: "constant", value: 11 }] });
    for (const key of ["coulomb-decrement", "half-cycles-to-rest", "rest-position", "time-to-rest"])
      expect(rowOf(page, key).difference).toBeCloseTo(0, 9);
  });

  test("a body released inside its rest band has nothing to swing", () => {
    const page = pageOf(released({ kinetic: 1, x0: 0.5 }));
    expect(rowOf(page, "half-cycles-to-rest").value).toBe(0);
    expect(rowOf(page, "time-to-rest").ofRun).toBe(0);
  });

  test("says why it does not apply", () => {
    const driven = pageOf({
      ...released({ kinetic: 0.1, x0: 1, seconds: 20 }),
      force: [{ kind: "harmonic", amplitude: 1, hz: 0.3 }],
    });
    expect(reasonOf(driven, "rest-position")).toMatch(/driven/);
    expect(reasonOf(pageOf(released({ k: 0, kinetic: 1, x0: 0, v0: 1 })), "coulomb-decrement")).toMatch(/no spring/);
    expect(reasonOf(pageOf(released({ kinetic: 0, x0: 1, seconds: 20 })), "coulomb-decrement")).toMatch(/No friction/);
    expect(reasonOf(pageOf(released({ kinetic: 1e-5, x0: 1, seconds: 20 })), "time-to-rest")).toMatch(/10,000/);
  });
});

describe("Coulomb and viscous friction", () => {
  test("ζ 0.02, x_k 0.5, from 20: 17.812246 after one swing, rests at 0.050437 on the same side after 13", () => {
    const page = pageOf(released({ c: 0.04, kinetic: 0.5, x0: 20 }));
    expectBoth(page, "damped-swing", "17.812246");
    expectBoth(page, "half-cycles-to-rest", "13");
    const { value, ofRun } = rowOf(page, "rest-position");
    expectPrinted(Math.abs(value), "0.050437");
    expect(ofRun).toBeCloseTo(value, 9);
  });

  test("pushed off: m 200, k 4000, c 200, 0.5 m at 2.5 m/s rests at −0.039215 m at 2.993587 s", () => {
    const page = pageOf(released({ m: 200, k: 4000, c: 200, kinetic: 0.1 * 200 * 9.81, x0: 0.5, v0: 2.5 }));
    expectBoth(page, "rest-position", "-0.039215");
    expectBoth(page, "time-to-rest", "2.993587");
    expectBoth(page, "damped-swing", "0.416061");
  });

  test("pushed from the equilibrium: m 1, μ 0.5, k 4, 10 m/s rests at −0.983077 m at 3.806739 s; pushed back, at its mirror image", () => {
    const push = { k: 4, kinetic: 0.5 * 9.81, x0: 0 };
    expectBoth(pageOf(released({ ...push, v0: 10 })), "rest-position", "-0.983077");
    expectBoth(pageOf(released({ ...push, v0: -10 })), "rest-position", "0.983077");
    expectBoth(pageOf(released({ ...push, v0: 10 })), "time-to-rest", "3.806739");
    expectBoth(pageOf(released({ ...push, v0: 10 })), "half-cycles-to-rest", "3");
  });

  test("the purely dry formulas stand back, and say so", () => {
    const page = pageOf(released({ c: 0.04, kinetic: 0.5, x0: 20 }));
    expect(reasonOf(page, "coulomb-decrement")).toBe("It is damped besides.");
    expect(reasonOf(page, "logarithmic-decrement")).toMatch(/Dry friction/);
  });
});

test("logarithmic decrement of 20 cycles without dry friction: 2πζ/√(1−ζ²)", () => {
  const page = pageOf(released({ c: 0.04, kinetic: 0, x0: 1, seconds: 2 * Math.PI * 20.2 }));
  const { value, ofRun, note } = rowOf(page, "logarithmic-decrement");
  expectPrinted(value, "0.125689");
  expect(ofRun).toBeCloseTo(value, 10);
  expect(note).toContain("n = 20 cycles");
});
