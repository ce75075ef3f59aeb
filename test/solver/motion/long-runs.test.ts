import { describe, expect, test } from "vitest";
import { simulate, type Result } from "@restband/solver";
import { buildScenario, type ScenarioSketch } from "../../support/scenario-builder.ts";

function run(sketch: ScenarioSketch, quantities: string[]): Result {
  const result = simulate(buildScenario(sketch), { samples: 0, quantities, energy: false });
  if ("error" in result) throw new Error(result.error.message);
  return result;
}

const coulomb = (force: number, preload = 1): ScenarioSketch["contact"] => ({
  law: { model: "coulomb", static: force / preload, kinetic: force / preload },
  normal: { preload },
});

describe("long runs do not drift", () => {
  // x falls by 2 xk each half cycle of π/ω (Lorenz 1924 and every textbook): both are exact, so is their 100,000-fold.
  test("100,000 half cycles of free decay end where and when the closed form says", () => {
    const halfCycles = 100_000;
    const omega = Math.sqrt(50 / 2);
    const xk = 0.01 / 50;
    const result = run(
      {
        body: { inertia: 2, stiffness: 50 },
        contact: coulomb(0.01),
        initial: { displacement: (2 * halfCycles + 0.5) * xk },
        span: { seconds: (2 * halfCycles * Math.PI) / omega, untilRest: true, maxEvents: 200_000 },
      },
      ["restTime", "restDisplacement", "halfCycles"],
    );
    expect(result.ended).toBe("rest");
    expect(result.quantities.halfCycles).toBe(halfCycles);
    expect(result.quantities.restTime).toBeCloseTo((halfCycles * Math.PI) / omega, 6);
    // each half cycle rounds x by about 1e-17 × its size: 100,000 of them leave 1e-12 of the first swing
    expect(Math.abs((result.quantities.restDisplacement ?? NaN) - 0.5 * xk)).toBeLessThan(1e-11 * halfCycles * xk);
  });

  // Den Hartog's no-stop motion is periodic with the force: after 10,000 periods each turn stands where it stood.
  test("10,000 cycles of forced motion keep their phase and amplitude", () => {
    const hz = 1.3;
    const sketch = (cycles: number): ScenarioSketch => ({
      body: { inertia: 1, stiffness: 100, viscous: 1 },
      contact: coulomb(2),
      force: [{ kind: "harmonic", amplitude: 10, hz }],
      span: { seconds: cycles / hz, untilRest: false },
    });
    const early = run(sketch(200), ["amplitude"]);
    const late = run(sketch(10_000), ["amplitude"]);
    const lastTurn = (result: Result): number => {
      const turns = result.events.filter((event) => event.kind === "turn");
      return turns[turns.length - 1].t * hz;
    };
    // 7,700 s in, the clock itself is good to 1e-12 s
    expect(late.quantities.amplitude).toBeCloseTo(early.quantities.amplitude as number, 11);
    expect(lastTurn(late) - 10_000 - (lastTurn(early) - 200)).toBeCloseTo(0, 9);
    expect(late.events.length).toBeGreaterThan(19_990);
  });

  test("a run is cut off at maxEvents and says so", () => {
    const result = run(
      {
        body: { inertia: 1, stiffness: 100 },
        contact: coulomb(1e-9),
        initial: { displacement: 1 },
        span: { seconds: 1e7, untilRest: true, maxEvents: 200_000 },
      },
      ["peakDisplacement"],
    );
    expect(result.ended).toBe("max-events");
    expect(result.events.filter(({ kind }) => kind !== "start" && kind !== "end")).toHaveLength(200_000);
    expect(result.outcome).toBeNull();
  });

  test("a clamp is held to the cap of the span", () => {
    const result = run(
      {
        body: { inertia: 10, stiffness: 1e6 },
        contact: coulomb(200),
        force: [{ kind: "harmonic", amplitude: 124, hz: 8 }],
        span: { seconds: 1e7, untilRest: false },
      },
      ["holdUse", "driveForceRms"],
    );
    expect(result.outcome).toBe("never-moved");
    expect(result.quantities.holdUse).toBeCloseTo(0.62, 12);
  });
});

describe("hard numbers", () => {
  // The same dimensionless motion at every scale: x0 = 6.5 xk swings 6.5, −4.5, 2.5, −0.5 and rests (A1's rule).
  const masses = [1e-6, 1, 1e6];
  const stiffnesses = [1e-3, 1e3, 1e9];
  test.each(masses.flatMap((m) => stiffnesses.map((k) => [m, k])))("m %d kg, k %d N/m", (inertia, stiffness) => {
    for (const force of [1e-6, 1, 1e6]) {
      const xk = force / stiffness;
      const omega = Math.sqrt(stiffness / inertia);
      const { quantities, ended } = run(
        {
          body: { inertia, stiffness },
          contact: coulomb(force),
          initial: { displacement: 6.5 * xk },
          span: { seconds: 20 / omega, untilRest: true },
        },
        ["restTime", "restDisplacement", "halfCycles"],
      );
      expect(ended).toBe("rest");
      expect(quantities.halfCycles).toBe(3);
      expect((quantities.restTime as number) * omega).toBeCloseTo(3 * Math.PI, 12);
      expect((quantities.restDisplacement as number) / xk).toBeCloseTo(-0.5, 12);
    }
  });
});
