import { checkScenario, simulate, type Scenario } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { complaint, look, type Expectation } from "../support/expectation.ts";

/** A case of `public/`; how its values were made is told in README.md. */
interface Case {
  name: string;
  capability: string;
  scenario: unknown;
  at: number[];
  expect: Expectation[];
}

const cases = Object.values(import.meta.glob<Case>("./public/*.json", { eager: true, import: "default" }));

function checked(input: unknown): Scenario {
  const { scenario, faults } = checkScenario(input);
  if (!scenario) throw new Error(JSON.stringify(faults));
  return scenario;
}

describe("independent results, two integrators apart from this solver", () => {
  test.each(cases)("$name: $capability", ({ scenario, at, expect: expected }) => {
    const result = simulate(checked(scenario), { at });
    if ("error" in result) throw new Error(`${result.error.path}: ${result.error.message}`);
    expect(expected.map((one) => complaint(one, look(result, one.what))).filter(Boolean)).toEqual([]);
  });
});
