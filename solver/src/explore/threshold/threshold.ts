import type { Dimension } from "../../field.ts";
import type { Outcome } from "../../result.ts";
import type { Scenario } from "../../scenario/scenario.ts";
import type { RunReply } from "../asking.ts";
import type { Links } from "../links.ts";

/**
 * What is to be so. An outcome search is met where the outcome is (or is not) one of those named; a limit search where the
 * limit at that place of the scenario is kept. Where base or belt runs past the body, `stick-slip` takes `growing` along: a
 * swing that grows there is stick–slip to come.
 */
export type Target =
  | { readonly kind: "outcome"; readonly outcomes: readonly Outcome[]; readonly isWanted: boolean }
  | { readonly kind: "limit"; readonly limit: number }
  | { readonly kind: "limits" };

/** From which value of a field on a target is met. */
export interface ThresholdQuestion {
  readonly scenario: Scenario;
  readonly path: string;
  /** Where to search, SI, low < high. */
  readonly low: number;
  readonly high: number;
  readonly target: Target;
  /** What follows the field; the default links where left out. */
  readonly links?: Links;
  /** Values of the coarse scan, spread by equal ratios where both ends have one sign and are decades apart; default 24. */
  readonly points?: number;
}

/** Where a search starts its runs: as the scenario says; stuck on the counterface; sliding steadily on it but for a trifle. */
export type StartKind = "scenario" | "rest" | "steady-sliding";

/** One end of a bracket: a value that was run, as it stands here to the last digit. */
export interface ThresholdEnd {
  readonly value: number;
  /** Null where the run cannot be judged: then `reply` says why. */
  readonly isMet: boolean | null;
  readonly reply: RunReply;
  /** What was run, as it was run: start and span included. Null where the values cannot stand together. */
  readonly scenario: Scenario | null;
}

/** Two neighbouring values on either side of a change, at most 1e-4 apart, relative. */
export interface Flip {
  readonly below: ThresholdEnd;
  readonly above: ThresholdEnd;
}

/** What was found from one start. */
export interface StartedSearch {
  readonly start: StartKind;
  /** All flips found, by rising value. Between values of the coarse scan others may lie unseen. */
  readonly flips: readonly Flip[];
  /** The ends of the range as run. */
  readonly low: ThresholdEnd;
  readonly high: ThresholdEnd;
}

/** What a formula says of the same threshold. */
export interface AnalyticThreshold {
  readonly key: string;
  readonly label: string;
  readonly formula: string;
  readonly source: string;
  /** The value of the field, SI. */
  readonly value: number;
  /** (answer − value)/|value|; null without an answer. */
  readonly difference: number | null;
  /** The start whose flip it speaks of; its difference is taken to that flip. */
  readonly start: StartKind;
}

export interface Threshold {
  readonly path: string;
  readonly label: string;
  readonly dimension: Dimension;
  readonly searches: readonly StartedSearch[];
  /**
   * The flip that is safe from every start: where the target is met at the high end, the highest; else, where it is met at
   * the low end, the lowest. Null where nothing flips, and where it is met at neither end.
   */
  readonly answer: Flip | null;
  /** The end of `answer` at which the target is met: `above` answers "the lowest", `below` "the highest". */
  readonly safeSide: "above" | "below" | null;
  /** True where the starts do not agree on the answer: within the values between, it depends on how the motion begins. */
  readonly dependsOnStart: boolean;
  /** No flip in the range: met at every value run, or at none. Null where there is one. */
  readonly outOfReach: "met-everywhere" | "met-nowhere" | null;
  readonly analytic: readonly AnalyticThreshold[];
}
