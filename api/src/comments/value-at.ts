import type { Scenario } from "@restband/solver";

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
