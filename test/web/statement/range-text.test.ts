import { describe, expect, it } from "vitest";
import { readRange, writeRange } from "../../../web/src/features/statement/origin/range-text.ts";
import type { Measure } from "../../../web/src/format/unit.ts";
import { unitByLabel, unitsOf } from "../../../web/src/format/units.ts";

const stiffness: Measure = { dimension: "stiffness", motion: "linear" };
const unit = unitByLabel(stiffness, "N/μm") ?? unitsOf(stiffness)[0];
const reading = { measure: stiffness, unit, value: 4e6 };
const plain = (text: string): string => text.replaceAll("\u00a0", " ");

describe("the range of a value", () => {
  it.each([
    ["3.5 to 4.5", { low: 3.5e6, high: 4.5e6 }],
    ["3,5 – 4,5", { low: 3.5e6, high: 4.5e6 }],
    ["3500 to 4500 N/mm", { low: 3.5e6, high: 4.5e6 }],
    ["3500 N/mm to 4.5 N/μm", { low: 3.5e6, high: 4.5e6 }],
    ["±10 %", { low: 3.6e6, high: 4.4e6 }],
    ["+-10%", { low: 3.6e6, high: 4.4e6 }],
    ["± 0.5", { low: 3.5e6, high: 4.5e6 }],
    ["± 500 N/mm", { low: 3.5e6, high: 4.5e6 }],
    ["3.5 or more", { low: 3.5e6 }],
    ["4500 N/mm or less", { high: 4.5e6 }],
    ["", {}],
  ])("%s", (text, range) => expect(readRange(text, reading)).toEqual(range));

  it.each([
    ["4.5 to 3.5", "The first end of a range is the lower one."],
    ["about 4", "A range reads “0.12 to 0.18”, “±10 %” or “0.12 or more”."],
    ["3 to 4 kg", /^“kg” is not a unit that fits here\./],
    ["3 to 1,200", "“1,200” can be 1.2 N/μm or 1200 N/μm. Choose which is meant."],
  ])("%s is refused with a reason", (text, message) =>
    expect(readRange(text, reading)).toEqual({ message: expect.stringMatching(message) as string }),
  );

  it.each([{ low: 3.5e6, high: 4.5e6 }, { low: 3.5e6 }, { high: 4.5e6 }, {}])("%o is read back as written", (range) => {
    expect(readRange(writeRange(range, reading), reading)).toEqual(range);
  });

  it("keeps its sides around a value below zero", () => {
    expect(readRange("±10 %", { ...reading, value: -4e6 })).toEqual({ low: -4.4e6, high: -3.6e6 });
    expect(plain(writeRange({ low: -4.4e6, high: -3.6e6 }, reading))).toBe("−4.4 to −3.6 N/μm");
  });
});
