import { describe, expect, test } from "vitest";
import { freeDecay, wayAlong } from "../support/free-decay.ts";
import { expectClose, expectPrinted, expectPrintedList } from "../support/printed.ts";
import { pathOf, run, turningPoints } from "../support/run.ts";
import { coulombForces, type ScenarioSketch } from "../support/scenario-builder.ts";

/*
 * Free vibration with dry friction: problems printed on public pages and in textbooks. The closed form (from memory: Lorenz
 * 1924; each half-cycle loses 2 F/k and lasts π/ω, the body rests at the first turning point within ±Fs/k) is worked out in
 * `freeDecay`; each case holds the solver against it and against what was printed, to the printed digits.
 */

/** A body released at rest at x0 with friction coefficients and a normal force of its own (sources differ in their g). */
interface Release {
  inertia: number;
  stiffness: number;
  normal: number;
  fixed: number;
  kinetic: number;
  x0: number;
}

const sketchOf = ({ inertia, stiffness, normal, fixed, kinetic, x0 }: Release): ScenarioSketch => ({
  body: { inertia, stiffness },
  contact: { law: { model: "coulomb", static: fixed, kinetic }, normal: { preload: normal } },
  initial: { displacement: x0 },
  span: { seconds: 1000 },
});

const closedForm = ({ stiffness, normal, fixed, kinetic, x0 }: Release): number[] =>
  freeDecay({ x0, xk: (kinetic * normal) / stiffness, xs: (fixed * normal) / stiffness, ratio: 0 });

/** Runs a release, holds it against the closed form, and gives both. */
function release(body: Release) {
  const points = closedForm(body);
  const result = run(sketchOf(body));
  const halfPeriod = Math.PI * Math.sqrt(body.inertia / body.stiffness);
  expectClose(turningPoints(result), points);
  expect(result.outcome).toBe("came-to-rest");
  expect(result.quantities.halfCycles).toBe(points.length - 1);
  expectClose([result.quantities.restTime ?? NaN], [(points.length - 1) * halfPeriod]);
  expectClose([pathOf(result, body.kinetic * body.normal)], [wayAlong(points)]);
  return { result, points, halfPeriod };
}

const millimetres = (points: readonly number[]): number[] => points.map((x) => x * 1000);

describe("A1, published at solveirodov.com/problems/4-82", () => {
  const body = { inertia: 0.5, stiffness: 245, fixed: 0.1, kinetic: 0.1, x0: 0.03 };

  test("period 0.28 s and 3.5 oscillations, n = (x0 − Δ)/4Δ; the rest point is exactly on the band's edge", () => {
    const { result, points, halfPeriod } = release({ ...body, normal: 0.5 * 9.8 });
    expectPrinted(2 * halfPeriod, "0.28");
    expectPrinted(2 * halfPeriod, "0.283845");
    const delta = (0.1 * 0.5 * 9.8) / 245;
    expect((0.03 - delta) / (4 * delta)).toBeCloseTo(3.5, 12);
    expect((points.length - 1) / 2).toBe(3.5);
    expectPrintedList(millimetres(turningPoints(result)), "30 -26 22 -18 14 -10 6 -2");
    expectPrinted(result.quantities.restTime, "0.99346");
  });

  test("with g = 9.81, recomputed here: rests at −1.9714 mm", () => {
    const { result } = release({ ...body, normal: 0.5 * 9.81 });
    expectPrinted((result.quantities.restDisplacement ?? NaN) * 1000, "-1.9714");
  });
});

test("A2, published at collegephysicsanswers.com (0.750 kg): (a) 4.91 mm agrees; (b) a path of 9.46 mm does not", () => {
  const body = { inertia: 0.75, stiffness: 150, normal: 0.75 * 9.81, fixed: 0.1, kinetic: 0.085 };
  const edge = (0.1 * body.normal) / 150;
  expectPrinted(edge * 1000, "4.905");
  // Released at twice the edge: one half-cycle to 2 Fk/k − x0 = −1.4715 mm, which is held since 1.4715 < 4.905.
  const { result } = release({ ...body, x0: 2 * edge });
  expectPrinted((result.quantities.restDisplacement ?? NaN) * 1000, "-1.4715");
  const path = pathOf(result, 0.085 * body.normal) * 1000;
  expectPrinted(path, "11.2815");
  expect(Math.abs(path - 9.46)).toBeGreaterThan(1.8);
  // Spending all of k x0²/2 on friction, with no halt, would not give it either.
  expectPrinted((1000 * (150 * (2 * edge) ** 2)) / 2 / (0.085 * body.normal), "11.541");
});

