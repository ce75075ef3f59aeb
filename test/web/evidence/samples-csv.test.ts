import { describe, expect, it } from "vitest";
import { runViewOf, type RunView } from "../../../web/src/features/evidence/run-view.ts";
import { sampleColumns, samplesCsv } from "../../../web/src/features/evidence/samples-csv.ts";
import { creepFeed, solved } from "../support/scenarios.ts";

const run = solved(creepFeed, 51);
const { samples } = runViewOf(run.scenario, run.result) as RunView;
const columns = sampleColumns(samples, creepFeed);
const usual = columns.map((column) => ({ column, unit: column.usual }));

describe("samples as CSV", () => {
  it("have a row to each sample, the unit in the head, every digit", () => {
    const [head, ...rows] = samplesCsv(samples, usual).trimEnd().split("\r\n");
    expect(head).toBe(
      '\uFEFF"time, s","displacement, mm","velocity, mm/s","acceleration, m/s²","friction on the body, N","phase (−1 back, 0 stuck, 1 forward)"',
    );
    expect(rows).toHaveLength(samples.t.length);
    const last = rows[rows.length - 1].split(",").map(Number);
    expect(last[0]).toBe(samples.t.at(-1));
    expect(last[1]).toBeCloseTo(1000 * (samples.x.at(-1) ?? 0), 14);
    expect(last[4]).toBe(samples.f.at(-1));
  });

  it("have only the columns and units that were chosen, numbers below zero as numbers", () => {
    const friction = columns.find(({ channel }) => channel === "f");
    const kilo = friction?.units.find(({ label }) => label === "kN");
    if (!friction || !kilo) throw new Error("no kN");
    const [head, ...rows] = samplesCsv(samples, [{ column: friction, unit: kilo }])
      .trimEnd()
      .split("\r\n");
    expect(head).toBe('\uFEFF"friction on the body, kN"');
    expect(rows.some((row) => row.startsWith("-0.1"))).toBe(true);
    rows.forEach((row, i) => expect(Number(row)).toBeCloseTo(samples.f[i] / 1000, 12));
  });
});
