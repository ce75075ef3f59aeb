import fc from "fast-check";
import { agreementOf, simulate, unsupported, type Result, type Scenario } from "@restband/solver";
import { expect, test } from "vitest";
import { anyScenario } from "../../support/any-scenario.ts";
import { propertyRuns, propertyTimeout } from "../../support/property-runs.ts";
import { disagreement } from "../../support/disagreement.ts";
import { delayed, moved } from "../../support/transformed.ts";

function run(scenario: Scenario): Result {
  const result = simulate(scenario, { samples: 0, quantities: peaks, energy: false });
  if ("error" in result) throw new Error(result.error.message);
  return result;
}

/** What deviations are told as shares of. */
const peaks = ["slipVelocityPeak", "peakVelocity", "peakDisplacement", "driveForcePeak"];
const periodic = ["harmonic", "unbalance", "chirp"];

/** All but the start, where one of the two is told an instant before its inputs begin. */
const happenings = (result: Result): Result => ({ ...result, outcome: null, events: result.events.slice(1) });

/** The body at rest where nothing pulls at it, on ground, and inputs that have all still to begin. */
function atRest(drawn: Scenario): Scenario {
  const isShaken = drawn.base.some(({ kind }) => kind === "acceleration-record");
  const begins = ({ kind }: { kind: string }) => !periodic.includes(kind) && kind !== "constant";
  return {
    ...drawn,
    incline: 0,
    contact: {
      ...drawn.contact,
      normal: { ...drawn.contact.normal, ripple: null },
      counterface: isShaken ? "base" : "ground",
    },
    force: drawn.force.filter(begins).map(fromZero),
    base: drawn.base.filter(begins).map(fromZero),
    initial: { displacement: 0, velocity: 0 },
    span: { ...drawn.span, untilRest: false },
  };
}

/** Two terms that lead the base against each other may leave it to rounding when it moves at all. */
const movesCancel = ({ base }: Scenario): boolean => base.length > 1;

/**
 * Whether the body goes as far as its spring is stretched and as fast as its grip could make it, near enough: else its x and v
 * are small differences of large numbers.
 */
function goesFar({ quantities }: Result, { body, contact, span }: Scenario): boolean {
  const { preload, faces } = contact.normal;
  const couldReach = (preload * faces * contact.radius * span.seconds) / (25 * body.inertia);
  const isFar = quantities.peakDisplacement! * body.stiffness >= 1e-3 * quantities.driveForcePeak!;
  return isFar && quantities.slipVelocityPeak! >= 1e-4 * couldReach;
}

/** An exponent below 1 makes friction fall infinitely fast at rest: from there more than one motion solves the equation. */
const leavesInManyWays = ({ contact: { law } }: Scenario): boolean => law.model === "stribeck" && law.exponent < 1;

/** A record that is 0 at its first point. */
function fromZero<Term extends object>(term: Term): Term {
  if (!("values" in term)) return term;
  const values = term.values as number[];
  return { ...term, values: values.map((value) => value - values[0]) };
}

test(
  "inputs that all begin later move the run along with them",
  () => {
    let [compared, sensitive] = [0, 0];
    const delay = fc.constantFrom(0.25, 1, 3.7);
    fc.assert(
      fc.property(anyScenario, delay, (drawn, share) => {
        const scenario = atRest(drawn);
        // bristles are integrated all the time: their steps fall elsewhere; without friction moves may cancel the swing
        // that they set going, and when the rest of it turns there is rounding
        fc.pre(scenario.contact.law.model !== "bristle" && scenario.contact.law.model !== "none");
        fc.pre(unsupported(scenario) === null && !leavesInManyWays(scenario) && !movesCancel(scenario));
        const { seconds } = scenario.span;
        const later = share * seconds;
        const [now, then] = [
          scenario,
          { ...delayed(scenario, later), span: { ...scenario.span, seconds: seconds + later } },
        ].map(run);
        fc.pre(now.ended === "time" && goesFar(now, scenario));
        const back = {
          ...then,
          events: then.events.map((event) => ({ ...event, t: event.t - later })),
        };
        const again = (sign: 1 | -1): Result => happenings(run(moved(scenario, sign * 1e-12)));
        const found = agreementOf(happenings(now), happenings(back), again);
        compared++;
        if (found.verdict === "sensitive") sensitive++;
        expect(disagreement(found)).toBeNull();
      }),
      propertyRuns,
    );
    expect(sensitive).toBeLessThan(0.02 * compared);
  },
  propertyTimeout,
);
