import { describe, expect, test } from "vitest";
import { compareWithTextbook, type Result } from "@restband/solver";
import { criticalSpeedRatio } from "../../../solver/src/textbook/critical-feed.ts";
import { expectPrinted } from "../../support/printed.ts";
import { buildScenario, coulombForces, type ScenarioSketch } from "../../support/scenario-builder.ts";
import { run } from "../../support/run.ts";
import { pageOf, reasonOf, rowOf } from "./page.ts";

interface Drive {
  m: number;
  k: number;
  Fs: number;
  Fk: number;
  V: number;
  c?: number;
}

const fed = ({ m, k, Fs, Fk, V, c = 0 }: Drive, seconds: number): ScenarioSketch => ({
  body: { inertia: m, stiffness: k, viscous: c },
  contact: coulombForces(Fk, Fs),
  base: [{ kind: "ramp", rate: V }],
  span: { seconds },
});

const onBelt = ({ m, k, Fs, Fk, V, c = 0 }: Drive, seconds: number): ScenarioSketch => ({
  body: { inertia: m, stiffness: k, viscous: c },
  contact: { ...coulombForces(Fk, Fs), counterface: { velocity: V } },
  initial: { velocity: V },
  span: { seconds, untilRest: false },
});

describe("the stick–slip cycle", () => {
  const rows: [Drive, unit: number, A: string, slip: string, stick: string, period: string][] = [
    [{ m: 1, k: 1, Fs: 1, Fk: 0.5, V: 0.2 }, 1, "0.538516", "3.902605", "5.000000", "8.902605"],
    [{ m: 1, k: 1, Fs: 1, Fk: 0.5, V: 0.1 }, 1, "0.509902", "3.536384", "10.000000", "13.536384"],
    [{ m: 1000, k: 1e7, Fs: 300, Fk: 200, V: 1e-3 }, 1e6, "14.1421", "0.0471239", "0.0200000", "0.0671239"],
    [{ m: 500, k: 2e7, Fs: 1500, Fk: 1000, V: 2e-3 }, 1e6, "26.9258", "0.0195130", "0.0250000", "0.0445130"],
  ];
  test.each(rows)("%o", (drive, unit, A, slip, stick, period) => {
    const seconds = 30 * Number(period);
    for (const sketch of [fed(drive, seconds), onBelt(drive, seconds)]) {
      const page = pageOf(sketch);
      for (const [key, printed, factor] of [
        ["slip-amplitude", A, unit],
        ["slip-time", slip, 1],
        ["stick-time", stick, 1],
        ["stick-slip-period", period, 1],
      ] as const) {
        expectPrinted(rowOf(page, key).value * factor, printed);
        expect(rowOf(page, key).difference).toBeCloseTo(0, 8);
      }
      expect(rowOf(page, "peak-slip-speed").difference).toBeCloseTo(0, 9);
    }
  });

  test("the first load-up is longer than the later ones: 0.030 s against 0.020 s", () => {
    const [, , [drive]] = rows;
    const page = pageOf(fed(drive, 2));
    expectPrinted(rowOf(page, "first-break-away").value, "0.030");
    expect(rowOf(page, "first-break-away").difference).toBeCloseTo(0, 9);
    expectPrinted(rowOf(page, "stick-time").value, "0.020");
  });

  test("damping is left out and said to be: a 120 kg carriage with 350 N·s/m jumps 0.8 % sooner", () => {
    const page = pageOf({
      body: { inertia: 120, stiffness: 4e6, viscous: 350 },
      contact: { law: { model: "coulomb", static: 0.15, kinetic: 0.12 }, normal: { preload: 800, weight: true } },
      base: [{ kind: "ramp", rate: 0.002 }],
      span: { seconds: 0.5 },
    });
    const period = rowOf(page, "stick-slip-period");
    expectPrinted(period.value * 1e3, "39.00");
    expectPrinted(period.ofRun * 1e3, "38.69");
    expect(period.note).toMatch(/leaves damping out/);
    expectPrinted(rowOf(page, "first-break-away").value * 1e3, "37.06");
    expectPrinted(rowOf(page, "critical-feed-estimate").value * 1e3, "8.54");
    expectPrinted(rowOf(page, "critical-feed-exact").value * 1e3, "8.34");
  });

  test("has no place where nothing sticks, jumps or feeds", () => {
    const drive = { m: 1, k: 1, Fs: 1, Fk: 0.5, V: 0.2 };
    expect(reasonOf(pageOf(fed({ ...drive, Fk: 1 }, 50)), "stick-time")).toMatch(/alike/);
    expect(reasonOf(pageOf(fed({ ...drive, V: 5, c: 0.4 }, 100)), "stick-time")).toMatch(/does not stick and slip/);
    expect(reasonOf(pageOf(fed({ ...drive, V: 0 }, 50)), "stick-time")).toMatch(/neither fed/);
  });
});

