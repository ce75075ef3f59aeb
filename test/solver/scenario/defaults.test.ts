import { checkScenario } from "@restband/solver";
import { expect, it } from "vitest";
import { plainScenario, withContact } from "./plain-scenario.ts";

it("writes every default", () => {
  expect(checkScenario(plainScenario()).scenario).toEqual({
    format: "restband-scenario/1",
    title: "",
    purpose: "other",
    motion: "linear",
    body: { inertia: 2, stiffness: 800, cubic: 0, viscous: 0 },
    solid: { model: "none" },
    contact: {
      law: { model: "coulomb", static: 0.2, kinetic: 0.1 },
      normal: { preload: 40, faces: 1, weight: false, ripple: null },
      radius: 1,
      counterface: "ground",
    },
    incline: 0,
    force: [],
    base: [],
    initial: { displacement: 0, velocity: 0 },
    span: { seconds: 1, untilRest: true, maxEvents: 200_000, maxWork: 2e7 },
    settleBand: null,
    limits: [],
    origins: {},
  });
});

it("writes the defaults of kinds and of half-given groups", () => {
  const { scenario } = checkScenario({
    ...withContact({ normal: { preload: 1, ripple: { amplitude: 1, hz: 2 } } }),
    initial: { velocity: 3 },
    force: [
      { kind: "ramp", rate: 1 },
      { kind: "harmonic", amplitude: 1, hz: 1 },
      { kind: "pulse", shape: "triangle", peak: 1, duration: 1 },
    ],
    base: [{ kind: "move", distance: 1, speed: 1, acceleration: 1 }],
  });
  expect(scenario?.contact.normal.ripple).toEqual({ amplitude: 1, hz: 2, phase: 0 });
  expect(scenario?.initial).toEqual({ displacement: 0, velocity: 3 });
  expect(scenario?.force[0]).toEqual({ kind: "ramp", rate: 1, start: 0, stop: "none" });
  expect(scenario?.force[1]).toEqual({ kind: "harmonic", amplitude: 1, hz: 1, phase: 0 });
  expect(scenario?.force[2]).toMatchObject({ start: 0 });
  expect(scenario?.base[0]).toMatchObject({ start: 0 });
});

it("gives a copy: what is done to it leaves what was given alone", () => {
  const times = [0, 1];
  const given = plainScenario({ force: [{ kind: "record", times, values: [0, 1] }] });
  const { scenario } = checkScenario(given);
  times[1] = -1;
  expect(scenario?.force[0]).toEqual({ kind: "record", times: [0, 1], values: [0, 1] });
});
