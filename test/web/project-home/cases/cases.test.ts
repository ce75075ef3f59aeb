import { fieldPaths, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import {
  buildCases,
  decimalOf,
  hasDoubt,
  type Decimal,
} from "../../../../web/src/features/project-home/cases/build-cases.ts";
import type { CaseField } from "../../../../web/src/features/project-home/cases/case-field.ts";
import { casesCsv } from "../../../../web/src/features/project-home/cases/cases-csv.ts";
import { readColumns, type ColumnChoice } from "../../../../web/src/features/project-home/cases/columns.ts";
import { exampleTable } from "../../../../web/src/features/project-home/cases/example-table.ts";
import { readTable } from "../../../../web/src/features/project-home/cases/read-table.ts";
import { writePath } from "../../../../web/src/features/statement/path.ts";
import { fieldAt, measureOf, numberAt } from "../../../../web/src/features/statement/scenario-fields.ts";
import { creepFeed, variant } from "../../support/scenarios.ts";

const base = variant({ origins: { "contact.law.static": { kind: "catalogue", source: "sheet 12" } } }, creepFeed);
const fields: CaseField[] = fieldPaths(base).flatMap((path) => {
  const field = fieldAt(base, path);
  const value = numberAt(base, path);
  return field && value !== undefined
    ? [{ path, label: field.label, symbol: field.symbol, measure: measureOf(base, field), value }]
    : [];
});

function read(text: string, choices: Record<number, ColumnChoice> = {}, chosen: Decimal | null = null) {
  const { table, fault } = readTable(text);
  if (!table) return { fault, cases: [], columns: [], faults: [], isDoubtful: false };
  const { columns, rows, faults } = readColumns(table, fields, choices);
  const decimal = decimalOf(rows, columns) ?? chosen;
  const cases = buildCases(rows, { base, columns, decimal, write: writePath });
  return { fault, columns, faults, cases, isDoubtful: hasDoubt(rows, columns) };
}

const rate = (scenario: Scenario | null) => (scenario ? numberAt(scenario, "base[0].rate") : undefined);
const friction = (scenario: Scenario | null) => (scenario ? numberAt(scenario, "contact.law.static") : undefined);

describe("a table of cases", () => {
  it.each([
    ["tabs, a row of units", "Title\tStatic friction\tFeed\n\t\tmm/min\nA\t0.2\t3\n"],
    ["semicolons, decimal commas, units in the head", "title;μs;feed [mm/min]\r\nA;0,2;3\r\n"],
    ["commas, paths, a mark at the beginning", '\uFEFFname,contact.law.static,"base[0].rate (mm/min)"\nA,0.2,3'],
    ["units after a comma in the head", "Title\tStatic friction\tRate, mm/min\nA\t0.2\t3"],
    ["a unit in each cell", "Title|static|Feed\nA|0.2|3 mm/min"],
  ])("is read with %s", (_, text) => {
    const { cases, faults } = read(text);
    expect(faults).toEqual([]);
    expect(cases.map(({ title }) => title)).toEqual(["A"]);
    expect(friction(cases[0].scenario)).toBe(0.2);
    expect(rate(cases[0].scenario)).toBeCloseTo(0.003 / 60, 15);
  });

  it("leaves all that it does not name as it is in the base, titles its rows, and keeps only origins that still hold", () => {
    const { cases } = read("μs\tFeed [mm/s]\n0.15\t\n0.2\t3");
    expect(cases.map(({ scenario }) => scenario?.title)).toEqual([
      "Z carriage, creep feed, case 1",
      "Z carriage, creep feed, case 2",
    ]);
    expect(cases[0].scenario).toEqual({ ...base, title: "Z carriage, creep feed, case 1" });
    expect(cases[1].scenario?.origins).toEqual({});
    expect(cases[1].scenario?.body).toEqual(base.body);
  });

  it("names each fault in its cell and makes nothing of the row", () => {
    const { cases } = read("Title\tμs\tMass [kg]\nA\t0.1\t120\nB\tx\t-3\nC\t0.2\t0\nD\t0.2\t1 mm");
    expect(cases.map(({ scenario }) => scenario)).toEqual([null, null, null, null]);
    expect(cases.map(({ faults }) => faults.map(({ column }) => column))).toEqual([[1], [1], [2], [2]]);
    expect(cases[0].faults[0].message).toMatch(/Static friction cannot be smaller than kinetic/u);
    expect(cases[3].faults[0].message).toMatch(/“mm” is not a unit that fits here/u);
    expect(cases.map(({ line }) => line)).toEqual([2, 3, 4, 5]);
  });

  it("asks where a comma may be either, and only there", () => {
    const text = "Title\tMass [kg]\nA\t1,200";
    expect(read(text)).toMatchObject({ isDoubtful: true, cases: [{ scenario: null }] });
    expect(read(text, {}, ",").cases[0].scenario?.body.inertia).toBe(1.2);
    expect(read(text, {}, ".").cases[0].scenario?.body.inertia).toBe(1200);
    expect(read(`${text}\nB\t0,5`).cases.map(({ scenario }) => scenario?.body.inertia)).toEqual([1.2, 0.5]);
    expect(read(`${text}\nB\t0.5`).cases.map(({ scenario }) => scenario?.body.inertia)).toEqual([1200, 0.5]);
    expect(read(`Title\tMass [kg]\nA\t1.200,5\nB\t1.200`).cases.map(({ scenario }) => scenario?.body.inertia)).toEqual([
      1200.5, 1200,
    ]);
  });

  it("tells of columns for the same, and of units that do not fit", () => {
    expect(read("μs\tStatic friction\n0.2\t0.3").faults).toEqual([
      "Columns “μs” and “Static friction” are for the same: leave one out.",
    ]);
    expect(read("Mass [mm]\n3").faults[0]).toMatch(/“mm” is not a unit that fits here\. Among those that fit: kg/u);
  });

  it("takes what is chosen for a column over what its head says", () => {
    const { cases, columns } = read("Any\n3", { 0: { target: "body.inertia", unit: "g" } });
    expect(columns[0].kind).toBe("field");
    expect(cases[0].scenario?.body.inertia).toBe(0.003);
  });

  it.each([
    ["", /empty/u],
    ["Title\tμs", /no row yet/u],
    ["μs\n0.2\t0.3\t0.4", /Line 2 has more cells/u],
    [["μs", ...Array.from({ length: 502 }, () => "0.2")].join("\n"), /502 rows; at most 500/u],
  ])("is refused as a whole in words: %.12j", (text, sentence) => {
    expect(read(text).fault).toMatch(sentence);
  });

  it("goes into the file of results with its numbers in the units of its columns, the base's where a cell is empty", () => {
    const { columns, cases } = read("Title;μs;Mass [g]\nA;0,2;\nB;;500");
    const [head, ...rows] = casesCsv(columns, cases, []).split("\r\n");
    expect(head).toContain("Title,Static friction,Mass [g],Outcome,Limits");
    expect(rows.slice(0, 2).map((row) => row.split(",").slice(0, 3))).toEqual([
      ["A", "0.2", "120000"],
      ["B", "0.15", "500"],
    ]);
  });

  it("offered to begin with is the base itself", () => {
    const { cases, faults } = read(exampleTable("Slide", fields));
    expect(faults).toEqual([]);
    expect(cases.map(({ scenario }) => scenario)).toEqual([{ ...base, title: "Slide, case 1" }]);
  });
});
