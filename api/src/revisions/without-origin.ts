import { fieldPaths, type Scenario } from "@restband/solver";

/** How long a run is followed and what is asked of it come from nowhere: they are what the person wants. */
const wanted = /^(?:span|limits|settleBand)\b/u;

/** The paths of the values of a scenario of which nobody has said where they come from. */
export function pathsWithoutOrigin(scenario: Scenario): string[] {
  return fieldPaths(scenario).filter(
    (path) => !wanted.test(path) && !(path in scenario.origins) && needsOne(scenario, path),
  );
}

/** Nothing, one face and one metre of radius need none. */
function needsOne(scenario: Scenario, path: string): boolean {
  const value = valueAt(scenario, path);
  return value !== 0 && !(value === 1 && /\.(?:faces|radius)$/u.test(path));
}

/** The value at a path of the format (`force[0].amplitude`); undefined where there is none. */
export function valueAt(scenario: Scenario, path: string): unknown {
  const steps = path.replaceAll(/\[(\d+)\]/gu, ".$1").split(".");
  return steps.reduce<unknown>(
    (value, step) =>
      typeof value === "object" && value !== null && Object.hasOwn(value, step)
        ? (value as Record<string, unknown>)[step]
        : undefined,
    scenario,
  );
}
