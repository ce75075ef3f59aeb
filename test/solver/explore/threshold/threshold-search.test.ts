import {
  answerAll,
  thresholdSearch,
  type RunFigures,
  type RunReply,
  type Scenario,
  type Threshold,
  type ThresholdEnd,
  type ThresholdQuestion,
} from "@restband/solver";
import { describe, expect, it } from "vitest";
import { buildScenario } from "../../../support/scenario-builder.ts";

const search = (question: ThresholdQuestion): Threshold => answerAll(thresholdSearch(question));

/** 2 kg on 800 N/m, released; friction holds 2 N and takes 1.5 N: the rest band is ±2.5 mm. */
const released = (limits: Scenario["limits"]): Scenario =>
  buildScenario({
    body: { inertia: 2, stiffness: 800 },
    contact: { law: { model: "coulomb", static: 0.2, kinetic: 0.15 }, normal: { preload: 10 } },
    initial: { displacement: 0.02 },
    span: { seconds: 20 },
    limits,
  });

const outcomeOf = (end: ThresholdEnd | undefined) => (end && "outcome" in end.reply ? end.reply.outcome : null);

describe("a search over a limit", () => {
  const narrow = released([{ quantity: "restBand", max: 0.002 }]);

  it("brackets the value by two neighbours of five digits, both run", () => {
    const found = search({
      scenario: narrow,
      path: "body.stiffness",
      low: 100,
      high: 5000,
      target: { kind: "limit", limit: 0 },
    });
    // x_b = μs N/k = 2 N/k is 2 mm at 1000 N/m
    expect(found.answer?.below).toMatchObject({ value: 999.9, isMet: false });
    expect(found.answer?.above).toMatchObject({ value: 1000, isMet: true });
    expect(found).toMatchObject({ safeSide: "above", dependsOnStart: false, outOfReach: null, label: "Stiffness" });
    expect(found.answer?.above.scenario?.body.stiffness).toBe(1000);
  });

  it("keeps the ratio of the friction coefficients unless told otherwise", () => {
    const question = {
      scenario: narrow,
      path: "contact.law.static",
      low: 0.01,
      high: 0.3,
      target: { kind: "limits" },
    } as const;
    const found = search(question);
    expect(found.answer?.below.value).toBeCloseTo(0.16, 4);
    expect(found.answer?.below.scenario?.contact.law).toMatchObject({ static: found.answer?.below.value });
    const law = found.answer?.below.scenario?.contact.law as { static: number; kinetic: number };
    expect(law.kinetic / law.static).toBeCloseTo(0.75, 12);
    expect(found.safeSide).toBe("below");
    // alone, static friction cannot be below the kinetic 0.15: such values are not run, and do not count as met
    const alone = search({ ...question, low: 0.1, high: 0.2, links: {} });
    expect(alone.searches[0].low).toMatchObject({ isMet: null, scenario: null });
    expect(alone.searches[0].flips).toHaveLength(2);
    expect(alone.answer).toBeNull();
  });

  it("finds and tells several flips", () => {
    // From x₀ the body rests on the side of (−1)ⁿ, n = ⌊x₀/2x_k⌋, 2x_k = 2 Fk/k = 3.75 mm: the side changes at its multiples.
    const scenario = released([{ quantity: "restOffset", min: 0 }]);
    const found = search({
      scenario,
      path: "initial.displacement",
      low: 0.001,
      high: 0.016,
      target: { kind: "limit", limit: 0 },
    });
    const { flips } = found.searches[0];
    expect(flips).toHaveLength(4);
    [0.00375, 0.0075, 0.01125, 0.015].forEach((value, i) => {
      expect(flips[i].below.value).toBeLessThanOrEqual(value * (1 + 1e-9));
      expect(flips[i].above.value).toBeGreaterThanOrEqual(value * (1 - 1e-9));
      expect(flips[i].above.value - flips[i].below.value).toBeLessThanOrEqual(1e-4 * value);
    });
    expect(found.answer).toEqual(flips[3]);
  });

  it("says where it is out of reach", () => {
    const within = { path: "body.stiffness", low: 2000, high: 5000, target: { kind: "limit", limit: 0 } } as const;
    expect(search({ scenario: narrow, ...within })).toMatchObject({ answer: null, outOfReach: "met-everywhere" });
    expect(search({ scenario: narrow, ...within, low: 100, high: 900 })).toMatchObject({ outOfReach: "met-nowhere" });
  });

  it("searches whole numbers as whole numbers", () => {
    const found = search({
      scenario: narrow,
      path: "contact.normal.faces",
      low: 1,
      high: 40,
      target: { kind: "limit", limit: 0 },
    });
    expect(found.outOfReach).toBe("met-nowhere");
    const wide = released([{ quantity: "restBand", max: 0.008 }]);
    const faces = search({
      scenario: wide,
      path: "contact.normal.faces",
      low: 1,
      high: 40,
      target: { kind: "limit", limit: 0 },
    });
    expect([faces.answer?.below.value, faces.answer?.above.value]).toEqual([3, 4]);
  });

  it("refuses a field the scenario does not have, and a range without values", () => {
    const question = { scenario: narrow, low: 1, high: 2, target: { kind: "limits" } } as const;
    expect(() => search({ ...question, path: "contact.law.velocity" })).toThrow(/no number called/);
    expect(() => search({ ...question, path: "body.stiffness", low: 2 })).toThrow(/from 2 to 2/);
  });
});

