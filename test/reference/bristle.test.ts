import type { Result, SimulateOptions } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { expectPrinted, expectPrintedList } from "../support/printed.ts";
import { run } from "../support/run.ts";
import type { ScenarioSketch } from "../support/scenario-builder.ts";

/*
 * Bristle friction with the set of Canudas de Wit, Olsson, Åström & Lischinsky, IEEE Trans. Automatic Control 40 (1995) 419,
 * table I, as published at github.com/auralius/LuGre, where the experiments are described too: σ0 1e5, σ1 √1e5, σ2 0.4, Fc 1,
 * Fs 1.5, vs 0.001, m 1. The figures are recomputed here by an implicit method (Radau, relative 1e-9).
 */
const law = {
  model: "bristle",
  static: 1.5,
  kinetic: 1,
  velocity: 1e-3,
  stiffness: 1e5,
  damping: Math.sqrt(1e5),
  fluid: 0.4,
} as const;

function onBristles(sketch: Partial<ScenarioSketch> & { span: { seconds: number } }, options: SimulateOptions): Result {
  return run(
    { body: { inertia: 1, stiffness: 0 }, contact: { law, normal: { preload: 1 } }, ...sketch },
    { quantities: [], energy: false, ...options },
  );
}

describe("E, bristles of the published set", () => {
  test("pulled at 0.1 m/s by 2 N/m: first slip at 7.643 s and 1.5080 N, troughs of 0.7413 N, period 6.3622 ± 0.003 s", () => {
    const at = Array.from({ length: 24_001 }, (_, i) => i / 1000);
    const sketch: ScenarioSketch = {
      body: { inertia: 1, stiffness: 2 },
      base: [{ kind: "ramp", rate: 0.1 }],
      span: { seconds: 24 },
    };
    const result = onBristles(sketch, { at, quantities: ["peakVelocity"] });
    const pull = at.map((t, i) => 2 * (0.1 * t - result.at!.x[i]));
    const inside = at.map((_, i) => i).slice(1, -1);
    const tops = inside.filter((i) => pull[i] > pull[i - 1] && pull[i] >= pull[i + 1]);
    const troughs = inside.filter((i) => pull[i] < pull[i - 1] && pull[i] <= pull[i + 1]);
    expectPrinted(pull[tops[0]], "1.5080");
    // the top is flat: where it lies is told less closely than how high it is
    expect(Math.abs(at[tops[0]] - 7.643)).toBeLessThan(0.003);
    for (const i of troughs) expect(Math.abs(pull[i] - 0.7413)).toBeLessThan(1e-4);
    expect(troughs).toHaveLength(3);
    for (const list of [tops, troughs]) {
      for (let n = 1; n < list.length; n++) {
        expect(Math.abs(at[list[n]] - at[list[n - 1]] - 6.3622)).toBeLessThan(0.003);
      }
    }
    expectPrinted(result.quantities.peakVelocity, "0.36982");
  });

  test.each([
    [1, "1.43241"],
    [2, "1.39442"],
    [5, "1.31321"],
    [10, "1.21995"],
    [20, "1.09861"],
    [30, "1.02448"],
    [40, "1.00425"],
    [50, "1.00747"],
  ])("pulled at %d N/s it breaks away at %s N: the first top of the friction force", (rate, printed) => {
    const span = { seconds: 2 / rate };
    const { samples } = onBristles(
      { force: [{ kind: "ramp", rate, start: 0, stop: "none" }], span },
      { samples: 8001 },
    );
    const f = samples!.f;
    const top = f.findIndex((force, i) => i > 0 && i + 1 < f.length && force < f[i - 1] && force <= f[i + 1]);
    expectPrinted(-f[top], printed);
  });

  test("gives elastically below the break-away force, and its loop closes", () => {
    const load = {
      kind: "record",
      times: [0, 10, 15, 35, 40, 60],
      values: [0, 1.425, 1.425, -1.425, -1.425, 1.425],
    } as const;
    const sketch = {
      force: [{ ...load, times: [...load.times], values: [...load.values] }],
      span: { seconds: 60 },
    };
    const { at } = onBristles(sketch, { at: [10, 15, 35, 40, 60] });
    const micrometres = [...at!.x].map((x) => x * 1e6);
    expectPrintedList([micrometres[0], micrometres[1], micrometres[4]], "44.858 45.312 44.858");
    expectPrinted(micrometres[2], "-9.5635");
    expectPrinted(micrometres[3], "-10.017");
  });
});
