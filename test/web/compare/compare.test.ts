import type { Result } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { compareAnswers, comparisonWords } from "../../../web/src/features/compare/compare-answers.ts";
import { changeWords, compareFields } from "../../../web/src/features/compare/compare-fields.ts";
import { differencesOf } from "../../../web/src/features/statement/saving/differences.ts";
import { fieldWords } from "../../../web/src/pages/field-words.ts";
import { creepFeed, solved, variant } from "../support/scenarios.ts";
import type { Scenario } from "@restband/solver";

const compare = (a: Scenario, b: Scenario) => {
  const work = (content: Scenario) => ({ content, switchedOff: [] });
  return compareFields(a, b, differencesOf(work(a), work(a), work(b)), fieldWords);
};

describe("what two scenarios do not have in common", () => {
  it("tells numbers one by one with units, origins and how much they have become", () => {
    const damped = variant({
      body: { ...creepFeed.body, viscous: 4200 },
      origins: { "body.viscous": { kind: "catalogue", source: "damper sheet OD-4" } },
    });
    const { rows, same } = compare(creepFeed, damped);
    expect(rows).toEqual([
      {
        path: "body.viscous",
        label: "Damping",
        values: ["350\u00a0N·s/m", "4200\u00a0N·s/m"],
        origins: [null, "catalogue, damper sheet OD-4"],
        change: "12 times",
      },
    ]);
    expect(same).toBeGreaterThan(10);
  });

  it("looks into a law of the same kind, and tells another kind as a whole", () => {
    const { contact } = creepFeed;
    const rougher = variant({ contact: { ...contact, law: { model: "coulomb", static: 0.18, kinetic: 0.12 } } });
    expect(compare(creepFeed, rougher).rows.map(({ path, values }) => [path, ...values])).toEqual([
      ["contact.law.static", "0.15", "0.18"],
    ]);
    const without = variant({ contact: { ...contact, law: { model: "none" } } });
    const [law, ...others] = compare(creepFeed, without).rows;
    expect(others).toEqual([]);
    expect(law).toMatchObject({ path: "contact.law", label: "Friction law", change: "" });
    expect(law.values[0]).toContain("0.15");
  });

  it("tells a value that only comes from somewhere else", () => {
    const known = variant({ origins: { "body.inertia": { kind: "measured", source: "scales" } } });
    expect(compare(creepFeed, known).rows).toEqual([
      {
        path: "body.inertia",
        label: "Mass",
        values: ["120\u00a0kg", "120\u00a0kg"],
        origins: [null, "measured, scales"],
        change: "",
      },
    ]);
  });

  it("finds nothing between a scenario and itself", () => {
    expect(compare(creepFeed, variant({})).rows).toEqual([]);
  });
});

describe("how much a number has become of another", () => {
  it.each([
    [350, 4200, "12 times"],
    [100, 105, "+5\u00a0%"],
    [0.2, 0.18, "−10\u00a0%"],
    [4, 1, "1/4"],
    [0, 3, ""],
    [-1, 1, ""],
    ["a", "b", ""],
  ])("%s to %s: %s", (from, to, words) => expect(changeWords(from, to)).toBe(words));
});

describe("what came of two scenarios", () => {
  const sticking = solved(creepFeed, 0).result;
  const sliding = solved(variant({ body: { ...creepFeed.body, viscous: 4200 } }), 0).result;

  it("tells outcomes, the limit that is now kept first, then what differs", () => {
    const answers = compareAnswers(sticking, sliding);
    expect(answers.outcomes).toEqual(["sticks and slips", "slides smoothly"]);
    expect(answers.rows[0]).toMatchObject({ name: "stickFraction", limit: { word: "now kept", tone: "kept" } });
    expect(answers.rows.some(({ name }) => name === "naturalHz")).toBe(false);
    expect(comparisonWords(answers)).toBe(
      "The first: sticks and slips. The second: slides smoothly. One limit is now kept.",
    );
  });

  it("does not say that a limit is kept which cannot be judged or is not asked for", () => {
    const cutOff: Result = { ...sliding, limits: sliding.limits.map((limit) => ({ ...limit, kept: null })) };
    expect(compareAnswers(sticking, cutOff).rows[0].limit?.word).toBe("cannot be judged");
    expect(compareAnswers(sticking, { ...sliding, limits: [] }).rows[0].limit?.word).toBe("no limit here");
    expect(compareAnswers(sliding, sticking).rows[0].limit).toEqual({ word: "now broken", tone: "broken" });
  });

  it("finds nothing between a run and itself but its limits", () => {
    const answers = compareAnswers(sticking, sticking);
    expect(answers.rows.map(({ limit }) => limit?.word)).toEqual(["still broken"]);
    expect(comparisonWords(answers)).toBe("Both: sticks and slips.");
  });
});
