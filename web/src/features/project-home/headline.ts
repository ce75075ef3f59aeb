import type { RevisionState } from "@restband/api/contract";
import type { LimitVerdict } from "@restband/solver";
import { capitalised, listed, sayCount, sayMany } from "../../format/words.ts";

/** How a scenario stands against its limits; `unjudged` where at least one cannot be judged and none is broken. */
export type Standing = "broken" | "unjudged" | "kept" | "no-limits";

export function standingOf(limits: readonly LimitVerdict[]): Standing {
  if (limits.length === 0) return "no-limits";
  if (limits.some(({ kept }) => kept === false)) return "broken";
  return limits.every(({ kept }) => kept) ? "kept" : "unjudged";
}

/** "2 of 4 limits broken", "1 limit kept", "no limits set". */
export function limitsWords(limits: readonly LimitVerdict[]): string {
  const of = (count: number) => `${count} of ${limits.length} limits`;
  const all = limits.length === 1 ? "1 limit" : `${limits.length} limits`;
  const broken = limits.filter(({ kept }) => kept === false).length;
  const unjudged = limits.filter(({ kept }) => kept === null).length;
  if (limits.length === 0) return "no limits set";
  if (broken > 0) return `${broken === limits.length ? all : of(broken)} broken`;
  if (unjudged > 0) return `${unjudged === limits.length ? all : of(unjudged)} cannot be judged`;
  return `${all} kept`;
}

/** How many scenarios stand so in a review, by their newest revision. */
export interface InReview {
  readonly waiting: number;
  readonly returned: number;
}

/** By the states of the newest revisions. */
export const inReview = (states: readonly RevisionState[]): InReview => ({
  waiting: states.filter((state) => state === "in-review").length,
  returned: states.filter((state) => state === "returned").length,
});

/**
 * The project in a sentence or two. What has not been computed yet is not counted, and the sentence says so.
 *
 * @param count all scenarios of the project
 * @param standings those computed so far
 */
export function headline(count: number, standings: readonly Standing[], reviews: InReview): string {
  if (count === 0) return "No scenario yet.";
  const isWhole = standings.length === count;
  const review = reviewed(reviews, count);
  const verdict = isWhole ? wholeVerdict(standings) : partialVerdict(standings, count);
  // A count of what is computed so far speaks of the verdict alone.
  const sentences = isWhole ? [listed([...verdict, ...review])] : [...verdict, listed(review)];
  const told = [sayMany(count, "scenario"), ...sentences].filter((sentence) => sentence !== "");
  return told.map((sentence) => `${capitalised(sentence)}.`).join(" ");
}

function reviewed({ waiting, returned }: InReview, count: number): string[] {
  return [
    waiting > 0 ? `${who(waiting, count)} ${waiting === 1 ? "waits" : "wait"} for a decision` : "",
    returned > 0 ? `${who(returned, count)} ${returned === 1 ? "was" : "were"} returned` : "",
  ].filter((part) => part !== "");
}

function partialVerdict(standings: readonly Standing[], count: number): string[] {
  const broken = breaking(standings, count);
  return broken === "" ? [] : [`${broken}, of ${sayCount(standings.length)} computed so far`];
}

const numberOf = (standing: Standing, standings: readonly Standing[]): number =>
  standings.filter((each) => each === standing).length;

/** "it" or "all" where it is true of every scenario, else how many. */
function who(number: number, count: number): string {
  if (number < count) return sayCount(number);
  return count === 1 ? "it" : "all";
}

function breaking(standings: readonly Standing[], count: number): string {
  const broken = numberOf("broken", standings);
  if (broken === 0) return "";
  return `${who(broken, count)} ${broken === 1 ? "breaks its" : "break their"} limits`;
}

/** Faults first; without any, what is kept. */
function wholeVerdict(standings: readonly Standing[]): string[] {
  const count = standings.length;
  const unjudged = numberOf("unjudged", standings);
  const doubt = unjudged > 0 ? `${who(unjudged, count)} cannot be judged` : "";
  const faults = [breaking(standings, count), doubt].filter(Boolean);
  const kept = numberOf("kept", standings);
  if (faults.length > 0 || kept === 0) return faults;
  if (kept < count) return ["none breaks its limits"];
  return [`${who(kept, count)} ${kept === 1 ? "keeps its" : "keep their"} limits`];
}