describe("the lowest smooth feed", () => {
  const rows: [ratio: number, exact: string, share: string][] = [
    [0.001, "8.89327", "0.997"],
    [0.005, "3.93019", "0.985"],
    [0.01, "2.73924", "0.971"],
    [0.02, "1.88328", "0.944"],
    [0.05, "1.09809", "0.870"],
    [0.1, "0.680218", "0.763"],
    [0.2, "0.366974", "0.582"],
  ];
  test.each(rows)("ζ %s: %s ΔF/√(km), %s of the estimate", (ratio, exact, share) => {
    expectPrinted(criticalSpeedRatio(ratio), exact);
    expectPrinted(criticalSpeedRatio(ratio) * Math.sqrt(4 * Math.PI * ratio), share);
  });

  const drive = { m: 1000, k: 1e8, Fs: 500, Fk: 300, c: 0.1 * Math.sqrt(1e11) };
  const at = (perMinute: number) => pageOf(fed({ ...drive, V: perMinute / 60000 }, 2));

  test("1000 kg on 1e8 N/m, 200 N, ζ 0.05: 41.67 mm/min, the estimate 47.87; the solver parts there too", () => {
    expectPrinted(rowOf(at(20), "critical-feed-exact").value * 60000, "41.67");
    expectPrinted(rowOf(at(20), "critical-feed-estimate").value * 60000, "47.87");
    expect(rowOf(at(41.66), "critical-feed-exact").note).toMatch(/at 1.00 of it and sticks and slips/);
    expect(rowOf(at(41.68), "critical-feed-exact").note).toMatch(/at 1.00 of it and does not/);
  });

  test("without damping there is none", () => {
    expect(reasonOf(pageOf(fed({ ...drive, c: 0, V: 1e-3 }, 1)), "critical-feed-exact")).toBe("There is no damping.");
  });
});

describe("linear stability of steady sliding, c + N dμ/dv", () => {
  /** Only what a page reads of a run that it asks for no number. */
  const unread = run({ body: { inertia: 1, stiffness: 1 }, span: { seconds: 1 } });
  const netAt = (V: number, law: NonNullable<ScenarioSketch["contact"]>["law"], radius = 1): number => {
    const sketch: ScenarioSketch = {
      motion: radius === 1 ? "linear" : "angular",
      body: { inertia: 1, stiffness: 1, viscous: 0.1 },
      contact: { law, normal: { preload: 1 }, counterface: { velocity: V }, radius },
      span: { seconds: 1 },
    };
    const result: Result = { ...unread, outcome: "smooth-sliding" };
    return rowOf(compareWithTextbook(buildScenario(sketch), result), "linear-stability").value;
  };
  // ξ 0.05, μ 0.5 + 0.5 e^(−v/0.5): zero at v = ½ ln 10 (Stender, Hoffmann & Papangelo 2020, Lubricants 8(12):105)
  const falling = { model: "stribeck", static: 1, kinetic: 0.5, velocity: 0.5, exponent: 1 } as const;

  test("vanishes at ½ ln 10 = 1.151293 for the published set, below it is negative, above positive", () => {
    const critical = Math.log(10) / 2;
    expectPrinted(critical, "1.151293");
    expect(netAt(critical, falling)).toBeCloseTo(0, 12);
    expect(netAt(1.1, falling)).toBeLessThan(0);
    expect(netAt(1.2, falling)).toBeGreaterThan(0);
  });

  test("counts the film, and on a rotor the radius twice", () => {
    expect(netAt(50, { ...falling, fluid: 0.3 })).toBeCloseTo(0.4, 12);
    expect(netAt(50, { ...falling, fluid: 0.3 }, 2)).toBeCloseTo(0.1 + 4 * 0.3, 12);
    expect(netAt(1, { model: "coulomb", static: 0.2, kinetic: 0.1 })).toBe(0.1);
  });
});
