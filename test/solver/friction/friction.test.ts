import { describe, expect, it } from "vitest";
import type { Law } from "@restband/solver";
import { lawOf } from "../../../solver/src/friction/index.ts";

const compile = (law: Law) => lawOf(law.model).compile(law);

/** Central difference: independent of the closed form of the slope. */
const slopeBy = (f: (v: number) => number, v: number, h = 1e-6 * v) => (f(v + h) - f(v - h)) / (2 * h);

describe("none and coulomb", () => {
  it("are one constant while sliding", () => {
    const none = compile({ model: "none" });
    expect([none.atRest, none.atOnset, none.constant, none.coefficient(1)]).toEqual([0, 0, 0, 0]);
    const coulomb = compile({ model: "coulomb", static: 0.2, kinetic: 0.15 });
    expect([coulomb.atRest, coulomb.atOnset, coulomb.constant, coulomb.coefficient(3)]).toEqual([
      0.2, 0.15, 0.15, 0.15,
    ]);
    expect(coulomb.slope(3)).toBe(0);
  });
});

describe("stribeck", () => {
  const stribeck = compile({ model: "stribeck", static: 0.2, kinetic: 0.1, velocity: 0.01, exponent: 0.7, fluid: 4 });

  it("falls from static towards kinetic as Bo and Pavelescu write it", () => {
    for (const v of [1e-5, 0.003, 0.01, 0.2])
      expect(stribeck.coefficient(v)).toBeCloseTo(0.1 + 0.1 * Math.exp(-((v / 0.01) ** 0.7)), 14);
    expect([stribeck.atRest, stribeck.atOnset, stribeck.fluid, stribeck.constant]).toEqual([0.2, 0.2, 4, null]);
  });

  it("has the slope of that curve", () => {
    for (const v of [1e-4, 0.003, 0.02]) {
      const slope = slopeBy((speed) => stribeck.coefficient(speed), v);
      expect(Math.abs(stribeck.slope(v) - slope)).toBeLessThan(1e-7 * Math.abs(slope));
    }
  });
});

describe("table", () => {
  const points: [number, number][] = [
    [0, 0.2],
    [0.01, 0.13],
    [0.1, 0.11],
  ];
  const table = compile({ model: "table", points });

  it("meets its points, starts at rest and stays constant past the last", () => {
    for (const [v, mu] of points) expect(table.coefficient(v)).toBeCloseTo(mu, 15);
    expect([table.atRest, table.atOnset]).toEqual([0.2, 0.2]);
    expect([table.coefficient(5), table.slope(5)]).toEqual([0.11, 0]);
    expect(table.corners).toEqual([0.01, 0.1]);
  });

  it("has the slopes of Fritsch and Carlson, worked by hand", () => {
    // Secants −7 and −2/9; the mean, −3.6111, is 16.25 secants of the second interval, scaled by 3/√(16.25² + 1).
    const scale = 3 / Math.hypot(16.25, 1);
    const middle = 16.25 * scale * (-2 / 9);
    const last = scale * (-2 / 9);
    expect(table.slope(0)).toBeCloseTo(-7, 12);
    expect(table.slope(0.01)).toBeCloseTo(middle, 12);
    expect(table.coefficient(0.055)).toBeCloseTo(0.12 + (0.09 / 8) * (middle - last), 14);
    expect(table.coefficient(0.005)).toBeCloseTo(0.165 + (0.01 / 8) * (-7 - middle), 14);
  });

  it("never leaves the range of the two points around", () => {
    const wild = compile({
      model: "table",
      points: [0.3, 0.1, 0.1, 0.25, 0.24, 0.0].map((mu, i) => [i * i * 0.01, mu]),
    });
    for (let v = 0; v < 0.3; v += 0.0007) {
      const i = Math.min(4, Math.floor(Math.sqrt(v / 0.01)));
      const [low, high] = [0.3, 0.1, 0.1, 0.25, 0.24, 0.0].slice(i, i + 2).sort((a, b) => a - b);
      if (v >= 0.25) expect(wild.coefficient(v)).toBe(0);
      else expect(wild.coefficient(v)).toBeGreaterThanOrEqual(low - 1e-15);
      if (v < 0.25) expect(wild.coefficient(v)).toBeLessThanOrEqual(high + 1e-15);
    }
  });

  it("of one point is a constant", () => {
    const constant = compile({ model: "table", points: [[0, 0.17]] });
    expect([constant.atRest, constant.coefficient(0.3), constant.slope(0.3)]).toEqual([0.17, 0.17, 0]);
  });
});

describe("bristle", () => {
  const bristle = compile({
    model: "bristle",
    static: 0.15,
    kinetic: 0.1,
    velocity: 0.001,
    stiffness: 1e5,
    damping: 316,
    fluid: 0.4,
  });

  it("has the steady curve g/N, and the rest for the inner state", () => {
    for (const v of [1e-4, 1e-3, 5e-3])
      expect(bristle.coefficient(v)).toBeCloseTo(0.1 + 0.05 * Math.exp(-((v / 0.001) ** 2)), 14);
    expect(bristle.slope(1e-3)).toBeCloseTo(
      slopeBy((speed) => bristle.coefficient(speed), 1e-3),
      4,
    );
    expect(bristle.bristle).toEqual({ stiffness: 1e5, damping: 316, kinetic: 0.1, velocity: 0.001 });
    expect(bristle.fluid).toBe(0.4);
  });
});
