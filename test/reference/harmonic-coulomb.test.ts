import type { Result } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { noStopLimit, noStopMotion } from "../support/den-hartog.ts";
import { expectPrinted } from "../support/printed.ts";
import { run, turningPoints } from "../support/run.ts";
import { coulombForces, type ScenarioSketch } from "../support/scenario-builder.ts";

/*
 * Harmonic force with dry friction, in units m = k = P = 1: r = Ω/ω, β = F/P, amplitudes in P/k. Den Hartog, Phil. Mag. 9
 * (1930) 801 and Trans. ASME 53 (1931) 107; formula for X and the limit as published in public code citing Nonlinear
 * Dynamics 98:2595 and 99:1781; figures recomputed here (regenerate.py).
 */

const hzOf = (r: number): number => r / (2 * Math.PI);

interface Forced {
  r: number;
  beta: number;
  ratio?: number;
  /** Periods of the force to run. */
  periods: number;
}

function forced({ r, beta, ratio = 0, periods }: Forced, more: Partial<ScenarioSketch> = {}): Result {
  return run({
    body: { inertia: 1, stiffness: 1, viscous: 2 * ratio },
    contact: coulombForces(beta),
    force: [{ kind: "harmonic", amplitude: 1, hz: hzOf(r) }],
    span: { seconds: periods / hzOf(r), untilRest: false },
    ...more,
  });
}

/** Started on the motion without stops, at its upper turning point. */
function onNoStopMotion({ r, beta, ratio = 0, periods }: Forced): Result {
  const { amplitude, phase } = noStopMotion(r, ratio, beta);
  return forced(
    { r, beta, ratio, periods },
    {
      initial: { displacement: amplitude },
      force: [{ kind: "harmonic", amplitude: 1, hz: hzOf(r), phase }],
    },
  );
}

const stopsOf = ({ events }: Result): number => events.filter(({ kind }) => kind === "stop").length;

const table: [r: number, U: string, S: string, limit: string, ...X: string[]][] = [
  [0.3, "-5.773503", "1.0198", "0.0864", "–", "–", "–"],
  [0.5, "0.000000", "1", "0.333333", "1.333333", "–", "–"],
  [0.7, "-1.791372", "1", "0.722071", "1.927775", "1.825167", "1.639948"],
  [0.8, "-3.017767", "1", "0.817406", "2.711415", "2.501788", "2.106551"],
  [0.9, "-6.301424", "1", "0.819650", "5.110040", "4.620342", "3.661416"],
  [1.1, "6.322866", "1", "0.746772", "4.590925", "4.034744", "2.878094"],
  [1.25, "2.462147", "1", "0.698821", "1.708218", "1.480050", "0.988996"],
  [1.5, "1.154701", "1", "0.646579", "0.765942", "0.653197", "0.400000"],
  [2, "0.500000", "1", "0.596285", "0.317980", "0.266667", "–"],
  [3, "0.192450", "1", "0.562500", "0.118927", "0.098484", "–"],
];
const betas = [0.2, 0.4, 0.6];

describe("C, the motion without stops, undamped", () => {
  test.each(table)("r %s: U, S and the β limit", (r, U, S, limit) => {
    const found = noStopLimit(r);
    expectPrinted(found.U, U);
    expectPrinted(found.S, S);
    expectPrinted(found.beta, limit);
  });

  // At r = 0.3 a stop within the half-cycle ends it (S > 1); elsewhere a stop at the turning point.
  test.each(table)("r %s: a body on that motion does not stop just below the limit, and does just above", (r) => {
    const { beta } = noStopLimit(r);
    expect(stopsOf(onNoStopMotion({ r, beta: beta * (1 - 1e-5), periods: 3 }))).toBe(0);
    expect(stopsOf(onNoStopMotion({ r, beta: beta * (1 + 1e-5), periods: 3 }))).toBeGreaterThan(0);
  });

  const entries = table.flatMap(([r, , , , ...X]) => X.map((amplitude, i) => ({ r, beta: betas[i], X: amplitude })));

  test.each(entries.filter(({ X }) => X !== "–"))("r $r, β $beta: amplitude $X", ({ r, beta, X }) => {
    const result = onNoStopMotion({ r, beta, periods: 40 });
    expectPrinted(result.quantities.amplitude, X);
    expect(result.quantities.amplitude).toBeCloseTo(noStopMotion(r, 0, beta).amplitude, 10);
    expect(stopsOf(result)).toBe(0);
    expect(result.outcome).toBe("smooth-sliding");
  });

  test.each(entries.filter(({ X }) => X === "–"))("r $r, β $beta: beyond the limit, so it stops", ({ r, beta }) => {
    expect(forced({ r, beta, periods: 60 }).quantities.sticksPerCycle).toBeGreaterThan(1.9);
  });

  const pairs: [number, number][] = [
    [0.8, 0.4],
    [0.8, 0.6],
    [0.9, 0.4],
    [1.25, 0.4],
    [1.5, 0.4],
    [2, 0.4],
  ];
  test.each(pairs)("r %s, β %s: four hundred periods from rest arrive at it", (r, beta) => {
    const { quantities } = forced({ r, beta, periods: 400 });
    expect(quantities.amplitude).toBeCloseTo(noStopMotion(r, 0, beta).amplitude, 6);
  });
});

