import { simulate, type Energy, type Result, type Scenario } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { largestOf, ledgerByQuadrature, residualOf, type Flip } from "../support/ledger.ts";
import { driveNames, randomScenario } from "../support/random-scenario.ts";

/*
 * Every entry of the ledger, integrated a second time by quadrature; and the energy check must break when the sign of the
 * contact force, or of c, is wrong in a single phase.
 */

function solve(scenario: Scenario): Result & { energy: Energy } {
  const result = simulate(scenario, { samples: 0 });
  if ("error" in result || !result.energy) throw new Error("refused");
  return { ...result, energy: result.energy };
}

/** The share of the largest entry that the ledger is out of balance by. */
const imbalance = (energy: Energy): number => Math.abs(residualOf(energy)) / largestOf(energy);

/** Reid's solid damping has corners that no event marks: quadrature over them is coarser. */
const isSmooth = ({ solid }: Scenario): boolean => solid.model !== "displacement-proportional";

describe("the ledger against quadrature", () => {
  test.each(driveNames)("%s", (name) => {
    for (let i = 0; i < 2; i++) {
      const scenario = randomScenario(driveNames.indexOf(name) + i * driveNames.length);
      const { energy, ...result } = solve(scenario);
      const second = ledgerByQuadrature(scenario, { ...result, energy }, 400);
      const tolerance = (isSmooth(scenario) ? 1e-9 : 1e-6) * Math.max(largestOf(energy), 1e-6);
      for (const [entry, value] of Object.entries(energy)) {
        expect(Math.abs(value - second[entry as keyof Energy]), `${i} ${entry}`).toBeLessThanOrEqual(tolerance);
      }
      expect(Math.abs(energy.residual)).toBeLessThanOrEqual(1e-9 * largestOf(energy));
      expect(energy.residual).toBeCloseTo(residualOf(energy), 12);
    }
  });
});

describe("the energy check breaks when a sign is wrong in one phase", () => {
  // A scenario with dry friction and a damper that moves all through: µs = µk, many turns.
  const scenario = (): Scenario => {
    const drawn = randomScenario(driveNames.indexOf("freely"));
    const { inertia, stiffness } = drawn.body;
    return {
      ...drawn,
      solid: { model: "none" },
      body: { ...drawn.body, viscous: 0.04 * Math.sqrt(inertia * stiffness) },
    };
  };

  test.each(["friction", "damping"] as const)("of %s", (of) => {
    const result = solve(scenario());
    const turns = result.events.filter(({ kind }) => kind === "turn");
    expect(turns.length).toBeGreaterThanOrEqual(2);
    expect(imbalance(ledgerByQuadrature(scenario(), result, 400))).toBeLessThanOrEqual(1e-9);
    for (let i = 1; i < turns.length; i++) {
      const flip: Flip = { of, from: turns[i - 1].t, to: turns[i].t };
      expect(imbalance(ledgerByQuadrature(scenario(), result, 400, flip))).toBeGreaterThan(1e-4);
    }
  });
});
