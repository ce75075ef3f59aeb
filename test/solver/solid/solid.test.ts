import { describe, expect, it } from "vitest";
import type { Solid } from "@restband/solver";
import { solidOf } from "../../../solver/src/solid/index.ts";

const body = { stiffness: 800, inertia: 2, driveHz: 4 };
const compile = (solid: Solid) => solidOf(solid.model).compile(solid, body);

describe("solid damping", () => {
  it("none does nothing", () => {
    expect(compile({ model: "none" })).toEqual({ viscous: 0, proportional: 0 });
  });

  it("equivalent-viscous loses π η k X² per cycle at its frequency", () => {
    const ways: [Solid, number][] = [
      [{ model: "equivalent-viscous", lossFactor: 0.03, at: "natural" }, Math.sqrt(800 / 2)],
      [{ model: "equivalent-viscous", lossFactor: 0.03, at: "drive" }, 2 * Math.PI * 4],
      [{ model: "equivalent-viscous", lossFactor: 0.03, at: { hz: 7 } }, 2 * Math.PI * 7],
    ];
    for (const [solid, omega] of ways) {
      // A damper loses π c ω X² per cycle.
      expect(Math.PI * compile(solid).viscous * omega).toBeCloseTo(Math.PI * 0.03 * 800, 12);
      expect(compile(solid).proportional).toBe(0);
    }
  });

  it("displacement-proportional loses π η k X² per cycle at any frequency", () => {
    const { viscous, proportional } = compile({ model: "displacement-proportional", lossFactor: 0.03 });
    // Reid's force loses 4 ∫ ρ k d dd = 2 ρ k X² per cycle.
    expect(2 * proportional * 800).toBeCloseTo(Math.PI * 0.03 * 800, 12);
    expect(viscous).toBe(0);
  });
});
