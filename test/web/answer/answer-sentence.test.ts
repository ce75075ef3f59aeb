import type { Outcome, Result, Scenario } from "@restband/solver";
import { describe, expect, it } from "vitest";
import { answerSentence, shortAnswer } from "../../../web/src/features/answer/answer-sentence.ts";
import { leadLine, limitsLine } from "../../../web/src/features/answer/lead-line.ts";
import { buildScenario, coulombForces } from "../../support/scenario-builder.ts";
import { creepFeed, solved, variant } from "../support/scenarios.ts";

const plain = (text: string): string => text.replaceAll("\u00a0", " ");
const sentenceOf = ({ scenario, result }: { scenario: Scenario; result: Result }): string => {
  const { before, verdict, after } = answerSentence(scenario, result);
  return plain(before + verdict + after);
};
const leadOf = ({ scenario, result }: { scenario: Scenario; result: Result }): string =>
  plain(leadLine(scenario, result));

/** A result made up for outcomes that take long to reach by a run. */
const madeUp = (scenario: Scenario, change: Partial<Result>): { scenario: Scenario; result: Result } => ({
  scenario,
  result: { ...solved(scenario, 0).result, limits: [], ...change },
});

describe("the answer to runs of the solver", () => {
  it("a creep feed that sticks and slips", () => {
    const run = solved(creepFeed);
    expect(sentenceOf(run)).toBe("The carriage sticks and slips, 26 times a second.");
    expect(leadOf(run)).toBe(
      "It stands still 37 % of the time, then slips 77.4 μm at up to 5.3 mm/s. The limit is broken.",
    );
    expect(plain(shortAnswer(answerSentence(run.scenario, run.result)).verdict)).toBe("Sticks and slips");
  });

  it("the same feed, fast enough to slide", () => {
    const span = { ...creepFeed.span, seconds: 10 };
    const run = solved(variant({ base: [{ kind: "ramp", rate: 0.02, start: 0, stop: "none" }], limits: [], span }));
    expect(sentenceOf(run)).toBe("The carriage slides smoothly at 20 mm/s.");
    // μk N/k = 237.216/4·10⁶ m
    expect(leadOf(run)).toMatch(/^On average it is 59\.3 μm behind the drive; its speed varies by/);
  });

  // A block of 0.5 kg on a spring of 245 N/m, friction 0.4903325 N, released at 30 mm: seven half cycles, rest near −2 mm
  // (the case with T 0.28 s of checks on free vibration with dry friction).
  it("a released block that comes to rest", () => {
    const run = solved({
      body: { inertia: 0.5, stiffness: 245 },
      contact: coulombForces(0.49),
      initial: { displacement: 0.03 },
      span: { seconds: 10 },
    });
    expect(sentenceOf(run)).toBe("The body comes to rest after 0.993 s, 2 mm off its equilibrium.");
    expect(leadOf(run)).toBe("It stands at −2 mm after seven swings, where friction can hold it within ±2 mm.");
  });

  it("a braked rotor without a spring", () => {
    const run = solved({
      motion: "angular",
      body: { inertia: 1.6, stiffness: 0 },
      contact: {
        law: { model: "coulomb", static: 0.35, kinetic: 0.3 },
        normal: { preload: 900, faces: 2 },
        radius: 0.12,
      },
      initial: { velocity: 75.4 },
      span: { seconds: 5 },
    });
    // ω0 J / (μk N r) = 75.4 · 1.6 / 64.8 = 1.86173 s; half of ω0 times that, 70.187 rad.
    expect(sentenceOf(run)).toBe("The rotor comes to rest after 1.86 s, at 70.2 rad.");
    expect(leadOf(run)).toBe("That is 70.2 rad, 11.2 turns from where it began.");
  });

  it("a clamp that holds", () => {
    const run = solved({
      body: { inertia: 8, stiffness: 2e5 },
      contact: coulombForces(480, 600),
      force: [{ kind: "harmonic", amplitude: 320, hz: 12 }],
      span: { seconds: 1, untilRest: false },
    });
    expect(sentenceOf(run)).toBe("The body never moves; it uses 53 % of its static friction.");
    expect(leadOf(run)).toBe("Friction could hold 1.88 times as much.");
  });

  it("a body on a belt", () => {
    const run = solved({
      body: { inertia: 4, stiffness: 900, viscous: 2 },
      contact: {
        law: { model: "coulomb", static: 0.4, kinetic: 0.3 },
        normal: { weight: true },
        counterface: { velocity: 0.05 },
      },
      span: { seconds: 3 },
    });
    expect(sentenceOf(run)).toBe("The body sticks and slips, 2.16 times a second.");
    expect(leadOf(run)).toMatch(/^It is carried along 35 % of the time, then slips 23\.2 mm/);
  });

  it("a forced body that never sticks", () => {
    const run = solved({
      body: { inertia: 1, stiffness: 400, viscous: 4 },
      contact: coulombForces(0.5),
      force: [{ kind: "harmonic", amplitude: 40, hz: 3 }],
      span: { seconds: 20, untilRest: false },
    });
    expect(sentenceOf(run)).toMatch(/^The body swings without sticking by ±\d+(\.\d+)? mm\.$/);
  });

  it("a forced body that stops twice a cycle", () => {
    // r 0.5, β 0.8: two stops a cycle.
    const run = solved({
      body: { inertia: 1, stiffness: 400 },
      contact: coulombForces(8),
      force: [{ kind: "harmonic", amplitude: 10, hz: 10 / (2 * Math.PI) }],
      span: { seconds: 40, untilRest: false },
    });
    expect(sentenceOf(run)).toBe("The body sticks and slips, twice a cycle.");
  });

  it("a run that is too short, with the time at which it goes on", () => {
    const run = solved({
      body: { inertia: 1, stiffness: 100 },
      contact: coulombForces(5),
      base: [{ kind: "ramp", rate: 0.001 }],
      span: { seconds: 10, untilRest: false },
    });
    expect(sentenceOf(run)).toBe("The run is too short to tell: the body stands at its end, but not for good.");
    // 5 N = 100 N/m · 1 mm/s · t
    expect(leadOf(run)).toBe("It breaks away next at 50 s; the run ends at 10 s.");
  });

  it("a run cut off by its events", () => {
    const run = solved(variant({ span: { ...creepFeed.span, maxEvents: 4 } }));
    expect(sentenceOf(run)).toMatch(
      /^There is no answer: the run was cut off after four events, at 0\.1 s of 0\.5 s\.$/,
    );
    expect(leadOf(run)).toBe("The limit is not to be judged.");
  });
});

