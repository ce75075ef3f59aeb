import type { Scenario } from "@restband/solver";
import { readPath, writePath } from "../path.ts";
import { fieldAt, measureOf } from "../scenario-fields.ts";
import { joined, readInput } from "../../../format/format-quantity.ts";
import { groups } from "../groups.ts";
import { sayTerm } from "../sentence/drive-sentence.ts";
import { plainText } from "../sentence/plain-text.ts";
import { isSame, type Work } from "./work.ts";

export type Side = "mine" | "theirs";

/** One thing in which two versions differ, with both in words. */
export interface Difference {
  readonly path: string;
  readonly label: string;
  readonly mine: string;
  readonly theirs: string;
  /** Where only one of the two changed it since the version both began from, that one; else one's own. */
  readonly likely: Side;
}

/** Parts that are taken as a whole where their kind or length differs: a law is no mixture of two. */
const wholes: readonly { path: string; label: string }[] = [
  { path: "contact.law", label: "Friction law" },
  { path: "contact.normal.ripple", label: "Ripple of the pressing force" },
  { path: "contact.counterface", label: "Counterface" },
  { path: "solid", label: "Solid damping" },
  { path: "base", label: "Motion of the far end" },
  { path: "force", label: "Forces" },
  { path: "limits", label: "Limits" },
  { path: "origins", label: "Where values come from" },
];

const singles: readonly { path: string; label: string }[] = [
  { path: "title", label: "Title" },
  { path: "purpose", label: "Purpose" },
  { path: "motion", label: "Motion" },
  { path: "contact.normal.weight", label: "Its weight presses too" },
  { path: "span.untilRest", label: "End when it rests for good" },
];

const numbers = [
  ...["inertia", "stiffness", "cubic", "viscous"].map((key) => `body.${key}`),
  ...["preload", "faces"].map((key) => `contact.normal.${key}`),
  "contact.radius",
  "incline",
  "initial.displacement",
  "initial.velocity",
  "span.seconds",
  "span.maxEvents",
  "span.maxWork",
  "settleBand",
];

/** Everything in which two versions of a scenario differ. */
export function differencesOf(base: Work, mine: Work, theirs: Work): Difference[] {
  return [...contentDifferences(base.content, mine.content, theirs.content), ...offDifference(base, mine, theirs)];
}

/** The path of what is switched off: no path of the format. */
const OFF = "switchedOff";

function offDifference(base: Work, mine: Work, theirs: Work): Difference[] {
  if (isSame(mine.switchedOff, theirs.switchedOff)) return [];
  const likely = isSame(mine.switchedOff, base.switchedOff) ? "theirs" : "mine";
  return [{ path: OFF, label: "Switched off", mine: sayOff(mine), theirs: sayOff(theirs), likely }];
}

function sayOff({ content, switchedOff }: Work): string {
  const terms = switchedOff.map(({ place, term, units }) => sayTerm(content, place, term, units));
  return terms.length === 0 ? "nothing" : terms.join(". ");
}

function contentDifferences(base: Scenario, mine: Scenario, theirs: Scenario): Difference[] {
  const paths = [
    ...singles,
    ...numbers.map((path) => ({ path, label: fieldAt(mine, path)?.label ?? path })),
    ...wholes,
  ];
  return paths
    .filter(({ path }) => !isSame(readPath(mine, path), readPath(theirs, path)))
    .map(({ path, label }) => ({
      path,
      label,
      mine: say(mine, path),
      theirs: say(theirs, path),
      likely: isSame(readPath(mine, path), readPath(base, path)) ? "theirs" : "mine",
    }));
}

/** One's own version with the chosen parts of the other. */
export function merged(mine: Work, theirs: Work, choices: Readonly<Record<string, Side>>): Work {
  const { [OFF]: off, ...parts } = choices;
  const content = Object.entries(parts).reduce(
    (scenario, [path, side]) =>
      side === "theirs" ? writePath(scenario, path, readPath(theirs.content, path)) : scenario,
    mine.content,
  );
  return { content, switchedOff: (off === "theirs" ? theirs : mine).switchedOff };
}

/** What stands at a path, in words. */
function say(scenario: Scenario, path: string): string {
  const value = readPath(scenario, path);
  const field = fieldAt(scenario, path);
  if (typeof value === "number" && field) return joined(readInput(value, measureOf(scenario, field)));
  if (typeof value === "boolean") return value ? "yes" : "no";
  if (value === null) return "none";
  return typeof value === "string" && !isUnderSentence(path) ? value || "none" : sayWhole(scenario, path);
}

const isUnderSentence = (path: string): boolean => wholes.some((whole) => whole.path === path);

/** The sentence of the group a part belongs to says it best. */
function sayWhole(scenario: Scenario, path: string): string {
  if (path === "origins") return `${Object.keys(scenario.origins).length} values have an origin`;
  const group = groups.find(({ roots }) => roots.includes(path.split(".")[0])) ?? groups[0];
  return plainText(scenario, group.sentence(scenario));
}
