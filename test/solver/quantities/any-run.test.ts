import { quantities, simulate, type Result, type Scenario, type Term } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { driveNames, randomScenario } from "../../support/random-scenario.ts";

/* What every quantity must satisfy on every run: 60 drawn scenarios of every kind the exact method covers. */

const drawn = Array.from({ length: 60 }, (_, seed) => ({
  seed,
  drive: driveNames[seed % driveNames.length],
  scenario: randomScenario(seed),
}));

function solve(scenario: Scenario): Result {
  const result = simulate(scenario, { samples: 0 });
  if ("error" in result) throw new Error(`${result.error.path}: ${result.error.message}`);
  return result;
}

/** Everything with a direction turned round. */
function mirrored(scenario: Scenario): Scenario {
  const { counterface } = scenario.contact;
  const belt = typeof counterface === "object" ? { velocity: -counterface.velocity } : counterface;
  const { displacement, velocity } = scenario.initial;
  return {
    ...scenario,
    contact: { ...scenario.contact, counterface: belt },
    incline: -scenario.incline,
    force: scenario.force.map(reversed),
    base: scenario.base.map(reversed),
    initial: { displacement: -displacement, velocity: -velocity },
  };
}

function reversed(term: Term): Term {
  if ("values" in term) return { ...term, values: term.values.map((value) => -value) };
  const directed = ["value", "rate", "amplitude", "mass", "peak", "distance", "increment"];
  const turn = ([key, value]: [string, unknown]) => [key, directed.includes(key) ? -(value as number) : value];
  const turned: unknown = Object.fromEntries(Object.entries(term).map((entry) => turn(entry)));
  return turned as Term;
}

describe.each(drawn)("run $seed, $drive", ({ scenario }) => {
  const result = solve(scenario);
  const { quantities: values } = result;

  test("has every quantity, a finite number or none, negative only where it is signed", () => {
    expect(Object.keys(values)).toEqual(quantities.map(({ name }) => name));
    for (const { name, signed } of quantities) {
      const value = values[name];
      if (value === null) continue;
      expect(Number.isFinite(value), name).toBe(true);
      if (!signed) expect(value, name).toBeGreaterThanOrEqual(0);
    }
  });

  test("has values that fit together", () => {
    for (const share of [values.stickFraction, values.cycleStickFraction, values.holdUse]) {
      if (share !== null) expect(share).toBeLessThanOrEqual(1);
    }
    expect(values.amplitude).toBeLessThanOrEqual(Math.max(values.peakDisplacement!, values.followingErrorPeak!));
    expect(values.driveForceRms).toBeLessThanOrEqual(values.driveForcePeak! * (1 + 1e-12));
    expect(Math.abs(values.driftPerCycle ?? 0)).toBeLessThanOrEqual((values.slipPerCycle ?? 0) * (1 + 1e-12));
    expect(values.restTime === null).toBe(values.halfCycles === null);
    // a body held under a load that goes on swinging never moved, and so never stopped
    if (result.outcome !== "never-moved") expect(values.restTime !== null).toBe(result.outcome === "came-to-rest");
  });

  test("is told alike in a mirror: signed quantities turn round, the others and the outcome stay", () => {
    const mirror = solve(mirrored(scenario));
    expect(mirror.outcome).toBe(result.outcome);
    for (const { name, signed } of quantities) {
      const [value, other] = [values[name], mirror.quantities[name]];
      if (value === null || other === null) expect(other, name).toBe(value);
      else expect(signed ? -other : other, name).toBeCloseTo(value, 9);
    }
  });
});
