import { compareWithTextbook, simulate, textbookCompanions } from "@restband/solver";
import { readdirSync, readFileSync } from "node:fs";
import { describe, expect, it } from "vitest";
import { randomScenario } from "../../support/random-scenario.ts";

describe("the list of textbook companions", () => {
  it("uses each key once, and a file of its name for each", () => {
    const keys = textbookCompanions.map(({ key }) => key);
    expect(new Set(keys).size).toBe(keys.length);
    const files = readdirSync(new URL("../../../solver/src/textbook/", import.meta.url));
    for (const key of keys) expect(files).toContain(`${key}.ts`);
  });

  it("lists every companion that has been written", () => {
    const folder = new URL("../../../solver/src/textbook/", import.meta.url);
    const written = readdirSync(folder).filter((file) =>
      readFileSync(new URL(file, folder), "utf8").includes(": TextbookCompanion = {"),
    );
    expect(written).toHaveLength(textbookCompanions.length);
  });

  it.each(textbookCompanions)("$key has a label, a formula, a source and conditions", (companion) => {
    for (const text of [companion.label, companion.formula, companion.source]) expect(text).not.toMatch(/^$|[.!]$/);
    expect(companion.conditions.length).toBeGreaterThan(0);
  });
});

it("on any body each formula either gives a number or says in a sentence why it has no place", () => {
  for (let seed = 0; seed < 100; seed++) {
    const scenario = randomScenario(seed);
    const result = simulate(scenario, { samples: 201 });
    if ("error" in result) continue;
    const { comparisons, mismatches } = compareWithTextbook(scenario, result);
    expect(comparisons.length + mismatches.length).toBe(textbookCompanions.length);
    for (const { reason } of mismatches) expect(reason).toMatch(/^[A-Z].*\.$/);
    for (const { value, ofRun, note } of comparisons) {
      expect(value).not.toBeNaN();
      expect(Number.isFinite(value) && (ofRun === null || Number.isFinite(ofRun))).toBe(true);
      if (note !== null) expect(note).toMatch(/\.$/);
    }
  }
}, 30_000);
