import { agreementOf, movedInputs, simulate, type Result, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { buildScenario } from "../../support/scenario-builder.ts";

function run(scenario: Scenario): Result {
  const result = simulate(scenario, { samples: 0 });
  if ("error" in result) throw new Error(result.error.message);
  return result;
}

/** Free decay from x0 with a force that slips at 1 N on a spring of 100 N/m: x falls by 0.02 m each half cycle. */
const decay = (displacement: number, force = 1): Scenario =>
  buildScenario({
    body: { inertia: 1, stiffness: 100 },
    contact: { law: { model: "coulomb", static: force, kinetic: force }, normal: { preload: 1 } },
    initial: { displacement },
    span: { seconds: 20 },
  });

const judged = (scenario: Scenario, second: Result) =>
  agreementOf(run(scenario), second, (sign) => run(movedInputs(scenario, sign))).verdict;

describe("movedInputs", () => {
  it("moves every input by 1e-12, neighbours apart, and leaves what is no input", () => {
    const scenario = decay(0.05);
    const moved = movedInputs(scenario, 1);
    const shares = [
      moved.body.inertia / scenario.body.inertia,
      moved.body.stiffness / scenario.body.stiffness,
      moved.initial.displacement / scenario.initial.displacement,
    ].map((ratio) => Math.abs(ratio - 1));
    for (const share of shares) expect(share).toBeCloseTo(1e-12, 15);
    expect(Math.sign(moved.body.inertia - 1)).toBe(-Math.sign(moved.body.stiffness - 100));
    expect([moved.span, moved.limits, moved.contact.normal.faces]).toEqual([scenario.span, scenario.limits, 1]);
  });

  it("keeps static friction at or above kinetic", () => {
    const { law } = movedInputs(decay(0.05), -1).contact;
    expect(law).toMatchObject({ model: "coulomb" });
    if (law.model === "coulomb") expect(law.static).toBeGreaterThanOrEqual(law.kinetic);
  });
});

describe("agreement with inputs moved", () => {
  it("agrees with itself, and with a replay that rounds otherwise", () => {
    expect(judged(decay(0.055), run(decay(0.055)))).toBe("agrees");
    expect(judged(decay(0.055), run(decay(0.055 * (1 + 1e-15))))).toBe("agrees");
  });

  it("differs where the input itself is another", () => {
    expect(judged(decay(0.055), run(decay(0.055, 1.01)))).toBe("differs");
  });

  // 0.05 m is 5 x_k: the second turn falls on x = x_k exactly, where the body just holds. A hair more and it swings on.
  it("is sensitive where a tie decides", () => {
    expect(judged(decay(0.05), run(decay(0.05 * (1 + 5e-12))))).toBe("sensitive");
  });
});
