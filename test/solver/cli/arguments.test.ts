import { describe, expect, it } from "vitest";
import { readArguments, UsageError } from "../../../solver/src/cli/arguments.ts";

describe("readArguments", () => {
  it("reads a file with its options", () => {
    expect(readArguments(["a.json"])).toEqual({ file: "a.json", asPython: false, options: { samples: undefined } });
    const given = [
      "a.json",
      "--samples",
      "5",
      "--at",
      "0,1e-3",
      "--method",
      "exact",
      "--no-events",
      "--quantities",
      "restTime",
    ];
    expect(readArguments(given)).toEqual({
      file: "a.json",
      asPython: false,
      options: { samples: 5, at: [0, 0.001], method: "exact", events: false, quantities: ["restTime"] },
    });
    expect(readArguments(["a.json", "--no-samples"])?.options.samples).toBe(0);
  });

  it("leaves samples out of lines unless asked", () => {
    expect(readArguments(["--lines"])).toEqual({ file: null, asPython: false, options: { samples: 0 } });
    expect(readArguments(["--lines", "--samples", "9"])?.options.samples).toBe(9);
    expect(readArguments(["--help"])).toBeNull();
  });

  it("reads that a Python file is wanted", () => {
    expect(readArguments(["python", "a.json"])).toMatchObject({ file: "a.json", asPython: true });
    expect(readArguments(["python"])).toMatchObject({ file: "python", asPython: false });
  });

  it.each([
    [[]],
    [["a.json", "b.json"]],
    [["--lines", "a.json"]],
    [["a.json", "--samples", "1"]],
    [["a.json", "--samples", "many"]],
    [["a.json", "--at", "1,,2"]],
    [["a.json", "--at", "1,x"]],
    [["a.json", "--method", "euler"]],
    [["a.json", "--quantities", "speed"]],
    [["a.json", "--unknown"]],
  ])("refuses %j with a sentence", (given) => {
    expect(() => readArguments(given)).toThrow(UsageError);
  });
});
