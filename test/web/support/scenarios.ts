import { checkScenario, simulate, type Result, type Scenario } from "@restband/solver";
import { buildScenario, type ScenarioSketch } from "../../support/scenario-builder.ts";

/** A carriage on a feed drive that sticks and slips: every number of it is used somewhere in these tests. */
export const creepFeed: Scenario = {
  ...buildScenario({
    body: { inertia: 120, stiffness: 4e6, viscous: 350 },
    contact: { law: { model: "coulomb", static: 0.15, kinetic: 0.12 }, normal: { preload: 800, weight: true } },
    base: [{ kind: "ramp", rate: 0.002 }],
    span: { seconds: 0.5 },
    limits: [{ quantity: "stickFraction", max: 0 }],
  }),
  title: "Z carriage, creep feed",
  purpose: "feed",
};

/** A scenario with some members replaced, checked. */
export function variant(change: Partial<Scenario>, from: Scenario = creepFeed): Scenario {
  const { scenario, faults } = checkScenario({ ...from, ...change });
  if (!scenario) throw new Error(faults.map(({ path, message }) => `${path}: ${message}`).join("\n"));
  return scenario;
}

/** A sketch as a scenario and its result. */
export function solved(sketch: ScenarioSketch | Scenario, samples = 2001): { scenario: Scenario; result: Result } {
  const scenario = "format" in sketch ? sketch : buildScenario(sketch);
  const result = simulate(scenario, { samples });
  if ("error" in result) throw new Error(result.error.message);
  return { scenario, result };
}
