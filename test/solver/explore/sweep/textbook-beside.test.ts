import { checkSweepPlan, textbookBeside, type LimitLine, type Scenario, type SweepPlan } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { buildScenario } from "../../../support/scenario-builder.ts";

/** ζ = 0.05; the exact root of "velocity never regains V" is 1.09809 ΔF/√(km), and ΔF = 2000 N (1.5 − 1) μk. */
const slide = buildScenario({
  body: { inertia: 1000, stiffness: 1e8, viscous: 2 * 0.05 * Math.sqrt(1e8 * 1000) },
  contact: { law: { model: "coulomb", static: 0.3, kinetic: 0.2 }, normal: { preload: 2000 } },
  base: [{ kind: "ramp", rate: 0.0003 }],
  span: { seconds: 0.5, untilRest: false },
});
const planOf = (scenario: Scenario): SweepPlan =>
  checkSweepPlan(
    {
      format: "restband-sweep/1",
      axes: [
        { path: "contact.law.kinetic", spacing: "linear", from: 0.02, to: 0.4, count: 6 },
        { path: "base[0].rate", spacing: "log", from: 1e-5, to: 0.01, count: 5 },
      ],
      quantities: [],
    },
    scenario,
  ).plan as SweepPlan;

const feedAt = (kinetic: number): number => (1.09809 * 1000 * kinetic) / Math.sqrt(1e8 * 1000);
const lineOf = (between: LimitLine["between"], off: (across: number) => number): LimitLine => ({
  between,
  points: [0.1, 0.2, 0.3].map((across) => ({ across, up: feedAt(across) * off(across) })),
});

describe("the textbook beside a line of a map", () => {
  it("tells the formula at places of the line, and how far the line is from it", () => {
    const line = lineOf(["stick-slip", "smooth-sliding"], (across) => 1 + across / 10);
    const [exact, ...others] = textbookBeside(slide, planOf(slide), line);
    expect(others).toEqual([]);
    expect(exact).toMatchObject({ key: "critical-feed-exact" });
    exact.points.forEach(({ across, up }) => expect(up / feedAt(across)).toBeCloseTo(1, 5));
    expect(exact.least).toBeCloseTo(0.01, 5);
    expect(exact.largest).toBeCloseTo(0.03, 5);
  });

  it("says nothing of other lines, nor of cells that do not start from rest", () => {
    const plan = planOf(slide);
    expect(
      textbookBeside(
        slide,
        plan,
        lineOf(["kept", "broken"], () => 1),
      ),
    ).toEqual([]);
    const thrown = { ...slide, initial: { displacement: 0, velocity: 0.1 } };
    expect(
      textbookBeside(
        thrown,
        plan,
        lineOf(["stick-slip", "smooth-sliding"], () => 1),
      ),
    ).toEqual([]);
  });
});
