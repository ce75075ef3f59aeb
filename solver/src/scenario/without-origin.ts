import { fieldPaths } from "./field-paths.ts";
import { numberAt } from "./path.ts";
import type { Scenario } from "./scenario.ts";

/** How long a run is followed and what is asked of it come from nowhere: they are what the person wants. */
const wanted = /^(?:span|limits|settleBand)\b/u;

/**
 * The paths of the values of a scenario of which nobody has said where they come from, in its order: what a statement and
 * a revision list alike.
 */
export function pathsWithoutOrigin(scenario: Scenario): string[] {
  return fieldPaths(scenario).filter(
    (path) => !wanted.test(path) && !Object.hasOwn(scenario.origins, path) && needsOne(scenario, path),
  );
}

/** Nothing, one face and one metre of radius need none. */
function needsOne(scenario: Scenario, path: string): boolean {
  const value = numberAt(scenario, path);
  return value !== 0 && !(value === 1 && /\.(?:faces|radius)$/u.test(path));
}
