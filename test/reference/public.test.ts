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

/** True where no closed form exists between events, so that the adaptive method is needed. */
function needsAdaptive({ body, contact, force }: Scenario): boolean {
  const { law, normal } = contact;
  const losesContact = normal.ripple !== null && normal.ripple.amplitude >= normal.faces * normal.preload;
  const isSmoothLaw = law.model !== "none" && law.model !== "coulomb";
  return isSmoothLaw || body.cubic !== 0 || losesContact || force.some((term) => term.kind === "chirp");
}

const exact = cases.filter((one) => !needsAdaptive(checked(one.scenario)));
const adaptive = cases.filter((one) => needsAdaptive(checked(one.scenario)));

describe("independent results, two integrators apart from this solver", () => {
  test.each(exact)("$name: $capability", ({ scenario, at, expect: expected }) => {
    const result = simulate(checked(scenario), { at });
    if ("error" in result) throw new Error(`${result.error.path}: ${result.error.message}`);
    expect(expected.map((one) => complaint(one, look(result, one.what))).filter(Boolean)).toEqual([]);
  });
});

describe("cases without a closed form between events", () => {
  test.each(adaptive)("$name: $capability: not computed by this version", ({ scenario, at }) => {
    expect(simulate(checked(scenario), { at })).toMatchObject({ error: { message: "not computed by this version" } });
  });
});