describe("the answer to a move of the base", () => {
  const move = (distance: number, start = 0) =>
    ({ kind: "move", distance, speed: 1e-3, acceleration: 1, start }) as const;
  // μs N/k = 5 N / 1·10⁶ N/m = 5 μm: as far as the base can go before the body follows.
  const held = {
    body: { inertia: 2, stiffness: 1e6 },
    contact: coulombForces(5),
    span: { seconds: 2, untilRest: true },
  };

  it("too short for the body to follow", () => {
    const run = solved({ ...held, base: [move(3.1e-6)] });
    expect(sentenceOf(run)).toBe("The body never moves; it uses 62 % of its static friction.");
  });

  // It starts on the edge of the rest band, slides from the first instant, and each ramp of speed lasts one natural period:
  // d comes back to −μs N/k with ḋ = 0 at the end of both, and the body stops there, 0.2 + 0.02 + 0.2 s after the start.
  it("that ends short by μs N/k", () => {
    const [period, cruise, acceleration] = [0.2, 0.02, 0.5];
    const inertia = 120;
    const stiffness = inertia * ((2 * Math.PI) / period) ** 2;
    const speed = acceleration * period;
    const distance = speed * (period + cruise);
    const run = solved({
      body: { inertia, stiffness },
      contact: coulombForces(3.1e-6 * stiffness),
      base: [{ kind: "move", distance, speed, acceleration, start: 0 }],
      initial: { displacement: -3.1e-6 },
      span: { seconds: 2, untilRest: true },
    });
    expect(sentenceOf(run)).toBe("The body comes to rest 3.1 μm short of its target after 0.42 s.");
  });

  it("and back: what is lost is the way already held and μs N/k", () => {
    const run = solved({ ...held, base: [move(7e-6 - 5e-6), move(-1e-4, 1)], settleBand: 1e-5 });
    expect(leadOf(run)).toMatch(/ It loses 7 μm at the reversal\.$/);
    expect(leadOf(run)).toMatch(/ It is within ±10 μm of its target (as soon as|[\d.]+ m?s after) the move ends\./);
  });

  it.each<[number, number, string]>([
    [1e-4, -3.1e-6, "The body comes to rest 3.1 μm short of its target after 0.42 s."],
    [1e-4, 3.1e-6, "The body comes to rest 3.1 μm past its target after 0.42 s."],
    [-1e-4, 3.1e-6, "The body comes to rest 3.1 μm short of its target after 0.42 s."],
    [-1e-4, -3.1e-6, "The body comes to rest 3.1 μm past its target after 0.42 s."],
    [1e-4, 1e-17, "The body comes to rest at its target after 0.42 s."],
  ])("of %d m that ends at d = %d m", (distance, settleOffset, text) => {
    const { scenario } = solved({ ...held, base: [move(-distance), move(distance, 0.2)] }, 0);
    const quantities = { restTime: 0.42, restOffset: settleOffset, settleOffset, lostMotion: 1.2e-5 };
    const run = madeUp(scenario, { outcome: "came-to-rest", quantities });
    expect(sentenceOf(run)).toBe(text);
    expect(leadOf(run)).toBe("It loses 12 μm at the reversal.");
  });
});

