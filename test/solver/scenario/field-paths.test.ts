import { checkScenario, fieldPaths, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { numberAt, withNumber } from "../../../solver/src/scenario/path.ts";
import { plainScenario } from "./plain-scenario.ts";

const scenario = checkScenario(
  plainScenario({
    solid: { model: "equivalent-viscous", lossFactor: 0.1, at: { hz: 3 } },
    contact: {
      law: {
        model: "table",
        points: [
          [0, 0.2],
          [0.1, 0.1],
        ],
      },
      normal: { preload: 40, ripple: { amplitude: 1, hz: 2 } },
      counterface: { velocity: 0.1 },
    },
    force: [
      { kind: "record", times: [0, 1], values: [0, 1] },
      { kind: "record", digest: "0".repeat(64), points: 7 },
      { kind: "ramp", rate: 1 },
      { kind: "ramp", rate: 1, stop: 2 },
    ],
    settleBand: 1e-5,
    limits: [{ quantity: "restTime", max: 5 }],
    origins: { "body.inertia": { kind: "assumed", low: 1 } },
  }),
).scenario as Scenario;

describe("fieldPaths", () => {
  it("lists every single number of the scenario as it stands, and no data", () => {
    expect(fieldPaths(scenario)).toEqual([
      ...["body.inertia", "body.stiffness", "body.cubic", "body.viscous", "solid.lossFactor", "solid.at.hz"],
      ...["contact.normal.preload", "contact.normal.faces", "contact.normal.ripple.amplitude"],
      ...["contact.normal.ripple.hz", "contact.normal.ripple.phase", "contact.radius", "contact.counterface.velocity"],
      ...["incline", "force[2].rate", "force[2].start", "force[3].rate", "force[3].start", "force[3].stop"],
      ...["initial.displacement", "initial.velocity", "span.seconds", "span.maxEvents", "span.maxWork"],
      ...["settleBand", "limits[0].max"],
    ]);
  });

  it("names places that can be read and written", () => {
    for (const path of fieldPaths(scenario)) {
      const changed = withNumber(scenario, path, 1234.5);
      expect(numberAt(changed, path)).toBe(1234.5);
      expect(numberAt(scenario, path)).not.toBe(1234.5);
      expect(fieldPaths(changed)).toEqual(fieldPaths(scenario));
    }
  });
});