test("A3, published at askfilo.com (…3336323736323530): 'after 16 cycles' is 16 half-cycles, that is 8 cycles", () => {
  // In inches, as printed; friction is a tenth of the weight, the period 0.25 s.
  const omega = 2 * Math.PI * 4;
  const { result, points } = release({
    inertia: 1,
    stiffness: omega ** 2,
    normal: 386.1,
    fixed: 0.1,
    kinetic: 0.1,
    x0: 2,
  });
  expectPrinted(38.61 / omega ** 2, "0.061125");
  expectPrinted((4 * 38.61) / omega ** 2, "0.24450");
  expectPrinted(turningPoints(result)[12], "0.53300");
  expect(points.length - 1).toBe(16);
  expectPrinted(result.quantities.restTime, "2.000");
  expectPrinted(result.quantities.restDisplacement, "0.043995");
});

test("A4, published at askfilo.com (…3432323434353030): rest 'at 20 mm' is wrong; the question fixes friction to 2.5 % only", () => {
  // Ten cycles and a rest on the release side: F/k ≥ 20/41 mm (the 20th turning point is held) and < 1/2 mm (20 − 40 F/k > 0).
  const stiffness = (0.5 * 9.81) / 0.002;
  expectPrinted(Math.sqrt(stiffness / 0.5) / (2 * Math.PI), "11.1465");
  expectPrinted(20 / 41, "0.48780");
  expectPrinted((stiffness * 20e-3) / 41, "1.19634");
  expectPrinted(stiffness * 0.5e-3, "1.22625");
  const rest = (edge: number) =>
    release({ inertia: 0.5, stiffness, normal: (edge * stiffness) / 1000, fixed: 1, kinetic: 1, x0: 0.02 });
  for (const edge of [0.4879, 0.4999]) {
    const { result } = rest(edge);
    expect(result.quantities.halfCycles).toBe(20);
    expect((result.quantities.restDisplacement ?? NaN) * 1000).toBeCloseTo(20 - 40 * edge, 10);
  }
  expect(rest(0.4877).result.quantities.halfCycles).toBe(21);
  expect(rest(0.5001).result.quantities.restDisplacement).toBeLessThan(0);
});

test("A5, the 12.74 kg problem of a bookstore's question page, recomputed here: the last swing stays on one side", () => {
  const body = { inertia: 12.74, stiffness: 20000, normal: 12.74 * 9.81, fixed: 0.32, kinetic: 0.32, x0: 0.039 };
  const { result, points, halfPeriod } = release(body);
  expectPrinted(1 / (2 * halfPeriod), "6.30595");
  expectPrinted(((0.32 * body.normal) / 20000) * 1000, "1.999670");
  expect(points.length - 1).toBe(10);
  expectPrintedList(millimetres(turningPoints(result).slice(-3)), "7.00527 -3.00593 -0.99341");
  expectPrinted(result.quantities.restTime, "0.792902");
});

test("A6, published at physicsoverflow.org/37593: 0.5 m/s without friction; with it, a rest exactly on the band's edge", () => {
  expectPrinted(
    run({ body: { inertia: 1.6, stiffness: 1000 }, initial: { displacement: 0.02 }, span: { seconds: 1 } }).quantities
      .peakVelocity,
    "0.5000",
  );
  const body = { inertia: 1.6, stiffness: 1000, normal: 4, fixed: 1, kinetic: 1, x0: 0.02 };
  const { result } = release(body);
  expectPrintedList(millimetres(turningPoints(result)), "20 -12 4");
  expectPrinted(pathOf(result, 4) * 1000, "48");
  // The first pass through 0: x = 4 + 16 cos ωt mm, so cos ωt = −1/4; v = −√(ω² x0² − 2 F x0/m).
  const first = Math.acos(-0.25) / 25;
  const { at } = run(sketchOf(body), { at: [first] });
  expect(at?.x[0]).toBeCloseTo(0, 14);
  expectPrinted(at ? -at.v[0] : null, "0.38730");
  // The energy shortcut k x0²/2 = F·path would give 50 mm: it overlooks what the spring still holds at 4 mm.
  expectPrinted((1000 * 1000 * 0.02 ** 2) / 2 / 4, "50");
});

