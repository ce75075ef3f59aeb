import { describe, expect, it } from "vitest";
import { decayPoints, swingsToRest } from "../../../web/src/features/account/decay.ts";

describe("the drawn decay", () => {
  const swings = swingsToRest(9.95, 0.485);

  it("loses twice the kinetic share with each swing and stops at the first end inside the band", () => {
    expect(swings).toHaveLength(10);
    for (const { from, to } of swings) expect(Math.abs(from) - Math.abs(to)).toBeCloseTo(0.97, 12);
    expect(swings.at(-1)!.to).toBeCloseTo(0.25, 12);
    expect(Math.abs(swings.at(-2)!.to)).toBeGreaterThan(1);
  });

  it("satisfies the equation of motion within each swing: ẍ = −π²(x − centre), starting and ending at rest", () => {
    const perSwing = 1000;
    const points = decayPoints(swings, perSwing);
    const h = 1 / perSwing;
    for (const n of [0, 4, 9]) {
      const x = (i: number) => points[n * perSwing + i][1];
      const { centre } = swings[n];
      for (const i of [1, 300, 999]) {
        const acceleration = (x(i + 1) - 2 * x(i) + x(i - 1)) / h ** 2;
        expect(acceleration).toBeCloseTo(-(Math.PI ** 2) * (x(i) - centre), 3);
      }
      expect((x(1) - x(0)) / h).toBeCloseTo(0, 1);
    }
  });

  it("keeps its place when it starts inside the band", () => {
    expect(swingsToRest(0.9, 0.8)).toEqual([]);
  });
});
