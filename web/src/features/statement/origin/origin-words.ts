import type { Origin, Scenario } from "@restband/solver";
import { joined, readInput } from "../../../format/format-quantity.ts";
import { groupOf, type Group } from "../groups.ts";
import { fieldAt, measureOf } from "../scenario-fields.ts";

/** Where a value of a group comes from, in words: "static friction: catalogue, way maker's sheet, 0.12 to 0.18". */
export function originsIn(scenario: Scenario, group: Group): { path: string; text: string }[] {
  return Object.entries(scenario.origins)
    .filter(([path]) => groupOf(path) === group)
    .map(([path, origin]) => ({ path, text: originWords(scenario, path, origin) }));
}

function originWords(scenario: Scenario, path: string, origin: Origin): string {
  const name = (fieldAt(scenario, path)?.label ?? path).toLowerCase();
  return `${name}: ${originText(scenario, path, origin)}`;
}

/** "catalogue, way maker's sheet, 0.12 to 0.18". */
export function originText(scenario: Scenario, path: string, { kind, source, low, high }: Origin): string {
  return [kind, source, rangeWords(scenario, path, low, high)].filter(Boolean).join(", ");
}

function rangeWords(scenario: Scenario, path: string, low?: number, high?: number): string {
  const field = fieldAt(scenario, path);
  const say = (value: number): string => (field ? joined(readInput(value, measureOf(scenario, field))) : String(value));
  if (low !== undefined && high !== undefined) return `${say(low)} to ${say(high)}`;
  if (low !== undefined) return `${say(low)} or more`;
  return high === undefined ? "" : `${say(high)} or less`;
}
