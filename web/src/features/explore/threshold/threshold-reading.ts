import type {
  AnalyticThreshold,
  Flip,
  Outcome,
  RunReply,
  StartKind,
  StartedSearch,
  Threshold,
  ThresholdEnd,
} from "@restband/solver";
import type { StoredExploration } from "@restband/api/contract";
import type { ExplorationDraft } from "../../../api/explorations.ts";
import type { TargetChoice } from "./targets.ts";

/** A value that was run, as far as it is kept with an answer. */
export interface EndReading {
  readonly value: number;
  readonly isMet: boolean | null;
  readonly outcome: Outcome | null;
  /** Why there is no outcome. */
  readonly reason: string | null;
}

export interface FlipReading {
  readonly below: EndReading;
  readonly above: EndReading;
}

/** A finished search as it is shown and kept: without the scenarios that were run. */
export interface ThresholdReading {
  readonly path: string;
  readonly low: number;
  readonly high: number;
  readonly target: Pick<TargetChoice, "key" | "ask" | "met" | "unmet" | "short">;
  readonly searches: readonly {
    readonly start: StartKind;
    readonly flips: readonly FlipReading[];
    readonly low: EndReading;
    readonly high: EndReading;
  }[];
  readonly answer: FlipReading | null;
  readonly safeSide: "above" | "below" | null;
  readonly dependsOnStart: boolean;
  readonly outOfReach: "met-everywhere" | "met-nowhere" | null;
  readonly analytic: readonly AnalyticThreshold[];
}

export function readThreshold(
  threshold: Threshold,
  { low, high, choice }: { low: number; high: number; choice: TargetChoice },
): ThresholdReading {
  const { path, answer, safeSide, dependsOnStart, outOfReach, analytic } = threshold;
  const { key, ask, met, unmet, short } = choice;
  return {
    path,
    low,
    high,
    target: { key, ask, met, unmet, short },
    searches: threshold.searches.map(searchReading),
    answer: answer && flipReading(answer),
    safeSide,
    dependsOnStart,
    outOfReach,
    analytic,
  };
}

const searchReading = ({ start, flips, low, high }: StartedSearch) => ({
  start,
  flips: flips.map(flipReading),
  low: endReading(low),
  high: endReading(high),
});

export const flipReading = ({ below, above }: Flip): FlipReading => ({
  below: endReading(below),
  above: endReading(above),
});

const endReading = ({ value, isMet, reply }: ThresholdEnd): EndReading => ({ value, isMet, ...outcomeOf(reply) });

function outcomeOf(reply: RunReply): { outcome: Outcome | null; reason: string | null } {
  if ("reason" in reply) return { outcome: null, reason: reply.reason };
  return { outcome: reply.outcome, reason: reply.outcome === null ? `The run ended by ${reply.ended}.` : null };
}

/** A finished search for the server to keep. */
export const searchToKeep = (
  reading: ThresholdReading,
  words: { headline: string },
  about: { title: string; scenarioVersion: number; solverVersion: string },
): ExplorationDraft => ({
  kind: "search",
  ...about,
  plan: { path: reading.path, low: reading.low, high: reading.high, target: reading.target.key },
  tileCells: [],
  cellValues: 1,
  conclusion: { headline: words.headline.slice(0, 400), answer: { reading } },
});

/** What the server kept of one. */
export const storedReading = ({ answer }: StoredExploration): ThresholdReading | null =>
  (answer as { reading?: ThresholdReading } | null)?.reading ?? null;
