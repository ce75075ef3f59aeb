import { expect, test } from "vitest";
import { simulate } from "@restband/solver";
import { buildScenario } from "../../support/scenario-builder.ts";

/*
 * Just before the ripple lets the contact go, its share of the force is used up within less than the clock can tell from the
 * crossing itself: it is passed once, and the run goes on.
 */
test("a share used up next to the loss of contact is passed once", () => {
  const scenario = buildScenario({
    body: { inertia: 1, stiffness: 0.9657319646011708, cubic: 0.1044787115285363 },
    solid: { model: "displacement-proportional", lossFactor: 0.06587012952108284 },
    contact: {
      law: { model: "coulomb", static: 1, kinetic: 1 },
      normal: { preload: 1, ripple: { amplitude: 1.479, hz: 0.1965433249541862, phase: 30 } },
    },
    base: [
      {
        kind: "move",
        distance: 0.015951987739853613,
        speed: 0.16195405580829977,
        acceleration: 0.025330295910584447,
        start: 11.164027831281494,
      },
    ],
    initial: { velocity: 8.175644970861784e-7 },
    span: { seconds: 25.57475939167787, maxWork: 200_000 },
  });
  const result = simulate(scenario, { samples: 0, quantities: [] });
  if ("error" in result) throw new Error(result.error.message);
  expect(result.ended).toBe("time");
  expect(result.events.length).toBeLessThan(20);
});
