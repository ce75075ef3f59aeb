import { describe, expect, test } from "vitest";
import { expectPrinted } from "../../support/printed.ts";
import type { ScenarioSketch } from "../../support/scenario-builder.ts";
import { pageOf, reasonOf, rowOf } from "./page.ts";

const reid = (lossFactor: number): ScenarioSketch => ({
  body: { inertia: 1, stiffness: 1 },
  solid: { model: "displacement-proportional", lossFactor },
  initial: { displacement: 1 },
  span: { seconds: 60 },
});

describe("a swing damped by the spring's material (Reid 1956)", () => {
  const rows: [lossFactor: number, ratio: string, decrement: string, estimate: string][] = [
    [0.01, "0.984413", "0.031419", "0.031416"],
    [0.05, "0.924315", "0.157404", "0.157080"],
    [0.2, "0.722416", "0.650307", "0.628319"],
  ];
  test.each(rows)("η %s: ratio %s; decrement %s, πη %s", (lossFactor, ratio, decrement, estimate) => {
    const page = pageOf(reid(lossFactor));
    const extremes = rowOf(page, "reid-ratio");
    expectPrinted(extremes.value, ratio);
    expect(extremes.ofRun).toBeCloseTo(extremes.value, 10);
    expectPrinted(rowOf(page, "solid-decrement").value, estimate);
    expectPrinted(rowOf(page, "solid-decrement").ofRun, decrement);
  });

  test("ζ_eq = η/2; an equivalent damper at the natural frequency swings by it", () => {
    const solid = { model: "equivalent-viscous", lossFactor: 0.1, at: "natural" } as const;
    const { value, ofRun } = rowOf(pageOf({ ...reid(0), solid }), "solid-damping-ratio");
    expect(value).toBe(0.05);
    expect(ofRun).toBeCloseTo(0.05, 10);
  });
});

const forced = (solid: ScenarioSketch["solid"], hz: number): ScenarioSketch => ({
  body: { inertia: 1, stiffness: 1, viscous: 0.4 },
  solid,
  force: [{ kind: "harmonic", amplitude: 1, hz }],
  span: { seconds: 40 / hz, untilRest: false },
});

describe("a forced swing: ΔW = π η k X² and c_eq = η k/Ω", () => {
  test.each([
    [0.03, 200],
    [0.1, 200],
    [0.2, 45],
  ])("displacement-proportional at %s Hz, %s samples a cycle", (hz, perCycle) => {
    const page = pageOf(forced({ model: "displacement-proportional", lossFactor: 0.05 }, hz), 40 * perCycle + 3);
    expect(Math.abs(rowOf(page, "solid-loss-per-cycle").difference ?? NaN)).toBeLessThan(1e-3);
    expect(Math.abs(rowOf(page, "solid-equivalent-damping").difference ?? NaN)).toBeLessThan(1e-3);
  });

  test("an equivalent damper has this loss at its own frequency, and twice it at double that", () => {
    const at = { hz: 0.05 };
    const solid = { model: "equivalent-viscous", lossFactor: 0.05, at } as const;
    const own = rowOf(pageOf(forced(solid, 0.05), 8001), "solid-loss-per-cycle");
    const double = rowOf(pageOf(forced(solid, 0.1), 8001), "solid-loss-per-cycle");
    expect(own.difference).toBeCloseTo(0, 6);
    expect(double.difference).toBeCloseTo(1, 6);
  });

  test("tells no loss where samples are missing, and why it does not apply", () => {
    const page = pageOf(forced({ model: "displacement-proportional", lossFactor: 0.05 }, 0.1));
    expect(rowOf(page, "solid-loss-per-cycle").ofRun).toBeNaN();
    expect(reasonOf(pageOf(reid(0.1)), "solid-loss-per-cycle")).toMatch(/harmonic force/);
    expect(reasonOf(pageOf(forced({ model: "none" }, 0.1)), "solid-loss-per-cycle")).toBe("There is no solid damping.");
  });
});
