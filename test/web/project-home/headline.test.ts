import type { LimitVerdict } from "@restband/solver";
import { describe, expect, it } from "vitest";
import {
  headline,
  inReview,
  limitsWords,
  standingOf,
  type Standing,
} from "../../../web/src/features/project-home/headline.ts";

const limit = (kept: boolean | null): LimitVerdict => ({ quantity: "stickFraction", value: 0, kept, margin: 0 });
const standings = (...counts: [Standing, number][]) => counts.flatMap(([s, n]) => Array<Standing>(n).fill(s));

describe("the project in a sentence", () => {
  it.each<[number, Standing[], string]>([
    [0, [], "No scenario yet."],
    [1, [], "One scenario."],
    [7, standings(["kept", 6], ["broken", 1]), "Seven scenarios. One breaks its limits."],
    [7, standings(["kept", 5], ["broken", 2]), "Seven scenarios. Two break their limits."],
    [7, standings(["broken", 7]), "Seven scenarios. All break their limits."],
    [1, standings(["broken", 1]), "One scenario. It breaks its limits."],
    [7, standings(["kept", 7]), "Seven scenarios. All keep their limits."],
    [1, standings(["kept", 1]), "One scenario. It keeps its limits."],
    [2, standings(["kept", 1], ["no-limits", 1]), "Two scenarios. None breaks its limits."],
    [2, standings(["no-limits", 2]), "Two scenarios."],
    [20, standings(["broken", 3], ["kept", 5]), "20 scenarios. Three break their limits, of eight computed so far."],
    [20, standings(["kept", 8], ["unjudged", 1]), "20 scenarios."],
    [2, standings(["kept", 1], ["unjudged", 1]), "Two scenarios. One cannot be judged."],
    [
      4,
      standings(["broken", 1], ["unjudged", 2], ["kept", 1]),
      "Four scenarios. One breaks its limits and two cannot be judged.",
    ],
  ])("%i scenarios, %j", (count, computed, sentence) => {
    expect(headline(count, computed, { waiting: 0, returned: 0 })).toBe(sentence);
  });

  it.each<[number, Standing[], [waiting: number, returned: number], string]>([
    [
      7,
      standings(["kept", 6], ["broken", 1]),
      [1, 0],
      "Seven scenarios. One breaks its limits and one waits for a decision.",
    ],
    [
      7,
      standings(["kept", 6], ["broken", 1]),
      [2, 1],
      "Seven scenarios. One breaks its limits, two wait for a decision and one was returned.",
    ],
    [2, standings(["no-limits", 2]), [2, 0], "Two scenarios. All wait for a decision."],
    [1, standings(["kept", 1]), [1, 0], "One scenario. It keeps its limits and it waits for a decision."],
    [3, [], [0, 2], "Three scenarios. Two were returned."],
    [
      20,
      standings(["broken", 3]),
      [1, 0],
      "20 scenarios. Three break their limits, of three computed so far. One waits for a decision.",
    ],
  ])("%i scenarios, %j, of which %j wait and were returned", (count, computed, [waiting, returned], sentence) => {
    expect(headline(count, computed, { waiting, returned })).toBe(sentence);
  });

  it("counts a scenario by the state of its newest revision", () => {
    const states = ["in-review", "accepted", "returned", "in-review", "open"] as const;
    expect(inReview(states)).toEqual({ waiting: 2, returned: 1 });
  });
});

describe("the limits of one scenario", () => {
  it.each<[(boolean | null)[], Standing, string]>([
    [[], "no-limits", "no limits set"],
    [[true], "kept", "1 limit kept"],
    [[true, true], "kept", "2 limits kept"],
    [[false], "broken", "1 limit broken"],
    [[true, false, null, false], "broken", "2 of 4 limits broken"],
    [[false, false], "broken", "2 limits broken"],
    [[true, null], "unjudged", "1 of 2 limits cannot be judged"],
    [[null], "unjudged", "1 limit cannot be judged"],
  ])("%j", (kept, standing, words) => {
    const limits = kept.map(limit);
    expect(standingOf(limits)).toBe(standing);
    expect(limitsWords(limits)).toBe(words);
  });
});
