import type { Result, Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { cautionRules } from "../../../web/src/features/cautions/caution-rules.ts";
import { creepFeed, solved, variant } from "../support/scenarios.ts";

const { result } = solved(creepFeed);
const limit = { quantity: "peakVelocity", max: 1, value: 0, kept: true, margin: 1 };
const outcome = (change: Partial<Result>): Result => ({ ...result, limits: [], ...change });

describe("the caution that friction must not be what holds", () => {
  it.each<[string, Scenario, Result | null, boolean]>([
    ["a feed that slides", creepFeed, outcome({ outcome: "smooth-sliding" }), false],
    ["purpose holding, before any run", variant({ purpose: "holding" }), null, true],
    ["purpose braking", variant({ purpose: "braking" }), outcome({ outcome: "smooth-sliding" }), true],
    ["an inclined body that rests", variant({ incline: 20 }), outcome({ outcome: "came-to-rest" }), true],
    ["a level body that rests", creepFeed, outcome({ outcome: "came-to-rest" }), false],
    ["growing", creepFeed, outcome({ outcome: "growing" }), true],
    ["a limit met by a body that rests", creepFeed, outcome({ outcome: "never-moved", limits: [limit] }), true],
    ["a limit met by a body that slides", creepFeed, outcome({ outcome: "smooth-sliding", limits: [limit] }), false],
  ])("%s", (_, scenario, run, shown) => expect(cautionRules(scenario, run).holding).toBe(shown));
});

describe("the caution on standing time", () => {
  it("is shown where a body breaks away after it has stood", () => {
    expect(cautionRules(creepFeed, result).dwell).toBe(true);
    expect(cautionRules(creepFeed, null).dwell).toBe(false);
    const start = result.events.filter(({ t }) => t === 0);
    expect(cautionRules(creepFeed, outcome({ events: start })).dwell).toBe(false);
  });
});
