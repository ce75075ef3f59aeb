import { describe, expect, it } from "vitest";
import { simulate, type Result } from "@restband/solver";
import { buildScenario } from "../../support/scenario-builder.ts";

/** A spring that stiffens, let go without friction: nothing but the integration can be wrong. */
const swing = buildScenario({
  body: { inertia: 1, stiffness: 100, cubic: 5e4 },
  initial: { displacement: 0.05 },
  span: { seconds: 6, untilRest: false },
});

describe("the tolerance of the adaptive method", () => {
  it("brings a run closer to the finest one, the smaller it is", () => {
    const apart = [1e-6, 1e-8, 1e-10].map((tolerance) => Math.abs(endOf(tolerance) - endOf(1e-12)));
    expect(apart[0]).toBeGreaterThan(10 * apart[1]);
    expect(apart[1]).toBeGreaterThan(apart[2]);
    expect(apart[0]).toBeLessThan(1e-4);
  });
});

function endOf(tolerance: number): number {
  const result = simulate(swing, { samples: 2, tolerance, method: "adaptive" }) as Result;
  return result.events[result.events.length - 1].x;
}
