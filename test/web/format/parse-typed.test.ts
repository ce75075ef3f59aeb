import { beforeAll, describe, expect, it, vi } from "vitest";
import { otherUnits } from "../../../web/src/format/other-units.ts";
import { parseTyped } from "../../../web/src/format/parse-typed.ts";
import { unitByLabel, unitsOf } from "../../../web/src/format/units.ts";
import type { Measure } from "../../../web/src/format/unit.ts";

const speed: Measure = { dimension: "velocity", motion: "linear" };
const read = (text: string, measure: Measure = speed, unit = "mm/s") =>
  parseTyped(text, measure, unitByLabel(measure, unit) ?? unitsOf(measure)[0]);
const valueOf = (text: string, measure: Measure = speed, unit = "mm/s") => {
  const reading = read(text, measure, unit);
  return reading.kind === "value" ? reading.value : reading.message;
};

beforeAll(() => vi.waitFor(() => expect(otherUnits()).not.toBeNull()));

describe("what a person types becomes SI", () => {
  it.each([
    ["2", 0.002],
    ["2 mm/min", 0.002 / 60],
    ["2mm/min", 0.002 / 60],
    ["0,15", 0.00015],
    ["0,150", 0.00015],
    ["-1.5e1", -0.015],
    ["−3", -0.003],
    ["− 3", -0.003],
    ["1.2·10^3 μm/s", 0.0012],
    ["1.2·10⁻³ m/s", 0.0012],
    ["3 in/min", (3 * 0.0254) / 60],
    ["12,500.5", 12.5005],
    ["12.500,5", 12.5005],
    ["1,200,000", 1200],
    ["12 500", 12.5],
    ["12\u202f500", 12.5],
    ["12'500 mm/s", 12.5],
    [".5", 0.0005],
    ["5.", 0.005],
    ["1 ft/s", 0.3048],
    ["2 MM/S", 0.002],
  ])("%s mm/s", (text, expected) => {
    expect(valueOf(text)).toBeCloseTo(expected, 14);
  });

  it.each<[string, Measure, number]>([
    ["3 in", { dimension: "displacement", motion: "linear" }, 0.0762],
    ['3"', { dimension: "displacement", motion: "linear" }, 0.0762],
    ["100 um", { dimension: "displacement", motion: "linear" }, 1e-4],
    ["100 µm", { dimension: "displacement", motion: "linear" }, 1e-4],
    ["90°", { dimension: "displacement", motion: "angular" }, Math.PI / 2],
    ["300 rpm", { dimension: "velocity", motion: "angular" }, 10 * Math.PI],
    ["300 rpm", { dimension: "frequency", motion: "linear" }, 5],
    ["10 rad/s", { dimension: "frequency", motion: "linear" }, 10 / (2 * Math.PI)],
    ["4 N/um", { dimension: "stiffness", motion: "linear" }, 4e6],
    ["10 lbf/in", { dimension: "stiffness", motion: "linear" }, 1751.268352464764],
    ["0.35 N s/mm", { dimension: "damping", motion: "linear" }, 350],
    ["12 N*m", { dimension: "force", motion: "angular" }, 12],
    ["15 %", { dimension: "none", motion: "linear" }, 0.15],
    ["2 m/s2", { dimension: "acceleration", motion: "linear" }, 2],
    ["1 g", { dimension: "acceleration", motion: "linear" }, 9.80665],
  ])("%s of %o", (text, measure, expected) => {
    expect(valueOf(text, measure)).toBeCloseTo(expected, 12);
  });

  it("leaves decimal units clean to the last bit", () => {
    expect(valueOf("1.2", { dimension: "displacement", motion: "linear" }, "mm")).toBe(0.0012);
    expect(valueOf("74.1", { dimension: "displacement", motion: "linear" }, "μm")).toBe(7.41e-5);
  });

  it("asks where a comma can be either kind", () => {
    const reading = read("1,200");
    expect(reading.kind).toBe("ambiguous");
    expect(reading).toMatchObject({
      choices: [
        { label: "1.2 mm/s", value: 0.0012 },
        { label: "1200 mm/s", value: 1.2 },
      ],
    });
  });

  it.each([
    ["", "A number is missing here."],
    ["fast", "“fast” is not a number."],
    ["2 kg", "“kg” is not a unit that fits here."],
    ["2 furlongs", "“furlongs” is not a unit that fits here."],
    ["1,2,3", "“1,2,3” is not a number."],
    ["1.2.3", "“1.2.3” is not a number."],
  ])("says why “%s” cannot be read", (text, message) => {
    expect(valueOf(text)).toContain(message);
  });
});
