import { describe, expect, it } from "vitest";
import { inertias } from "../../../web/src/features/reckoning/inertias/index.ts";
import { springs } from "../../../web/src/features/reckoning/springs/index.ts";
import { transmissions } from "../../../web/src/features/reckoning/transmissions/index.ts";
import { formulaOf } from "./all-formulas.ts";

const E = 210e9;
const G = 80e9;

/* Each expected number is worked by hand beside it, SI throughout. */
describe("springs", () => {
  it.each<[string, Record<string, number>, number]>([
    // A = π · 0.02² / 4 = 3.141593e-4; E A = 6.597345e7; / 0.5
    ["screw-fixed-free", { modulus: E, diameter: 0.02, length: 0.5 }, 1.319469e8],
    // both halves of 0.5 m side by side: twice the above
    ["screw-fixed-fixed", { modulus: E, diameter: 0.02, length: 1, position: 0.5 }, 2.638938e8],
    // a = 0.2: E A / 0.2 + E A / 0.8 = 3.298672e8 + 0.824668e8
    ["screw-fixed-fixed", { modulus: E, diameter: 0.02, length: 1, position: 0.2 }, 4.12334e8],
    // 1.2e6 / 0.8
    ["belt", { specific: 1.2e6, length: 0.8 }, 1.5e6],
    // A = π (9e-4 − 4e-4) / 4 = 3.926991e-4; · 70e9 / 1
    ["rod", { modulus: 70e9, diameter: 0.03, bore: 0.02, length: 1 }, 2.748894e7],
    // J = π · 1.6e-7 / 32 = 1.570796e-8; · 80e9 = 1256.637; / 0.3
    ["torsion-shaft", { shearModulus: G, diameter: 0.02, bore: 0, length: 0.3 }, 4188.79],
    // I = 0.04 · 1e-6 / 12 = 3.333333e-9; E I = 700; 3 · 700 / 0.008
    ["cantilever-rectangular", { modulus: E, width: 0.04, height: 0.01, length: 0.2 }, 262500],
    // I = π · 1.6e-7 / 64 = 7.853982e-9; E I = 1649.336; 3 · / 0.064
    ["cantilever-round", { modulus: E, diameter: 0.02, length: 0.4 }, 77312.63],
    // the same E I; 48 · / 0.064
    ["supported-round", { modulus: E, diameter: 0.02, length: 0.4 }, 1.237002e6],
    // E I = 700; 48 · 700 / 0.064
    ["supported-rectangular", { modulus: E, width: 0.04, height: 0.01, length: 0.4 }, 525000],
    // 192 is four times 48
    ["clamped-rectangular", { modulus: E, width: 0.04, height: 0.01, length: 0.4 }, 2.1e6],
    ["clamped-round", { modulus: E, diameter: 0.02, length: 0.4 }, 4.948008e6],
    // 80e9 · 1.6e-11 = 1.28; 8 · 4.096e-6 · 8 = 2.62144e-4
    ["helical-spring", { shearModulus: G, wire: 0.002, coil: 0.016, turns: 8 }, 4882.8125],
    // 3e6 · 0.1 · 0.05 / 0.02
    ["pad-pressed", { stiffnessModulus: 3e6, length: 0.1, width: 0.05, thickness: 0.02 }, 750000],
    // 1e6 · 0.1 · 0.05 / 0.02
    ["pad-sheared", { stiffnessModulus: 1e6, length: 0.1, width: 0.05, thickness: 0.02 }, 250000],
    ["nut", { rate: 4e8 }, 4e8],
    ["coupling", { rate: 9000 }, 9000],
  ])("%s of %o is %d", (key, values, expected) => {
    expect(formulaOf(springs, key).value(values) / expected).toBeCloseTo(1, 6);
  });

  it.each<[string, Record<string, number>, string]>([
    ["screw-fixed-fixed", { modulus: E, diameter: 0.02, length: 1, position: 1 }, "position"],
    ["rod", { modulus: E, diameter: 0.02, bore: 0.02, length: 1 }, "bore"],
    ["helical-spring", { shearModulus: G, wire: 0.02, coil: 0.016, turns: 8 }, "coil"],
  ])("%s refuses %o at its %s", (key, values, at) => {
    expect(formulaOf(springs, key).fault?.(values)?.key).toBe(at);
  });
});

describe("inertias", () => {
  it.each<[string, Record<string, number>, number]>([
    ["mass", { mass: 120 }, 120],
    // 7850 · 0.5 · 0.3 · 0.1
    ["block", { density: 7850, length: 0.5, width: 0.3, height: 0.1 }, 117.75],
    // π · 7850 · 1 = 24661.50; · 0.04⁴ = 2.56e-6 → 0.06313345; / 32
    ["cylinder", { density: 7850, diameter: 0.04, bore: 0, length: 1 }, 1.97292e-3],
    // 2.56e-6 − 1.6e-7 = 2.4e-6: 15/16 of the solid one
    ["cylinder", { density: 7850, diameter: 0.04, bore: 0.02, length: 1 }, 1.849613e-3],
    // 2 · 0.09
    ["orbiting-mass", { mass: 2, radius: 0.3 }, 0.18],
    ["rotor", { inertia: 2e-4 }, 2e-4],
  ])("%s of %o is %d", (key, values, expected) => {
    expect(formulaOf(inertias, key).value(values) / expected).toBeCloseTo(1, 5);
  });
});

describe("transmissions", () => {
  it.each<[string, Record<string, number>, number]>([
    // 2 π / 0.01
    ["lead", { lead: 0.01 }, 628.318531],
    // 1 / 0.025
    ["pinion", { radius: 0.025 }, 40],
    ["gears", { ratio: 10 }, 10],
    // 0.3 / 0.1
    ["lever", { arm: 0.3, bodyArm: 0.1 }, 3],
    ["arm", { radius: 0.2 }, 0.2],
  ])("%s of %o is %d", (key, values, expected) => {
    expect(formulaOf(transmissions, key).value(values) / expected).toBeCloseTo(1, 8);
  });
});