test("A7, published at physicsforums.com/threads/spring-equilibrium.101702: 11.898 cm/s without friction; a rest on one side", () => {
  const body = { inertia: 1.5, stiffness: 1950, normal: 2, fixed: 1, kinetic: 1, x0: 0.0033 };
  const frictionless = { ...sketchOf(body), contact: {}, span: { seconds: 1 } };
  expectPrinted((run(frictionless).quantities.peakVelocity ?? NaN) * 100, "11.898");
  const { result } = release(body);
  expectPrintedList(millimetres(turningPoints(result).slice(1)), "-1.24872 -0.80256");
  expectPrinted(result.quantities.restTime, "0.174264");
  const edge = 2 / 1950;
  const first = Math.acos(-edge / (0.0033 - edge)) / Math.sqrt(1300);
  expectPrinted((run(sketchOf(body), { at: [first] }).at?.v[0] ?? NaN) * -100, "7.3192");
  // Friction k x0/2 = 3.2175 N just brings it to x = 0.
  expectPrinted((1950 * 0.0033) / 2, "3.2175");
  const { result: barely } = release({ ...body, normal: (1950 * 0.0033) / 2 });
  expect(barely.quantities.restDisplacement).toBeCloseTo(0, 15);
});

test("A8, published at byjus.com (0.5 kg block against a spring, 1983): compresses it by 0.10 m and stays; path 4.24 m", () => {
  // g = 10: 5 N. A rough stretch of 2.14 m without spring from 3 m/s leaves 2.25 − 2.14 = 0.11 J.
  const contact = { law: { model: "coulomb", static: 0.22, kinetic: 0.2 } as const, normal: { preload: 5 } };
  const length = 2.14;
  const arrival = (3 - Math.sqrt(9 - 4 * length)) / 2;
  const rough = run(
    { body: { inertia: 0.5, stiffness: 0 }, contact, initial: { velocity: 3 }, span: { seconds: 2 } },
    { at: [arrival] },
  );
  expect(rough.at?.x[0]).toBeCloseTo(length, 12);
  const speed = rough.at?.v[0] ?? NaN;
  expectPrinted((0.5 * speed ** 2) / 2, "0.11");
  const spring = run({
    body: { inertia: 0.5, stiffness: 2 },
    contact,
    initial: { velocity: speed },
    span: { seconds: 60 },
  });
  expect(spring.outcome).toBe("came-to-rest");
  expect(spring.quantities.halfCycles).toBe(1);
  expectPrinted(spring.quantities.restDisplacement, "0.10000");
  // The spring pulls with 0.20 N, static friction can hold 1.1 N.
  expectPrinted(2 * (spring.quantities.restDisplacement ?? NaN), "0.20");
  // The page's path begins with 2 m of smooth table.
  expectPrinted(2 + length + (spring.quantities.restDisplacement ?? NaN), "4.2400");
});

test("A9, asked at thephysics.org/128083 (answers from memory): 0.855 and 0.592 m/s at the spring's middle", () => {
  const body = { inertia: 2, stiffness: 475, fixed: 0.35, kinetic: 0.35, x0: 0.0555 };
  const frictionless = { ...sketchOf({ ...body, normal: 0 }), contact: {}, span: { seconds: 1 } };
  expectPrinted(run(frictionless).quantities.peakVelocity, "0.85531");
  const edge = (0.35 * 2 * 9.8) / 475;
  const first = Math.acos(-edge / (0.0555 - edge)) / Math.sqrt(237.5);
  expectPrinted(-(run(sketchOf({ ...body, normal: 2 * 9.8 }), { at: [first] }).at?.v[0] ?? NaN), "0.59231");
  const { result } = release({ ...body, normal: 2 * 9.81 });
  const [start, ...turns] = millimetres(turningPoints(result));
  expectPrinted(start, "55.5");
  expectPrinted(turns[0], "-26.586");
  expectPrinted(turns[1], "-2.3274");
});

test("A10, published at tutorsglobe.com (…51688231): F = 0.15 k q0 loses 0.60 q0 a cycle and rests after 1.5 cycles", () => {
  const { result } = release({ inertia: 1, stiffness: 1, normal: 0.15, fixed: 1, kinetic: 1, x0: 1 });
  expectPrintedList(turningPoints(result), "1.0 -0.7 0.4 -0.1");
  expect(turningPoints(result)[0] - turningPoints(result)[2]).toBeCloseTo(0.6, 14);
  expect(result.quantities.halfCycles).toBe(3);
});