/*
 * The lowest feed without stick–slip, damper beside the spring: exact roots of "a slip never regains the feed", in units
 * ΔF/√(km); recomputed by an event solver of another hand.
 */
const criticalFeeds = [
  [0.001, 8.89327],
  [0.005, 3.93019],
  [0.01, 2.73924],
  [0.02, 1.88328],
  [0.05, 1.09809],
  [0.1, 0.680218],
  [0.2, 0.366974],
] as const;

describe("the lowest feed without stick-slip", () => {
  const noStickSlip = { kind: "outcome", outcomes: ["stick-slip"], isWanted: false } as const;
  const fed = (ratio: number, rate: number): Scenario =>
    buildScenario({
      body: { inertia: 1, stiffness: 100, viscous: 20 * ratio },
      contact: { law: { model: "coulomb", static: 1, kinetic: 0.5 }, normal: { preload: 20 } },
      base: [{ kind: "ramp", rate }],
      span: { seconds: 1, untilRest: false },
    });

  it.each(criticalFeeds)(
    "ζ %d: %d, to 1e-4, either way, from a millionth of it on",
    { timeout: 30_000 },
    (ratio, feed) => {
      for (const sign of [1, -1]) {
        const ends = [sign * 1e-6 * feed, sign * 3 * feed].sort((a, b) => a - b);
        const found = search({
          scenario: fed(ratio, sign),
          path: "base[0].rate",
          low: ends[0],
          high: ends[1],
          target: noStickSlip,
        });
        expect(found.safeSide).toBe(sign > 0 ? "above" : "below");
        const { answer } = found;
        const [sticks, slides] = sign > 0 ? [answer?.below, answer?.above] : [answer?.above, answer?.below];
        expect(outcomeOf(sticks)).toBe("stick-slip");
        expect(outcomeOf(slides)).toMatch(/^(?:smooth-sliding|not-settled)$/);
        for (const end of [sticks, slides])
          expect(Math.abs(sign * (end?.value ?? NaN) - feed)).toBeLessThanOrEqual(1e-4 * feed);
        // steady sliding is stable at every feed: who starts there never sticks
        expect(found.dependsOnStart).toBe(true);
        expect(found.searches.find(({ start }) => start === "steady-sliding")?.flips).toEqual([]);
        expect(found.analytic.map(({ key }) => key)).toEqual(["critical-feed-exact"]);
        expect(found.analytic[0].value * sign).toBeCloseTo(feed, 5);
        expect(Math.abs(found.analytic[0].difference ?? NaN)).toBeLessThan(1e-4);
      }
    },
  );
});

