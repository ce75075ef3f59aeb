import { createHash } from "node:crypto";
import { describe, expect, it } from "vitest";
import {
  excitationTerms,
  frictionLaws,
  pythonGap,
  pythonScript,
  recordDigest,
  simulate,
  type Scenario,
} from "@restband/solver";
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
    expect(text).toContain(String.raw`# "a\"\"\"\nimport os\r\n\\"`);
    expect(text).not.toMatch(/^import os/mu);
  });

  it("carries a long record as the very bytes that its digest is of", () => {
    const times = Array.from({ length: 1001 }, (_, i) => i / 3);
    const values = times.map((t) => -t * t);
    const text = scriptOf({
      ...decay,
      force: [{ kind: "record", times, values }],
      span: { ...decay.span, seconds: 1 },
    });
    const [, digest, block] = /unpacked\(\s*"(\w+)",\s*"""\n(.*?)"""/su.exec(text) ?? [];
    const bytes = Buffer.from(block, "base64");
    expect(digest).toBe(recordDigest(times, values));
    expect(createHash("sha256").update(bytes).digest("hex")).toBe(digest);
    expect(bytes.readDoubleLE(8 * 1000)).toBe(times[1000]);
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
