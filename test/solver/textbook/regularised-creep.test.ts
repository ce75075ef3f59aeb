import { compareWithTextbook, simulate } from "@restband/solver";
import { expect, test } from "vitest";
import { expectPrinted } from "../../support/printed.ts";
import { buildScenario, coulombForces, type ScenarioSketch } from "../../support/scenario-builder.ts";
import { pageOf, reasonOf, rowOf } from "./page.ts";

const pulled = (force: number): ScenarioSketch => ({
  body: { inertia: 1, stiffness: 0 },
  contact: coulombForces(2),
  force: [{ kind: "constant", value: force }],
  span: { seconds: 1 },
});

test("half of the friction used and v_0 1 mm/s: creeps with 0.549306 mm/s, 32.96 mm/min, where the run rests", () => {
  const { value, ofRun } = rowOf(pageOf(pulled(1)), "regularised-creep");
  expectPrinted(value * 1e3, "0.549306");
  expectPrinted(value * 60e3, "32.96");
  expect(ofRun).toBe(0);
});

test("a smoothed law integrated on its own creeps with it", () => {
  // v̇ = W − F tanh(v/v_0), Heun's method to its steady speed
  const pull = (v: number) => 1 - 2 * Math.tanh(v / 1e-3);
  let v = 0;
  for (let i = 0, h = 1e-5; i < 2000; i++) {
    const first = pull(v);
    v += (h / 2) * (first + pull(v + h * first));
  }
  expect(v).toBeCloseTo(rowOf(pageOf(pulled(1)), "regularised-creep").value, 9);
});

test("takes the velocity a reader gives", () => {
  const scenario = buildScenario(pulled(1));
  const result = simulate(scenario);
  if ("error" in result) throw new Error(result.error.message);
  const page = compareWithTextbook(scenario, result, { regularVelocity: 1e-2 });
  expectPrinted(rowOf(page, "regularised-creep").value * 1e3, "5.49306");
});

test("says nothing of a body that moves, or that has nothing to hold", () => {
  expect(reasonOf(pageOf(pulled(3)), "regularised-creep")).toMatch(/does not rest/);
  expect(reasonOf(pageOf(pulled(0)), "regularised-creep")).toMatch(/nothing to hold/);
});
