import { checkScenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { frictionPairs } from "../../../web/src/features/reckoning/tables/friction-pairs.ts";
import { lossFactors } from "../../../web/src/features/reckoning/tables/loss-factors.ts";
import { takenFrom, type Table } from "../../../web/src/features/reckoning/tables/table.ts";
import { creepFeed } from "../support/scenarios.ts";

/** The values taken from a row, by path. */
function valuesOf(table: Table, key: string): Record<string, number> {
  const row = table.rows.find((each) => each.key === key);
  return Object.fromEntries((row ? takenFrom(table, row) : []).map(({ path, value }) => [path, value]));
}

describe.each([frictionPairs, lossFactors])("$caption", (table) => {
  it("takes from every row something inside what is printed, with its source", () => {
    for (const row of table.rows) {
      const taken = takenFrom(table, row);
      expect(taken.length).toBeGreaterThan(0);
      for (const { path, value, origin } of taken) {
        expect(value).toBeGreaterThanOrEqual(row.printed[path].low);
        expect(value).toBeLessThanOrEqual(row.printed[path].high);
        expect(origin.source).toBe(`${row.name}, ${row.condition}: ${row.source}`);
        expect(origin.low === undefined).toBe(row.printed[path].low === row.printed[path].high);
      }
    }
  });
});

describe("friction pairs", () => {
  it("take the middle of what is printed", () => {
    // (0.12 + 0.80) / 2 and (0.08 + 0.70) / 2
    expect(valuesOf(frictionPairs, "steel-steel-dry")).toEqual({
      "contact.law.static": 0.46,
      "contact.law.kinetic": 0.39,
    });
  });

  it("leave alone what is not printed", () => {
    // (0.002 + 0.006) / 2
    expect(valuesOf(frictionPairs, "rail-ball")).toEqual({ "contact.law.kinetic": 0.004 });
  });

  it("give static and kinetic values a scenario accepts together", () => {
    for (const row of frictionPairs.rows) {
      const values = valuesOf(frictionPairs, row.key);
      const law = {
        model: "coulomb" as const,
        static: values["contact.law.static"] ?? 1,
        kinetic: values["contact.law.kinetic"] ?? 0,
      };
      const origins = Object.fromEntries(takenFrom(frictionPairs, row).map(({ path, origin }) => [path, origin]));
      expect(checkScenario({ ...creepFeed, contact: { ...creepFeed.contact, law }, origins }).faults).toEqual([]);
    }
  });
});

it("loss factors take the geometric middle, since they span powers of ten: √(2e-5 · 3e-4) = 7.75e-5", () => {
  expect(valuesOf(lossFactors, "steel")).toEqual({ "solid.lossFactor": 7.75e-5 });
  // √(0.06 · 0.14) = 0.09165
  expect(valuesOf(lossFactors, "jointed")).toEqual({ "solid.lossFactor": 0.0917 });
});
