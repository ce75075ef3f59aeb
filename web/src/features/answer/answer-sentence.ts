import type { Outcome, Result, Scenario } from "@restband/solver";
import { formatNumber } from "../../format/format-number.ts";
import { say, sayUse } from "../../format/format-quantity.ts";
import { nounOf } from "../../format/noun.ts";
import { sayMany } from "../../format/words.ts";
import { lastTravel } from "./last-travel.ts";
import { readingOf, type ResultReading } from "./result-reading.ts";

/** The answer in one sentence, its verdict apart so that it can be underlined: `before` + `verdict` + `after`. */
export interface AnswerSentence {
  readonly before: string;
  readonly verdict: string;
  readonly after: string;
  /** Null where the run was cut off and there is no verdict. */
  readonly outcome: Outcome | null;
}

/** One true sentence for what a run came to. It says nothing that the quantities do not. */
export function answerSentence(scenario: Scenario, result: Result): AnswerSentence {
  const reading = readingOf(scenario, result);
  const parts = result.outcome === null ? cutOff(reading) : sentences[result.outcome](reading);
  return { ...parts, outcome: result.outcome };
}

/** The sentence without its subject, for rows: "Sticks and slips, 26 times a second." */
export function shortAnswer({ verdict, after }: AnswerSentence): { verdict: string; after: string } {
  return { verdict: verdict.charAt(0).toUpperCase() + verdict.slice(1), after };
}

type Parts = Omit<AnswerSentence, "outcome">;

const theBody = ({ scenario }: ResultReading): string => `The ${nounOf(scenario)} `;

const sentences: Record<Outcome, (reading: ResultReading) => Parts> = {
  "never-moved": (reading) => ({ before: theBody(reading), verdict: "never moves", after: `${holdInUse(reading)}.` }),
  "came-to-rest": (reading) => {
    const place = offTarget(reading);
    const after = place === null ? afterTime(reading) + offCentre(reading) : place + afterTime(reading);
    return { before: theBody(reading), verdict: "comes to rest", after: `${after}.` };
  },
  "too-short": (reading) => ({
    before: "The run is ",
    verdict: "too short to tell",
    after: `: the ${nounOf(reading.scenario)} stands at its end, but not for good.`,
  }),
  growing: () => ({ before: "The motion ", verdict: "grows", after: " without a limit in sight." }),
  "stick-slip": (reading) => ({
    before: theBody(reading),
    verdict: "sticks and slips",
    after: `${howOften(reading)}.`,
  }),
  settles: (reading) => ({ before: theBody(reading), verdict: "settles", after: " without a stop." }),
  "not-settled": (reading) => ({
    before: "The motion ",
    verdict: "has not settled",
    after: ` by the end of the run, at ${say(reading.end, reading.measure("time"))}.`,
  }),
  "smooth-sliding": smooth,
};

function holdInUse({ value }: ResultReading): string {
  const use = value("holdUse");
  if (use === null) return "";
  return `; it uses ${use > 0 ? sayUse(use) : "none"} of its static friction`;
}

/** Where a move of the base has left it, against where the base has gone; null without a move. */
function offTarget({ scenario, value, measure }: ResultReading): string | null {
  const offset = value("settleOffset");
  const travel = offset === null ? null : lastTravel(scenario);
  if (offset === null || travel === null || travel === 0) return null;
  if (Math.abs(offset) <= ROUNDING * Math.abs(travel)) return " at its target";
  const side = offset * travel < 0 ? "short of" : "past";
  return ` ${say(Math.abs(offset), measure("displacement"))} ${side} its target`;
}

/** Share of a move below which an offset is the noise of its sums. */
const ROUNDING = 1e-12;

function afterTime({ value, measure }: ResultReading): string {
  const time = value("restTime");
  if (time === null) return "";
  return time === 0 ? " at once" : ` after ${say(time, measure("time"))}`;
}

/** Where it rests, against where the spring alone would leave it; without a spring, against the zero of x. */
function offCentre({ value, measure, scenario }: ResultReading): string {
  const offset = value("restOffset");
  const place = value("restDisplacement");
  const displacement = measure("displacement");
  if (offset !== null)
    return offset === 0 ? ", at its equilibrium" : `, ${say(Math.abs(offset), displacement)} off its equilibrium`;
  return place === null || scenario.body.stiffness > 0 ? "" : `, at ${say(place, displacement)}`;
}

function howOften({ value, measure }: ResultReading): string {
  const perCycle = value("sticksPerCycle");
  if (perCycle !== null) return perCycle > 0 ? `, ${times(perCycle)} a cycle` : "";
  const hz = value("stickSlipHz");
  if (hz === null || hz === 0) return "";
  return hz >= 1 ? `, ${times(hz)} a second` : `, once every ${say(1 / hz, measure("time"))}`;
}

/** "once", "twice", "26 times": a whole number where it is one to a tenth of a percent. */
function times(count: number): string {
  const whole = Math.round(count);
  const isWhole = Math.abs(count - whole) <= 1e-3 * count;
  if (isWhole && whole === 1) return "once";
  if (isWhole && whole === 2) return "twice";
  return `${formatNumber(isWhole ? whole : count, count >= 10 ? 2 : 3)} times`;
}

function smooth(reading: ResultReading): Parts {
  const { scenario, drive, value, measure } = reading;
  const before = theBody(reading);
  if (drive.kind === "feed")
    return { before, verdict: "slides smoothly", after: ` at ${say(Math.abs(drive.speed), measure("velocity"))}.` };
  if (drive.kind === "belt")
    return {
      before,
      verdict: "slides smoothly",
      after: ` on its counterface, at ${say(Math.abs(drive.speed), measure("velocity"))}.`,
    };
  const amplitude = value("amplitude");
  const swing = amplitude === null ? "" : ` by ±${say(amplitude, measure("displacement"))}`;
  const verdict = scenario.contact.law.model === "none" ? "swings freely" : "swings without sticking";
  return { before, verdict, after: `${swing}.` };
}

function cutOff({ result, scenario, end, measure }: ResultReading): Parts {
  const at = ` at ${say(end, measure("time"))} of ${say(scenario.span.seconds, measure("time"))}`;
  const events = result.events.length > 0 ? sayMany(scenario.span.maxEvents, "event") : "";
  const why: Partial<Record<Result["ended"], string>> = {
    "max-events": `: the run was cut off after ${events || "its last allowed event"},${at}.`,
    "max-work": `: the run was cut off after ${formatNumber(scenario.span.maxWork)} steps of work,${at}.`,
    cancelled: `: the run was cancelled${at}.`,
  };
  return { before: "There is ", verdict: "no answer", after: why[result.ended] ?? `: the run ended${at}.` };
}
