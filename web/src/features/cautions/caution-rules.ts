import type { Result, Scenario } from "@restband/solver";

/** Which cautions a run calls for. */
export interface CautionRules {
  /** Friction must not be what holds: people can get hurt. */
  readonly holding: boolean;
  /** It stands and breaks away again: standing time can make the first jump larger. */
  readonly dwell: boolean;
}

/** The rules by which a caution is shown; `result` null while there is none. */
export function cautionRules(scenario: Scenario, result: Result | null): CautionRules {
  return {
    holding: isHeld(scenario, result),
    dwell: scenario.contact.law.model !== "none" && breaksAwayAgain(result),
  };
}

function isHeld(scenario: Scenario, result: Result | null): boolean {
  if (scenario.purpose === "holding" || scenario.purpose === "braking") return true;
  if (!result) return false;
  const rests = result.outcome === "never-moved" || result.outcome === "came-to-rest";
  if (result.outcome === "growing") return true;
  return rests && (scenario.incline !== 0 || result.limits.some(({ kept }) => kept === true));
}

const breaksAwayAgain = (result: Result | null): boolean =>
  result?.events.some(({ kind, t }) => kind === "break-away" && t > 0) ?? false;
