import { keptResultOf, replayDraftSchema } from "@restband/api/contract";
import { simulate, type Result, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { replay, waysOf, type Ask } from "../../../web/src/features/replay/replay-run.ts";
import { buildScenario } from "../../support/scenario-builder.ts";
import { creepFeed } from "../support/scenarios.ts";

const ask: Ask = (scenario, options) => {
  const result = simulate(scenario, options);
  return "error" in result ? Promise.reject(new Error(result.error.message)) : Promise.resolve(result);
};

const freeze = (scenario: Scenario) => {
  const result = simulate(scenario, { samples: 0 }) as Result;
  return { scenario, result: keptResultOf(result) };
};

const belt = buildScenario({
  body: { inertia: 1, stiffness: 100 },
  contact: {
    law: { model: "stribeck", static: 0.4, kinetic: 0.2, velocity: 0.1, exponent: 1 },
    normal: { preload: 20 },
    counterface: { velocity: 0.05 },
  },
  span: { seconds: 3, untilRest: false },
});

describe("a revision run again", () => {
  it("agrees by the same method to the last bit, and by the other within 1e-6", async () => {
    const frozen = freeze(creepFeed);
    expect(waysOf(frozen)).toEqual(["same-method", "other-method"]);
    const same = await replay("same-method", frozen, ask);
    expect(same).toMatchObject({ verdict: "agrees", allowed: 1e-9, differences: [], convergence: [] });
    expect(same.deviations.every(({ relative }) => relative === 0)).toBe(true);
    const other = await replay("other-method", frozen, ask);
    expect(other).toMatchObject({ verdict: "agrees", allowed: 1e-6 });
    expect(other.deviations[0].relative).toBeGreaterThan(0);
    expect(replayDraftSchema.safeParse(other).success).toBe(true);
  });

  it("takes the adaptive method at two tolerances where no other applies, and tells how they close in", async () => {
    const frozen = freeze(belt);
    expect(waysOf(frozen)).toEqual(["same-method", "tolerances"]);
    const draft = await replay("tolerances", frozen, ask);
    expect(draft.verdict).toBe("agrees");
    expect(draft.convergence.map(({ tolerance }) => tolerance)).toEqual([1e-6, 1e-11]);
    expect(draft.convergence[0].relative).toBeGreaterThan(draft.convergence[1].relative);
    expect(replayDraftSchema.safeParse(draft).success).toBe(true);
  });

  it("differs where a number was changed after the freeze", async () => {
    const frozen = freeze(creepFeed);
    const { quantities } = frozen.result;
    const wrong = { ...frozen.result, quantities: { ...quantities, amplitude: 1.00001 * (quantities.amplitude ?? 0) } };
    const draft = await replay("same-method", { ...frozen, result: wrong }, ask);
    expect(draft.verdict).toBe("differs");
    expect(draft.deviations[0].what).toBe("amplitude");
  });

  it("says sensitive where inputs moved by 1e-12 move the run as much as it is off", async () => {
    const frozen = freeze(creepFeed);
    const off = (result: Result, restBand: number) => ({ ...result, quantities: { ...result.quantities, restBand } });
    // A machine whose runs scatter: each comes out a little different, moved inputs or not.
    let count = 0;
    const scattering: Ask = async (scenario, options) => off(await ask(scenario, options), [1, 1, 1e9, 1][count++]);
    expect((await replay("same-method", frozen, scattering)).verdict).toBe("sensitive");
    const steady: Ask = async (scenario, options) => off(await ask(scenario, options), 1);
    expect((await replay("same-method", frozen, steady)).verdict).toBe("differs");
  });

  it("counts the events that are too many to keep", async () => {
    const frozen = freeze(creepFeed);
    const more = { ...frozen.result, eventCount: frozen.result.eventCount + 1 };
    const draft = await replay("same-method", { ...frozen, result: more }, ask);
    expect(draft.verdict).toBe("differs");
    expect(draft.differences[0]).toMatch(/^There are \d+ events in the revision/u);
  });
});
