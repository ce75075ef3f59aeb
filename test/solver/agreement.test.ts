import type { Result } from "@restband/solver";
import { agreementOf } from "@restband/solver";
import { describe, expect, test } from "vitest";
import { run } from "../support/run.ts";
import { coulombForces } from "../support/scenario-builder.ts";

/** A free body that rests at −5 mm after five half cycles, from 105 mm or a given share more. */
const released = (share = 0): Result =>
  run({
    body: { inertia: 1, stiffness: 100 },
    contact: coulombForces(1, 1.5),
    initial: { displacement: 0.105 * (1 + share) },
    span: { seconds: 10 },
    limits: [{ quantity: "halfCycles", max: 5 }],
  });
const result = released();

/** The same with one quantity moved. */
const moved = (name: string, by: number, more: Partial<Result> = {}): Result => ({
  ...result,
  ...more,
  quantities: { ...result.quantities, [name]: result.quantities[name]! + by },
});

describe("two results of one scenario", () => {
  test("agree where they are the same", () => {
    const agreement = agreementOf(result, released());
    expect(agreement).toMatchObject({ verdict: "agrees", allowed: 1e-9, differences: [] });
    for (const { absolute, relative } of agreement.deviations) expect([absolute, relative]).toEqual([0, 0]);
  });

  test("agree within 1e-9 of the run's peak in the unit, not of the value itself", () => {
    // the mean is 2 mm, the largest displacement 105 mm
    expect(agreementOf(result, moved("meanDisplacement", 1.0e-10)).verdict).toBe("agrees");
    const agreement = agreementOf(result, moved("meanDisplacement", 1.1e-10));
    expect(agreement.verdict).toBe("differs");
    expect(agreement.deviations[0].what).toBe("meanDisplacement");
    expect(agreement.deviations[0].absolute).toBeCloseTo(1.1e-10, 16);
    expect(agreement.deviations[0].relative).toBeCloseTo(1.1e-10 / 0.105, 16);
  });

  test("agree within 1e-6 where one is adaptive", () => {
    const adaptive = (by: number) => agreementOf(result, moved("peakVelocity", by, { method: "adaptive" }));
    expect(adaptive(0.9e-6)).toMatchObject({ verdict: "agrees", allowed: 1e-6 });
    expect(adaptive(1.1e-6).verdict).toBe("differs");
  });

  test("measure what has no unit by itself or by 1, not by the largest count", () => {
    expect(agreementOf(result, moved("stickFraction", 2e-9)).verdict).toBe("differs");
  });

  test("differ by the event that is furthest apart", () => {
    const events = result.events.map((event, i) => (i === 3 ? { ...event, x: event.x + 1e-6 } : event));
    const { verdict, deviations } = agreementOf(result, { ...result, events });
    expect(verdict).toBe("differs");
    expect(deviations[0]).toMatchObject({ what: "x", event: 3, values: [result.events[3].x, events[3].x] });
  });

  test.each<[string, Partial<Result>, string]>([
    ["end", { ended: "time" }, "One run ended by rest, the other by time."],
    ["outcome", { outcome: "settles" }, "The outcomes are came-to-rest and settles."],
    ["verdicts", { limits: [{ ...result.limits[0], kept: false }] }, "The verdicts on the limits differ."],
    ["events", { events: result.events.slice(1) }, "The events differ: 8 and 7."],
    ["values", { quantities: { ...result.quantities, restTime: null } }, "Time to rest has a value in one run only."],
  ])("differ where %s are not the same", (_what, more, sentence) => {
    expect(agreementOf(result, { ...result, ...more })).toMatchObject({ verdict: "differs", differences: [sentence] });
  });
});

describe("a run that hangs on the last digits", () => {
  test("is sensitive where inputs moved by 1e-12 move it as much", () => {
    const other = released(1e-6);
    expect(agreementOf(result, other, (sign) => released(sign * 1e-12)).verdict).toBe("differs");
    const sensitive = agreementOf(result, other, (sign) => released(sign * 2e-6));
    expect(sensitive.verdict).toBe("sensitive");
    expect(sensitive.moved!.deviations[0].relative).toBeGreaterThan(sensitive.deviations[0].relative);
  });

  test("is sensitive where they change what happens, too", () => {
    // from 115 mm on it takes a sixth half cycle
    const [below, above] = [released(0.0952), released(0.0953)];
    expect(below.events.length).toBeLessThan(above.events.length);
    expect(agreementOf(below, above, () => above).verdict).toBe("sensitive");
    expect(agreementOf(below, above, () => below).verdict).toBe("differs");
  });

  test("is not run again where the two agree", () => {
    const never = () => {
      throw new Error("run again");
    };
    expect(agreementOf(result, released(), never).verdict).toBe("agrees");
  });
});
