import type { LimitVerdict } from "@restband/solver";
import { capitalised, sayCount, sayMany } from "../../format/words.ts";

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
  const judged = standings.length;
  if (judged === 0) return opening;
  const broken = standings.filter((standing) => standing === "broken").length;
  const withLimits = standings.filter((standing) => standing !== "no-limits").length;
  if (judged < count && broken === 0) return opening;
  const verdict = verdictWords(broken, withLimits, judged === count && standings.every((s) => s === "kept"));
  if (verdict === "") return opening;
  const sofar = judged < count ? `, of ${sayCount(judged)} computed so far` : "";
  return `${opening} ${capitalised(verdict)}${sofar}.`;
}

function verdictWords(broken: number, withLimits: number, allKept: boolean): string {
  if (broken === 1) return "one breaks its limits";
  if (broken > 1) return `${sayCount(broken)} break their limits`;
  if (allKept) return withLimits === 1 ? "it keeps its limits" : "all keep their limits";
  return withLimits > 0 ? "none breaks its limits" : "";
}