describe("C, limits of the motion without stops", () => {
  test("r → 1: π/4 from either side; r → ∞: 1/√(1 + π²/4); r = 1/3: none without a stop", () => {
    expectPrinted(noStopLimit(0.999).beta, "0.785791");
    expectPrinted(noStopLimit(1.001).beta, "0.785005");
    expectPrinted(1 / Math.sqrt(1 + Math.PI ** 2 / 4), "0.537029");
    expect(noStopLimit(3000).beta).toBeCloseTo(0.537029, 6);
    expect(forced({ r: 1 / 3, beta: 0.05, periods: 60 }).quantities.sticksPerCycle).toBeGreaterThan(0);
  });

  test("β ≥ 1 (a static answer): no motion at all, and 1/β of the static friction is used", () => {
    for (const beta of [1, 1.25]) {
      const { outcome, quantities } = forced({ r: 0.7, beta, periods: 5 });
      expect(outcome).toBe("never-moved");
      expect(quantities.holdUse).toBeCloseTo(1 / beta, 14);
    }
  });
});

describe("C, the equivalent-viscous estimate (from memory), shown beside the exact answer", () => {
  const estimate = (r: number, beta: number) => Math.sqrt(1 - ((4 * beta) / Math.PI) ** 2) / Math.abs(1 - r * r);
  const errors: [number, number, string][] = [
    [0.8, 0.4, "-4.4"],
    [0.8, 0.6, "-14.9"],
    [0.9, 0.4, "-2.0"],
    [1.25, 0.4, "3.4"],
    [1.5, 0.4, "5.4"],
    [2, 0.4, "7.6"],
  ];
  test.each(errors)("r %s, β %s: off by %s %%", (r, beta, printed) => {
    expectPrinted(100 * (estimate(r, beta) / noStopMotion(r, 0, beta).amplitude - 1), printed);
  });

  test("posed at transtutors.com (13684388; 12 kN/m, 10 kg, 50 N at 10 Hz, µ 0.07 for lubricated steel)", () => {
    const omega = Math.sqrt(1200);
    const [r, beta] = [(20 * Math.PI) / omega, (0.07 * 10 * 9.81) / 50];
    const perForce = (50 / 12000) * 1000;
    expectPrinted(r, "1.813799");
    expectPrinted(perForce * estimate(r, beta), "1.7916");
    expectPrinted(perForce / (r * r - 1), "1.8196");
    expectPrinted(perForce * noStopMotion(r, 0, beta).amplitude, "1.7814");
    const { quantities } = run({
      body: { inertia: 10, stiffness: 12000 },
      contact: { law: { model: "coulomb", static: 0.07, kinetic: 0.07 }, normal: { preload: 98.1 } },
      force: [{ kind: "harmonic", amplitude: 50, hz: 10 }],
      span: { seconds: 60, untilRest: false },
    });
    expectPrinted((quantities.amplitude ?? NaN) * 1000, "1.7814");
  });

  test("undamped resonance with β < π/4 grows by (π − 4β) P/k a cycle: 300 cycles at β 0.5", () => {
    const result = forced({ r: 1, beta: 0.5, periods: 300 });
    expect(result.outcome).toBe("growing");
    const peaks = turningPoints(result).map(Math.abs);
    expect((peaks.at(-1)! - peaks.at(-21)!) / 10).toBeCloseTo(Math.PI - 2, 5);
    // From rest under P cos Ωt the first cycles gain a little less than the rule, which is 342.478 for 300 cycles.
    expectPrinted(300 * (Math.PI - 2), "342.478");
    expectPrinted(result.quantities.peakDisplacement, "342.1942");
  });
});

