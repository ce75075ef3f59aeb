import { termOf } from "../excitation/index.ts";
import type { Choice, Dimension, Field } from "../field.ts";
import { lawOf } from "../friction/index.ts";
import { fieldPaths } from "./field-paths.ts";
import * as fields from "./fields.ts";
import { numberAt, stepsOf, withNumber } from "./path.ts";
import type { Scenario } from "./scenario.ts";
import { solidOf } from "../solid/index.ts";

/** A number of a scenario, described as its kind describes it, and what it is now. */
export interface NumericField extends Field {
  readonly path: string;
  /** SI, as the scenario stores it. */
  readonly value: number;
}

/**
 * Every number of a scenario as it stands that can be varied, in its order: label, unit, bounds, value. Limits are left
 * out: they are what a search is for, not what it varies.
 */
export function numericFields(scenario: Scenario): NumericField[] {
  return variablePaths(scenario).map((path) => ({
    ...describe(scenario, path),
    path,
    value: numberAt(scenario, path),
  }));
}

/** The number at one path; undefined where the path names no number of this scenario. */
export function numericField(scenario: Scenario, path: string): NumericField | undefined {
  if (!variablePaths(scenario).includes(path)) return undefined;
  return { ...describe(scenario, path), path, value: numberAt(scenario, path) };
}

/** The number at one of a scenario's field paths. Throws RangeError where the path names none. */
export function readField(scenario: Scenario, path: string): number {
  return numberAt(scenario, known(scenario, path));
}

/**
 * A copy of a scenario with another number at one of its field paths. Whether it may stand there is for `checkScenario` to
 * say. Throws RangeError where the path names none.
 */
export function withField(scenario: Scenario, path: string, value: number): Scenario {
  return withNumber(scenario, known(scenario, path), value);
}

function known(scenario: Scenario, path: string): string {
  if (variablePaths(scenario).includes(path)) return path;
  throw new RangeError(`this scenario has no number called ${JSON.stringify(path)}`);
}

/** The paths of the numbers that can be varied. */
export const variablePaths = (scenario: Scenario): string[] => fieldPaths({ ...scenario, limits: [] });

const under = (root: string, list: readonly Field[]): [string, Field][] =>
  list.map((field) => [root + field.key, field]);
const belt = fields.counterfaceChoice.options.flatMap(({ field }) => field ?? []);

/** The numbers that belong to no kind, by path. */
const own: ReadonlyMap<string, Field> = new Map([
  ...under("body.", fields.bodyFields),
  ...under("contact.normal.", fields.normalFields),
  ...under("contact.normal.ripple.", fields.rippleFields),
  ...under("contact.", [fields.radiusField]),
  ...under("contact.counterface.", belt),
  ...under("initial.", fields.initialFields),
  ...under("span.", fields.spanFields),
  ...under("", [fields.inclineField, fields.settleBandField]),
]);

/** What an angular body calls differently. */
const angularLabels: Readonly<Record<string, string>> = {
  "body.inertia": "Moment of inertia",
  "body.stiffness": "Torsional stiffness",
  "initial.displacement": "Starting angle",
};

function describe(scenario: Scenario, path: string): Field {
  const field = own.get(path);
  if (field === undefined) return ofKind(scenario, path);
  const label = scenario.motion === "angular" ? angularLabels[path] : undefined;
  return label === undefined ? field : { ...field, label, help: undefined };
}

function ofKind(scenario: Scenario, path: string): Field {
  const [root, second] = stepsOf(path);
  const key = stepsOf(path).at(-1) as string;
  if (root === "contact") return memberOf(lawOf(scenario.contact.law.model), key);
  if (root === "solid") return memberOf(solidOf(scenario.solid.model), key);
  return ofTerm(scenario, root as "force" | "base", Number(second), key);
}

/** A number of a kind, or the one that goes with one of its words. */
function memberOf({ fields: list, choices = [] }: Kind, key: string): Field {
  const withWords = choices.flatMap(({ options }) => options.flatMap(({ field }) => field ?? []));
  const found = [...list, ...withWords].find((field) => field.key === key);
  if (found === undefined) throw new RangeError(`no field of this kind is called ${JSON.stringify(key)}`);
  return found;
}

interface Kind {
  readonly fields: readonly Field[];
  readonly choices?: readonly Choice[];
}

/** Terms say "force" for what is F or y alike: on the base it is a displacement, and its rate a velocity. */
const onBase: Partial<Record<Dimension, Dimension>> = { force: "displacement", forceRate: "velocity" };

function ofTerm(scenario: Scenario, place: "force" | "base", i: number, key: string): Field {
  const field = memberOf(termOf(scenario[place][i].kind), key);
  return place === "force" ? field : { ...field, dimension: onBase[field.dimension] ?? field.dimension };
}
