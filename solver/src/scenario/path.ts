import type { Scenario } from "./scenario.ts";

/** A path as messages and origins write it: `force[0].times[2]`. */
export function pathText(steps: readonly PropertyKey[]): string {
  return steps.reduce<string>((path, step) => {
    if (typeof step === "number") return `${path}[${step}]`;
    return path === "" ? String(step) : `${path}.${String(step)}`;
  }, "");
}

/** The number at one of a scenario's `fieldPaths`. */
export function numberAt(scenario: Scenario, path: string): number {
  return stepsOf(path).reduce<unknown>((part, step) => (part as Record<string, unknown>)[step], scenario) as number;
}

/** A copy of a scenario with another number at one of its `fieldPaths`; all that lies beside the path is shared. */
export function withNumber(scenario: Scenario, path: string, value: number): Scenario {
  return replaced(scenario, stepsOf(path), value) as Scenario;
}

/** The steps of a path, as text: `force[0].rate` is force, 0, rate. */
export const stepsOf = (path: string) => path.split(/[.[\]]+/).filter((step) => step !== "");

function replaced(part: unknown, [step, ...rest]: readonly string[], value: number): unknown {
  if (step === undefined) return value;
  const next = replaced((part as Record<string, unknown>)[step], rest, value);
  if (!Array.isArray(part)) return { ...(part as object), [step]: next };
  return part.map((item: unknown, i) => (i === Number(step) ? next : item));
}
