import {
  bodyFields,
  counterfaceChoice,
  inclineField,
  initialFields,
  lawOf,
  normalFields,
  radiusField,
  rippleFields,
  settleBandField,
  solidOf,
  spanFields,
  termOf,
  type Choice,
  type Dimension,
  type Field,
  type Scenario,
} from "@restband/solver";
import type { Measure } from "../../format/unit.ts";
import { isShare, quantityNamed } from "../../format/quantities.ts";
import { readPath, stepsOf } from "./path.ts";

/** A number of a scenario, described. `isShare`: read as a percentage. */
export type PathField = Field & { readonly isShare?: boolean };

type Members = Readonly<Record<string, Field>>;

const under = (root: string, fields: readonly Field[]): Members =>
  Object.fromEntries(fields.map((field) => [`${root}.${field.key}`, field]));

const beltField = counterfaceChoice.options.flatMap(({ field }) => field ?? []);

/** The numbers that belong to no kind. */
const own: Members = {
  ...under("body", bodyFields),
  ...under("contact.normal", normalFields),
  ...under("contact.normal.ripple", rippleFields),
  ...under("contact", [radiusField]),
  ...under("contact.counterface", beltField),
  ...under("initial", initialFields),
  ...under("span", spanFields),
  incline: inclineField,
  settleBand: settleBandField,
};

/** What a turning body calls differently. */
const angularLabels: Readonly<Record<string, string>> = {
  "body.inertia": "Moment of inertia",
  "body.stiffness": "Torsional stiffness",
  "initial.displacement": "Starting angle",
};

/**
 * What the number at a path is: label, unit, bounds. A kind's own members are described by the kind; undefined where the
 * path names no number of this scenario.
 */
export function fieldAt(scenario: Scenario, path: string): PathField | undefined {
  const field = own[path];
  if (!field) return fieldOfKind(scenario, path);
  if (!hasPlace(scenario, path)) return undefined;
  const label = scenario.motion === "angular" ? angularLabels[path] : undefined;
  return label ? { ...field, label, help: undefined } : field;
}

/** A ripple that is not there, a counterface that stands still: their numbers have no place. */
function hasPlace(scenario: Scenario, path: string): boolean {
  const parent = path.slice(0, Math.max(0, path.lastIndexOf(".")));
  const holder = readPath(scenario, parent);
  return typeof holder === "object" && holder !== null;
}

function fieldOfKind(scenario: Scenario, path: string): PathField | undefined {
  const [root, second, third] = stepsOf(path);
  const last = String(stepsOf(path).at(-1));
  if (root === "contact" && second === "law") return find(lawOf(scenario.contact.law.model), last);
  if (root === "solid") return find(solidOf(scenario.solid.model), last);
  if (root === "force" || root === "base") return fieldOfTerm(scenario, root, Number(second), last);
  if (root === "limits") return fieldOfLimit(scenario, Number(second), String(third));
  return undefined;
}

interface Kind {
  readonly fields: readonly Field[];
  readonly choices?: readonly Choice[];
}

/** A number of a kind, or the number that goes with one of its words. */
function find({ fields, choices = [] }: Kind, key: string): Field | undefined {
  const withWords = choices.flatMap(({ options }) => options.flatMap((option) => option.field ?? []));
  return [...fields, ...withWords].find((each) => each.key === key);
}

/** Terms say "force" for what is F or y alike: on the base it is a displacement, and its rate a velocity. */
const onBase: Partial<Record<Dimension, Dimension>> = { force: "displacement", forceRate: "velocity" };

function fieldOfTerm(scenario: Scenario, place: "force" | "base", index: number, key: string): Field | undefined {
  const term = scenario[place][index];
  const described = term && find(termOf(term.kind), key);
  if (!described || place === "force") return described;
  return { ...described, dimension: onBase[described.dimension] ?? described.dimension };
}

function fieldOfLimit(scenario: Scenario, index: number, bound: string): PathField | undefined {
  const quantity = quantityNamed(scenario.limits[index]?.quantity);
  if (!quantity || (bound !== "min" && bound !== "max")) return undefined;
  return {
    key: bound,
    label: `${quantity.label}, ${bound === "min" ? "at least" : "at most"}`,
    dimension: quantity.dimension,
    initial: 0,
    optional: true,
    isShare: isShare(quantity.name),
  };
}

/** What a number measures on this body. */
export const measureOf = ({ motion }: Scenario, { dimension, isShare: isPart }: PathField): Measure => ({
  dimension,
  motion,
  isShare: isPart,
});

/** The number at a path; undefined where there is none, also where an optional one is left out. */
export function numberAt(scenario: Scenario, path: string): number | undefined {
  const value = readPath(scenario, path);
  return typeof value === "number" ? value : undefined;
}
