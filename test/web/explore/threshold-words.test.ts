import { answerAll, thresholdSearch, type Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import {
  exploreField,
  exploreFields,
  likeliestField,
  rangeAround,
} from "../../../web/src/features/explore/explore-field.ts";
import { roundedTo } from "../../../web/src/features/explore/say-value.ts";
import { targetChoices } from "../../../web/src/features/explore/threshold/targets.ts";
import { readThreshold } from "../../../web/src/features/explore/threshold/threshold-reading.ts";
import { sayThreshold } from "../../../web/src/features/explore/threshold/threshold-words.ts";
import { creepFeed, variant } from "../support/scenarios.ts";

function search(scenario: Scenario, path: string, [low, high]: [number, number], key: string) {
  const choice = targetChoices(scenario).find((each) => each.key === key)!;
  const threshold = answerAll(thresholdSearch({ scenario, path, low, high, target: choice.target }));
  const field = exploreField(scenario, path)!;
  return sayThreshold(readThreshold(threshold, { low, high, choice }), field, "the carriage");
}

describe("the answer of a search", () => {
  it("says the lowest feed rounded up, and both ends that were run", () => {
    const { headline, lead } = search(creepFeed, "base[0].rate", [2e-5, 0.2], "no-stick-slip");
    expect(headline).toBe("The carriage slides without sticking from 8.345\u00a0mm/s of feed on.");
    expect(lead[0]).toMatch(/^8\.34\d\d\smm\/s still sticks and slips, 8\.34\d\d\smm\/s slides\.$/);
    const [low, high] = [...lead[0].matchAll(/[\d.]+(?=\smm)/g)].map(([text]) => Number(text));
    expect(low).toBeLessThan(8.3443);
    expect(high).toBeGreaterThan(8.344);
  });

  it("says that it is out of reach, and how far was looked", () => {
    const { headline, lead } = search(creepFeed, "base[0].rate", [2e-5, 1e-3], "no-stick-slip");
    expect(headline).toBe("Out of reach: the carriage sticks and slips at every feed looked at.");
    expect(lead).toEqual([
      "From steady sliding it slides without sticking all along.",
      "Looked at from 20\u00a0μm/s to 1\u00a0mm/s. Beyond that nothing is said.",
    ]);
  });

  it("says what is so everywhere", () => {
    expect(search(creepFeed, "base[0].rate", [0.02, 0.05], "no-stick-slip").headline).toBe(
      "The carriage slides without sticking at every feed looked at.",
    );
  });

  it("says the largest value allowed rounded down", () => {
    const sliding = variant({ base: [{ kind: "ramp", rate: 0.012, start: 0, stop: "none" }] });
    const { headline } = search(sliding, "contact.law.static", [0.12, 0.4], "no-stick-slip");
    expect(headline).toMatch(/^The carriage slides without sticking up to 0\.\d+ of static friction\.$/);
  });
});

describe("what can be asked about", () => {
  it("calls things as a sentence does, the feed first", () => {
    const names = exploreFields(creepFeed).map(({ name }) => name);
    expect(names).toContain("static friction");
    expect(names).toContain("preload");
    expect(likeliestField(exploreFields(creepFeed))?.name).toBe("feed");
    expect(names).not.toContain("most events");
  });

  it("looks two decades around a value, from nothing where it is nothing, and within 1 for a friction", () => {
    const around = (path: string, scenario = creepFeed) => rangeAround(exploreField(scenario, path)!, scenario);
    expect(around("body.inertia")).toEqual({ low: 1.2, high: 12_000 });
    expect(around("contact.law.static")).toEqual({ low: 0.01, high: 1 });
    const undamped = variant({ body: { ...creepFeed.body, viscous: 0 } });
    expect(around("body.viscous", undamped)).toEqual({ low: 0, high: 2 * Math.sqrt(4e6 * 120) });
    const back = variant({ base: [{ kind: "ramp", rate: -0.02, start: 0, stop: "none" }] });
    expect(around("base[0].rate", back)).toEqual({ low: -2, high: -0.0002 });
  });

  it("rounds to the side that is safe, also below zero, and leaves what is round", () => {
    expect(roundedTo(8.34422, 4, "up")).toBe(8.345);
    expect(roundedTo(8.34422, 4, "down")).toBe(8.344);
    expect(roundedTo(-8.34422, 4, "up")).toBe(-8.344);
    expect(roundedTo(8.345, 4, "up")).toBe(8.345);
  });
});