describe("C, the motion without stops, with viscous damping (formula from memory, recomputed here)", () => {
  const rows: [r: number, ratio: number, beta: number, X: string, viscousEstimate: string][] = [
    [0.8, 0.1, 0.3, "2.0339222705", "1.98493"],
    [1.0, 0.1, 0.5, "1.8120885783", "1.81690"],
    [0.6, 0.05, 0.3, "1.4689100741", "1.38332"],
    [1.25, 0.05, 0.4, "1.2652231723", "1.31403"],
    [2, 0.2, 0.3, "0.2573446536", "0.26764"],
  ];

  /** X = −βG + √(1/q² − β²H²). */
  function formula(r: number, ratio: number, beta: number): number {
    const s = Math.sqrt(1 - ratio * ratio);
    const [damping, turning] = [(ratio * Math.PI) / r, (s * Math.PI) / r];
    const D = Math.cosh(damping) + Math.cos(turning);
    const G = (Math.sinh(damping) - (ratio / s) * Math.sin(turning)) / D;
    const H = Math.sin(turning) / (r * s * D);
    const q = Math.hypot(1 - r * r, 2 * ratio * r);
    return -beta * G + Math.sqrt(1 / q ** 2 - (beta * H) ** 2);
  }

  test.each(rows)("r %s, ζ %s, β %s: amplitude %s, from rest", (r, ratio, beta, X) => {
    expectPrinted(formula(r, ratio, beta), X);
    expect(noStopMotion(r, ratio, beta).amplitude).toBeCloseTo(formula(r, ratio, beta), 12);
    const result = forced({ r, beta, ratio, periods: 120 });
    expectPrinted(result.quantities.amplitude, X);
    expect(result.quantities.stickFraction).toBe(0);
  });

  test.each(rows)("r %s, ζ %s, β %s: equivalent damping gives another figure", (r, ratio, beta, _X, printed) => {
    // X solves X² ((1−r²)² + (2ζr + 4β/πX)²) = 1.
    const [a, b] = [(1 - r * r) ** 2 + (2 * ratio * r) ** 2, (4 * beta) / Math.PI];
    const half = 2 * ratio * r * b;
    expectPrinted((-half + Math.sqrt(half * half - a * (b * b - 1))) / a, printed);
  });
});

describe("C, motion with stops (recomputed here, µs = µk)", () => {
  const rows: [r: number, beta: number, amplitude: string, stops: number, stuck: string][] = [
    [0.5, 0.5, "1.303429", 2, "0.1750"],
    [0.5, 0.8, "1.020785", 2, "0.2986"],
    [0.6, 0.7, "1.351931", 2, "0.1195"],
    [0.8, 0.9, "0.068345", 2, "0.5063"],
    [1.5, 0.8, "0.056744", 2, "0.3365"],
    [2.0, 0.6, "0.145394", 2, "0.0066"],
    // Each half-cycle it holds at 0.434054 for 0.8256 and at 0.743257 for 13.6068, of π/r = 31.4159.
    [0.1, 0.3, "0.743257", 4, "0.4594"],
  ];
  test.each(rows)(
    "r %s, β %s: amplitude %s, %d stops a cycle, stuck for %s of it",
    (r, beta, amplitude, stops, stuck) => {
      const { outcome, quantities } = forced({ r, beta, periods: 200 });
      expectPrinted(quantities.amplitude, amplitude);
      expect(quantities.sticksPerCycle).toBeCloseTo(stops, 12);
      expectPrinted(quantities.stickFraction, stuck);
      expect(outcome).toBe("stick-slip");
    },
  );

  test("r 0.5, β 0.2 from rest: not settled after 400 periods (Csernák, Stépán & Shaw 2007: at Ω = ω/2n it depends on the start)", () => {
    const result = forced({ r: 0.5, beta: 0.2, periods: 400 });
    expectPrinted(result.quantities.amplitude, "1.333347");
    expect(result.quantities.sticksPerCycle).toBeCloseTo(1, 12);
    expect(result.notes.map(({ code }) => code)).toContain("steady-state-depends-on-start");
  });
});
