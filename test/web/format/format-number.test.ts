import { describe, expect, it } from "vitest";
import { formatExactly, formatFixed, formatNumber } from "../../../web/src/format/format-number.ts";
import { readInput, say, sayInput, sayShare } from "../../../web/src/format/format-quantity.ts";
import { unitByLabel, unitFor, unitsOf } from "../../../web/src/format/units.ts";
import { fromSi, toSi, type Measure } from "../../../web/src/format/unit.ts";

const length: Measure = { dimension: "displacement", motion: "linear" };

describe("numbers as people read them", () => {
  it.each([
    [0, "0"],
    [-0.5, "−0.5"],
    [9999, "9999"],
    [12345.6, "12\u202f346"],
    [0.07712, "0.0771"],
    [26.04, "26"],
    [0.99996, "1"],
    [3.2e-13, "3.2·10⁻¹³"],
    [-4.5e9, "−4.5·10⁹"],
  ])("%d to three digits", (value, text) => expect(formatNumber(value)).toBe(text));

  it("groups five digits and more, never four", () => {
    expect(formatExactly(1976.8)).toBe("1976.8");
    expect(formatExactly(200000)).toBe("200\u202f000");
    expect(formatExactly(1234567)).toBe("1\u202f234\u202f567");
  });

  it("keeps every digit of an input and drops the noise of conversion", () => {
    expect(formatExactly(0.1 + 0.2)).toBe("0.3");
    expect(formatExactly(0.123456789)).toBe("0.123456789");
  });

  it("keeps columns of equal width and never writes a negative zero", () => {
    expect(formatFixed(-0.00001, 3)).toBe("0.000");
    expect(formatFixed(-45.2849, 2)).toBe("−45.28");
  });
});

describe("units", () => {
  it.each([
    [0.0000741, "74.1\u00a0μm"],
    [0.0004312, "0.431\u00a0mm"],
    [0.01, "10\u00a0mm"],
    [1.48, "1.48\u00a0m"],
    [0, "0\u00a0mm"],
    [-0.0003, "−0.3\u00a0mm"],
  ])("%d m chooses a readable one", (value, text) => expect(say(value, length)).toBe(text));

  it.each<[number, Measure, string]>([
    [4e6, { dimension: "stiffness", motion: "linear" }, "4\u00a0N/μm"],
    [0.5, { dimension: "time", motion: "linear" }, "0.5\u00a0s"],
    [0.0132, { dimension: "time", motion: "linear" }, "13.2\u00a0ms"],
    [0.002, { dimension: "velocity", motion: "linear" }, "2\u00a0mm/s"],
    [2.5, { dimension: "force", motion: "angular" }, "2.5\u00a0N·m"],
    [0.02, { dimension: "displacement", motion: "angular" }, "20\u00a0mrad"],
    [30, { dimension: "angle", motion: "linear" }, "30°"],
    [0.15, { dimension: "none", motion: "linear" }, "0.15"],
  ])("%d of %o", (value, measure, text) => expect(sayInput(value, measure)).toBe(text));

  it("shows all digits in SI beside what is shown", () => {
    expect(readInput(0.002, { dimension: "velocity", motion: "linear" }).full).toBe("0.002\u00a0m/s");
  });

  it("goes there and back for every unit of every dimension", () => {
    for (const dimension of ["displacement", "velocity", "stiffness", "force", "frequency", "inertia", "time"] as const)
      for (const motion of ["linear", "angular"] as const)
        for (const unit of unitsOf({ dimension, motion }))
          expect(fromSi(toSi(1.2345, unit), unit)).toBeCloseTo(1.2345, 13);
  });

  it("forgets a unit that the kind of body does not have", () => {
    expect(unitByLabel({ dimension: "displacement", motion: "angular" }, "mm")).toBeUndefined();
    expect(unitFor(0, { dimension: "displacement", motion: "angular" }).label).toBe("rad");
  });

  it("writes shares as percentages", () => expect(sayShare(0.3962)).toBe("39.6\u00a0%"));
});
