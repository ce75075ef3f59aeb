import { describe, expect, test } from "vitest";
import { expectClose, expectPrinted } from "../support/printed.ts";
import { run } from "../support/run.ts";
import { coulombForces } from "../support/scenario-builder.ts";

/*
 * Displacement-proportional solid damping (Reid 1956; closed form derived here: on the way out the spring is k(1 + a), on the
 * way back k(1 − a), a = πη/2), free and without contact. Half-cycle ratio √((1−a)/(1+a)), half-cycle time
 * (π/2ω)(1/√(1−a) + 1/√(1+a)).
 */

function freeDecay(lossFactor: number, seconds: number) {
  return run({
    body: { inertia: 1, stiffness: 1 },
    solid: { model: "displacement-proportional", lossFactor },
    initial: { displacement: 1 },
    span: { seconds },
  });
}

describe("F, Reid's free decay", () => {
  const rows: [lossFactor: number, ratio: string, decrement: string, loss: string, period: string][] = [
    [0.01, "0.984413", "0.031419", "0.031416", "1.000093"],
    [0.02, "0.969062", "0.062853", "0.062832", "1.000370"],
    [0.05, "0.924315", "0.157404", "0.157080", "1.002324"],
    [0.1, "0.853516", "0.316782", "0.314159", "1.009423"],
    [0.2, "0.722416", "0.650307", "0.628319", "1.039912"],
  ];

  test.each(rows)(
    "η %s: half-cycle ratio %s, decrement %s (πη %s), period %s of the undamped",
    (lossFactor, ratio, decrement, loss, period) => {
      const turns = freeDecay(lossFactor, 200).events.filter(({ kind }) => kind === "turn");
      const a = (Math.PI * lossFactor) / 2;
      const shrink = Math.sqrt((1 - a) / (1 + a));
      const half = (Math.PI / 2) * (1 / Math.sqrt(1 - a) + 1 / Math.sqrt(1 + a));
      expect(turns.length).toBe(Math.floor(200 / half));
      expectClose(
        turns.map(({ x }, i) => x / (-shrink) ** (i + 1)),
        turns.map(() => 1),
      );
      expectClose(
        turns.map(({ t }) => t),
        turns.map((_, i) => (i + 1) * half),
      );
      expectPrinted(-turns[0].x, ratio);
      expectPrinted(-Math.log(turns[1].x), decrement);
      expectPrinted(Math.PI * lossFactor, loss);
      expectPrinted(turns[1].t / (2 * Math.PI), period);
    },
  );

  test("η 0.1, checked by direct integration: ratio 0.8535159657, half-cycle 3.171195/ω", () => {
    const [first] = freeDecay(0.1, 10).events.filter(({ kind }) => kind === "turn");
    expectPrinted(-first.x, "0.8535159657");
    expectPrinted(first.t, "3.171195");
  });

  test("it never halts: the ratio is constant, and no stop is reported though the swing falls below 1e-12", () => {
    const { events, outcome, ended, quantities } = freeDecay(0.2, 300);
    expect(Math.abs(events.at(-1)?.x ?? NaN)).toBeLessThan(1e-12);
    expect(events.filter(({ kind }) => kind === "stop")).toEqual([]);
    expect(quantities.restTime).toBeNull();
    expect([ended, outcome]).toEqual(["time", "settles"]);
  });

  test.each([0.02, 0.08, 0.3])(
    "it loses π η k X² in each cycle of a forced motion, at %s Hz too (definition, from memory)",
    (hz) => {
      const after = (cycles: number) =>
        run({
          body: { inertia: 1, stiffness: 1, viscous: 0.4 },
          solid: { model: "displacement-proportional", lossFactor: 0.05 },
          force: [{ kind: "harmonic", amplitude: 1, hz }],
          span: { seconds: cycles / hz, untilRest: false },
        });
      const [before, end] = [after(59), after(60)];
      const loss = (end.energy?.heatSolid ?? NaN) - (before.energy?.heatSolid ?? NaN);
      expectClose([loss], [Math.PI * 0.05 * (end.quantities.amplitude ?? NaN) ** 2], 1e-9);
    },
  );
});

test("held by contact and spring together on a shaken base: the contact takes its share first (closed form derived here)", () => {
  // k d = 1 N, ω² A = 0.3, so the body needs 1 − ω² y N; the contact gives 1.1 at most, the spring up to ρ k d = 0.31.
  // Over half a period y goes from A to −A, and ∫ f dy = −(0.2·1.1 + ∫ (1 − s) ds from −0.1 to 0.3)/ω² = −0.58/ω².
  const [omega, amplitude] = [3, 0.3 / 9];
  const { outcome, energy } = run({
    body: { inertia: 1, stiffness: 100 },
    solid: { model: "displacement-proportional", lossFactor: 0.2 },
    contact: { ...coulombForces(1.1), counterface: "base" },
    base: [{ kind: "harmonic", amplitude, hz: omega / (2 * Math.PI) }],
    initial: { displacement: amplitude + 0.01 },
    span: { seconds: Math.PI / omega, untilRest: false },
  });
  expect(outcome).toBe("never-moved");
  expectClose([energy?.workCounterface ?? NaN, energy?.workBase ?? NaN], [-0.58 / 9, 0.58 / 9]);
});
