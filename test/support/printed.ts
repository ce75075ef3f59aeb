import { expect } from "vitest";

/** Holds where the value, rounded to as many decimals as were printed, reads as printed. */
export function expectPrinted(value: number | null, printed: string): void {
  const decimals = printed.split(".")[1]?.length ?? 0;
  expect(value?.toFixed(decimals).replace(/^-(0(\.0*)?)$/, "$1")).toBe(printed);
}

/** The same for a list, as printed: numbers parted by blanks. */
export function expectPrintedList(values: readonly number[], printed: string): void {
  const each = printed.trim().split(/\s+/);
  expect(values).toHaveLength(each.length);
  each.forEach((one, i) => expectPrinted(values[i], one));
}

/** Holds where both lists are alike within `tol`, relative to the largest expected value. */
export function expectClose(values: readonly number[], expected: readonly number[], tol = 1e-11): void {
  expect(values).toHaveLength(expected.length);
  const size = Math.max(...expected.map(Math.abs));
  const off = expected.map((value, i) => Math.abs(values[i] - value) / size);
  expect(Math.max(...off), `${values.join(" ")} against ${expected.join(" ")}`).toBeLessThanOrEqual(tol);
}
