import { answerAll, curesOf, simulate, type Cures, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { buildScenario } from "../../../support/scenario-builder.ts";

/** x_b = μs N/k = 0.2 · 10/800 = 2.5 mm. */
const released = (limits: Scenario["limits"]): Scenario =>
  buildScenario({
    body: { inertia: 2, stiffness: 800 },
    contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
    initial: { displacement: 0.02 },
    span: { seconds: 20 },
    limits,
  });
const curesFor = (scenario: Scenario): Cures => answerAll(curesOf(scenario, 0));

describe("cures of a broken limit", () => {
  it("tell what each field alone must become, the smallest change first", () => {
    const found = curesFor(released([{ quantity: "restBand", max: 0.002 }]));
    const byPath = Object.fromEntries(found.cures.map((cure) => [cure.path, cure]));
    // a fifth less friction or preload, a quarter more stiffness: ln 1.25 each
    expect(Object.keys(byPath).sort()).toEqual(["body.stiffness", "contact.law.static", "contact.normal.preload"]);
    expect(byPath["body.stiffness"].value).toBeCloseTo(1000, 6);
    expect(byPath["contact.normal.preload"].value).toBeCloseTo(8, 2);
    expect(byPath["contact.law.static"].value).toBeCloseTo(0.16, 4);
    for (const { size } of found.cures) expect(size).toBeCloseTo(Math.log(1.25), 3);
    expect(found.withoutCure.map(({ path }) => path).sort()).toEqual([
      "body.inertia",
      "body.viscous",
      "contact.law.kinetic",
    ]);
  });

  it("are scenarios that keep the limit, and say whether the others are kept", () => {
    const scenario = released([
      { quantity: "halfCycles", max: 4 },
      { quantity: "restBand", max: 0.0025 },
    ]);
    const { cures } = curesFor(scenario);
    expect(cures.length).toBeGreaterThan(2);
    for (const { scenario: cured, keepsOthers, path, value } of cures) {
      const result = simulate(cured, { samples: 0 });
      if ("error" in result) throw new Error(result.error.message);
      expect(result.limits[0].kept).toBe(true);
      expect(result.limits[1].kept, `${path} ${value}`).toBe(keepsOthers);
    }
    expect(new Set(cures.map(({ keepsOthers }) => keepsOthers))).toEqual(new Set([true, false]));
    // damping was 0: its size is a share of 2√(km) = 80 N·s/m
    const damping = cures.find(({ path }) => path === "body.viscous");
    expect(damping?.size).toBeCloseTo((damping?.value ?? NaN) / 80, 12);
    expect(cures.map(({ size }) => size)).toEqual(cures.map(({ size }) => size).sort((a, b) => a - b));
  });

  it("are none where nothing is broken", () => {
    expect(curesFor(released([{ quantity: "restBand", max: 1 }]))).toEqual({
      limit: 0,
      isBroken: false,
      cures: [],
      withoutCure: [],
    });
    expect(() => answerAll(curesOf(released([]), 0))).toThrow(/no limit 0/);
  });
});
