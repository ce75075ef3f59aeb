import { pathText } from "./path.ts";
import type { Scenario, Term } from "./scenario.ts";

/** The paths of all single numbers of a scenario as it stands, in its order: what can be swept and searched. */
export function fieldPaths(scenario: Scenario): string[] {
  const { body, solid, contact, incline, force, base, initial, span, settleBand, limits } = scenario;
  const numbers = { body, solid, contact, incline, force, base, initial, span, settleBand, limits };
  return numbersIn(numbers, []);
}

/** The paths an origin may be given for: every number, and the points of a table or record as one. */
export function originPaths(scenario: Scenario): Set<string> {
  const { law } = scenario.contact;
  return new Set([
    ...fieldPaths(scenario),
    ...(law.model === "table" ? ["contact.law.points"] : []),
    ...scenario.force.flatMap((term, i) => columnPaths(term, `force[${i}]`)),
    ...scenario.base.flatMap((term, i) => columnPaths(term, `base[${i}]`)),
  ]);
}

/** The canonical form may have put a digest in place of the points: they stay what an origin speaks of. */
function columnPaths(term: Term, path: string): string[] {
  return "times" in term || "digest" in term ? [`${path}.times`, `${path}.values`] : [];
}

function numbersIn(value: unknown, steps: PropertyKey[]): string[] {
  if (typeof value === "number") return [pathText(steps)];
  if (typeof value !== "object" || value === null || isData(value)) return [];
  const members: [PropertyKey, unknown][] = Array.isArray(value) ? [...value.entries()] : Object.entries(value);
  return members.flatMap(([key, member]) => numbersIn(member, [...steps, key]));
}

/** Points, and what stands for points: data, not fields. */
function isData(value: object): boolean {
  return "digest" in value || (Array.isArray(value) && typeof value[0] !== "object") || isPairs(value);
}

const isPairs = (value: object) => Array.isArray(value) && Array.isArray(value[0]);
