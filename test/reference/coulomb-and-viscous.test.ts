import { expect, test } from "vitest";
import { freeDecay } from "../support/free-decay.ts";
import { expectClose, expectPrinted, expectPrintedList } from "../support/printed.ts";
import { run, turningPoints } from "../support/run.ts";
import { coulombForces, type ScenarioSketch } from "../support/scenario-builder.ts";

/*
 * Free vibration with dry and viscous friction. The closed form between turning points (from memory):
 * |x(i+1)| = B |x(i)| − (1 + B) F/k, B = exp(−πζ/√(1−ζ²)), half-cycles of π/ω_d. Figures recomputed here unless said otherwise.
 */

const light: ScenarioSketch = {
  body: { inertia: 1, stiffness: 1, viscous: 0.04 },
  contact: coulombForces(0.5),
  initial: { displacement: 20 },
  span: { seconds: 100 },
};

test("B1, ζ 0.02, F/k 0.5, from 20: thirteen half-cycles, the last of which stays on one side", () => {
  const points = freeDecay({ x0: 20, xk: 0.5, xs: 0.5, ratio: 0.02 });
  const result = run(light);
  expectClose(turningPoints(result), points);
  expectPrintedList(
    turningPoints(result).slice(1, 13).map(Math.abs),
    "17.812246 15.757750 13.828394 12.016555 10.315077 8.717236 7.216721 5.807603 4.484314 3.241628 2.074634 0.978722",
  );
  expectPrinted(result.quantities.restDisplacement, "0.050437");
  expect(result.quantities.halfCycles).toBe(13);
  expectClose([result.quantities.restTime ?? NaN], [(13 * Math.PI) / Math.sqrt(1 - 0.02 ** 2)]);
});

test("B2, both dampings parted from three turning magnitudes (Feeny & Liang 1996, formula from memory)", () => {
  const [a0, a1, a2] = turningPoints(run(light)).map(Math.abs);
  const B = (a1 - a2) / (a0 - a1);
  expectPrinted(B, "0.9390895629");
  expect(-Math.log(B) / Math.hypot(Math.PI, Math.log(B))).toBeCloseTo(0.02, 12);
  expect((B * a0 - a1) / (1 + B)).toBeCloseTo(0.5, 11);
  // The logarithmic decrement over the first cycle alone, taken as 2πζ, reports nearly twice the damping.
  expectPrinted(Math.log(a0 / a2) / (2 * Math.PI), "0.037943");
});

/** The first turning point of a body thrown off: its time and place, from x = centre + e^(−ζωt)(a cos ω_d t + b sin ω_d t). */
function firstPeak({ omega, ratio, centre, x0, v0 }: Record<"omega" | "ratio" | "centre" | "x0" | "v0", number>) {
  const damped = omega * Math.sqrt(1 - ratio * ratio);
  const a = x0 - centre;
  const b = (v0 + ratio * omega * a) / damped;
  // ẋ = e^(−ζωt)(v0 cos ω_d t − (ζω b + ω_d a) sin ω_d t)
  const t = Math.atan2(v0, ratio * omega * b + damped * a) / damped;
  const x = centre + Math.exp(-ratio * omega * t) * (a * Math.cos(damped * t) + b * Math.sin(damped * t));
  return { t, x, half: Math.PI / damped };
}

test("B3, posed at transtutors.com (…13148130: 200 kg, 4000 N/m, 200 N·s/m, µ 0.1; no answer printed)", () => {
  const result = run({
    body: { inertia: 200, stiffness: 4000, viscous: 200 },
    contact: { law: { model: "coulomb", static: 0.1, kinetic: 0.1 }, normal: { preload: 200 * 9.81 } },
    initial: { displacement: 0.5, velocity: 2.5 },
    span: { seconds: 60 },
  });
  const omega = Math.sqrt(20);
  const ratio = 200 / (2 * Math.sqrt(4000 * 200));
  expectPrinted(omega, "4.472136");
  expectPrinted(result.quantities.dampingRatio, "0.111803");
  expectPrinted((0.1 * 200 * 9.81) / 4000, "0.04905");
  const peak = firstPeak({ omega, ratio, centre: -0.04905, x0: 0.5, v0: 2.5 });
  const points = freeDecay({ x0: peak.x, xk: 0.04905, xs: 0.04905, ratio });
  expectClose(turningPoints(result), [0.5, ...points]);
  expectPrintedList(turningPoints(result).slice(1), "0.711359 -0.416061 0.208686 -0.063055 -0.039215");
  expectPrinted(peak.t, "0.165932");
  expectClose([result.quantities.restTime ?? NaN], [peak.t + 4 * peak.half]);
  expectPrinted(result.quantities.restTime, "2.993587");
});

test("B4, a public course notebook (engineering dynamics: 1 kg, 4 N/m, µ 0.5, thrown off at 10 m/s; plots only)", () => {
  const result = run({
    body: { inertia: 1, stiffness: 4 },
    contact: { law: { model: "coulomb", static: 0.5, kinetic: 0.5 }, normal: { preload: 9.81 } },
    initial: { velocity: 10 },
    span: { seconds: 60 },
  });
  const peak = firstPeak({ omega: 2, ratio: 0, centre: -1.22625, x0: 0, v0: 10 });
  const points = freeDecay({ x0: peak.x, xk: 1.22625, xs: 1.22625, ratio: 0 });
  expectClose(turningPoints(result), [0, ...points]);
  expectPrintedList(turningPoints(result).slice(1), "3.921923 -1.469423 -0.983077");
  expectPrinted(peak.t, "0.665147");
  expectPrinted(result.quantities.restTime, "3.806739");
});
