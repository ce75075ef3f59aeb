import {
  answerAll,
  cellCount,
  checkSweepPlan,
  limitLines,
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
import { joinedEdges } from "../../../../solver/src/explore/sweep/map-lines.ts";
import { mapEdges } from "../../../../solver/src/explore/sweep/map-edges.ts";
import { buildScenario } from "../../../support/scenario-builder.ts";

/** x_b = μs N/k = 0.2 N/k: kept below 2.5 mm where N < 0.0125 k. */
const scenario = buildScenario({
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
  initial: { displacement: 0.02 },
  span: { seconds: 5 },
  limits: [{ quantity: "restBand", max: 0.0025 }],
});
const axes = [
  { path: "body.stiffness", spacing: "linear", from: 400, to: 1200, count: 9 },
  { path: "contact.normal.preload", spacing: "log", from: 4, to: 16, count: 7 },
];
const ofLimit = { kind: "limit", limit: 0 } as const;

const planned = (more: object = {}, of: Scenario = scenario): SweepPlan =>
  checkSweepPlan({ format: "restband-sweep/1", axes, quantities: [], ...more }, of).plan as SweepPlan;

function figuresOf(plan: SweepPlan, of: Scenario = scenario): (index: number) => CellFigures | null {
  const figures: (CellFigures | null)[] = Array.from({ length: cellCount(plan) }, () => null);
  for (let tile = 0; tile < tileCount(plan); tile++) {
    const rows = runTile(of, plan, tile) as Float64Array;
    tileCells(plan, tile).forEach(
      (cell, i) => (figures[cell] = readRow(rows, i * rowLength(plan), plan, of.limits.length)),
    );
  }
  return (index) => figures[index];
}

describe("the lines of the map of a sweep", () => {
  it("lie where runs put them, to a thousandth, and run on from square to square", () => {
    const plan = planned();
    const { lines, left } = answerAll(limitLines(scenario, plan, ofLimit, figuresOf(plan)));
    expect(left).toBe(0);
    expect(lines).toHaveLength(1);
    expect(lines[0].between).toEqual(["kept", "broken"]);
    expect(lines[0].points.length).toBeGreaterThan(10);
    for (const { across, up } of lines[0].points) expect(Math.abs(up / (0.0125 * across) - 1)).toBeLessThan(6e-4);
    const places = lines[0].points.map(({ across }) => across);
    expect(places).toEqual([...places].sort((a, b) => a - b));
  });

  it("part outcomes as the cells have them, and tell what lies below and above", () => {
    // from a start at 20 mm the body never moves where 0.2 N/k > 20 mm: N > 0.1 k
    const held = planned({
      axes: [axes[0], { path: "contact.normal.preload", spacing: "log", from: 10, to: 200, count: 9 }],
    });
    const { lines } = answerAll(limitLines(scenario, held, { kind: "outcome" }, figuresOf(held)));
    expect(lines).toHaveLength(1);
    expect(lines[0].between).toEqual(["came-to-rest", "never-moved"]);
    for (const { across, up } of lines[0].points) expect(Math.abs(up / (0.1 * across) - 1)).toBeLessThan(6e-4);
  });

  it("leave out what is not known, and there are none where nothing differs", () => {
    const plan = planned();
    const all = figuresOf(plan);
    const half = answerAll(limitLines(scenario, plan, ofLimit, (i) => (i % 9 < 4 ? all(i) : null)));
    expect(Math.max(...half.lines[0].points.map(({ across }) => across))).toBeLessThanOrEqual(700);
    expect(answerAll(limitLines(scenario, plan, { kind: "outcome" }, all)).lines).toEqual([]);
  });

  it("are not searched without end where sides alternate from cell to cell: what is left is counted", () => {
    const count = 60;
    const fine = planned({ axes: axes.map((axis) => ({ ...axis, count })) });
    const chequered = (index: number): CellFigures => {
      const kept = [(index + Math.floor(index / count)) % 2 === 0];
      return { outcome: "came-to-rest", refusal: null, kept, quantities: [] };
    };
    const search = limitLines(scenario, fine, ofLimit, chequered);
    let [step, most] = [search.next(), 0];
    while (!step.done) {
      most = Math.max(most, step.value.runs.length);
      step = search.next(step.value.runs.map(() => ({ reason: "not run" })));
    }
    expect(most).toBe(2000);
    expect(step.value.left).toBe(2 * count * (count - 1) - 2000);
  });

  it("need two fields and cells that stand alone", () => {
    const plan = planned({ continuation: "up" });
    expect(() => answerAll(limitLines(scenario, plan, ofLimit, () => null))).toThrow(/two fields/);
  });
});

describe("edges of a map joined to lines", () => {
  /** A map drawn with letters, its top row first. */
  function linesOf(...drawn: string[]): string[] {
    const rows = [...drawn].reverse();
    const sized = axes.map((axis, i) => ({ ...axis, count: i === 0 ? rows[0].length : rows.length }));
    const edges = mapEdges(planned({ axes: sized }), (i) => rows[Math.floor(i / rows[0].length)][i % rows[0].length]);
    return joinedEdges(edges).map((line) => line.map(({ place }) => place).join(", "));
  }

  it("close a line around what is surrounded", () => {
    expect(linesOf("aaa", "aba", "aaa")).toEqual(["1 1 0, 0 1 1, 1 1 1, 0 0 1, 1 1 0"]);
  });

  it("let lines end where three sides meet", () => {
    expect(linesOf("ab", "ac").sort()).toEqual(["0 0 0", "0 0 1", "1 1 0"]);
  });

  it("cut off two corners where all four edges of a square differ", () => {
    expect(linesOf("ab", "ba")).toEqual(["0 0 0, 1 1 0", "1 0 0, 0 0 1"]);
  });
});
