import fc from "fast-check";
import { quantities, simulate, type Limit, type Result, type Scenario } from "@restband/solver";
import { expect, test } from "vitest";
import { anyScenario } from "../../support/any-scenario.ts";
import { propertyRuns, propertyTimeout } from "../../support/property-runs.ts";
import { mirrored } from "../../support/transformed.ts";

const signed = quantities.filter((quantity) => quantity.signed).map(({ name }) => name);
/** Limits on both kinds of quantity; the mirror exchanges the bounds of the signed ones. */
const limits: Limit[] = [
  { quantity: "peakDisplacement", max: 1 },
  { quantity: "meanDisplacement", min: -0.1, max: 0.3 },
  { quantity: "restOffset", max: 0 },
  { quantity: "stickFraction", max: 0.2 },
];

function run(scenario: Scenario): Result {
  const result = simulate(scenario, { samples: 0 });
  if ("error" in result) throw new Error(result.error.message);
  return result;
}

/** Without −0, which toEqual tells from 0. */
const unsigned = (entries: object) =>
  Object.fromEntries(
    Object.entries(entries).map(([name, value]: [string, number | null]) => [name, value === null ? null : 0 + value]),
  );

/** A result as its mirror should tell it. 0 − leaves no −0. */
const reflected = (result: Result) => ({
  ended: result.ended,
  outcome: result.outcome,
  events: result.events.map(({ t, kind, x, v, f }) => ({ t, kind, x: 0 - x, v: 0 - v, f: 0 - f })),
  quantities: Object.fromEntries(
    Object.entries(result.quantities).map(([name, value]) => [
      name,
      value === null ? null : signed.some((one) => one === name) ? 0 - value : 0 + value,
    ]),
  ),
  verdicts: result.limits.map(({ kept }) => kept),
  energy: unsigned(result.energy!),
});

/** The same, seen directly. */
const plain = (result: Result) => ({
  ended: result.ended,
  outcome: result.outcome,
  events: result.events.map(({ t, kind, x, v, f }) => ({ t, kind, x: 0 + x, v: 0 + v, f: 0 + f })),
  quantities: unsigned(result.quantities),
  verdicts: result.limits.map(({ kept }) => kept),
  energy: unsigned(result.energy!),
});

// Every sum of mirrored numbers is the mirrored sum, to the last digit.
test(
  "a mirrored scenario has the mirrored answer, bit for bit, and the same verdicts",
  () => {
    fc.assert(
      fc.property(anyScenario, (drawn) => {
        const scenario = { ...drawn, limits };
        expect(plain(run(mirrored(scenario)))).toEqual(reflected(run(scenario)));
      }),
      propertyRuns,
    );
  },
  propertyTimeout,
);
