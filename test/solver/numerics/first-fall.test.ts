import { expect, test } from "vitest";
import { firstFall } from "../../../solver/src/numerics/bracketed-root.ts";

/** A dip of half-width w about c: positive outside [c − w, c + w]. */
const dip = (c: number, w: number) => (x: number) => (x - c) ** 2 - w ** 2;

const places = Array.from({ length: 60 }, (_, i) => 0.004 + i * 0.0167);

test.each(places)("two zeros within one look are found wherever the dip lies: %f", (c) => {
  expect(Math.abs(firstFall(dip(c, 1e-3), 0, 1) - (c - 1e-3))).toBeLessThan(1e-12);
});

test("a dip at the seam of two intervals is found in the one or the other", () => {
  for (const c of [0.9985, 0.9995, 1, 1.0005, 1.0015]) {
    const g = dip(c, 3e-4);
    const first = firstFall(g, 0, 1);
    const found = first === Infinity ? firstFall(g, 1, 2) : first;
    expect(Math.abs(found - (c - 3e-4))).toBeLessThan(1e-12);
  }
});

test("a dip that stays above zero is none", () => {
  for (const c of places) expect(firstFall((x) => (x - c) ** 2 + 1e-9, 0, 1)).toBe(Infinity);
});
