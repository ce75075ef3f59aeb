import type { Limit, LimitVerdict } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { run } from "../support/run.ts";
import { coulombForces, type ScenarioSketch } from "../support/scenario-builder.ts";

/** A body that rests at −7.5 mm after two half cycles, its numbers exact in binary: rest band 1/64 m. */
const released: ScenarioSketch = {
  body: { inertia: 1, stiffness: 1024 },
  contact: { law: { model: "coulomb", static: 0.125, kinetic: 0.125 }, normal: { preload: 128 } },
  initial: { displacement: -0.07 },
  span: { seconds: 20 },
};
const verdict = (limit: Limit, more: Partial<ScenarioSketch> = {}): LimitVerdict =>
  run({ ...released, ...more, limits: [limit] }, { quantities: [] }).limits[0];

describe("a limit", () => {
  test("is kept where its value is exactly the bound: no room left, none missing", () => {
    const limit = { quantity: "restBand", max: 0.015625 };
    expect(verdict(limit)).toEqual({ ...limit, value: 0.015625, kept: true, margin: 0 });
    expect(verdict({ quantity: "halfCycles", min: 2 })).toMatchObject({ kept: true, margin: 0 });
  });

  test("is broken by what is missing, in the quantity's own unit", () => {
    expect(verdict({ quantity: "halfCycles", max: 1 })).toMatchObject({ value: 2, kept: false, margin: -1 });
    expect(verdict({ quantity: "halfCycles", min: 5 })).toMatchObject({ kept: false, margin: -3 });
  });

  test("of two bounds has the smaller margin", () => {
    const two = verdict({ quantity: "restDisplacement", min: -0.01, max: 0.02 });
    expect(two.kept).toBe(true);
    expect(two.margin).toBeCloseTo(0.0025, 14);
    expect(verdict({ quantity: "restDisplacement", min: -0.03, max: -0.01 }).margin).toBeCloseTo(-0.0025, 14);
  });

  test("has the same verdict when all is mirrored", () => {
    const mirrored = { initial: { displacement: 0.07 } };
    const one = verdict({ quantity: "restDisplacement", min: -0.005, max: 0.02 });
    expect(verdict({ quantity: "restDisplacement", min: -0.02, max: 0.005 }, mirrored)).toMatchObject({
      value: -one.value!,
      kept: one.kept,
      margin: one.margin,
    });
  });

  test("on what has no value cannot be judged, and says why", () => {
    expect(verdict({ quantity: "lostMotion", max: 1 })).toEqual({
      quantity: "lostMotion",
      max: 1,
      value: null,
      kept: null,
      margin: null,
      reason:
        "Lost motion has no value in this run: the base does not reverse, or the body does not break away after it does.",
    });
  });

  test("on a run that was cut off cannot be judged, whatever its value so far", () => {
    const limit = { quantity: "peakDisplacement", max: 1 };
    const span = { seconds: 20, maxEvents: 1 };
    expect(verdict(limit, { span })).toEqual({
      ...limit,
      value: 0.07,
      kept: null,
      margin: null,
      reason: "The run reached the most events it is allowed before its end.",
    });
    const work = verdict(limit, { span: { seconds: 20, maxWork: 1 } });
    expect(work).toMatchObject({ kept: null, reason: "The run reached the most work it is allowed before its end." });
  });

  test("brings its quantity along where only others are asked for", () => {
    const { quantities } = run(
      { ...released, limits: [{ quantity: "restBand", max: 1 }] },
      { quantities: ["holdUse"] },
    );
    expect(Object.keys(quantities)).toEqual(["holdUse", "restBand"]);
  });
});

describe("limits on a clamp that uses 62 % of its hold", () => {
  // 46.5 N of 0.25 × 300 N
  const { limits } = run({
    body: { inertia: 2, stiffness: 50000 },
    contact: { ...coulombForces(0.2, 0.25), normal: { preload: 300 } },
    force: [{ kind: "harmonic", amplitude: 46.5, hz: 8 }],
    span: { seconds: 2, untilRest: false },
    limits: [
      { quantity: "holdUse", max: 0.65 },
      { quantity: "holdUse", max: 0.6 },
      { quantity: "slipPerCycle", max: 0 },
    ],
  });

  test("are judged in order", () => {
    expect(limits.map(({ kept }) => kept)).toEqual([true, false, true]);
    expect(limits[0].margin).toBeCloseTo(0.03, 14);
    expect(limits[1].margin).toBeCloseTo(-0.02, 14);
    expect(limits[2].margin).toBe(0);
  });
});
