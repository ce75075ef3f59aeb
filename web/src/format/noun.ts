import type { Scenario } from "@restband/solver";

/** What the body is called in sentences. */
export function nounOf({ motion, purpose }: Pick<Scenario, "motion" | "purpose">): string {
  if (motion === "angular") return "rotor";
  return purpose === "feed" ? "carriage" : "body";
}
