import { checkScenario, type Checked } from "@restband/solver";

/** Reads one scenario from JSON; or every reason why it cannot be taken. */
export function readScenario(text: string): Checked {
  if (text.trim() === "") return refused("There is nothing here yet.");
  try {
    return checkScenario(JSON.parse(text));
  } catch (error) {
    return refused(`This is no JSON: ${error instanceof Error ? error.message : String(error)}.`);
  }
}

const refused = (message: string): Checked => ({ scenario: null, faults: [{ path: "", message }] });
