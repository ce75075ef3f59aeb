import { describe, expect, it } from "vitest";
import { readSpan } from "../../../web/src/features/evidence/read-span.ts";

const second = { label: "s", factor: 1 };
const shown = { from: "0.33333", to: "0.5" };
const range = { from: 1 / 3, to: 0.5 };
const read = (from: string, to: string) => {
  const span = readSpan({ from, to }, shown, range, 0.5, second);
  return "fault" in span ? { fault: span.fault.replaceAll("\u00a0", " ") } : span;
};

describe("a typed span", () => {
  it("is read in the unit shown, or in its own", () => {
    expect(read("0.1", "0.25")).toEqual({ from: 0.1, to: 0.25 });
    expect(read("100 ms", "0,25")).toEqual({ from: 0.1, to: 0.25 });
  });

  it("keeps an end that was not touched, to the last digit", () => {
    expect(read("0.33333", "0.4")).toEqual({ from: 1 / 3, to: 0.4 });
    expect(read("0.2", "0.5")).toEqual({ from: 0.2, to: 0.5 });
  });

  it("says what is amiss", () => {
    expect(read("soon", "0.4")).toEqual({ fault: "“soon” is not a number." });
    expect(read("0.3", "0.2")).toEqual({ fault: "The span begins at 0.3 s; it has to end after that." });
    expect(read("-1", "0.2")).toEqual({ fault: "The run goes from 0 to 0.5 s; a span lies within it." });
    expect(read("0.1", "0.7")).toEqual({ fault: "The run goes from 0 to 0.5 s; a span lies within it." });
    expect(read("0.2", "0.200001")).toEqual({ fault: "A span of this run is 5 μs long or longer." });
  });
});
