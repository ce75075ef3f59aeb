import type { Outcome, Scenario, Target } from "@restband/solver";
import { quantityNamed } from "../../../format/quantities.ts";

/** Something a search can look for, as a sentence asks it and as an answer says it. */
export interface TargetChoice {
  readonly key: string;
  /** After "From which feed on": "does it slide smoothly". */
  readonly ask: string;
  /** "slides smoothly": what it does where the target is met. */
  readonly met: string;
  /** What it does where it is not. */
  readonly unmet: string;
  /** The same as `met` in a word, where that would be long. */
  readonly short?: string;
  readonly target: Target;
}

const outcome = (key: string, ask: string, met: string, unmet: string, outcomes: Outcome[]): TargetChoice => ({
  key,
  ask,
  met,
  unmet,
  target: { kind: "outcome", outcomes, isWanted: true },
});

const outcomes: readonly TargetChoice[] = [
  {
    key: "no-stick-slip",
    ask: "does it slide without sticking",
    met: "slides without sticking",
    unmet: "sticks and slips",
    short: "slides",
    target: { kind: "outcome", outcomes: ["stick-slip"], isWanted: false },
  },
  outcome("smooth", "does it slide smoothly", "slides smoothly", "does not slide smoothly", ["smooth-sliding"]),
  outcome("rests", "does it come to rest", "comes to rest", "does not come to rest", ["came-to-rest", "never-moved"]),
  outcome("holds", "does it never move", "never moves", "moves", ["never-moved"]),
  {
    key: "no-growth",
    ask: "does the motion not grow",
    met: "does not grow",
    unmet: "grows",
    target: { kind: "outcome", outcomes: ["growing"], isWanted: false },
  },
];

/** All that can be asked of a scenario: its outcomes, each of its limits, all of them together. */
export function targetChoices({ limits }: Scenario): TargetChoice[] {
  const each = limits.map(({ quantity }, limit): TargetChoice => {
    const name = (quantityNamed(quantity)?.label ?? quantity).toLowerCase();
    return {
      key: `limit ${limit}`,
      ask: `is the limit of the ${name} kept`,
      met: `keeps the limit of the ${name}`,
      unmet: `breaks the limit of the ${name}`,
      target: { kind: "limit", limit },
    };
  });
  const all: TargetChoice = {
    key: "limits",
    ask: "are all limits kept",
    met: "keeps all limits",
    unmet: "breaks a limit",
    target: { kind: "limits" },
  };
  return [...outcomes, ...each, ...(limits.length > 1 ? [all] : [])];
}
