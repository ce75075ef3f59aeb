import { checkScenario, type Fault, type Scenario } from "@restband/solver";
import { readPath, writePath } from "../path.ts";
import type { Sheet } from "./draft.ts";

/**
 * What of a sheet can be in force: all of it where it is valid; else with each refused value put back to what was in
 * force before, so that one wrong number holds up nothing else; else the state from before.
 */
export function checkSheet({ wanted, unread }: Sheet, before: Scenario): { inForce: Scenario; faults: Fault[] } {
  const unreadFaults = Object.entries(unread).map(([path, { message }]) => ({ path, message }));
  const checked = checkScenario(wanted);
  if (checked.scenario) return { inForce: checked.scenario, faults: unreadFaults };
  const repaired = checkScenario(putBack(wanted, before, checked.faults));
  const inForce = repaired.scenario ?? before;
  return { inForce, faults: [...unreadFaults, ...checked.faults.filter(({ path }) => !(path in unread))] };
}

function putBack(wanted: Scenario, before: Scenario, faults: readonly Fault[]): Scenario {
  return faults.reduce((scenario, { path }) => {
    const old = readPath(before, path);
    return old === undefined ? scenario : writePath(scenario, path, old);
  }, wanted);
}
