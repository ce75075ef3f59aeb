import { describe, expect, it } from "vitest";
import type { ScanPoint } from "../../../web/src/compute/use-scan.ts";
import { equivalentsOf } from "../../../web/src/features/statement/entry/equivalents.ts";
import { nudged } from "../../../web/src/features/statement/entry/nudge.ts";
import { stretchesOf, ticksOf } from "../../../web/src/features/statement/entry/ruler-scale.ts";
import { readRows, writeRows, type TypedColumn } from "../../../web/src/features/statement/form/rows-text.ts";
import { fieldAt, type PathField } from "../../../web/src/features/statement/scenario-fields.ts";
import { unitByLabel, unitsOf } from "../../../web/src/format/units.ts";
import type { Unit } from "../../../web/src/format/unit.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

const fieldOf = (path: string): PathField => {
  const field = fieldAt(creepFeed, path);
  if (!field) throw new Error(path);
  return field;
};
const unit = (path: string, label: string): Unit => {
  const measure = { dimension: fieldOf(path).dimension, motion: "linear" } as const;
  return unitByLabel(measure, label) ?? unitsOf(measure)[0];
};

describe("an arrow key", () => {
  it.each([
    ["base[0].rate", "mm/s", 0.002, 0.01, 0.00202],
    ["base[0].rate", "mm/s", 0.002, -0.1, 0.0018],
    ["body.stiffness", "N/μm", 4e6, 0.01, 4.04e6],
    ["contact.law.static", "", 0.15, 0.01, 0.1515],
    ["contact.normal.faces", "", 1, 0.01, 2],
    ["contact.normal.faces", "", 1, -0.01, 1],
    ["body.viscous", "N·s/m", 0, -0.01, 0],
    ["initial.displacement", "mm", -0.01, 0.1, -0.009],
    ["incline", "°", 90, 0.1, 90],
  ])("moves %s from %s by a share of itself, within its bounds", (path, label, value, share, expected) => {
    expect(nudged(value, share, fieldOf(path), unit(path, label))).toBeCloseTo(expected, 12);
  });

  it("moves zero as well", () => {
    expect(nudged(0, 0.01, fieldOf("initial.displacement"), unit("initial.displacement", "mm"))).toBeCloseTo(1e-5, 12);
  });
});

describe("equivalents", () => {
  it("say damping as a ratio and as a percentage of critical", () => {
    // ζ = 350 / (2 √(4·10⁶ · 120)) = 0.0079876…
    const [ratio, percent] = equivalentsOf(creepFeed, "body.viscous");
    expect(ratio.of(350)).toBeCloseTo(0.00798762, 8);
    expect(percent.of(350)).toBeCloseTo(0.798762, 6);
    expect(ratio.to(ratio.of(350))).toBeCloseTo(350, 10);
  });

  it("say stiffness as a natural frequency and friction as a force", () => {
    const [frequency] = equivalentsOf(creepFeed, "body.stiffness");
    expect(frequency.of(4e6)).toBeCloseTo(29.0576, 4);
    expect(frequency.to(frequency.of(4e6))).toBeCloseTo(4e6, 4);
    const [force] = equivalentsOf(creepFeed, "contact.law.static");
    expect(force.of(0.15)).toBeCloseTo(296.52, 2);
  });

  it("are left out where they mean nothing", () => {
    const bare = variant({ body: { ...creepFeed.body, stiffness: 0 }, limits: [] });
    expect(equivalentsOf(bare, "body.viscous")).toEqual([]);
    expect(equivalentsOf(creepFeed, "span.seconds")).toEqual([]);
  });
});

describe("the drag ruler", () => {
  it("has ticks at 1 to 9 of each decade within its reach, labels at 1, 2 and 5", () => {
    const ticks = ticksOf(350, 1.5);
    expect(ticks.filter(({ isLabelled }) => isLabelled).map(({ value }) => value)).toEqual([
      20, 50, 100, 200, 500, 1000, 2000, 5000, 10_000,
    ]);
    expect(ticks.every(({ at }) => Math.abs(at) <= 1.5)).toBe(true);
    expect(ticksOf(-0.02, 1).every(({ value }) => value < 0)).toBe(true);
  });

  it("joins neighbours of one outcome and puts the boundary half way", () => {
    const points: ScanPoint[] = [
      { at: 0, outcome: "stick-slip" },
      { at: 0.5, outcome: "stick-slip" },
      { at: 0.75, outcome: null },
      { at: 1, outcome: "smooth-sliding" },
    ];
    expect(stretchesOf(points, 1)).toEqual([
      { from: -1, to: 0.25, outcome: "stick-slip" },
      { from: 0.25, to: 0.75, outcome: null },
      { from: 0.75, to: 1, outcome: "smooth-sliding" },
    ]);
    expect(stretchesOf([], 1)).toEqual([]);
  });
});

describe("rows of numbers as text", () => {
  const columns: [TypedColumn, TypedColumn] = [
    {
      label: "Sliding speed",
      measure: { dimension: "slidingVelocity", motion: "linear" },
      unit: { label: "m/s", factor: 1 },
    },
    { label: "Friction", measure: { dimension: "none", motion: "linear" }, unit: { label: "", factor: 1 } },
  ];
  const rows: [number, number][] = [
    [0, 0.2],
    [0.01, 0.13],
  ];

  it("go there and back", () => expect(readRows(writeRows(rows, columns), columns)).toEqual({ rows }));

  it("come from a pasted table, with units, decimal commas and empty lines", () => {
    expect(readRows("0;0,2\r\n\r\n10mm/s\t0,13\n", columns)).toEqual({ rows });
  });

  it.each([
    ["0 0.2\n0.01", "Line 2 has 1 numbers"],
    ["0 0.2\nfast 0.1", "Line 2, Sliding speed: “fast” is not a number."],
    ["0 0.2\n1,200 0.1", "Line 2, Sliding speed: “1,200” can be"],
  ])("name the line that cannot be read: %s", (text, message) => {
    const read = readRows(text, columns);
    expect("message" in read && read.message).toContain(message);
  });
});
