import type { MotionEvent, Result } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { expectClose, expectPrinted } from "../support/printed.ts";
import { run } from "../support/run.ts";
import { coulombForces } from "../support/scenario-builder.ts";

/*
 * A mass on a spring on a moving belt, constant Fs > Fk (closed forms derived here and recomputed by regenerate.py; the
 * cycle itself is known from textbooks, from memory).
 */

interface Belt {
  m: number;
  k: number;
  Fs: number;
  Fk: number;
  V: number;
}

function onBelt({ m, k, Fs, Fk, V }: Belt, seconds: number, viscous = 0): Result {
  return run({
    body: { inertia: m, stiffness: k, viscous },
    contact: { ...coulombForces(Fk, Fs), counterface: { velocity: V } },
    initial: { velocity: V },
    span: { seconds, untilRest: false },
  });
}

const timesOf = ({ events }: Result, kind: MotionEvent["kind"]): number[] =>
  events.filter((event) => event.kind === kind).map(({ t }) => t);

/** Amplitude about Fk/k, slip time and stick time of the undamped cycle, with d = (Fs − Fk)/k. */
function cycleOf({ m, k, Fs, Fk, V }: Belt) {
  const [d, omega] = [(Fs - Fk) / k, Math.sqrt(k / m)];
  return {
    A: Math.hypot(d, V / omega),
    slip: (2 / omega) * (Math.PI - Math.atan((d * omega) / V)),
    stick: (2 * d) / V,
    omega,
  };
}

describe("D, the undamped stick-slip cycle", () => {
  const rows: [belt: Belt, unit: number, A: string, slip: string, stick: string, period: string][] = [
    [{ m: 1, k: 1, Fs: 1, Fk: 0.5, V: 0.2 }, 1, "0.538516", "3.902605", "5.000000", "8.902605"],
    [{ m: 1, k: 1, Fs: 1, Fk: 0.5, V: 0.1 }, 1, "0.509902", "3.536384", "10.000000", "13.536384"],
    [{ m: 1000, k: 1e7, Fs: 300, Fk: 200, V: 1e-3 }, 1e6, "14.1421", "0.0471239", "0.0200000", "0.0671239"],
    [{ m: 500, k: 2e7, Fs: 1500, Fk: 1000, V: 2e-3 }, 1e6, "26.9258", "0.0195130", "0.0250000", "0.0445130"],
  ];

  test.each(rows)("%o: amplitude, slip time, stick time, period", (belt, unit, A, slip, stick, period) => {
    const cycle = cycleOf(belt);
    const loadUp = belt.Fs / (belt.k * belt.V);
    const result = onBelt(belt, loadUp + 20 * (cycle.slip + cycle.stick) + 0.1 * cycle.slip);
    const [breakAways, stops] = [timesOf(result, "break-away"), timesOf(result, "stop")];
    expect(stops).toHaveLength(20);
    const slips = stops.map((t, i) => t - breakAways[i]);
    const sticks = stops.map((t, i) => breakAways[i + 1] - t);
    expectClose(
      slips,
      slips.map(() => cycle.slip),
      1e-10,
    );
    expectClose(
      sticks,
      sticks.map(() => cycle.stick),
      1e-10,
    );
    expectPrinted(slips[0], slip);
    expectPrinted(sticks[0], stick);
    expectPrinted(1 / (result.quantities.stickSlipHz ?? NaN), period);
    expectPrinted((result.quantities.amplitude ?? NaN) * unit, A);
    expectClose([result.quantities.slipVelocityPeak ?? NaN], [belt.V + cycle.A * cycle.omega]);
    expect(result.outcome).toBe("stick-slip");
  });

  test("the frequent shortcut Fs/(k V) is the first load-up only: 0.030 s, where later sticks last 0.020 s", () => {
    const [, , [belt]] = rows;
    const [first] = timesOf(onBelt(belt, 0.05), "break-away");
    expectPrinted(first, "0.030");
    expectPrinted(cycleOf(belt).stick, "0.020");
    // In the first row the two coincide, because there Fs = 2 (Fs − Fk).
    const [[unit]] = rows;
    expect(cycleOf(unit).stick).toBeCloseTo(unit.Fs / (unit.k * unit.V), 12);
  });
});

/**
 * The belt speed above which a slip never regains it, in units (Fs − Fk)/√(km), damper to ground. About the sliding rest
 * point the body starts at u = 1 − 2ζV, v = V (it breaks away at k x + c V = Fs); v = e^(−ζt)(V cos st − B sin st), with
 * B = (ζV + u)/s, has its next maximum half a turn after its first minimum. V is where that maximum equals V.
 */
function criticalSpeed(ratio: number): number {
  const s = Math.sqrt(1 - ratio * ratio);
  const excess = (V: number) => {
    const B = (ratio * V + 1 - 2 * ratio * V) / s;
    const trough = Math.atan2(ratio * V + s * B, -(s * V - ratio * B));
    const top = (trough + Math.PI) / s;
    return Math.exp(-ratio * top) * (V * Math.cos(s * top) - B * Math.sin(s * top)) - V;
  };
  let [low, high] = [1e-3, 1 / Math.sqrt(4 * Math.PI * ratio)];
  for (let i = 0; i < 100; i++) {
    const middle = (low + high) / 2;
    if (excess(middle) > 0) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}

describe("D, the critical speed with damping (estimate 1/√(4πζ): Derjaguin, Push & Tolstoi 1957, from memory)", () => {
  const rows: [ratio: number, exact: string, share: string][] = [
    [0.001, "8.89327", "0.997"],
    [0.005, "3.93019", "0.985"],
    [0.01, "2.73924", "0.971"],
    [0.02, "1.88328", "0.944"],
    [0.05, "1.09809", "0.870"],
    [0.1, "0.680218", "0.763"],
    [0.2, "0.366974", "0.582"],
  ];
  const stopsAt = (ratio: number, V: number) =>
    timesOf(onBelt({ m: 1, k: 1, Fs: 1.5, Fk: 0.5, V }, 60 + 10 / V, 2 * ratio), "stop").length;

  test.each(rows)("ζ %s: %s (F_s − F_k)/√(km), %s of the estimate", (ratio, exact, share) => {
    const V = criticalSpeed(ratio);
    expectPrinted(V, exact);
    expectPrinted(V * Math.sqrt(4 * Math.PI * ratio), share);
    expect(stopsAt(ratio, V * (1 - 1e-6))).toBeGreaterThan(0);
    expect(stopsAt(ratio, V * (1 + 1e-6))).toBe(0);
  });

  test("1000 kg on 1e8 N/m, 200 N, ζ 0.05: 41.67 mm/min, where the estimate says 47.87", () => {
    const perMinute = (200 / Math.sqrt(1e8 * 1000)) * 60000;
    expectPrinted(criticalSpeed(0.05) * perMinute, "41.67");
    expectPrinted(perMinute / Math.sqrt(0.2 * Math.PI), "47.87");
    const belt = { m: 1000, k: 1e8, Fs: 500, Fk: 300 };
    const viscous = 2 * 0.05 * Math.sqrt(1e8 * 1000);
    const stops = (perMin: number) => timesOf(onBelt({ ...belt, V: perMin / 60000 }, 1, viscous), "stop").length;
    expect(stops(41.66)).toBeGreaterThan(0);
    expect(stops(41.68)).toBe(0);
  });
});
