import type { StartKind } from "@restband/solver";
import { unitFor } from "../../../format/units.ts";
import { say } from "../../../format/format-quantity.ts";
import { capitalised, listed, sayMany } from "../../../format/words.ts";
import type { ExploreField } from "../explore-field.ts";
import { sayTowards } from "../say-value.ts";
import type { EndReading, FlipReading, ThresholdReading } from "./threshold-reading.ts";

/** The answer of a search: a headline, and what stands behind it. */
export interface ThresholdWords {
  readonly headline: string;
  readonly lead: readonly string[];
}

const startWords: Record<StartKind, string> = {
  scenario: "as the scenario starts",
  rest: "from rest",
  "steady-sliding": "from steady sliding",
};

export function sayThreshold(reading: ThresholdReading, field: ExploreField, body: string): ThresholdWords {
  const { answer, safeSide, outOfReach, target } = reading;
  if (outOfReach)
    return { headline: everywhereWords(reading, field, body, outOfReach), lead: [searched(reading, field)] };
  if (reading.searches.every(({ flips }) => flips.length === 0)) return startDecides(reading, field, body);
  if (!answer || !safeSide) return { headline: noSafeSide(reading, field, body), lead: bracketLines(reading, field) };
  const value = safeValue(answer, safeSide, field);
  const reach = safeSide === "above" ? `from ${value} of ${field.name} on` : `up to ${value} of ${field.name}`;
  return {
    headline: `${capitalised(body)} ${reading.target.met} ${reach}.`,
    lead: [bracketWords(answer, field, target), ...manyFlips(reading, field), ...startLines(reading, field)],
  };
}

/** What is said to be safe: rounded to the side that is. */
export function safeValue(flip: FlipReading, side: "above" | "below", { measure }: ExploreField): string {
  return side === "above" ? sayTowards(flip.above.value, measure, "up") : sayTowards(flip.below.value, measure, "down");
}

/** "8.3444 mm/s still sticks and slips, 8.3449 mm/s slides." Both ends were run as they stand. */
export function bracketWords({ below, above }: FlipReading, { measure }: ExploreField, target: TargetWords): string {
  const unit = unitFor(above.value, measure);
  const low = sayTowards(below.value, measure, "down", { digits: 5, unit });
  const high = sayTowards(above.value, measure, "up", { digits: 5, unit });
  return `${low} still ${endWords(below, target)}, ${high} ${endWords(above, target)}.`;
}

type TargetWords = Pick<ThresholdReading["target"], "met" | "unmet" | "short">;

const endWords = ({ isMet, reason }: EndReading, { met, unmet, short }: TargetWords): string =>
  isMet === null ? `cannot be judged (${reason ?? "cut off"})` : isMet ? (short ?? met) : unmet;

function everywhereWords(
  { target }: ThresholdReading,
  field: ExploreField,
  body: string,
  where: "met-everywhere" | "met-nowhere",
): string {
  return where === "met-everywhere"
    ? `${capitalised(body)} ${target.met} at every ${field.name} looked at.`
    : `Out of reach: ${body} ${target.unmet} at every ${field.name} looked at.`;
}

/** Nothing changes over the range, but the starts differ: the way the scenario starts is the answer, the others beside it. */
function startDecides(reading: ThresholdReading, field: ExploreField, body: string): ThresholdWords {
  const { searches, target } = reading;
  const isMet = searches[0].low.isMet === true;
  const others = searches.filter(({ low }) => (low.isMet === true) !== isMet).map(({ start }) => startWords[start]);
  return {
    headline: everywhereWords(reading, field, body, isMet ? "met-everywhere" : "met-nowhere"),
    lead: [
      `${capitalised(listed(others))} it ${isMet ? target.unmet : target.met} all along.`,
      searched(reading, field),
    ],
  };
}

const searched = ({ low, high }: ThresholdReading, { measure }: ExploreField): string =>
  `Looked at from ${say(low, measure)} to ${say(high, measure)}. Beyond that nothing is said.`;

const noSafeSide = ({ target }: ThresholdReading, field: ExploreField, body: string): string =>
  `${capitalised(body)} ${target.met} only between two values of ${field.name}, not at either end.`;

function bracketLines({ searches, target }: ThresholdReading, field: ExploreField): string[] {
  const most = searches.reduce((a, b) => (b.flips.length > a.flips.length ? b : a), searches[0]);
  return (most?.flips ?? []).map((flip) => bracketWords(flip, field, target));
}

/** More than one change in the range is told: between them the answer is not the whole truth. */
function manyFlips({ searches, answer }: ThresholdReading, field: ExploreField): string[] {
  const most = searches.reduce((a, b) => (b.flips.length > a.flips.length ? b : a), searches[0]);
  if (!most || most.flips.length < 2) return [];
  const others = most.flips.filter(({ above }) => above.value !== answer?.above.value);
  const values = others.map(({ above }) => say(above.value, field.measure, { digits: 4 }));
  return [`It changes ${sayMany(others.length, "more time")} in the range, at ${listed(values)}.`];
}

/** Where starts disagree each is told; the answer is the safe one. */
function startLines({ dependsOnStart, searches }: ThresholdReading, field: ExploreField): string[] {
  if (!dependsOnStart) return [];
  const told = searches.map(({ start, flips }) => {
    const values = flips.map(({ above }) => say(above.value, field.measure, { digits: 4 }));
    return `${startWords[start]} ${values.length === 0 ? "nothing changes" : `at ${listed(values)}`}`;
  });
  return [`It depends on how the motion begins: ${listed(told)}. The answer is the one that is safe from every start.`];
}
