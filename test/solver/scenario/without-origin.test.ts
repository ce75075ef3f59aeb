import { checkScenario, pathsWithoutOrigin } from "@restband/solver";
import { expect, it } from "vitest";
import { plainScenario } from "./plain-scenario.ts";

const missing = (more: object) => pathsWithoutOrigin(checkScenario(plainScenario(more)).scenario!);

it("misses the origin of every value but what is wanted, what is 0, and one face", () => {
  const values = ["body.inertia", "body.stiffness", "contact.law.static", "contact.law.kinetic"];
  const limits = [{ quantity: "peakDisplacement", max: 0.02 }];
  expect(missing({ limits, settleBand: 0.001 }).sort()).toEqual([...values, "contact.normal.preload"].sort());
});

it("misses it no more once somebody has said it, and of each term anew", () => {
  const origins = { "body.inertia": { kind: "assumed" } };
  expect(missing({ origins })).not.toContain("body.inertia");
  expect(missing({ origins: {}, force: [{ kind: "ramp", rate: 2 }] })).toContain("force[0].rate");
});
