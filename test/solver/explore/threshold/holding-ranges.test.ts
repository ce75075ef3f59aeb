import { answerAll, holdingPaths, holdingRanges, type HoldingRange, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { buildScenario } from "../../../support/scenario-builder.ts";

/** x_b = μs N/k = 0.2 · 10/800 = 2.5 mm; it comes to rest whatever friction is, unless there is none. */
const released: Scenario = buildScenario({
  body: { inertia: 2, stiffness: 800 },
  contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
  initial: { displacement: 0.02 },
  span: { seconds: 20 },
  limits: [{ quantity: "restBand", min: 0.002, max: 0.004 }],
});

function rangesOf(scenario: Scenario): Record<string, HoldingRange> {
  return Object.fromEntries(answerAll(holdingRanges(scenario)).map((range) => [range.path, range]));
}

describe("how far a scenario holds", () => {
  it("is told for friction, preload, damping and feed where no value is known as a range", () => {
    const ranges = rangesOf(released);
    expect(Object.keys(ranges)).toEqual([
      "body.viscous",
      "contact.law.static",
      "contact.law.kinetic",
      "contact.normal.preload",
    ]);
    const { low, high } = ranges["contact.normal.preload"];
    expect(low.value).toBeCloseTo(8, 2);
    expect(high.value).toBeCloseTo(16, 2);
    expect([low.change, high.change]).toEqual([
      { kind: "limit", limit: 0 },
      { kind: "limit", limit: 0 },
    ]);
    expect(high.flip?.below.value).toBe(high.value);
    expect(high.flip?.above.value).toBeGreaterThan(high.value);
  });

  it("ends where values cannot stand together, and says so", () => {
    const { low, high, entered } = rangesOf(released)["contact.law.kinetic"];
    expect(entered).toBe(0.15);
    expect(low.value).toBeLessThan(0.05);
    expect(high.value).toBeCloseTo(0.2, 4);
    expect(high.change).toBeNull();
    expect(high.flip?.above.reply).toMatchObject({ reason: expect.stringMatching(/Static friction/) as string });
  });

  it("tells a change of outcome", () => {
    // held at the start while k x₀ ≤ μs N: 16 N; with 80 N of preload or more it never moves
    const ranges = rangesOf({ ...released, limits: [] });
    const { low, high } = ranges["contact.normal.preload"];
    expect(low).toEqual({ value: 1, flip: null, change: null });
    expect(high.value).toBeCloseTo(80, 1);
    expect(high.change).toEqual({ kind: "outcome" });
  });

  it("is told for values known as ranges alone where there are any", () => {
    const origins = { "body.stiffness": { kind: "assumed", low: 700, high: 900 } } as const;
    expect(holdingPaths({ ...released, origins })).toEqual(["body.stiffness"]);
    const { low, high } = rangesOf({ ...released, origins })["body.stiffness"];
    expect(low.value).toBeCloseTo(500, 1);
    expect(high.value).toBeCloseTo(1000, 1);
  });
});
