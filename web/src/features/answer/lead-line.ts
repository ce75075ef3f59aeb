import type { LimitVerdict, Outcome, Result, Scenario } from "@restband/solver";
import { formatNumber } from "../../format/format-number.ts";
import { say, sayShare } from "../../format/format-quantity.ts";
import type { Measure } from "../../format/unit.ts";
import { capitalised, sayMany } from "../../format/words.ts";
import { some } from "./range-words.ts";
import { readingOf, type ResultReading } from "./result-reading.ts";

/** The line under the answer: what the motion is like, then what became of the limits; over the ranges once they are run. */
export function leadLine(scenario: Scenario, result: Result, overRanges: string | null = null): string {
  const reading = readingOf(scenario, result);
  const motion = result.outcome === null ? [] : [motionLines[result.outcome](reading), ...moveLines(reading)];
  return [...motion, overRanges ?? limitsLine(scenario, result.limits)].filter(Boolean).join(" ");
}

const motionLines: Record<Outcome, (reading: ResultReading) => string> = {
  "never-moved": holding,
  "came-to-rest": resting,
  "too-short": nextBreakAway,
  growing: (reading) => swingLine(reading, "By the end of the run it swings by ±"),
  "stick-slip": sticking,
  settles: ({ value, measure, scenario }) => {
    const place = value("meanDisplacement");
    return scenario.body.stiffness > 0 || place === null
      ? "It comes ever closer to rest and is never held by friction."
      : `It comes ever closer to rest, on average at ${say(place, measure("displacement"))}.`;
  },
  "not-settled": (reading) => `${swingLine(reading, "It then swings by ±")} Follow it for longer.`.trim(),
  "smooth-sliding": sliding,
};

function holding({ value }: ResultReading): string {
  const use = value("holdUse");
  return use === null || use === 0 ? "" : `Friction could hold ${formatNumber(1 / use)} times as much.`;
}

/** What became of a move of the base: how soon it settles, and what is lost where it turns back. */
function moveLines({ scenario: { settleBand }, value, measure }: ResultReading): string[] {
  const [settled, lost] = [value("settleTime"), value("lostMotion")];
  const within = `within ±${say(settleBand ?? 0, measure("displacement"))} of its target`;
  return [
    settled === null
      ? ""
      : `It is ${within} ${settled === 0 ? "as soon as the move ends" : `${say(settled, measure("time"))} after the move ends`}.`,
    lost === null ? "" : `It loses ${say(lost, measure("displacement"))} at the reversal.`,
  ];
}

function resting({ scenario, value, measure }: ResultReading): string {
  if (scenario.body.stiffness === 0) return wayTravelled(scenario, value("restDisplacement"), measure("displacement"));

  const swings = value("halfCycles");
  const band = value("restBand");
  const place = value("restDisplacement");
  const count = swings === null ? "" : `after ${sayMany(swings, "swing")}`;
  const at = place === null ? "" : `It stands at ${say(place, measure("displacement"))} ${count}`.trim();
  const within = band === null ? "" : `, where friction can hold it within ±${say(band, measure("displacement"))}`;
  return at === "" ? "" : `${at}${within}.`;
}

/** Without a spring there is no place to come back to: what counts is how far it went. */
function wayTravelled({ motion, initial }: Scenario, place: number | null, measure: Measure): string {
  if (place === null) return "";
  const way = Math.abs(place - initial.displacement);
  const turns = motion === "angular" ? `, ${formatNumber(way / (2 * Math.PI))} turns` : "";
  return `That is ${say(way, measure)}${turns} from where it began.`;
}

function nextBreakAway({ result, measure, scenario }: ResultReading): string {
  const note = result.notes.find(({ code }) => code === "next-break-away");
  if (note?.t === undefined) return "";
  return `It breaks away next at ${say(note.t, measure("time"), { digits: 4 })}; the run ends at ${say(scenario.span.seconds, measure("time"))}.`;
}

/** Whole cycles only, so that the figure does not hang on where the window was cut. */
function sticking({ value, measure, drive }: ResultReading): string {
  const share = value("cycleStickFraction") ?? value("stickFraction");
  const jump = value("slipDistance");
  const peak = value("slipVelocityPeak");
  const stands = drive.kind === "belt" ? "It is carried along" : "It stands still";
  const stuck = share === null ? "" : `${stands} ${sayShare(share, 2)} of the time`;
  const jumps = jump === null ? "" : `then slips ${say(jump, measure("displacement"))}`;
  const fast = peak === null ? "" : `at up to ${say(peak, measure("velocity"), { digits: 2 })}`;
  const line = [stuck, [jumps, fast].filter(Boolean).join(" ")].filter(Boolean).join(", ");
  return line === "" ? "" : `${line}.`;
}

function sliding({ value, measure, drive }: ResultReading): string {
  if (drive.kind === "feed") {
    const behind = value("meanDisplacement");
    const ripple = value("velocityRipple");
    const lag =
      behind === null
        ? ""
        : `On average it is ${say(Math.abs(behind), measure("displacement"))} ${behind * drive.speed <= 0 ? "behind" : "ahead of"} the drive`;
    const even = ripple === null ? "" : `its speed varies by ${sayShare(ripple, 2)}`;
    return sentenceOf([lag, even]);
  }
  const place = value("meanDisplacement");
  const peak = value("peakVelocity");
  const isCentred = Math.abs(place ?? 0) < 0.01 * (value("amplitude") ?? 0);
  const at = place === null || isCentred ? "" : `On average it is at ${say(place, measure("displacement"))}`;
  return sentenceOf([at, peak === null ? "" : `its peak velocity is ${say(peak, measure("velocity"))}`]);
}

function swingLine({ value, measure }: ResultReading, words: string): string {
  const amplitude = value("amplitude");
  return amplitude === null ? "" : `${words}${say(amplitude, measure("displacement"))}.`;
}

const sentenceOf = (parts: string[]): string => {
  const said = parts.filter(Boolean);
  return said.length === 0 ? "" : `${capitalised(said.join("; "))}.`;
};

/** "Two of four limits are broken." A limit that cannot be judged is not kept; ranges not yet run are said so. */
export function limitsLine(scenario: Scenario, limits: readonly LimitVerdict[]): string {
  if (limits.length === 0) return "";
  const asEntered = hasRanges(scenario) ? ", as entered only" : "";
  const broken = limits.filter(({ kept }) => kept === false).length;
  const open = limits.filter(({ kept }) => kept === null).length;
  if (broken > 0) return `${some(broken, limits.length)} broken${asEntered}.`;
  if (open > 0) return `${some(open, limits.length)} not to be judged${asEntered}.`;
  return `${some(limits.length, limits.length)} kept${asEntered}.`;
}

/** Whether a value is known only as a range, which this run has not gone through. */
export const hasRanges = ({ origins }: Scenario): boolean =>
  Object.values(origins).some(({ low, high }) => low !== undefined || high !== undefined);
