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

/**
 * The project in a sentence or two. What has not been computed yet is not counted, and the sentence says so.
 *
 * @param count all scenarios of the project
 * @param standings those computed so far
 */
export function headline(count: number, standings: readonly Standing[]): string {
  if (count === 0) return "No scenario yet.";
  const opening = `${capitalised(sayMany(count, "scenario"))}.`;
  const isWhole = standings.length === count;
  const verdict = isWhole ? wholeVerdict(standings) : breaking(standings, count);
  if (verdict === "") return opening;
  return `${opening} ${capitalised(verdict)}${isWhole ? "" : `, of ${sayCount(standings.length)} computed so far`}.`;
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
function wholeVerdict(standings: readonly Standing[]): string {
  const count = standings.length;
  const unjudged = numberOf("unjudged", standings);
  const doubt = unjudged > 0 ? `${who(unjudged, count)} cannot be judged` : "";
  const faults = listed([breaking(standings, count), doubt].filter(Boolean));
  const kept = numberOf("kept", standings);
  if (faults !== "" || kept === 0) return faults;
  return kept < count
    ? "none breaks its limits"
    : `${who(kept, count)} ${kept === 1 ? "keeps its" : "keep their"} limits`;
}
