import fc from "fast-check";
import { agreementOf, simulate, type MotionEvent, type Result, type Scenario } from "@restband/solver";
import { expect, test } from "vitest";
import { hardScenario } from "../../support/hard-scenario.ts";
import { propertyRuns, propertyTimeout } from "../../support/property-runs.ts";
import { disagreement } from "../../support/disagreement.ts";
import { delayed, moved } from "../../support/transformed.ts";

/** What deviations are told as shares of. */
const peaks = ["slipVelocityPeak", "peakVelocity", "peakDisplacement", "followingErrorPeak", "driveForcePeak"];

/** A linear run to its end, and the state at one instant. */
function run(scenario: Scenario, at: number[] = []): Result {
  const result = simulate(scenario, { samples: 200, quantities: peaks, energy: false, at });
  if ("error" in result) throw new Error(result.error.message);
  return { ...result, outcome: null };
}

/** The scenario from the instant t of its run on: the state there is its start, and all inputs come earlier by t. */
function rest(scenario: Scenario, t: number, at: NonNullable<Result["at"]>): Scenario {
  return {
    ...delayed(scenario, -t),
    initial: { displacement: at.x[0], velocity: at.v[0] },
    span: { ...scenario.span, seconds: scenario.span.seconds - t },
  };
}

/** What the two parts tell as one run. */
function joined(first: Result, t: number, second: Result): Result {
  const isInner = ({ kind }: MotionEvent) => kind !== "start";
  const after = second.events.filter(isInner).map((event) => ({ ...event, t: event.t + t }));
  return { ...first, ended: second.ended, events: [...first.events.filter((event) => event.t <= t), ...after] };
}

/** Whether an instant may be cut: not next to an event, where rounding tells on which side it lies. */
function isFree(result: Result, t: number, seconds: number): boolean {
  return result.events.every((event) => Math.abs(event.t - t) > 1e-6 * seconds);
}

/** Without friction a motion may graze v_r = 0 for ever, or die away below its rounding: when it turns there is rounding. */
const slidesFreely = ({ contact: { law } }: Scenario): boolean =>
  law.model === "none" || (law.model === "coulomb" && law.kinetic === 0);

/** With μs = μk a body that is fed slides on after each stick with a v_r that comes down to 0 once a period, and no further. */
const grazesForEver = ({ contact: { law, counterface }, base }: Scenario): boolean =>
  law.model === "coulomb" && law.static === law.kinetic && (typeof counterface === "object" || base.length > 0);

/** Where belt and base have one speed, the last digit tells whether the spring's own element holds too. */
const mayRunAlong = ({ solid, contact, base }: Scenario): boolean =>
  solid.model === "displacement-proportional" && typeof contact.counterface === "object" && base.length > 0;

test(
  "a run cut in two at any instant and taken up again goes on as if it had not been cut",
  () => {
    let [compared, sensitive] = [0, 0];
    const share = fc.double({ min: 0.02, max: 0.98, noNaN: true });
    fc.assert(
      fc.property(hardScenario, share, (drawn, part) => {
        fc.pre(!slidesFreely(drawn) && !grazesForEver(drawn) && !mayRunAlong(drawn));
        const scenario = { ...drawn, span: { ...drawn.span, untilRest: false } };
        const t = part * scenario.span.seconds;
        const whole = run(scenario, [t]);
        // a body carried by its base starts on it only where both velocities round alike
        const isCarried = whole.at!.phase[0] === 0 && scenario.contact.counterface === "base";
        fc.pre(whole.ended === "time" && isFree(whole, t, scenario.span.seconds) && !isCarried);
        const second = run(rest(scenario, t, whole.at!));
        // a motion that has died away into its own rounding has nothing left to go on with
        const [left, most] = [second, whole].map(({ quantities }) => quantities.slipVelocityPeak!);
        fc.pre(left === 0 || left > 1e-9 * most);
        const parts = joined(whole, t, second);
        const found = agreementOf(whole, parts, (sign) => run(moved(scenario, sign * 1e-12)));
        compared++;
        if (found.verdict === "sensitive") sensitive++;
        expect(disagreement(found)).toBeNull();
      }),
      // a fourth of the others: what follows a last stick is looked far ahead for, which is slow
      { ...propertyRuns, numRuns: Math.ceil(propertyRuns.numRuns / 4) },
    );
    expect(sensitive).toBeLessThan(0.02 * compared);
  },
  propertyTimeout,
);
