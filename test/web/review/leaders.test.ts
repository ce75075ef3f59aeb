import { describe, expect, it } from "vitest";
import { inOrder, pinsOf, timeOfX, turnsOf, xOfTime, type Pin } from "../../../web/src/features/review/leaders.ts";

const plot = { left: 50, right: 850, from: 0, to: 0.5 };
const instant = (number: number, t: number) => ({ number, anchor: { kind: "instant", t } as const });

describe("the time axis", () => {
  it("takes a time to its place and back, and stays within the plot", () => {
    expect(xOfTime(plot, 0.25)).toBe(450);
    expect(timeOfX(plot, 450)).toBe(0.25);
    expect([timeOfX(plot, 0), timeOfX(plot, 2000)]).toEqual([0, 0.5]);
  });
});

describe("comments", () => {
  it("stand along the axis, then those on values and on the whole", () => {
    const whole = { number: 1, anchor: { kind: "whole" } as const };
    const span = { number: 2, anchor: { kind: "span", from: 0.2, to: 0.4 } as const };
    const order = inOrder([whole, instant(3, 0.4), span, instant(4, 0.1)]).map(({ number }) => number);
    expect(order).toEqual([4, 2, 3, 1]);
  });

  it("are pinned where they are about, and lead to the columns of the first row", () => {
    const span = { number: 2, anchor: { kind: "span", from: 0.25, to: 0.5 } as const };
    const pins = pinsOf([instant(1, 0.1), span, instant(3, 0.45)], plot, [0, 300]);
    expect(pins).toEqual([
      { number: 1, x: 210, ends: null, column: 0 },
      { number: 2, x: 650, ends: [450, 850], column: 300 },
      { number: 3, x: 770, ends: null, column: null },
    ]);
  });
});

describe("leaders", () => {
  /** The stretches of a leader below the axis: down, across, down. */
  const stretches = ({ x, column }: Pin, turn: number) => [
    { x: [x, x], y: [0, turn] },
    { x: [Math.min(x, column!), Math.max(x, column!)], y: [turn, turn] },
    { x: [column!, column!], y: [turn, 1000] },
  ];
  const overlap = ([a, b]: number[], [c, d]: number[]) => a <= d && c <= b;

  it.each([
    ["all to the left", [400, 600, 800], [0, 300, 500]],
    ["all to the right", [60, 80, 100], [150, 400, 700]],
    ["to both sides", [60, 500, 800], [150, 400, 700]],
    ["straight down", [10, 300, 600], [10, 300, 600]],
  ])("%s cross nowhere", (_, places, columns) => {
    const pins = places.map((x, i) => ({ number: i + 1, x, ends: null, column: columns[i] }));
    const turns = turnsOf(pins, 60, 10);
    for (let i = 0; i < pins.length; i++) {
      for (let j = i + 1; j < pins.length; j++) {
        for (const a of stretches(pins[i], turns[i])) {
          for (const b of stretches(pins[j], turns[j])) {
            expect(overlap(a.x, b.x) && overlap(a.y, b.y)).toBe(false);
          }
        }
      }
    }
  });
});
