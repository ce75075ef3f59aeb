import type { ScenarioSummary } from "@restband/api/contract";
import type { Outcome } from "@restband/solver";
import { outcomeWords } from "../../format/outcomes.ts";
import type { Glance } from "./glances/glance-book.ts";
import { standingOf, type Standing } from "./headline.ts";
import { needsAnswers, type View } from "./view.ts";

/** What is known of a scenario's answer: nothing while it has not been computed. */
export interface Known {
  readonly outcome: Outcome | null;
  readonly standing: Standing;
  readonly broken: number;
}

/** A scenario that this version cannot compute, or whose run failed, keeps no limit and breaks none. */
export function knownOf(glance: Glance | undefined): Known | null {
  if (!glance) return null;
  const { computed } = glance;
  if (!computed) return { outcome: null, standing: "unjudged", broken: 0 };
  if ("refusal" in computed) {
    return { outcome: null, standing: computed.scenario.limits.length > 0 ? "unjudged" : "no-limits", broken: 0 };
  }
  const { outcome, limits } = computed.result;
  return { outcome, standing: standingOf(limits), broken: limits.filter(({ kept }) => kept === false).length };
}

export interface Arranged {
  readonly rows: readonly ScenarioSummary[];
  /** How many candidates wait for their answer where it decides: to be shown, or to be put in order. */
  readonly waiting: number;
}

/** The scenarios that a view shows or may show: all that can be told without their answers. */
export function candidatesOf(scenarios: readonly ScenarioSummary[], view: View): ScenarioSummary[] {
  const words = fold(view.search).split(/\s+/);
  return scenarios.filter(({ title, updatedBy, archivedAt }) => {
    if ((archivedAt !== null) !== view.isArchived) return false;
    if (view.author !== "" && updatedBy.accountId !== view.author) return false;
    const folded = fold(title);
    return words.every((word) => folded.includes(word));
  });
}

/**
 * Those of the candidates that a view shows, in its order. An order by answers is taken up once all of them are there:
 * until then rows keep their place, last touched first.
 */
export function arrange(
  candidates: readonly ScenarioSummary[],
  view: View,
  known: (digest: string) => Known | null,
): Arranged {
  const waiting = needsAnswers(view) ? candidates.filter(({ digest }) => !known(digest)).length : 0;
  const rows = candidates.filter(({ digest }) => fits(known(digest), view));
  return { rows: rows.sort(comparison(waiting > 0 ? "touched" : view.order, known)), waiting };
}

/** "Träger" is found by "trager" and by "TRÄGER". */
const fold = (text: string): string => text.normalize("NFD").replace(/\p{M}/gu, "").toLowerCase();

function fits(known: Known | null, { outcome, limits }: View): boolean {
  if (outcome === "" && limits === "") return true;
  if (!known) return false;
  return (outcome === "" || (known.outcome ?? "none") === outcome) && (limits === "" || known.standing === limits);
}

type Comparison = (a: ScenarioSummary, b: ScenarioSummary) => number;

const titles = new Intl.Collator("en", { numeric: true, sensitivity: "base" });
const byTitle: Comparison = (a, b) => titles.compare(a.title, b.title);
const byTouch: Comparison = (a, b) =>
  a.updatedAt === b.updatedAt ? byTitle(a, b) : a.updatedAt < b.updatedAt ? 1 : -1;

const outcomeRank = Object.keys(outcomeWords);
const standingRank: readonly Standing[] = ["broken", "unjudged", "kept", "no-limits"];
const LAST = 100;

function comparison(order: View["order"], known: (digest: string) => Known | null): Comparison {
  if (order === "touched") return byTouch;
  if (order === "title") return byTitle;
  const rank = order === "outcome" ? rankOfOutcome : rankOfLimits;
  return (a, b) => rank(known(a.digest)) - rank(known(b.digest)) || byTouch(a, b);
}

function rankOfOutcome(known: Known | null): number {
  if (!known) return LAST;
  return known.outcome === null ? LAST - 1 : outcomeRank.indexOf(known.outcome);
}

/** The more limits broken, the further ahead. */
function rankOfLimits(known: Known | null): number {
  return known ? standingRank.indexOf(known.standing) + 1 / (1 + known.broken) : LAST;
}
