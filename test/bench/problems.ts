import type { Scenario } from "@restband/solver";
import { mulberry32 } from "../support/mulberry32.ts";
import { buildScenario, coulombForces } from "../support/scenario-builder.ts";

/*
 * The problems of the bench. All yardsticks solve the same ones; events and last position are compared before times are.
 */

const turn = 2 * Math.PI;

/** Free decay by Coulomb friction: 100 half cycles to rest. */
export const p1 = buildScenario({
  body: { inertia: 1, stiffness: 100 },
  contact: coulombForces(0.5),
  initial: { displacement: 1 },
  span: { seconds: 1000 },
});

/** A body shaken by cos Ωt with stops inside the cycle, from rest. */
export const shaken = (friction: number, omega: number, periods: number): Scenario =>
  buildScenario({
    body: { inertia: 1, stiffness: 1, viscous: 0.02 },
    contact: coulombForces(friction),
    force: [{ kind: "harmonic", amplitude: 1, hz: omega / turn }],
    span: { seconds: (periods * turn) / omega, untilRest: false },
  });

export const p2 = shaken(0.6, 0.4, 200);

/** A slide fed at 0.1 m/s, friction falling with speed, dashpot to ground. */
export const p3 = buildScenario({
  body: { inertia: 1, stiffness: 1 },
  contact: {
    law: { model: "stribeck", static: 1, kinetic: 0.6, velocity: 0.2, exponent: 2, fluid: 0.05 },
    normal: { preload: 1 },
  },
  base: [{ kind: "ramp", rate: 0.1 }],
  span: { seconds: 500, untilRest: false },
});

/** Every fifth cell each way of P2 over friction 0…1 and frequency 0.2…2 rad/s, 100 × 100 cells of 100 periods. */
export const p4 = Array.from({ length: 400 }, (_, n) =>
  shaken((5 * Math.floor(n / 20)) / 99, 0.2 + (1.8 * 5 * (n % 20)) / 99, 100),
);

/** A floor's acceleration, m/s²: noise through two low passes of 2.5 Hz, 200 Hz, 60 s, peak 3. */
export function floorAcceleration(): number[] {
  const random = mulberry32(20261201);
  const share = 1 - Math.exp((-turn * 2.5) / 200);
  let [once, twice] = [0, 0];
  const values = Array.from({ length: 12_001 }, () => {
    once += share * (random() - 0.5 - once);
    twice += share * (once - twice);
    return twice;
  });
  const peak = Math.max(...values.map(Math.abs));
  return values.map((value) => (3 * value) / peak);
}

/** A body of 1 Hz on that floor. */
export const p5 = buildScenario({
  body: { inertia: 1, stiffness: turn ** 2 },
  contact: { ...coulombForces(0.5), counterface: "base" },
  base: [
    {
      kind: "acceleration-record",
      times: floorAcceleration().map((_, i) => i * 0.005),
      values: floorAcceleration(),
    },
  ],
  span: { seconds: 60, untilRest: false },
});