test("A11, published at brainmass.com (4960): n = (k x0/f − 1)/4 oscillations, where that is a multiple of 1/2", () => {
  for (const halves of [1, 2, 5, 12, 31]) {
    const x0 = 2 * halves + 1;
    const { result } = release({ inertia: 1, stiffness: 1, normal: 1, fixed: 1, kinetic: 1, x0 });
    expect(result.quantities.halfCycles).toBe(2 * ((x0 - 1) / 4));
  }
});

describe("A12, published at physics-arena.duckdns.org/problems/1166: springs k on either side, N = ⌊k x0/µmg + 1/2⌋ swings", () => {
  // Friction 1 N, k = 32 N/m each; every number is exact in binary.
  const swings = (ratio: number) =>
    release({ inertia: 1, stiffness: 64, normal: 1, fixed: 1, kinetic: 1, x0: ratio / 32 }).result.quantities;

  test("lasts N π √(m/2k)", () => {
    for (const ratio of [1.25, 3.25, 3.75, 8.125]) {
      const count = Math.floor(ratio + 0.5);
      expect(swings(ratio).halfCycles).toBe(count);
      expectClose([swings(ratio).restTime ?? NaN], [count * Math.PI * Math.sqrt(1 / 64)]);
    }
  });

  test("but a body exactly on the edge of its band rests: 3 swings, where the formula counts 4", () => {
    // 3.5/32 → −2.5/32 → 1.5/32 → −0.5/32 = −F/2k: held. ⌈k x0/µmg − 1/2⌉ counts the tie right.
    expect(Math.floor(3.5 + 0.5)).toBe(4);
    expect(swings(3.5).halfCycles).toBe(Math.ceil(3.5 - 0.5));
  });
});

test("A13, a public notebook on free vibration with friction (MCHE485; plots only), recomputed here: 20 half-cycles", () => {
  const { result, points } = release({
    inertia: 1,
    stiffness: (2 * Math.PI) ** 2,
    normal: 9.81,
    fixed: 0.1,
    kinetic: 0.1,
    x0: 1,
  });
  expectPrinted(0.981 / (2 * Math.PI) ** 2, "0.0248490");
  expect(points.length - 1).toBe(20);
  expectPrinted(result.quantities.restDisplacement, "0.00603919");
  expectPrinted(result.quantities.restTime, "10.000");
});

test("A14, published at site.fetraining.com (COULOMB page 5): friction read from sampled peaks came out 7 % high; turning points give it back", () => {
  // The page's other inputs are not printed, so the effect is shown on a body of our own: F = 126.
  const sketch: ScenarioSketch = {
    body: { inertia: 1, stiffness: 1000 },
    contact: coulombForces(126),
    initial: { displacement: 2 },
    span: { seconds: 10 },
  };
  const result = run(sketch);
  const [first, second, third] = turningPoints(result);
  expect((1000 * (first - second - (third - second))) / 4).toBeCloseTo(126, 9);
  // Read off a grid of eight points a period, the peak two half-cycles on is missed and the loss looks larger.
  const period = 2 * Math.PI * Math.sqrt(1 / 1000);
  const grid = Array.from({ length: 8 }, (_, i) => (0.55 + i / 8) * period);
  const sampled = Math.max(...(run(sketch, { at: grid }).at?.x ?? []));
  expect((1000 * (2 - sampled)) / 4).toBeGreaterThan(126 * 1.03);
});

test("A15, a public script of a brick on a spring, recomputed here: µs ≠ µk halts earlier than µs = µk", () => {
  const body = { inertia: 1, stiffness: 1000, normal: 9.8, fixed: 0.25, kinetic: 0.2, x0: 0.01 };
  const { result } = release(body);
  expectPrintedList(millimetres(turningPoints(result)), "10.00 -6.08 2.16");
  expectPrinted(result.quantities.restTime, "0.198692");
  expectPrinted(pathOf(result, 1.96) * 1000, "24.32");
  // With µs = µk the edge is 1.96 mm < 2.16 mm: one more half-cycle.
  expect(release({ ...body, fixed: 0.2 }).result.quantities.halfCycles).toBe(3);
});
