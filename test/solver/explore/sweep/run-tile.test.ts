import {
  answerRun,
  cellCount,
  cellOf,
  cellReason,
  checkSweepPlan,
  readRow,
  rowLength,
  runTile,
  tileCells,
  tileCount,
  type CellFigures,
  type Scenario,
  type SweepPlan,
} from "@restband/solver";
import { describe, expect, it } from "vitest";
import { buildScenario } from "../../../support/scenario-builder.ts";

const clamp = buildScenario({
  body: { inertia: 1, stiffness: 1, viscous: 0.02 },
  contact: { law: { model: "coulomb", static: 0.5, kinetic: 0.5 }, normal: { preload: 1 } },
  force: [{ kind: "harmonic", amplitude: 1, hz: 0.1 }],
  span: { seconds: 200, untilRest: false },
  limits: [
    { quantity: "stickFraction", max: 0.3 },
    { quantity: "restTime", max: 1 },
  ],
});

function planned(scenario: Scenario, plan: object): SweepPlan {
  const checked = checkSweepPlan({ format: "restband-sweep/1", quantities: [], ...plan }, scenario);
  expect(checked.faults).toEqual([]);
  return checked.plan as SweepPlan;
}

/** What every cell came to, by its index. */
function figuresOf(scenario: Scenario, plan: SweepPlan): CellFigures[] {
  const figures: CellFigures[] = Array.from({ length: cellCount(plan) });
  for (let tile = 0; tile < tileCount(plan); tile++) {
    const rows = runTile(scenario, plan, tile) as Float64Array;
    expect(rows.every(Number.isFinite)).toBe(true);
    tileCells(plan, tile).forEach((cell, i) => {
      figures[cell] = readRow(rows, i * rowLength(plan), plan, scenario.limits.length);
    });
  }
  return figures;
}

describe("the cells of a sweep", () => {
  it("come to what each comes to run alone, refused ones with their reason", () => {
    const plan = planned(clamp, {
      axes: [
        { path: "contact.law.static", spacing: "listed", values: [0, 0.2, 0.4, 0.6, 1.1] },
        { path: "force[0].hz", spacing: "log", from: 0.05, to: 0.2, count: 4 },
      ],
      links: { "contact.law.kinetic": { of: "force[0].hz", factor: 3 }, "span.seconds": { keep: "periods" } },
      quantities: ["stickFraction", "restTime", "amplitude"],
    });
    const kinds = new Set<string | null>();
    figuresOf(clamp, plan).forEach((figures, index) => {
      const cell = cellOf(clamp, plan, index);
      kinds.add(figures.outcome);
      if (cell.scenario === null) {
        expect(figures.refusal).toBe("refused");
        expect(cellReason(clamp, plan, index, "refused")).toMatch(/Static friction cannot be smaller/);
        return;
      }
      const alone = answerRun({ scenario: cell.scenario, quantities: plan.quantities });
      if ("reason" in alone) throw new Error(alone.reason);
      expect(figures.outcome).toBe(alone.outcome);
      expect(figures.kept).toEqual(alone.limits.map(({ kept }) => kept));
      expect(figures.quantities).toEqual(plan.quantities.map((name) => alone.quantities[name]));
      expect(
        cell.scenario.span.seconds * cell.scenario.force.map((term) => ("hz" in term ? term.hz : NaN))[0],
      ).toBeCloseTo(20, 12);
    });
    expect(kinds).toContain(null);
    expect(kinds).toContain("never-moved");
    expect(kinds).toContain("stick-slip");
    expect(kinds).toContain("smooth-sliding");
  });

  it("leave the scenario as it was", () => {
    const before = JSON.stringify(clamp);
    runTile(
      clamp,
      planned(clamp, { axes: [{ path: "body.stiffness", spacing: "linear", from: 1, to: 2, count: 4 }] }),
      0,
    );
    expect(JSON.stringify(clamp)).toBe(before);
  });

  it("tell why a run was cut off", () => {
    const plan = planned(clamp, { axes: [{ path: "span.maxEvents", spacing: "listed", values: [1, 1000] }] });
    expect(figuresOf(clamp, plan).map(({ refusal }) => refusal)).toEqual(["max-events", null]);
  });

  it("keep the damping ratio where asked", () => {
    const plan = planned(clamp, {
      axes: [{ path: "body.stiffness", spacing: "listed", values: [1, 4, 9] }],
      links: { "body.viscous": { keep: "dampingRatio" } },
      quantities: ["dampingRatio"],
    });
    for (const { quantities } of figuresOf(clamp, plan)) expect(quantities[0]).toBeCloseTo(0.01, 15);
  });

  it("end where they are told to", () => {
    const plan = planned(clamp, { axes: [{ path: "body.inertia", spacing: "linear", from: 1, to: 2, count: 30 }] });
    expect(runTile(clamp, plan, 1, { onCell: (done) => done < 2 })).toBeNull();
  });
});

describe("continuation", () => {
  /** Friction falls with speed: between about 1.15 and 1.84 the belt slides or sticks and slips, as the start has it. */
  const belt = buildScenario({
    body: { inertia: 1, stiffness: 1, viscous: 0.1 },
    contact: {
      law: { model: "stribeck", static: 1, kinetic: 0.5, velocity: 0.5, exponent: 1 },
      normal: { preload: 1 },
      counterface: { velocity: 1 },
    },
    span: { seconds: 400, untilRest: false },
  });

  it("finds both branches of a belt that slides or sticks, and opens a cell as it was run", { timeout: 30_000 }, () => {
    const values = [1, 1.1, 1.2, 1.3, 1.4, 1.5, 1.6, 1.7, 1.9];
    const plan = planned(belt, {
      axes: [{ path: "contact.counterface.velocity", spacing: "listed", values }],
      continuation: "both",
    });
    const outcomes = figuresOf(belt, plan).map(({ outcome }) => outcome);
    const [sticks, slides] = ["stick-slip", "smooth-sliding"];
    expect(outcomes.slice(0, 9)).toEqual([...Array.from({ length: 8 }, () => sticks), slides]);
    // on the way down 1.1 is below the limit of stability and a swing grows from next to nothing
    expect(outcomes.slice(9)).toEqual([sticks, "growing", ...Array.from({ length: 7 }, () => slides)]);
    const opened = [5, 14].map((index) => cellOf(belt, plan, index).scenario as Scenario);
    expect(opened.map((scenario) => scenario.contact.counterface)).toEqual([{ velocity: 1.5 }, { velocity: 1.5 }]);
    const alone = opened.map((scenario) => answerRun({ scenario, quantities: [] }));
    expect(alone.map((reply) => "outcome" in reply && reply.outcome)).toEqual([sticks, slides]);
  });
});
