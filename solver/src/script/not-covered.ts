import type { Result } from "../result.ts";
import type { Scenario } from "../scenario/scenario.ts";
import { isLawWritten } from "./law-part.ts";
import { isWritten } from "./term-parts.ts";

/**
 * Why there is no Python file for a scenario, as a sentence for people; null where there is one. `ended` is how the run came
 * to its end: one that was cut off has no motion to compare.
 */
export function pythonGap(scenario: Scenario, ended: Result["ended"]): string | null {
  const { contact, force, base } = scenario;
  if (ended !== "rest" && ended !== "time")
    return "The run was cut off before its end, so there is no whole motion to check.";
  if (!isLawWritten(contact.law.model)) return "Its friction law is not written out as a Python file.";
  const terms = [...force, ...base];
  if (!terms.every(({ kind }) => isWritten(kind))) return "One of the inputs is not written out as a Python file.";
  if (terms.some((term) => "digest" in term)) return "The points of one of its records are not at hand.";
  return null;
}