describe("the largest friction without stops under a harmonic force", () => {
  /* β = F/P by r = Ω/ω after Den Hartog's S and U, recomputed by a hand that is not this solver's. */
  it.each([
    [0.7, 0.722071],
    [0.8, 0.817406],
    [1.25, 0.698821],
    [2, 0.596285],
  ])("r %d: β %d", { timeout: 30_000 }, (r, beta) => {
    const scenario = buildScenario({
      body: { inertia: 1, stiffness: 1 },
      contact: { law: { model: "coulomb", static: 0.4, kinetic: 0.4 }, normal: { preload: 1 } },
      force: [{ kind: "harmonic", amplitude: 1, hz: r / (2 * Math.PI) }],
      span: { seconds: (100 * 2 * Math.PI) / r, untilRest: false },
    });
    const found = search({
      scenario,
      path: "contact.law.kinetic",
      low: 0.3,
      high: 0.95,
      points: 14,
      target: { kind: "outcome", outcomes: ["stick-slip"], isWanted: false },
    });
    expect(found).toMatchObject({ safeSide: "below", dependsOnStart: false });
    for (const end of [found.answer?.below, found.answer?.above])
      expect(Math.abs((end?.value ?? NaN) / beta - 1)).toBeLessThan(1e-4);
    expect(found.analytic.map(({ key }) => key)).toEqual(["no-stop-limit"]);
    expect(found.analytic[0].value).toBeCloseTo(beta, 5);
  });
});

describe("a belt that slides or sticks, as the start has it", () => {
  /*
   * ẍ = −x − 0.1 ẋ + μ(V − ẋ), μ = 0.5 + 0.5 exp(−|v|/0.5): parameters after Stender, Hoffmann & Papangelo 2020. Steady sliding is
   * stable from V = ½ ln 10; stick-slip ends at its fold, 1.836600 (recomputed by an event solver of another hand).
   */
  it("comes to both ends of the range between", { timeout: 60_000 }, () => {
    const scenario = buildScenario({
      body: { inertia: 1, stiffness: 1, viscous: 0.1 },
      contact: {
        law: { model: "stribeck", static: 1, kinetic: 0.5, velocity: 0.5, exponent: 1 },
        normal: { preload: 1 },
        counterface: { velocity: 1.5 },
      },
      span: { seconds: 400, untilRest: false },
    });
    const found = search({
      scenario,
      path: "contact.counterface.velocity",
      low: 1,
      high: 2.2,
      points: 9,
      target: { kind: "outcome", outcomes: ["stick-slip"], isWanted: false },
    });
    const flips = Object.fromEntries(found.searches.map((one) => [one.start, one.flips]));
    expect(flips["steady-sliding"].map(({ below, above }) => [below.value, above.value])).toEqual([[1.1512, 1.1513]]);
    expect(flips.rest).toHaveLength(1);
    expect(Math.abs(flips.rest[0].below.value / 1.8366 - 1)).toBeLessThan(1e-4);
    expect(Math.abs(flips.rest[0].above.value / 1.8366 - 1)).toBeLessThan(1e-4);
    expect(found).toMatchObject({ safeSide: "above", dependsOnStart: true, answer: flips.rest[0] });
    expect(found.analytic).toMatchObject([{ key: "linear-stability", start: "steady-sliding" }]);
    expect(found.analytic[0].value).toBeCloseTo(Math.log(10) / 2, 12);
  });
});

describe("a run that is too short", () => {
  const tooShort: RunFigures = { outcome: "too-short", ended: "time", limits: [], quantities: {}, nextBreakAway: 50 };
  const target = { kind: "outcome", outcomes: ["stick-slip"], isWanted: false } as const;
  const question = {
    scenario: released([]),
    path: "initial.displacement",
    low: 1,
    high: 2,
    points: 3,
    target,
  } as const;

  it("is made longer, past the break-away to come, and only then judged", () => {
    const asked: number[] = [];
    const searching = thresholdSearch(question);
    let step = searching.next();
    while (!step.done) {
      const replies: RunReply[] = step.value.runs.map(({ scenario: { span } }) => {
        asked.push(span.seconds);
        return span.seconds < 300 ? tooShort : { ...tooShort, outcome: "smooth-sliding", nextBreakAway: null };
      });
      step = searching.next(replies);
    }
    expect(asked).toEqual([20, 20, 20, 200, 200, 200, 400, 400, 400]);
    expect(step.value.outOfReach).toBe("met-everywhere");
  });

  it("is not judged where it stays too short", () => {
    const searching = thresholdSearch(question);
    let step = searching.next();
    while (!step.done) step = searching.next(step.value.runs.map(() => tooShort));
    expect(step.value.searches[0].low).toMatchObject({
      isMet: null,
      reply: { reason: expect.stringMatching(/too short/) as string },
    });
  });
});
