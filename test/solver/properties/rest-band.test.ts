import fc from "fast-check";
import { simulate, type Result, type Scenario } from "@restband/solver";
import { expect, test } from "vitest";
import { anyScenario } from "../../support/any-scenario.ts";
import { propertyRuns, propertyTimeout } from "../../support/property-runs.ts";

const share = fc.integer({ min: -999, max: 999 }).map((n) => n / 1000);
const instants = 20;

/** The same contact and spring, the body placed in its rest band with a constant force and one that swings. */
function inBand(drawn: Scenario, place: number, push: number, swing: number): Scenario {
  const { body, contact, span } = drawn;
  const holds = holdingForce(drawn);
  const parts = Math.abs(place) + Math.abs(push) + Math.abs(swing);
  // all of it together stays a hair below what is held
  const unit = (0.999 * holds) / Math.max(1, parts);
  const value = push * unit;
  return {
    ...drawn,
    incline: 0,
    body: { ...body, cubic: 0 },
    contact: { ...contact, normal: { ...contact.normal, ripple: null }, counterface: "ground" },
    force: [
      { kind: "constant", value },
      { kind: "harmonic", amplitude: swing * unit, hz: 3 / span.seconds, phase: 0 },
    ],
    base: [],
    initial: { displacement: body.stiffness > 0 ? (place * unit) / body.stiffness : 0, velocity: 0 },
  };
}

/** μs N r, N or N·m. */
function holdingForce({ contact }: Scenario): number {
  const { law, normal } = contact;
  const atRest = law.model === "table" ? law.points[0][1] : "static" in law ? law.static : 0;
  return atRest * normal.preload * normal.faces * contact.radius;
}

function run(scenario: Scenario): Result {
  const at = Array.from({ length: instants + 1 }, (_, i) => (scenario.span.seconds * i) / instants);
  const result = simulate(scenario, { samples: 0, quantities: ["holdUse"], energy: false, at });
  if ("error" in result) throw new Error(result.error.message);
  return result;
}

test(
  "a body at rest in its band stays where it is, to the last digit",
  () => {
    fc.assert(
      fc.property(anyScenario, share, share, share, (drawn, place, push, swing) => {
        // bristles give elastically, and without friction there is no band
        fc.pre(drawn.contact.law.model !== "bristle" && drawn.contact.law.model !== "none");
        const scenario = inBand(drawn, place, push, swing);
        const { events, outcome, at, quantities } = run(scenario);
        expect(events.map(({ kind }) => kind)).toEqual(["start", "end"]);
        expect(outcome).toBe("never-moved");
        expect(new Set(at!.x)).toEqual(new Set([scenario.initial.displacement]));
        expect([...at!.v].every((v) => v === 0)).toBe(true);
        expect(quantities.holdUse ?? 0).toBeLessThan(1);
      }),
      propertyRuns,
    );
  },
  propertyTimeout,
);
