import fc from "fast-check";
import { simulate, type Result, type Scenario } from "@restband/solver";
import { expect, test } from "vitest";
import { anyScenario } from "../../support/any-scenario.ts";
import { propertyRuns, propertyTimeout } from "../../support/property-runs.ts";
import { inUnits, unitOfPlace, type Units } from "../../support/transformed.ts";

function run(scenario: Scenario): Result {
  const result = simulate(scenario, { samples: 0, quantities: ["peakAcceleration", "stickFraction"], energy: false });
  if ("error" in result) throw new Error(result.error.message);
  return result;
}

const account = ({ ended, outcome, events, quantities }: Result, place: number, { length, time, mass }: Units) => ({
  ended,
  outcome,
  events: events.map(({ t, kind, x, v, f }) => ({
    kind,
    t: t * time,
    x: x * place,
    v: (v * place) / time,
    f: (f * mass * length ** 2) / time ** 2 / place,
  })),
  peakAcceleration: (quantities.peakAcceleration! * place) / time ** 2,
  stickFraction: quantities.stickFraction,
});

const one: Units = { length: 1, time: 1, mass: 1 };
const power = fc.integer({ min: -12, max: 12 }).map((n) => 2 ** n);
const units = fc.record({ length: power, time: power, mass: power });

// Units that are powers of two round nothing: a constant with a unit of its own anywhere in the solver would show.
test(
  "told in other units of length, time and mass the run is the same, bit for bit",
  () => {
    fc.assert(
      fc.property(anyScenario, units, (drawn, told) => {
        const scenario: Scenario = { ...drawn, incline: 0 };
        const place = unitOfPlace(scenario, told);
        expect(account(run(inUnits(scenario, told)), 1, one)).toEqual(account(run(scenario), place, told));
      }),
      propertyRuns,
    );
  },
  propertyTimeout,
);
