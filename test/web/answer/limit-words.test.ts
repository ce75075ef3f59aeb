import type { LimitVerdict } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { readLimit } from "../../../web/src/features/answer/limit-words.ts";

const read = (limit: Partial<LimitVerdict>, asEntered = false) => {
  const verdict: LimitVerdict = {
    quantity: "peakAcceleration",
    value: 0.61,
    kept: true,
    margin: 1.39,
    max: 2,
    ...limit,
  };
  const { demand, word, value, remark, from, to } = readLimit(verdict, "linear", asEntered);
  return { said: [demand, word, value, remark].filter(Boolean).join(" | ").replaceAll("\u00a0", " "), from, to };
};

describe("a limit in words and on its ruler", () => {
  it.each<[Partial<LimitVerdict>, string, [number, number]]>([
    [{}, "at most 2 m/s² | kept | 0.61 m/s² | 1.39 m/s² to spare", [0, 3]],
    [{ value: 2, margin: 0 }, "at most 2 m/s² | kept | 2 m/s² | nothing to spare", [0, 3]],
    [{ value: 2.5, margin: -0.5, kept: false }, "at most 2 m/s² | broken | 2.5 m/s² | 0.5 m/s² beyond", [0, 3]],
    [{ value: 11.2, margin: -9.2, kept: false }, "at most 2 m/s² | broken | 11.2 m/s² | 5.6 times the limit", [0, 15]],
    [
      { quantity: "stickFraction", max: 0, value: 0.396, margin: -0.396, kept: false },
      "none allowed | broken | 39.6 % | 0 % allowed",
      [0, 1],
    ],
    [
      { quantity: "restOffset", min: -0.005, max: 0.005, value: 0.00113, margin: 0.00387 },
      "from −5 mm to 5 mm | kept | 1.13 mm | 3.87 mm to spare",
      [-0.008, 0.008],
    ],
    [
      { quantity: "peakVelocity", min: 0.02, max: undefined, value: 0.015, margin: -0.005, kept: false },
      "at least 20 mm/s | broken | 15 mm/s | 5 mm/s beyond",
      [0, 0.03],
    ],
    [
      { quantity: "restTime", max: 2.5, value: null, kept: null, margin: null, reason: "It does not rest." },
      "at most 2.5 s | cannot be judged | It does not rest.",
      [0, 3],
    ],
  ])("%o", (limit, said, [from, to]) => expect(read(limit)).toEqual({ said, from, to }));

  it("says why, not how much, where the run was cut off", () => {
    const cut = { kept: null, margin: null, reason: "The run was cancelled before its end." };
    expect(read(cut).said).toBe("at most 2 m/s² | cannot be judged | The run was cancelled before its end.");
  });

  it("says that only the values as entered were run", () => {
    expect(read({}, true).said).toContain("kept as entered only");
    expect(read({ kept: null, margin: null, value: null, reason: "None." }, true).said).toContain(
      "cannot be judged | None.",
    );
  });
});
