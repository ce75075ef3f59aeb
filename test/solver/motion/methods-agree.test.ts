import { expect, test } from "vitest";
import { simulate, needsAdaptive, type Result } from "@restband/solver";
import { randomScenario } from "../../support/random-scenario.ts";

const seeds = Array.from({ length: 60 }, (_, i) => i);
const compared = [
  "peakDisplacement",
  "peakVelocity",
  "amplitude",
  "meanDisplacement",
  "driveForcePeak",
  "slipVelocityPeak",
];

function run(seed: number, method: "exact" | "adaptive"): Result {
  const result = simulate(randomScenario(seed), { method, samples: 0, quantities: compared, energy: false });
  if ("error" in result) throw new Error(result.error.message);
  return result;
}

/** Tells where two runs part: at events, within 1e-7 of the run's own peaks. */
test.each(seeds)("both methods tell the same motion, seed %i", (seed) => {
  const scenario = randomScenario(seed);
  expect(needsAdaptive(scenario)).toBeNull();
  const exact = run(seed, "exact");
  const adaptive = run(seed, "adaptive");
  expect(adaptive.outcome).toBe(exact.outcome);
  expect(adaptive.events.map(({ kind }) => kind)).toEqual(exact.events.map(({ kind }) => kind));
  const length = Math.max(...exact.events.map(({ x }) => Math.abs(x)), exact.quantities.peakDisplacement ?? 0);
  exact.events.forEach((event, i) => {
    const { t, x } = adaptive.events[i];
    expect(Math.abs(x - event.x)).toBeLessThanOrEqual(1e-7 * length);
    // a stop that comes to rest on almost no force: where it stops is certain, when is not
    const isAtSamePlace = Math.abs(x - event.x) <= 1e-10 * length;
    expect(Math.abs(t - event.t)).toBeLessThanOrEqual((isAtSamePlace ? 1e-5 : 1e-7) * scenario.span.seconds);
  });
  for (const name of compared) {
    const [a, b] = [exact.quantities[name] as number, adaptive.quantities[name] as number];
    const size = isLength(name) ? length : Math.abs(a);
    expect(Math.abs(a - b)).toBeLessThanOrEqual(1e-7 * size);
  }
});

function isLength(name: string): boolean {
  return name === "amplitude" || name === "meanDisplacement";
}
