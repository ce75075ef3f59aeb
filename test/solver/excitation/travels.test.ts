import { describe, expect, it } from "vitest";
import { compileTerm, cornersOf, readAbout } from "./evaluate.ts";

const stairs = {
  kind: "staircase",
  increment: 0.1,
  count: 7,
  dwell: 0.3,
  speed: 1,
  acceleration: 10,
  start: 0.1,
} as const;

describe("a move", () => {
  const move = { kind: "move", distance: 0.3, speed: 0.07, acceleration: 0.9, start: 0.1 } as const;

  it("stands at exactly its distance when it is over, without speed", () => {
    const compiled = compileTerm(move);
    const [{ to }] = compiled.travels;
    for (const t of [to, to + 1e-9, 1e6]) expect(readAbout(compiled, t)).toEqual({ value: 0.3, speed: 0 });
    expect(compiled.isConstantFrom(to)).toBe(true);
    expect(compiled.isConstantFrom(to - 1e-9)).toBe(false);
  });

  it("slows down to its end without the rounding of a difference", () => {
    const compiled = compileTerm(move);
    const [{ to }] = compiled.travels;
    // Told from where it began, the speed a nanosecond before the end would be the rounding of 0.07 − 0.07.
    const t = to - 1e-9;
    expect(readAbout(compiled, t).speed).toBe(0.9 * (to - t));
  });

  it("is a triangle when it is too short to reach its speed", () => {
    const compiled = compileTerm({ ...move, distance: 0.0001 });
    expect(compiled.travels[0].to - 0.1).toBeCloseTo(2 * Math.sqrt(0.0001 / 0.9), 14);
    expect(cornersOf(compiled, -1, 10)).toHaveLength(3);
  });

  it("of no distance does nothing", () => {
    const compiled = compileTerm({ ...move, distance: 0 });
    expect(compiled.nextCorner(-1)).toBe(Infinity);
    expect(compiled.travels).toEqual([]);
    expect(compiled.isConstantFrom(0)).toBe(true);
  });
});

describe("a staircase", () => {
  const compiled = compileTerm(stairs);

  it("stands at exactly k increments after its k-th step", () => {
    for (let k = 1; k <= 7; k++)
      expect(readAbout(compiled, 0.1 + 0.3 * k - 1e-6)).toEqual({ value: k * 0.1, speed: 0 });
    expect(readAbout(compiled, 1e9).value).toBe(7 * 0.1);
  });

  it("begins each step at the corner it announces", () => {
    for (let k = 0; k < 7; k++) {
      const begin = 0.1 + k * 0.3;
      expect(cornersOf(compiled, -1, 3)).toContain(begin);
      expect(readAbout(compiled, begin)).toEqual({ value: k * 0.1, speed: 0 });
    }
  });

  it("costs no more with a thousand million steps", () => {
    const long = compileTerm({ ...stairs, count: 1e9 });
    const begin = performance.now();
    for (let i = 0; i < 10_000; i++) readAbout(long, long.nextCorner(i * 29_999.7));
    expect(performance.now() - begin).toBeLessThan(5000);
    expect(readAbout(long, 1e12).value).toBe(1e9 * 0.1);
    expect(long.travels).toHaveLength(2);
  });

  it("may begin a step as the one before ends", () => {
    const tight = compileTerm({ ...stairs, dwell: 0.2 });
    for (const corner of cornersOf(tight, -1, 2)) {
      const read = readAbout(tight, corner);
      expect(Number.isFinite(read.value)).toBe(true);
      expect(tight.nextCorner(corner)).toBeGreaterThan(corner);
    }
    expect(readAbout(tight, 0.1 + 0.2 * 3).value).toBeCloseTo(0.3, 15);
  });

  it("tells its first and last travel", () => {
    expect(compiled.travels.map((travel) => travel.from)).toEqual([0.1, 0.1 + 6 * 0.3]);
    expect(compiled.travels.every((travel) => travel.distance === 0.1)).toBe(true);
  });
});

describe("a ramp", () => {
  it("travels for ever where it never stops", () => {
    const compiled = compileTerm({ kind: "ramp", rate: -2, start: 1, stop: "none" });
    expect(compiled.travels).toEqual([{ from: 1, to: Infinity, distance: -Infinity }]);
    expect(compiled.endlessRate).toBe(-2);
    expect(compiled.isConstantFrom(1e9)).toBe(false);
  });

  it("travels once where it stops", () => {
    const compiled = compileTerm({ kind: "ramp", rate: 2, start: 1, stop: 3 });
    expect(compiled.travels).toEqual([{ from: 1, to: 3, distance: 4 }]);
    expect(compiled.endlessRate).toBe(0);
  });
});

describe("a record", () => {
  const record = (times: number[], values: number[]) => compileTerm({ kind: "record", times, values });

  it("travels by its first stretch each way and its last", () => {
    const zigzag = record([0, 1, 2, 3, 4, 5, 6, 7], [0, 1, 3, 2, 2, 5, 1, 4]);
    expect(zigzag.travels).toEqual([
      { from: 0, to: 2, distance: 3 },
      { from: 2, to: 3, distance: -1 },
      { from: 6, to: 7, distance: 3 },
    ]);
  });

  it("is constant from where its values stay the same", () => {
    const settled = record([0, 1, 2, 3], [0, 4, 4, 4]);
    expect(settled.isConstantFrom(1)).toBe(true);
    expect(settled.isConstantFrom(0.999)).toBe(false);
    expect(record([0, 1], [2, 2]).isConstantFrom(-5)).toBe(true);
  });

  it("is quick to read, also out of order, with 200,000 points", () => {
    const times = Array.from({ length: 200_000 }, (_, i) => i / 200);
    const long = record(
      times,
      times.map((t) => Math.sin(t)),
    );
    const begin = performance.now();
    for (let i = 0; i < 50_000; i++) readAbout(long, (i * 7919) % 1000);
    expect(performance.now() - begin).toBeLessThan(5000);
    expect(readAbout(long, 123.4567).value).toBeCloseTo(Math.sin(123.4567), 5);
  });
});
