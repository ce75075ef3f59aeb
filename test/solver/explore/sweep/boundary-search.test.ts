import {
  answerAll,
  boundarySearch,
  cellCount,
  checkSweepPlan,
  readRow,
  rowLength,
  runTile,
  tileCells,
  tileCount,
  type CellFigures,
  type SweepPlan,
} from "@restband/solver";
import { describe, expect, it } from "vitest";
import { buildScenario } from "../../../support/scenario-builder.ts";

/** x_b = μs N/k = 0.2 N/k: kept below 2.5 mm where N < 0.0125 k. */
const scenario = buildScenario({
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
  initial: { displacement: 0.02 },
  span: { seconds: 5 },
  limits: [{ quantity: "restBand", max: 0.0025 }],
});

function planned(more: object = {}): SweepPlan {
  const axes = [
    { path: "body.stiffness", spacing: "linear", from: 400, to: 1200, count: 9 },
    { path: "contact.normal.preload", spacing: "log", from: 4, to: 16, count: 7 },
  ];
  return checkSweepPlan({ format: "restband-sweep/1", axes, quantities: [], ...more }, scenario).plan as SweepPlan;
}

function figuresOf(plan: SweepPlan): (index: number) => CellFigures | null {
  const figures: (CellFigures | null)[] = Array.from({ length: cellCount(plan) }, () => null);
  for (let tile = 0; tile < tileCount(plan); tile++) {
    const rows = runTile(scenario, plan, tile) as Float64Array;
    tileCells(plan, tile).forEach((cell, i) => (figures[cell] = readRow(rows, i * rowLength(plan), plan, 1)));
  }
  return (index) => figures[index];
}

describe("the boundary on the map of a sweep", () => {
  it("lies where runs put it, a sixty-fourth of a cell true, and runs on from square to square", () => {
    const plan = planned();
    const pieces = answerAll(boundarySearch(scenario, plan, { kind: "limit", limit: 0 }, figuresOf(plan)));
    expect(pieces.length).toBeGreaterThan(10);
    for (const [stiffness, preload] of pieces.flat()) {
      // true in one of the two directions, whichever its edge has
      const off = Math.min(
        Math.abs(preload / 0.0125 - stiffness) / 100,
        Math.abs(preload - 0.0125 * stiffness) / preload,
      );
      expect(off).toBeLessThan(0.26 / 64 + 1 / 128);
    }
    const ends = pieces.flat().map((point) => point.join(" "));
    const once = ends.filter((end) => ends.indexOf(end) === ends.lastIndexOf(end));
    // one line from edge to edge: all its points but two are shared by two pieces
    expect(once).toHaveLength(2);
  });

  it("leaves out what is not known, and finds none where nothing differs", () => {
    const plan = planned();
    const all = figuresOf(plan);
    const half = answerAll(
      boundarySearch(scenario, plan, { kind: "limit", limit: 0 }, (i) => (i % 9 < 4 ? all(i) : null)),
    );
    expect(Math.max(...half.flat().map(([stiffness]) => stiffness))).toBeLessThanOrEqual(700);
    const rests = { kind: "outcome", outcomes: ["came-to-rest"], isWanted: true } as const;
    expect(answerAll(boundarySearch(scenario, plan, rests, all))).toEqual([]);
  });

  it("needs two fields and cells that stand alone", () => {
    const plan = planned({ continuation: "up" });
    expect(() => answerAll(boundarySearch(scenario, plan, { kind: "limits" }, () => null))).toThrow(/two fields/);
  });
});
