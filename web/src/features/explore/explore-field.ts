import { numericFields, type NumericField, type Scenario } from "@restband/solver";
import { nounOf } from "../../format/noun.ts";
import type { Measure } from "../../format/unit.ts";

/** A number of a scenario that can be searched, swept or scattered, by the name a sentence calls it. */
export interface ExploreField extends NumericField {
  /** "feed", "kinetic friction": without an article, in lower case. */
  readonly name: string;
  readonly measure: Measure;
}

/** How a run is carried out is no question about the machine; whole numbers have no threshold. */
const leftOut = /^span\.max/;

/** The numbers of a scenario that an engineer may ask about, in its order. */
export function exploreFields(scenario: Scenario): ExploreField[] {
  const asked = numericFields(scenario).filter(
    ({ path, integer }) =>
      !leftOut.test(path) && integer !== true && !(path === "contact.radius" && isLinear(scenario)),
  );
  return asked.map((field) => ({
    ...field,
    name: nameOf(scenario, field),
    measure: { dimension: field.dimension, motion: scenario.motion },
  }));
}

export const exploreField = (scenario: Scenario, path: string): ExploreField | undefined =>
  exploreFields(scenario).find((field) => field.path === path);

const isLinear = ({ motion }: Scenario): boolean => motion === "linear";

function nameOf(scenario: Scenario, { path, label }: NumericField): string {
  const term = /^(force|base)\[(\d+)\]\.(\w+)$/.exec(path);
  const plain = label.charAt(0).toLowerCase() + label.slice(1);
  if (path === "contact.counterface.velocity") return "belt speed";
  if (!term) return path.startsWith("initial.") || path.startsWith("span.") ? plain : plain.replace(/ per face$/, "");
  const [, place, index, key] = term;
  if (isFeed(scenario, place, Number(index), key)) return "feed";
  const of = place === "force" ? "force" : "drive";
  return scenario[place as "force" | "base"].length > 1
    ? `${plain} of ${of} ${Number(index) + 1}`
    : `${plain} of the ${of}`;
}

/** A ramp of the base alone is what the trade calls the feed. */
function isFeed(scenario: Scenario, place: string, index: number, key: string): boolean {
  const only = scenario.base.filter(({ kind }) => kind === "ramp").length === 1;
  return place === "base" && key === "rate" && only && scenario.base[index].kind === "ramp";
}

/** The field a person most likely asks about first: the feed, the belt, what drives it, the friction. */
export function likeliestField(fields: readonly ExploreField[]): ExploreField | undefined {
  const wanted = ["feed", "belt speed"];
  return (
    fields.find(({ name }) => wanted.includes(name)) ??
    fields.find(({ path }) => path === "contact.law.static") ??
    fields.at(0)
  );
}

/** "The carriage", "the rotor". */
export const theBody = (scenario: Scenario): string => `the ${nounOf(scenario)}`;

/** Where to look around the value entered, SI: two decades each way; from nothing where it is nothing. */
export function rangeAround(field: ExploreField, { body }: Scenario): { low: number; high: number } {
  const { value, path, dimension, initial } = field;
  if (path.startsWith("contact.law.") && dimension === "none" && value <= 1) return { low: 0.01, high: 1 };
  if (dimension === "angle") return value < 0 ? { low: -60, high: 0 } : { low: 0, high: 60 };
  if (value > 0) return { low: value / 100, high: value * 100 };
  if (value < 0) return { low: value * 100, high: value / 100 };
  if (path === "body.viscous" && body.stiffness > 0)
    return { low: 0, high: 2 * Math.sqrt(body.stiffness * body.inertia) };
  return { low: 0, high: 10 * Math.abs(initial) || 1 };
}
