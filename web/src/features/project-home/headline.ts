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
  const of = (standing: Standing) => standings.filter((each) => each === standing).length;
  const isWhole = standings.length === count;
  const faults = listed([breaking(of("broken")), isWhole ? unjudged(of("unjudged")) : ""].filter(Boolean));
  if (faults && !isWhole) return `${opening} ${capitalised(faults)}, of ${sayCount(standings.length)} computed so far.`;
  const verdict = faults || (isWhole ? keeping(of("kept"), count) : "");
  return verdict ? `${opening} ${capitalised(verdict)}.` : opening;
}

function breaking(count: number): string {
  if (count === 0) return "";
  return count === 1 ? "one breaks its limits" : `${sayCount(count)} break their limits`;
}

const unjudged = (count: number): string => (count === 0 ? "" : `${sayCount(count)} cannot be judged`);

/** Where none is broken and none in doubt. */
function keeping(kept: number, count: number): string {
  if (kept === 0) return "";
  if (kept < count) return "none breaks its limits";
  return count === 1 ? "it keeps its limits" : "all keep their limits";
}
