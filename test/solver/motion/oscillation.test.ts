import { describe, expect, test } from "vitest";
import { compileProblem } from "../../../solver/src/scenario/compile-problem.ts";
import { checkScenario } from "../../../solver/src/scenario/check-scenario.ts";
import { Inputs } from "../../../solver/src/motion/inputs.ts";
import { newStance } from "../../../solver/src/motion/stance.ts";
import { Oscillation } from "../../../solver/src/motion/exact/oscillation.ts";

// m, k, c, F, ω, φ, x0, v0, t, then x and ẋ: the matrix exponential of the forced oscillator at 40 digits (mpmath 1.3.0).
// Among them: within 1e-9 of undamped resonance and on it, within 1e-10 of critical damping, no spring, no damper either.
const rows: number[][] = [
  [1, 1, 0, 1, 1.000000001, 0.3, 0.1, 0.2, 50, 0.9455580065002152, 25.079010765630134],
  [1, 1, 0, 1, 0.999999999, 0, 0, 0, 1000, 413.4396298778871, 281.6031844950618],
  [1, 1, 0, 1, 1, 0, 0, 0, 200, -87.32972972139946, 48.282118852093596],
  [2, 8, 1e-6, 3, 2.0000001, 1, 0.5, -0.1, 100, -1.8956326428502785, 75.50293235391213],
  [1, 1, 0.02, 1, 1.03, 0, 0, 0, 77, 4.612868101080097, -20.983526320526106],
  [1, 1, 0.02, 1, 1.06, 0, 0, 0, 77, -8.651051920047317, -2.6983172861516795],
  [1, 1, 2, 1, 0.5, 0.2, 1, 0, 3, 0.6132400858159873, -0.3128548674983445],
  [1, 1, 2.0000000002, 1, 0.5, 0.2, 1, 0, 3, 0.6132400858372654, -0.3128548674804905],
  [1, 0, 0.5, 2, 3, 0, 0, 1, 10, 1.9190245513559245, -0.6182000250732034],
  [1, 0, 0, 2, 3, 0, 0, 1, 10, 10.187944122247204, 0.3413122506047588],
  [1e-6, 1000.0, 0.0001, 0.1, 5000.0, 0, 0.001, 0, 0.01, -0.00015996666728841272, -14.993105750058332],
  [1, 1e-9, 0, 1, 0.0001, 0.5, 0, 0, 9, 35.53626609752517, 7.896300210837131],
  [1, 1, 100, 1, 0.01, 0, 0, 0, 20, 0.17993880419611197, 0.008002276635327056],
];

function oscillationOf(
  m: number,
  k: number,
  c: number,
  force: number,
  omega: number,
  phase: number,
): [Inputs, Oscillation] {
  const { scenario } = checkScenario({
    format: "restband-scenario/1",
    motion: "linear",
    body: { inertia: m, stiffness: k, viscous: c },
    contact: { law: { model: "none" }, normal: { preload: 0 } },
    force: [{ kind: "harmonic", amplitude: force, hz: omega / (2 * Math.PI), phase: (phase * 180) / Math.PI }],
    span: { seconds: 1 },
  });
  if (scenario === null) throw new Error("the test's scenario is refused");
  const inputs = new Inputs(compileProblem(scenario));
  inputs.locate(0);
  return [inputs, new Oscillation(2, "ground", 0)];
}

describe("the closed form of a slip", () => {
  test.each(rows)("m %d k %d c %d F %d ω %d φ %d x0 %d v0 %d t %d", (m, k, c, force, omega, phase, x0, v0, t, x, v) => {
    const [inputs, oscillation] = oscillationOf(m, k, c, force, omega, phase);
    const stance = { ...newStance(), contact: 1 as const, position: x0, velocity: v0, slip: v0 };
    oscillation.begin(inputs, { inertia: m, stiffness: k, viscous: c }, 0, stance);
    oscillation.evaluate(t);
    // Rounding ω through Hz and φ through degrees moves the input itself by about 1e-16 relative, hence ω t in the bound.
    const turns = 1 + omega * t + Math.sqrt(k / m) * t;
    expect(Math.abs(oscillation.position - x)).toBeLessThanOrEqual(2e-15 * turns * (Math.abs(x) + Math.abs(v) / omega));
    expect(Math.abs(oscillation.velocity - v)).toBeLessThanOrEqual(2e-15 * turns * (Math.abs(v) + Math.abs(x) * omega));
  });
});
