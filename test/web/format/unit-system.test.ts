import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { readInput, say, sayInput } from "../../../web/src/format/format-quantity.ts";
import { showUnitSystem } from "../../../web/src/format/unit-system.ts";
import type { Measurand, Motion } from "../../../web/src/format/unit.ts";
import { unitByLabel, unitFor } from "../../../web/src/format/units.ts";

const plain = (text: string): string => text.replaceAll("\u00a0", " ").replaceAll("\u202f", " ");
const measure = (dimension: Measurand, motion: Motion = "linear") => ({ dimension, motion });

afterEach(() => showUnitSystem("millimetre"));

describe("inch and pound", () => {
  beforeEach(() => showUnitSystem("inch"));

  // One of each unit in SI, from 1 in = 0.0254 m, 1 lb = 0.45359237 kg and g = 9.80665 m/s², all exact by definition.
  it.each<[Measurand, Motion, number, string]>([
    ["displacement", "linear", 0.0254, "1 in"],
    ["displacement", "linear", 2.54e-6, "100 μin"],
    ["velocity", "linear", 0.0254, "1 in/s"],
    ["acceleration", "linear", 9.80665, "386 in/s²"],
    ["inertia", "linear", 0.45359237, "1 lb"],
    ["inertia", "angular", 2.9263965e-4, "1 lb·in²"],
    ["force", "linear", 4.4482216152605, "1 lbf"],
    ["force", "angular", 0.112984829, "1 lbf·in"],
    ["pressing", "angular", 44.482216152605, "10 lbf"],
    ["stiffness", "linear", 175.126835, "1 lbf/in"],
    ["stiffness", "angular", 0.112984829, "1 lbf·in/rad"],
    ["damping", "linear", 175.126835, "1 lbf·s/in"],
    ["damping", "angular", 0.112984829, "1 lbf·in·s/rad"],
    ["pressure", "linear", 6894.757293, "1 psi"],
    ["energy", "linear", 0.112984829, "1 lbf·in"],
    ["power", "linear", 0.112984829, "1 lbf·in/s"],
    ["time", "linear", 0.002, "2 ms"],
    ["frequency", "linear", 12, "12 Hz"],
    ["none", "linear", 0.15, "0.15"],
  ])("%s, %s: %d", (dimension, motion, value, text) =>
    expect(plain(say(value, measure(dimension, motion)))).toBe(text),
  );

  it("leaves the unit chosen for one value alone", () => {
    const stiffness = measure("stiffness");
    expect(plain(sayInput(4e6, stiffness, unitByLabel(stiffness, "N/μm")))).toBe("4 N/μm");
  });

  it("says what was entered in other units to six digits, and all of it on demand", () => {
    const { text, full } = readInput(4e6, measure("stiffness"));
    expect([plain(text), plain(full)]).toEqual(["22 841", "4000000 N/m"]);
    expect(plain(sayInput(0.0254 / 4, measure("length")))).toBe("0.25 in");
  });
});

describe("metre, kilogram and second", () => {
  it.each<[Measurand, Motion, string]>([
    ["displacement", "linear", "m"],
    ["velocity", "linear", "m/s"],
    ["stiffness", "linear", "N/m"],
    ["pressure", "linear", "Pa"],
    ["angle", "linear", "°"],
    ["inertia", "angular", "kg·m²"],
  ])("%s, %s", (dimension, motion, label) => {
    showUnitSystem("metre");
    expect(unitFor(3e-6, measure(dimension, motion)).label).toBe(label);
  });
});
