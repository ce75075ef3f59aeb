import type { Energy } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { run } from "../support/run.ts";
import { coulombForces, type ScenarioSketch } from "../support/scenario-builder.ts";

const ledger = (sketch: ScenarioSketch): Energy => run(sketch, { quantities: [] }).energy!;
const nothing: Energy = {
  workForce: 0,
  workBase: 0,
  workWeight: 0,
  workCounterface: 0,
  heatContact: 0,
  heatViscous: 0,
  heatSolid: 0,
  changeKinetic: 0,
  changeStored: 0,
  residual: 0,
};

/** Holds where every entry is as worked out by hand, those left out being 0, and the residual is rounding. */
function expectLedger(sketch: ScenarioSketch, expected: Partial<Energy>): void {
  const found = ledger(sketch);
  const largest = Math.max(...Object.values(expected).map(Math.abs));
  for (const [entry, value] of Object.entries({ ...nothing, ...expected })) {
    const off = Math.abs(found[entry as keyof Energy] - value);
    expect(off / largest, `${entry}: ${found[entry as keyof Energy]}, by hand ${value}`).toBeLessThan(1e-12);
  }
}

describe("the energy ledger, by hand", () => {
  test("friction turns into heat what it brakes: force times path, 550 mm along the turning points", () => {
    const heat = 1 * (0.19 + 0.15 + 0.11 + 0.07 + 0.03);
    expectLedger(
      {
        body: { inertia: 1, stiffness: 100 },
        contact: coulombForces(1, 1.5),
        initial: { displacement: 0.105 },
        span: { seconds: 10 },
      },
      { heatContact: heat, changeStored: 50 * (0.005 ** 2 - 0.105 ** 2) },
    );
  });

  test("weight works along the incline", () => {
    // 2 kg, 30°, down from rest without friction: g sin θ along the way, for 3 s
    const acceleration = 9.80665 / 2;
    const work = (2 * (acceleration * 3) ** 2) / 2;
    expectLedger(
      { body: { inertia: 2, stiffness: 0 }, incline: 30, span: { seconds: 3 } },
      { workWeight: work, changeKinetic: work },
    );
  });

  test("a damper turns into heat what it slows down: v = v₀ e^(−ct/m)", () => {
    const lost = ((2 * 3 ** 2) / 2) * (1 - Math.exp(-2 * 0.5 * 4));
    expectLedger(
      { body: { inertia: 2, stiffness: 0, viscous: 1 }, initial: { velocity: 3 }, span: { seconds: 4 } },
      { heatViscous: lost, changeKinetic: -lost },
    );
  });

  test("a force works with the velocity: 6 N on 2 kg for 3 s", () => {
    const work = (2 * 9 ** 2) / 2;
    expectLedger(
      { body: { inertia: 2, stiffness: 0 }, force: [{ kind: "constant", value: 6 }], span: { seconds: 3 } },
      { workForce: work, changeKinetic: work },
    );
  });

  test("a base that moves away stretches the spring of a body held, and heats the damper", () => {
    const [k, c, rate, seconds] = [100, 5, 0.01, 1.2];
    const stored = (k * (rate * seconds) ** 2) / 2;
    const heat = c * rate ** 2 * seconds;
    expectLedger(
      {
        body: { inertia: 1, stiffness: k, viscous: c },
        contact: coulombForces(1, 1.5),
        base: [{ kind: "ramp", rate }],
        span: { seconds },
      },
      { workBase: stored + heat, changeStored: stored, heatViscous: heat },
    );
  });

  test("a belt brings in what a stuck body stretches its spring by", () => {
    const stored = (0.2 * 4) ** 2 / 2;
    expectLedger(
      {
        body: { inertia: 1, stiffness: 1 },
        contact: { ...coulombForces(0.5, 1), counterface: { velocity: 0.2 } },
        initial: { velocity: 0.2 },
        span: { seconds: 4 },
      },
      { workCounterface: stored, changeStored: stored },
    );
  });

  test("solid damping taken as a damper has an entry of its own", () => {
    const solid = { model: "equivalent-viscous", lossFactor: 0.1, at: "natural" } as const;
    const free = { body: { inertia: 1, stiffness: 100, viscous: 2 }, initial: { velocity: 1 }, span: { seconds: 20 } };
    // c_h = η k/ω = 1 beside c = 2: a third and two thirds of ½ J, all but e⁻⁶⁰ of it
    expectLedger({ ...free, solid }, { heatSolid: 1 / 6, heatViscous: 1 / 3, changeKinetic: -0.5 });
  });

  test("in relative motion the floor works on the inertia: −m ÿ ḋ", () => {
    // without a spring, 2 m/s² for 1 s drives 3 kg back at 2 m/s; the floor's acceleration then falls to 0 at once
    const base = [{ kind: "acceleration-record" as const, times: [0, 1], values: [2, 2] }];
    const contact = { counterface: "base" as const };
    const work = (3 * 2 ** 2) / 2;
    expectLedger(
      { body: { inertia: 3, stiffness: 0 }, contact, base, span: { seconds: 2 } },
      { workBase: work, changeKinetic: work },
    );
  });
});

describe("a body that is carried along and set down", () => {
  test("leaves nothing in the ledger, not even rounding", () => {
    const move = { kind: "move", distance: 0.17487, speed: 0.16156, acceleration: 1.61287, start: 0.12 } as const;
    const carried: ScenarioSketch = {
      body: { inertia: 2.8, stiffness: 689, viscous: 5.7 },
      contact: { ...coulombForces(6, 7), counterface: "base" },
      base: [move],
      span: { seconds: 4.1, untilRest: false },
    };
    expect(ledger(carried)).toEqual(nothing);
  });
});

describe("the ledger", () => {
  test("is left out where it is not asked for", () => {
    const sketch = { body: { inertia: 1, stiffness: 1 }, span: { seconds: 1 } };
    expect(run(sketch, { energy: false })).not.toHaveProperty("energy");
  });
});
