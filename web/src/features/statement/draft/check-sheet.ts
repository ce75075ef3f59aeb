import { checkScenario, fieldPaths, type Fault, type Scenario } from "@restband/solver";
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
  const faults = blamed(checked.faults, wanted, before);
  const inForce = checkScenario(putBack(wanted, before, faults)).scenario ?? before;
  return { inForce, faults: [...unreadFaults, ...faults.filter(({ path }) => !(path in unread))] };
}

/**
 * A rule across two values is told at one of them; a person looks for it at the one just changed. A fault that goes away
 * when a changed value is put back belongs to that value.
 */
function blamed(faults: readonly Fault[], wanted: Scenario, before: Scenario): Fault[] {
  const changed = fieldPaths(wanted).filter((path) => hasChanged(wanted, before, path));
  const cures = changed.map((path) => ({
    path,
    left: checkScenario(writePath(wanted, path, readPath(before, path))).faults,
  }));
  return faults.map((fault) => {
    const isCured = (left: readonly Fault[]): boolean => !left.some(({ path }) => path === fault.path);
    if (changed.includes(fault.path)) return fault;
    return { ...fault, path: cures.find(({ left }) => isCured(left))?.path ?? fault.path };
  });
}

function hasChanged(wanted: Scenario, before: Scenario, path: string): boolean {
  const old = readPath(before, path);
  return typeof old === "number" && old !== readPath(wanted, path);
}

function putBack(wanted: Scenario, before: Scenario, faults: readonly Fault[]): Scenario {
  return faults.reduce((scenario, { path }) => {
    const old = readPath(before, path);
    return old === undefined ? scenario : writePath(scenario, path, old);
  }, wanted);
}
