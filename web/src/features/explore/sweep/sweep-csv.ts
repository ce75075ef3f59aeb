import { cellPlace, cellReason, cellValues, type Scenario } from "@restband/solver";
import Papa from "papaparse";
import type { SweepCells } from "./sweep-cells.ts";

/** All cells that are there as a table for other programs: SI, points in numbers, one line a cell. */
export function sweepCsv(cells: SweepCells, scenario: Scenario): string {
  const { plan } = cells;
  const limits = scenario.limits.map(({ quantity }, i) => `limit ${i + 1}: ${quantity}`);
  const head = [
    "cell",
    ...plan.axes.map(({ path }) => path),
    "branch",
    "outcome",
    ...limits,
    ...plan.quantities,
    "reason",
  ];
  const lines: (string | number)[][] = [];
  for (let cell = 0; cell < cells.count; cell++) {
    const figures = cells.read(cell);
    if (!figures) continue;
    const branch = plan.continuation === "none" ? "" : cellPlace(plan, cell).isDown ? "down" : "up";
    lines.push([
      cell,
      ...cellValues(plan, cell),
      branch,
      figures.outcome ?? "",
      ...figures.kept.map((kept) => (kept === null ? "" : kept ? "kept" : "broken")),
      ...figures.quantities.map((value) => value ?? ""),
      figures.refusal ? cellReason(scenario, plan, cell, figures.refusal) : "",
    ]);
  }
  return Papa.unparse([head, ...lines], { newline: "\n" });
}
