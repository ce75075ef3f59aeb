import { readdirSync, readFileSync } from "node:fs";
import { checkScenario } from "@restband/solver";
import { describe, expect, it } from "vitest";

interface RefusedCase {
  name: string;
  scenario?: unknown;
  /** The text of a scenario that JSON can write but not hold. */
  line?: string;
  refused: string | string[];
}

const folder = new URL("refuse/", import.meta.url);
const cases = readdirSync(folder)
  .filter((file) => file.endsWith(".json"))
  .map((file) => JSON.parse(readFileSync(new URL(file, folder), "utf8")) as RefusedCase);

/** Scenarios that must be refused at the field they name; see `refuse/README.md` for where they come from. */
describe("a scenario with a fault", () => {
  it("stands in all files that came", () => expect(cases).toHaveLength(33));

  it.each(cases)("$name is refused at its field", ({ scenario, line, refused }) => {
    const checked = checkScenario(line === undefined ? scenario : JSON.parse(line));
    expect(checked.scenario).toBeNull();
    expect([refused].flat()).toContain(checked.faults[0]?.path);
  });

  it.each(cases)("$name says so in a sentence", ({ scenario, line }) => {
    const { faults } = checkScenario(line === undefined ? scenario : JSON.parse(line));
    for (const { message } of faults) expect(message).toMatch(/^\S.{10,}\.$/);
  });
});
