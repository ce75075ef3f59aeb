import { describe, expect, it } from "vitest";
import { excitationTerms, frictionLaws, pythonGap, pythonScript, simulate, type Scenario } from "@restband/solver";
import { buildScenario, coulombForces } from "../../support/scenario-builder.ts";

const decay = buildScenario({
  body: { inertia: 1, stiffness: 100 },
  contact: coulombForces(1),
  initial: { displacement: 0.1 },
  span: { seconds: 10 },
});

describe("the Python file of a scenario", () => {
  it("holds the scenario's numbers with every digit and the claim's values", () => {
    const text = scriptOf({ ...decay, body: { ...decay.body, stiffness: 100.10000000000001 } });
    expect(text).toContain("STIFFNESS = 100.10000000000001");
    expect(text).toContain('"halfCycles": 5.0,');
    expect(text).not.toMatch(/NaN|undefined|Infinity/u);
  });

  it("keeps a title on its own line of comment, whatever stands in it", () => {
    const text = scriptOf({ ...decay, title: 'a"""\nimport os\r\n\\' });
    expect(text.split(/\r\n|\r|\n/u).filter((line) => line.startsWith("import "))).toEqual([
      "import sys",
      "import numpy as np",
    ]);
  });

  it("writes out every friction law", () => {
    for (const { model } of frictionLaws) expect(pythonGap(withLaw(model), "time"), model).toBeNull();
  });

  it("writes out every kind of input", () => {
    for (const { kind } of excitationTerms) {
      const terms = [{ kind, times: [], values: [] }] as unknown as Scenario["force"];
      expect(pythonGap({ ...decay, force: terms }, "time"), kind).toBeNull();
    }
  });

  it("says why there is none for a run that was cut off", () => {
    expect(pythonGap(decay, "max-events")).toMatch(/cut off/u);
  });
});

function withLaw(model: string): Scenario {
  return { ...decay, contact: { ...decay.contact, law: { model } } } as Scenario;
}

function scriptOf(scenario: Scenario): string {
  const result = simulate(scenario, { samples: 0 });
  if ("error" in result) throw new Error(result.error.message);
  return pythonScript(scenario, { ...result, eventCount: result.events.length, digest: "0", name: "this run" });
}
