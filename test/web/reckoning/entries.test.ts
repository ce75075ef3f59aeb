import { describe, expect, it } from "vitest";
import {
  readEntries,
  startEntries,
  typedEntry,
  type Entries,
} from "../../../web/src/features/reckoning/formula/entries.ts";
import { expressionText, valuesText } from "../../../web/src/features/reckoning/formula/expression.ts";
import { springs } from "../../../web/src/features/reckoning/springs/index.ts";
import { formulaOf } from "./all-formulas.ts";

const screw = formulaOf(springs, "screw-fixed-free");
const [, diameter] = screw.givens;
const filled: Entries = {
  modulus: { text: "210", unit: "GPa" },
  diameter: { text: "20", unit: "mm" },
  length: { text: "0,5", unit: "m" },
};

describe("entries", () => {
  it("start with the customary number where there is one, else empty in the customary unit", () => {
    expect(startEntries(screw)).toEqual({
      modulus: { text: "210", unit: "GPa" },
      diameter: { text: "", unit: "mm" },
      length: { text: "", unit: "mm" },
    });
  });

  it("are read into SI", () => {
    expect(readEntries(screw, filled)).toEqual({ values: { modulus: 210e9, diameter: 0.02, length: 0.5 }, faults: {} });
  });

  it("take the unit that is typed behind the number", () => {
    const typed = typedEntry("3/4 in", { text: "", unit: "mm" }, diameter);
    expect(typed.unit).toBe("mm");
    expect(typedEntry("0.75 in", { text: "", unit: "mm" }, diameter)).toEqual({ text: "0.75 in", unit: "in" });
    expect(readEntries(screw, { ...filled, diameter: { text: "0.75 in", unit: "in" } }).values?.diameter).toBeCloseTo(
      0.01905,
      12,
    );
  });

  it("that are empty are missing, not wrong", () => {
    expect(readEntries(screw, startEntries(screw))).toEqual({ values: null, faults: {} });
  });

  it.each([
    ["0", "Enter more than 0\u00a0mm."],
    ["-4", "Enter more than 0\u00a0mm."],
    ["thick", "“thick” is not a number."],
    ["20 N", "“N” is not a unit that fits here. Among those that fit: mm, μm, nm, m, in, μin, mil."],
  ])("of %j say what is asked", (text, message) => {
    const { values, faults } = readEntries(screw, { ...filled, diameter: { text, unit: "mm" } });
    expect(values).toBeNull();
    expect(faults).toEqual({ diameter: { message, choices: [] } });
  });

  it("that can be read in two ways offer both", () => {
    const { faults } = readEntries(screw, { ...filled, length: { text: "1,200", unit: "mm" } });
    expect(faults.length.choices.map(({ label }) => label)).toEqual(["1.2 mm", "1200 mm"]);
  });

  it("that do not go together are told at one field", () => {
    const both = formulaOf(springs, "screw-fixed-fixed");
    const { faults } = readEntries(both, { ...filled, position: { text: "600", unit: "mm" } });
    expect(faults.position.message).toBe("The nut lies between the bearings: enter less than L.");
  });
});

it("a formula is written in a line with its numbers beside it", () => {
  const values = { modulus: 210e9, diameter: 0.02, length: 0.5 };
  expect(expressionText(screw)).toBe("E · π · d^2 / (4 · L)");
  expect(valuesText(screw, values, filled)).toBe("E 210\u00a0GPa, d 20\u00a0mm, L 0.5\u00a0m");
});