describe("a body that never moves", () => {
  it.each<[number | null, string]>([
    [0.62, "The body never moves; it uses 62 % of its static friction."],
    [0.99996, "The body never moves; it uses 99.996 % of its static friction."],
    [1, "The body never moves; it uses 100 % of its static friction."],
    [0, "The body never moves; it uses none of its static friction."],
    [null, "The body never moves."],
  ])("with %d of its hold in use", (holdUse, text) => {
    const still = buildScenario({ body: { inertia: 1, stiffness: 1 }, span: { seconds: 1 } });
    const run = madeUp(still, { outcome: "never-moved", quantities: { holdUse } });
    expect(sentenceOf(run)).toBe(text);
  });
});

describe("outcomes that take long to reach", () => {
  it.each<[Outcome, Partial<Result["quantities"]>, string]>([
    [
      "growing",
      { amplitude: 0.25 },
      "The motion grows without a limit in sight. | By the end of the run it swings by ±250 mm.",
    ],
    [
      "not-settled",
      { amplitude: 0.002 },
      "The motion has not settled by the end of the run, at 0.5 s. | It then swings by ±2 mm. Follow it for longer.",
    ],
    [
      "settles",
      {},
      "The carriage settles without a stop. | It comes ever closer to rest and is never held by friction.",
    ],
  ])("%s", (outcome, quantities, text) => {
    const run = madeUp(creepFeed, { outcome, quantities: quantities as Result["quantities"] });
    expect(`${sentenceOf(run)} | ${leadOf(run)}`).toBe(text);
  });

  it("less often than once a second is said by its period", () => {
    const run = madeUp(creepFeed, { outcome: "stick-slip", quantities: { stickSlipHz: 0.25 } });
    expect(sentenceOf(run)).toBe("The carriage sticks and slips, once every 4 s.");
  });

  it.each<[Result["ended"], string]>([
    ["cancelled", "There is no answer: the run was cancelled at 0.5 s of 0.5 s."],
    ["max-work", "There is no answer: the run was cut off after 2·10⁷ steps of work, at 0.5 s of 0.5 s."],
  ])("ended by %s", (ended, text) => expect(sentenceOf(madeUp(creepFeed, { outcome: null, ended }))).toBe(text));
});

describe("every outcome is said whatever quantities are missing", () => {
  const outcomes: (Outcome | null)[] = [
    "never-moved",
    "came-to-rest",
    "too-short",
    "growing",
    "stick-slip",
    "settles",
    "not-settled",
    "smooth-sliding",
    null,
  ];
  it.each(outcomes)("%s", (outcome) => {
    for (const scenario of [
      creepFeed,
      buildScenario({ motion: "angular", body: { inertia: 1, stiffness: 0 }, span: { seconds: 1 } }),
    ]) {
      const run = madeUp(scenario, { outcome, quantities: {} });
      expect(sentenceOf(run)).toMatch(/^[A-Z].*\.$/);
      expect(`${sentenceOf(run)} ${leadOf(run)}`).not.toMatch(/null|NaN|undefined| \.|,\./);
    }
  });
});

describe("the limits in one sentence", () => {
  const limit = (kept: boolean | null) => ({ quantity: "peakVelocity", max: 1, value: 1, kept, margin: 0 });
  const ranged = variant({ origins: { "contact.law.static": { kind: "catalogue", low: 0.12, high: 0.18 } } });

  it.each([
    [[], ""],
    [[true], "The limit is kept."],
    [[true, true], "Both limits are kept."],
    [[false, true, true, false], "Two of four limits are broken."],
    [[false, true], "One of two limits is broken."],
    [[false, false], "Both limits are broken."],
    [[null, true], "One of two limits is not to be judged."],
    [[null, false], "One of two limits is broken."],
  ] as [(boolean | null)[], string][])("%o", (kept, text) => expect(limitsLine(creepFeed, kept.map(limit))).toBe(text));

  it("says that ranges have not been gone through", () => {
    expect(limitsLine(ranged, [limit(true)])).toBe("The limit is kept, as entered only.");
  });
});
